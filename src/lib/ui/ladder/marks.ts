import type { CoilState, ContactState } from './states';

/** Half height and half gap of a contact: of the rung in work, of an upright list, of the other rungs. */
export const SIZES = {
	large: { height: 22, gap: 13, clock: 12, arrow: [11, 8] },
	upright: { height: 15, gap: 10.5, clock: 9.5, arrow: [8, 5.5] },
	small: { height: 11, gap: 7, clock: 7.5, arrow: [6, 4] },
} as const;

export type MarkSize = keyof typeof SIZES;

/** How far the line stays away from the middle of a contact: at its bars, or at the feet of the bridge outside them. */
export const reachOf = (state: ContactState, size: MarkSize): number =>
	state === 'not applicable' ? BRIDGES[size] : SIZES[size].gap;

/** How far the line stays away from the middle of a coil. */
export const coilReach = (state: CoilState, radius: number): number =>
	state === 'ready' ? radius + 5 : state === 'not ready' || state === 'held' ? radius * 0.9 : radius;

export const BRIDGES = { large: 24, upright: 19, small: 14 } as const;
