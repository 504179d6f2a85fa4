/** The three looks of every screen: day, a dark control room, sun on the glass. */
export const LOOKS = ['day', 'night', 'glare'] as const;

export type Look = (typeof LOOKS)[number];

export const isLook = (text: unknown): text is Look => LOOKS.includes(text as Look);
