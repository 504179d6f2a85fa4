import type { Plant } from '../../plant';
import { arc, circle, polygon, segment } from '../path';
import { area, stroke, type Point, type Shape } from '../shape';
import { distance, nearest, piecesOf, type Run } from './ducts';

type Element = Plant['elements'][number];

/** A valve, damper or gate on its duct, in the position that was seen; half way where nobody has looked. */
export function elementShapes(
	{ kind }: Element,
	position: string | undefined,
	at: Point,
	along: Point,
	size: number,
): readonly Shape[] {
	const on = (forward: number, aside: number): Point => ({
		x: at.x + (forward * along.x - aside * along.y) * size,
		y: at.y + (forward * along.y + aside * along.x) * size,
	});
	const bar = (a: Point, b: Point) => stroke(segment(a.x, a.y, b.x, b.y), { pen: 'bold' });
	switch (kind) {
		case 'damper': {
			const angle = (BLADE[position ?? ''] ?? 45) * (Math.PI / 180);
			const [c, s] = [Math.cos(angle) * 1.15, Math.sin(angle) * 1.15];
			return [bar(on(-c, -s), on(c, s)), area(circle(at, size * 0.26), 'ink')];
		}
		case 'valve':
			return [
				stroke([...polygon([on(-1, -0.7), on(0, 0), on(-1, 0.7)]), ...polygon([on(1, -0.7), on(0, 0), on(1, 0.7)])], {
					pen: 'line',
					fill: isShut(position) ? 'ink' : 'paper',
				}),
			];
		case 'slide gate':
		case 'blind':
			return isShut(position) || position === undefined
				? [bar(on(0, -1.2), on(0, 1.2)), bar(on(-0.3, -1.2), on(0.3, -1.2))]
				: [bar(on(0, -1.9), on(0, -0.7)), bar(on(-0.3, -1.9), on(0.3, -1.9))];
		case 'rotary valve':
			return [
				stroke(circle(at, size * 1.1), { pen: 'bold', fill: 'paper' }),
				stroke(
					[-0.75, 0.75].flatMap((d) =>
						segment(at.x - 0.75 * size, at.y - d * size, at.x + 0.75 * size, at.y + d * size),
					),
					{ pen: 'line' },
				),
			];
		case 'door':
			return [
				stroke(polygon([on(-0.8, -0.5), on(0.8, -0.5), on(0.8, 0.5), on(-0.8, 0.5)]), { pen: 'line', fill: 'paper' }),
				area(circle(on(0.45, 0), size * 0.14), 'ink'),
			];
		case 'explosion vent':
			return [
				stroke([...arc(at, size, -180, -90), ...arc(at, size, -90, 0).slice(1), ['Z']], { pen: 'line', fill: 'paper' }),
				stroke(segment(at.x - size * 1.3, at.y, at.x + size * 1.3, at.y), { pen: 'bold' }),
			];
	}
}

export const isShut = (position: string | undefined): boolean =>
	position !== undefined && /^(shut|closed)\b/i.test(position);

/** The direction of the duct under a point; upright where there is none near. */
export function alongDuct(at: Point, runs: readonly Run[], reach: number): Point {
	const near = runs
		.flatMap(({ points }) => piecesOf(points))
		.filter(({ length }) => length > 0)
		.map((piece) => ({ piece, away: distance(at, nearest(at, piece)) }))
		.sort((a, b) => a.away - b.away)[0];
	if (near === undefined || near.away > reach) return { x: 0, y: 1 };
	const { a, b, length } = near.piece;
	return { x: (b.x - a.x) / length, y: (b.y - a.y) / length };
}

/** Angle between a damper's blade and its duct. */
const BLADE: { readonly [position: string]: number } = { open: 0, shut: 90, closed: 90 };
