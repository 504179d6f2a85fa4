import type { Plant } from '../../plant';
import { arc, circle, polygon, polyline } from '../path';
import { area, stroke, type Box, type Point, type Shape } from '../shape';

type Outline = Plant['volumes'][number]['outline'];

/** Something with an outline: an enclosed volume, its surroundings, a vessel of inert gas. */
export type Equipment = {
	readonly id: string;
	readonly title: string;
	readonly outline: Outline;
	readonly box: Box;
	/** Written inside: the gas of a vessel. */
	readonly content?: string;
};

/** Sizes on the 100 x 60 grid where the plant description gives none. */
export const USUAL_SIZES: { readonly [outline in Outline]: readonly [width: number, height: number] } = {
	'hot gas generator': [13, 7],
	mill: [10, 22],
	'bag filter': [12, 22],
	fan: [6, 6],
	bin: [9, 11],
	silo: [10, 15],
	chute: [5, 8],
	screw: [12, 2.6],
	duct: [2, 8],
	stack: [2, 12],
	vessel: [4, 9],
};

/** Equipment as outlines of flow diagrams are drawn (ISO 10628, from memory, verify), in any box. */
export const equipmentShapes = (outline: Outline, box: Box): readonly Shape[] => [
	stroke(polygon(contourOf(outline, box)), { pen: outline === 'duct' ? 'line' : 'bold', fill: 'paper' }),
	...DETAILS[outline](within(box), box),
];

/** The outer edge, for a leader to end on. */
export function contourOf(outline: Outline, box: Box): readonly Point[] {
	const at = within(box);
	switch (outline) {
		case 'fan':
			return rounded(at(0.5, 0.5), Math.min(box.width, box.height) / 2, 0, 0);
		case 'vessel':
		case 'screw': {
			const radius = Math.min(box.width, box.height) / 2;
			return rounded(at(0.5, 0.5), radius, box.width / 2 - radius, box.height / 2 - radius);
		}
		default:
			return CONTOURS[outline].map(([x, y]) => at(x, y));
	}
}

/** A circle, stretched to a stadium by the half lengths of its straight sides. */
function rounded({ x, y }: Point, radius: number, dx: number, dy: number): readonly Point[] {
	return Array.from({ length: 72 }, (_, i) => {
		const angle = ((i + 0.5) * Math.PI) / 36;
		const [c, s] = [Math.cos(angle), Math.sin(angle)];
		return { x: x + Math.sign(c) * dx + c * radius, y: y + Math.sign(s) * dy + s * radius };
	});
}

/** A point of the box, by parts of its width and height. */
type Within = (x: number, y: number) => Point;

const within =
	(box: Box): Within =>
	(x, y) => ({ x: box.x + x * box.width, y: box.y + y * box.height });

const inner = (points: readonly Point[]): Shape => stroke(polyline(points), { pen: 'line' });

type Corners = readonly (readonly [x: number, y: number])[];

const hopper = (shoulder: number): Corners => [
	[0, 0],
	[1, 0],
	[1, shoulder],
	[0.62, 1],
	[0.38, 1],
	[0, shoulder],
];

const CONTOURS: { readonly [outline in Exclude<Outline, 'fan' | 'vessel' | 'screw'>]: Corners } = {
	'hot gas generator': [
		[0, 0],
		[0.84, 0],
		[1, 0.3],
		[1, 0.7],
		[0.84, 1],
		[0, 1],
	],
	mill: [
		[0, 1],
		[0, 0.31],
		[0.27, 0.17],
		[0.27, 0],
		[0.73, 0],
		[0.73, 0.17],
		[1, 0.31],
		[1, 1],
	],
	'bag filter': [
		[0, 0],
		[1, 0],
		[1, 1],
		[0, 1],
	],
	bin: hopper(0.5),
	silo: hopper(0.7),
	chute: [
		[0, 0],
		[0.35, 0],
		[1, 1],
		[0.65, 1],
	],
	duct: [
		[0, 0],
		[1, 0],
		[1, 1],
		[0, 1],
	],
	stack: [
		[0, 0],
		[1, 0],
		[1, 1],
		[0, 1],
	],
};

const DETAILS: { readonly [outline in Outline]: (at: Within, box: Box) => readonly Shape[] } = {
	'hot gas generator': (at, box) => [
		stroke(polyline([at(0, 0.3), at(-0.1, 0.3), at(-0.1, 0.7), at(0, 0.7)]), { pen: 'bold' }),
		flame(at, box),
	],
	mill: (at) => [
		inner([at(0.27, 0.17), at(0.73, 0.17)]),
		stroke(polygon([at(0.33, 0.2), at(0.67, 0.2), at(0.6, 0.37), at(0.4, 0.37)]), { pen: 'line' }),
		...[0.42, 0.5, 0.58].map((x) => inner([at(x, 0.2), at(0.5 + (x - 0.5) * 0.6, 0.37)])),
		roller(at, 0.3, 1),
		roller(at, 0.7, -1),
		stroke(polygon([at(0.15, 0.75), at(0.85, 0.75), at(0.85, 0.8), at(0.15, 0.8)]), { pen: 'line' }),
		inner([at(0.38, 0.8), at(0.38, 1)]),
		inner([at(0.62, 0.8), at(0.62, 1)]),
	],
	'bag filter': (at) => [
		inner([at(0, 0.22), at(1, 0.22)]),
		...Array.from({ length: 8 }, (_, i) => bag(at, 0.075 + i * 0.11)),
	],
	fan: (at, box) => {
		const [centre, radius] = [at(0.5, 0.5), Math.min(box.width, box.height) / 2];
		return [
			stroke([...arc(centre, radius * 0.6, 0, 80), ...arc(centre, radius * 0.6, 180, 260)], { pen: 'line' }),
			area(circle(centre, radius * 0.16), 'ink'),
		];
	},
	bin: () => [],
	silo: () => [],
	chute: () => [],
	screw: (at) => [inner(Array.from({ length: 13 }, (_, i) => at(0.06 + (i * 0.88) / 12, i % 2 === 0 ? 0.75 : 0.25)))],
	duct: () => [],
	stack: (at) => [stroke(polyline([at(-0.4, 0), at(1.4, 0)]), { pen: 'bold' })],
	vessel: () => [],
};

function flame(at: Within, box: Box): Shape {
	const [left, right, lift] = [at(0.1, 0.5), at(0.58, 0.5), box.height * 0.3];
	return stroke(
		[
			['M', left.x, left.y],
			['C', left.x + box.width * 0.13, left.y - lift, right.x - box.width * 0.13, right.y - lift, right.x, right.y],
			['C', right.x - box.width * 0.13, right.y + lift, left.x + box.width * 0.13, left.y + lift, left.x, left.y],
			['Z'],
		],
		{ pen: 'line' },
	);
}

/** A grinding roller leaning on the table: a box turned about its middle. */
function roller(at: Within, x: number, lean: 1 | -1): Shape {
	const corners: Corners = [
		[-0.11, -0.075],
		[0.09, -0.095],
		[0.13, 0.075],
		[-0.07, 0.095],
	];
	const points = corners.map(([dx, dy]) => at(x + dx * lean, 0.64 + dy));
	return stroke(polygon(points), { pen: 'line', fill: 'paper' });
}

function bag(at: Within, x: number): Shape {
	const [top, bottom] = [at(x, 0.22), at(x + 0.075, 0.84)];
	const drop = (bottom.x - top.x) * 0.6;
	return stroke(
		[
			['M', top.x, top.y],
			['L', top.x, bottom.y],
			['C', top.x, bottom.y + drop, bottom.x, bottom.y + drop, bottom.x, bottom.y],
			['L', bottom.x, top.y],
		],
		{ pen: 'line' },
	);
}
