import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { circle, clipped, hatching, roundedRectangle } from '../../src/lib/drawing/path';
import { drawTimeline, fitted, limitBar, segment, stroke, toSvg } from '../../src/lib/drawing';
import { apart } from '../../src/lib/drawing/apart';
import { numbersIn, paths, pointsOf, texts } from './scene';

const BOX = { x: 10, y: 20, width: 100, height: 50 };
const inside = ({ x, y }: { x: number; y: number }) =>
	x >= 10 - 1e-9 && x <= 110 + 1e-9 && y >= 20 - 1e-9 && y <= 70 + 1e-9;
const coordinate = fc.double({ min: -500, max: 500, noNaN: true });
const point = fc.record({ x: coordinate, y: coordinate });

describe('geometry', () => {
	test('what is clipped lies in its box, and a line inside is left as it is', () => {
		fc.assert(
			fc.property(point, point, (a, b) => {
				const piece = clipped(a, b, BOX);
				if (piece !== undefined) expect(piece.every(inside)).toBe(true);
				if (inside(a) && inside(b)) expect(piece).toEqual([a, b]);
			}),
		);
	});

	test('hatching fills its box and does not leave it', () => {
		const lines = hatching(BOX, 7);
		const points = lines.flatMap((each) => (each[0] === 'Z' || each[0] === 'C' ? [] : [{ x: each[1], y: each[2] }]));
		expect(points.length).toBeGreaterThan(30);
		expect(points.every(inside)).toBe(true);
	});

	test('a circle of four curves is round to three parts in ten thousand', () => {
		const [, ...curves] = circle({ x: 0, y: 0 }, 100);
		let from = { x: 100, y: 0 };
		for (const each of curves) {
			if (each[0] !== 'C') continue;
			const [, x1, y1, x2, y2, x, y] = each;
			const middle = (a: number, b: number, c: number, d: number) => (a + 3 * b + 3 * c + d) / 8;
			const radius = Math.hypot(middle(from.x, x1, x2, x), middle(from.y, y1, y2, y));
			expect(Math.abs(radius - 100)).toBeLessThan(0.03);
			from = { x, y };
		}
		expect(roundedRectangle(BOX, 1000)).toHaveLength(10);
	});

	test('positions that are pushed apart keep their distance and their order, and stay on the sheet', () => {
		fc.assert(
			fc.property(fc.array(fc.double({ min: 0, max: 300, noNaN: true }), { maxLength: 20 }), (positions) => {
				const moved = apart(
					[...positions].sort((a, b) => a - b),
					12,
					320,
				);
				expect(moved.every((at) => at <= 320)).toBe(true);
				expect(moved.slice(1).every((at, i) => at - moved[i]! >= 12 - 1e-9)).toBe(true);
			}),
		);
	});

	test('a drawing that is fitted scales its points and its lettering, and leaves its pens', () => {
		const drawing = { width: 200, height: 100, shapes: [stroke(segment(0, 0, 200, 100), { pen: 'bold' })] };
		expect(fitted(drawing, { x: 5, y: 7 }, 100)).toEqual([stroke(segment(5, 7, 105, 57), { pen: 'bold' })]);
	});
});

describe('SVG', () => {
	test('text from a record cannot break out of the document', () => {
		const drawing = limitBar({ value: 7, typed: '<7 & "8">', atMost: 8, width: 300 });
		const svg = toSvg(drawing, 'a <title>');
		expect(svg).toContain('&lt;7 &amp; &quot;8&quot;&gt;');
		expect(svg).toContain('<title>a &lt;title&gt;</title>');
	});

	test('a number that is none is a mistake of the drawing, not of the picture', () => {
		const drawing = { width: 10, height: 10, shapes: [stroke(segment(0, 0, Number.NaN, 1), { pen: 'line' })] };
		expect(() => toSvg(drawing, 'x')).toThrow(TypeError);
	});
});

describe('the limit bar', () => {
	test('the pointer of a value in the guard band lies between the line that stands and the limit', () => {
		const drawing = limitBar({ value: 7.85, atMost: 8, guard: 0.3, width: 460 });
		const centre = (tone: string) => {
			const xs = paths(drawing.shapes)
				.filter((path) => path.fill === tone || path.tone === tone)
				.flatMap((path) => pointsOf(path).map(([x]) => x));
			return { from: Math.min(...xs), to: Math.max(...xs) };
		};
		const pointer = centre('hand');
		expect((pointer.from + pointer.to) / 2).toBeGreaterThan(centre('ok-fill').to);
		expect((pointer.from + pointer.to) / 2).toBeLessThan(centre('bad').to);
	});

	test('any value against any limit makes numbers that can be drawn', () => {
		const any = fc.option(fc.double({ noDefaultInfinity: true, min: -1e9, max: 1e9 }), { nil: undefined });
		fc.assert(
			fc.property(any, any, any, fc.double({ min: 0, max: 1e3, noNaN: true }), (value, atMost, atLeast, guard) => {
				const drawing = limitBar({
					...(value === undefined ? {} : { value }),
					...(atMost === undefined || Number.isNaN(atMost) ? {} : { atMost }),
					...(atLeast === undefined || Number.isNaN(atLeast) ? {} : { atLeast }),
					guard,
					width: 300,
				});
				expect(numbersIn(drawing.shapes).every(Number.isFinite)).toBe(true);
			}),
		);
	});
});

describe('the timeline', () => {
	const HOUR = 3_600_000;
	const line = {
		from: 0,
		to: 10 * HOUR,
		utcOffsetMinutes: 60,
		gates: [
			{ name: '0', begins: HOUR, released: [{ from: 2 * HOUR, to: 10 * HOUR }], proofs: [HOUR] },
			{ name: '1', begins: undefined, released: [], proofs: [] },
		],
		events: [{ from: 5 * HOUR, to: 5.1 * HOUR }],
		gaps: [],
		notes: Array.from({ length: 30 }, (_, i) => ({ at: 5 * HOUR, text: `note ${i}`, tone: 'ink' as const })),
	};

	test('a gate is thick from its release on, and thin from its first proof', () => {
		const drawing = drawTimeline(line, { width: 400, height: 1000, lettering: 10 });
		const [thick] = paths(drawing.shapes).filter(({ pen }) => pen === 'power');
		const [top, bottom] = pointsOf(thick!).map(([, y]) => y);
		const height = 1000 - 24 - 10;
		expect(top).toBeCloseTo(24 + height * 0.2, 6);
		expect(bottom).toBeCloseTo(24 + height, 6);
	});

	test('thirty notes of one moment all stand on the sheet, one under the other', () => {
		const drawing = drawTimeline(line, { width: 400, height: 500, lettering: 12 });
		const notes = texts(drawing.shapes).filter(({ text }) => text.startsWith('note'));
		const heights = notes.map(({ y }) => y).sort((a, b) => a - b);
		expect(heights).toHaveLength(30);
		expect(heights.at(-1)).toBeLessThan(500);
		expect(Math.min(...heights.slice(1).map((y, i) => y - heights[i]!))).toBeGreaterThan(10);
	});
});
