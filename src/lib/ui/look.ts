/** The three looks of every screen and the words that choose them: day, a dark control room, sun on the glass. */
export const LOOKS = { day: 'Day', night: 'Night', glare: 'Glare' } as const;

export type Look = keyof typeof LOOKS;

export const isLook = (text: unknown): text is Look => typeof text === 'string' && Object.hasOwn(LOOKS, text);
