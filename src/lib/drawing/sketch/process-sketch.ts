import type { Plant } from '../../plant';
import { roughly } from '../roughly';
import { group, lettering, type Box, type Drawing, type Measure, type Shape } from '../shape';
import { bubbleItem, bubbleShapes, type SketchReading, type Type } from './bubble';
import { arrowShapes, ductShapes, hasWalls, piecesOf } from './ducts';
import { elementNameItem, elementNameShapes, type ElementName, type SketchElement } from './element-names';
import { around, grown } from './clash';
import { alongDuct, elementShapes } from './elements';
import { equipmentShapes, type Equipment } from './equipment';
import { layoutOf, type Layout } from './layout';
import { nameItem, nameShapes } from './names';
import type { Obstacles } from './item';
import { placeItems } from './placing';
import { sheetShapes } from './sheet';

export type SketchLook = {
	readonly width: number;
	/** Newest value of each measuring point, by tag. */
	readonly readings?: ReadonlyMap<string, SketchReading>;
	/** Position last seen of each valve and damper, by tag. */
	readonly positions?: ReadonlyMap<string, SketchElement>;
	/** Size of the lettering; by default that of a screen. */
	readonly lettering?: number;
	readonly measure?: Measure;
};

/** The plant as a flow diagram: equipment, ducts, dampers in their positions, and every measuring point with its last value. */
export function processSketch(plant: Plant, look: SketchLook): Drawing {
	const { width, readings, positions, lettering: size = 15, measure = roughly } = look;
	const type: Type = { size, measure };
	const margin = Math.max(12, width * 0.017);
	const grid = (width - 2 * margin) / GRID.width;
	const height = GRID.height * grid + 2 * margin;
	const duct = grid * DUCT;
	const layout = layoutOf(plant, grid, margin, readings);
	const names = layout.equipment.map((equipment) => ({
		item: nameItem(equipment, type),
		draw: nameShapes(equipment, type),
	}));
	const tags = layout.elements.map(({ element: { tag }, at }) => {
		const seen = positions?.get(tag);
		const name: ElementName = { tag, at, ...(seen === undefined ? {} : { seen }) };
		return { item: elementNameItem(name, duct, type), draw: elementNameShapes(name, type) };
	});
	const bubbles = layout.bubbles.map((bubble) => ({
		item: bubbleItem(bubble, type),
		draw: bubbleShapes(bubble, type),
	}));
	// What is most bound to its place comes first.
	const lettered = [...bubbles, ...tags, ...names];
	const sheet = { x: margin + 3, y: margin + 3, width: width - 2 * margin - 6, height: height - 2 * margin - 6 };
	const places = placeItems(
		lettered.map(({ item }) => item),
		obstaclesOf(layout, duct, sheet),
	);
	const shapes = [
		...sheetShapes({ width, height }, margin),
		...ductShapes(layout.runs, duct),
		...layout.equipment.map((equipment) => equipmentGroup(equipment, size)),
		...arrows(layout, duct),
		...elementGroups(layout, positions, duct),
		...lettered.flatMap(({ draw }, i) => (places[i] === undefined ? [] : draw(places[i]))),
	];
	return { width, height, shapes };
}

function obstaclesOf({ equipment, elements, runs }: Layout, duct: number, sheet: Box): Obstacles {
	const along = (walled: boolean, by: number): readonly Box[] =>
		runs
			.filter((run) => hasWalls(run) === walled)
			.flatMap((run) => piecesOf(run.points).map(({ a, b }) => grown(around([a, b]), by)));
	return {
		hard: [
			...equipment.map(({ box }) => box),
			...elements.map(({ at }) => grown({ ...at, width: 0, height: 0 }, duct)),
			...along(true, duct / 2),
		],
		soft: along(false, 2),
		sheet,
	};
}

function equipmentGroup({ id, title, outline, box, content }: Equipment, size: number): Shape {
	const middle = { x: box.x + box.width / 2, y: box.y + box.height / 2 + size * 0.4 };
	return group(`equipment ${id}`, `${id} ${title}`, [
		...(outline === 'duct' ? [] : equipmentShapes(outline, box)),
		...(content === undefined
			? []
			: [
					lettering(content, middle, {
						size: Math.min(size * 1.2, box.width * 0.42),
						voice: 'title',
						anchor: 'middle',
					}),
				]),
	]);
}

function arrows({ runs, elements, bubbles }: Layout, duct: number): readonly Shape[] {
	const keepClear = [...elements.map(({ at }) => at), ...bubbles.map(({ tap }) => tap)];
	return runs.flatMap((run) => arrowShapes(run, duct * 0.55, keepClear));
}

const elementGroups = (
	{ elements, runs }: Layout,
	positions: SketchLook['positions'],
	duct: number,
): readonly Shape[] =>
	elements.map(({ element, at }) => {
		const position = positions?.get(element.tag)?.position;
		const drawn = elementShapes(element, position, at, alongDuct(at, runs, duct), duct * 0.75);
		return group(`element ${element.tag}`, `${element.tag} ${element.title}: ${position ?? 'not looked at'}`, drawn);
	});

const GRID = { width: 100, height: 60 };
/** Width of a gas duct on the grid. */
const DUCT = 1.3;
