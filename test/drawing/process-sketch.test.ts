import { readFileSync } from 'node:fs';
import * as v from 'valibot';
import { describe, expect, test } from 'vitest';
import { processSketch, type Shape, type TextShape } from '../../src/lib/drawing';
import { measure } from '../../src/lib/dossier/fonts/faces';
import { PlantSchema, type Plant } from '../../src/lib/plant';
import { numbersIn, texts } from './scene';

const PLANT: Plant = v.parse(
	PlantSchema,
	JSON.parse(readFileSync(new URL('../../static/demo/plant.json', import.meta.url), 'utf8')),
);

const readings = new Map(
	PLANT.points.map(({ tag, unit }) => [
		tag,
		{ value: '7.34', unit: unit === '%' ? '% moist' : unit, mark: 'stands' as const, word: 'stands 10:46' },
	]),
);
const LOOK = { width: 1240, lettering: 15, measure, readings };
const drawing = processSketch(PLANT, LOOK);

const boxOf = ({ text, x, y, size, voice, anchor }: TextShape) => {
	const width = measure(text, voice, size);
	const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
	return { text, left, right: left + width, top: y - size * 0.7, bottom: y };
};

const overlaps = (shapes: readonly Shape[]) => {
	const boxes = texts(shapes).map(boxOf);
	return boxes.flatMap((a, i) =>
		boxes
			.slice(i + 1)
			.filter(
				(b) =>
					Math.min(a.right, b.right) - Math.max(a.left, b.left) > 1 &&
					Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top) > 1,
			)
			.map((b) => `${a.text} / ${b.text}`),
	);
};

describe('the process sketch', () => {
	test('no lettering of the demonstration unit lies over other lettering', () => {
		expect(overlaps(drawing.shapes)).toEqual([]);
	});

	test('every measuring point that has a place shows its letters, its number and its value', () => {
		const shown = drawing.shapes.flatMap((shape) =>
			shape.kind === 'group' && shape.id.startsWith('point ') ? [shape] : [],
		);
		expect(shown.map(({ id }) => id.slice(6)).sort()).toEqual(
			PLANT.points.flatMap(({ tag, sketch }) => (sketch === undefined ? [] : [tag])).sort(),
		);
		for (const { shapes, label } of shown) {
			expect(texts(shapes).map(({ text }) => text)).toEqual(expect.arrayContaining(['7.34', 'stands 10:46']));
			expect(label).toContain('7.34');
		}
	});

	test('every enclosed volume, source, valve and damper is there by its tag', () => {
		const written = new Set(texts(drawing.shapes).map(({ text }) => text));
		const tags = [
			...PLANT.volumes.map(({ id }) => id),
			...PLANT.inertSources.map(({ tag }) => tag),
			...PLANT.elements.map(({ tag }) => tag),
		];
		expect(tags.filter((tag) => !written.has(tag))).toEqual([]);
	});

	test('the same plant makes the same sheet', () => {
		expect(processSketch(PLANT, LOOK)).toEqual(drawing);
	});

	test('a plant without readings, and one without ducts, can be drawn', () => {
		const bare = processSketch(PLANT, { width: 700 });
		const empty = processSketch({ ...PLANT, ducts: [], points: [], elements: [] }, { width: 700 });
		expect([...numbersIn(bare.shapes), ...numbersIn(empty.shapes)].every(Number.isFinite)).toBe(true);
	});

	test('a damper that nobody looked at is said to be so', () => {
		const damper = drawing.shapes.find((shape) => shape.kind === 'group' && shape.id === 'element HV-11');
		expect(damper).toMatchObject({ label: expect.stringContaining('not looked at') as string });
	});
});
