import { cubicOut } from 'svelte/easing';
import { prefersReducedMotion } from 'svelte/motion';
import { draw, type TransitionConfig } from 'svelte/transition';

const lasts = (milliseconds: number): number => (prefersReducedMotion.current ? 0 : milliseconds);

/** The power line runs on to its new end, once. Only what changes moves: a page that opens is drawn as it is. */
export const runsOn = (piece: SVGPathElement): TransitionConfig =>
	draw(piece, { duration: lasts(500), easing: cubicOut });

/** A lapse withdraws it. */
export const withdraws = (piece: SVGPathElement): TransitionConfig => draw(piece, { duration: lasts(250) });

/** A coil fills from its middle. */
export const fills = (disc: SVGCircleElement): TransitionConfig => ({
	duration: lasts(200),
	css: (t) => `r: ${t * disc.r.baseVal.value}px`,
});
