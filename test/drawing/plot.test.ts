import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Plot, PlotCurve } from '../../src/lib/calc';
import { drawPlot, toSvg } from '../../src/lib/drawing';
import { numbersIn, paths, pointsOf, texts } from './scene';

const curve = (of: Partial<PlotCurve>): PlotCurve => ({
	id: 'c',
	label: 'AT-211',
	kind: 'line',
	x: [0, 60, 120],
	y: [20.9, 12, 7.4],
	...of,
});

const plotOf = (curves: readonly PlotCurve[], marks: Plot['marks'] = []): Plot => ({
	id: 'oxygen',
	title: 'Oxygen',
	x: { label: 'time', unit: 's' },
	y: { label: 'oxygen', unit: '%' },
	curves,
	marks,
});

const LOOK = { width: 500, height: 300 };

const anyNumber = fc.oneof(
	fc.double(),
	fc.double({ min: -1000, max: 1000, noNaN: true }),
	fc.constantFrom(NaN, Infinity, -Infinity, 0, -0, 1e308, -1e308, 5e-324),
);
const anyCurve = fc.record({
	id: fc.constant('c'),
	label: fc.constantFrom('a', 'b'),
	kind: fc.constantFrom('points', 'line', 'band', 'steps'),
	x: fc.array(anyNumber, { maxLength: 12 }),
	y: fc.array(anyNumber, { maxLength: 12 }),
	y2: fc.array(anyNumber, { maxLength: 12 }),
}) as fc.Arbitrary<PlotCurve>;
const anyMark = fc.record({
	kind: fc.constantFrom('limit', 'guard', 'window', 'event'),
	label: fc.constant('m'),
	axis: fc.constantFrom('x', 'y'),
	at: anyNumber,
}) as fc.Arbitrary<Plot['marks'][number]>;

describe('a plot', () => {
	test('whatever a calculator hands over, no number that is none reaches the sheet, and no line leaves the frame', () => {
		fc.assert(
			fc.property(
				fc.array(anyCurve, { maxLength: 4 }),
				fc.array(anyMark, { maxLength: 3 }),
				fc.boolean(),
				(curves, marks, logarithmic) => {
					const drawing = drawPlot(plotOf(curves, marks), { ...LOOK, y: { logarithmic } });
					expect(numbersIn(drawing.shapes).every(Number.isFinite)).toBe(true);
					const beyond = paths(drawing.shapes)
						.flatMap((path) => pointsOf(path))
						.filter(([x, y]) => x < -1 || x > 501 || y < -1 || y > 340);
					expect(beyond).toEqual([]);
					expect(() => toSvg(drawing, 'plot')).not.toThrow();
				},
			),
			{ numRuns: 300 },
		);
	});

	test('a sample that is not a number breaks the line there', () => {
		const whole = drawPlot(plotOf([curve({ x: [0, 1, 2, 3], y: [4, 3, 2, 1] })]), LOOK);
		const broken = drawPlot(plotOf([curve({ x: [0, 1, 2, 3], y: [4, NaN, 2, 1] })]), LOOK);
		const pieces = (drawing: typeof whole) =>
			paths(drawing.shapes)
				.filter(({ pen, tone, dash }) => pen === 'line' && tone === 'ink' && dash === undefined)
				.map(({ path }) => path.filter(([letter]) => letter === 'L').length);
		// The last path of ink is the curve: three pieces whole, one piece when the second sample is missing.
		expect(pieces(whole)[0]).toBe(3);
		expect(pieces(broken)[0]).toBe(1);
	});

	test('a guard that says only where it ends is hatched from there to its limit', () => {
		const marks: Plot['marks'] = [
			{ kind: 'limit', label: 'limit', axis: 'y', at: 8 },
			{ kind: 'guard', label: 'guard', axis: 'y', at: 7.7 },
		];
		const drawing = drawPlot(plotOf([curve({})], marks), LOOK);
		const limit = paths(drawing.shapes).find(({ tone, pen }) => tone === 'bad' && pen === 'bold')!;
		const wash = paths(drawing.shapes).find(({ fill }) => fill === 'warn-wash')!;
		const top = Math.min(...pointsOf(wash).map(([, y]) => y));
		expect(top).toBeCloseTo(pointsOf(limit)[0]![1], 6);
		expect(texts(drawing.shapes).map(({ text }) => text)).toContain('limit 8 %');
	});

	test('names at the ends of curves that end together stand apart', () => {
		const curves = ['a', 'b', 'c', 'd'].map((label) => curve({ id: label, label }));
		const names = texts(drawPlot(plotOf(curves), LOOK).shapes).filter(({ text }) => /^[abcd]$/.test(text));
		const heights = names.map(({ y }) => y).sort((a, b) => a - b);
		expect(heights.slice(1).map((y, i) => y - heights[i]! >= 14)).toEqual([true, true, true]);
	});

	test('an axis of seconds is printed as clock time of the plant', () => {
		const zero = Date.UTC(2026, 2, 14, 20, 40);
		const drawing = drawPlot(plotOf([curve({ x: [0, 3600], y: [20.9, 7] })]), {
			...LOOK,
			x: { clock: { zero, utcOffsetMinutes: 60 } },
		});
		expect(texts(drawing.shapes).map(({ text }) => text)).toEqual(expect.arrayContaining(['21:40', '22:00', '22:40']));
	});

	test('the curve that decides is drawn heavy, and a logarithmic axis steps by powers of ten', () => {
		const drawing = drawPlot(plotOf([curve({ decides: true, y: [1000, 10, 1] })]), {
			...LOOK,
			y: { logarithmic: true },
		});
		expect(paths(drawing.shapes).some(({ pen, tone }) => pen === 'bold' && tone === 'ink')).toBe(true);
		expect(texts(drawing.shapes).map(({ text }) => text)).toEqual(expect.arrayContaining(['1', '10', '100', '1000']));
	});
});
