import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { ladder, rungsOf } from '../../src/lib/drawing';
import { NIGHT_PROCEDURE } from '../support/night';
import { LARGE, numbersIn, paths, pointsOf, standingOf, texts } from './scene';

const STEP_STATES = ['not yet', 'stands', 'failed', 'lapsed', 'waits', 'not applicable'] as const;
const GATE_STATES = ['not ready', 'ready', 'released', 'lapsed', 'held', 'refused'] as const;

const stands = (...groups: readonly string[]) =>
	Object.fromEntries(
		NIGHT_PROCEDURE.steps.filter(({ group }) => groups.includes(group)).map(({ id }) => [id, 'stands' as const]),
	);

const anyStanding = fc
	.record({
		steps: fc.array(fc.constantFrom(...STEP_STATES), {
			minLength: NIGHT_PROCEDURE.steps.length,
			maxLength: NIGHT_PROCEDURE.steps.length,
		}),
		gates: fc.array(fc.constantFrom(...GATE_STATES), { minLength: 8, maxLength: 8 }),
		blocks: fc.option(fc.integer({ min: 0, max: 7 }), { nil: undefined }),
	})
	.map(({ steps, gates, blocks }) =>
		standingOf(NIGHT_PROCEDURE, {
			steps: Object.fromEntries(NIGHT_PROCEDURE.steps.map(({ id }, i) => [id, steps[i]!])),
			gates: Object.fromEntries(gates.map((state, i) => [i, state])),
			deviations:
				blocks === undefined ? [] : [{ deviation: 'D-1', state: 'open', blocks, raised: '2026-03-14T18:12:00+01:00' }],
		}),
	);

describe('where the line ends', () => {
	test('it passes every contact that stands and ends at the first that is open', () => {
		const standing = standingOf(NIGHT_PROCEDURE, {
			gates: { 0: 'released', 1: 'released' },
			steps: stands('O2 analysers', 'CO analysers'),
		});
		const gate2 = rungsOf(NIGHT_PROCEDURE, standing)[2]!;
		expect(gate2.contacts.map(({ label, state, powered }) => [label, state, powered]).slice(0, 5)).toEqual([
			['Gate 1', 'stands', true],
			['O2 analysers', 'stands', true],
			['CO analysers', 'stands', true],
			['Inert stock', 'not yet', true],
			['Seal gas', 'not yet', false],
		]);
		expect(gate2.passes).toBe(3);
	});

	test('a blocking deviation is the first open contact of its gate', () => {
		const standing = standingOf(NIGHT_PROCEDURE, {
			gates: { 0: 'released' },
			steps: stands('Doors and vents', 'Line-up', 'Auxiliaries', 'Trips'),
			deviations: [{ deviation: 'D-1', state: 'open', blocks: 1, raised: '2026-03-14T18:12:00+01:00' }],
		});
		const gate1 = rungsOf(NIGHT_PROCEDURE, standing)[1]!;
		expect(gate1.contacts[gate1.passes]).toMatchObject({
			label: 'D-1',
			of: 'deviation',
			state: 'blocks',
			powered: true,
		});
	});

	test('a lapsed gate opens every rung above it, whatever stands there', () => {
		const all = Object.fromEntries(NIGHT_PROCEDURE.steps.map(({ id }) => [id, 'stands' as const]));
		const standing = standingOf(NIGHT_PROCEDURE, {
			steps: all,
			gates: { 0: 'released', 1: 'released', 2: 'lapsed', 3: 'held', 4: 'held' },
		});
		const [, , gate2, gate3, gate4] = rungsOf(NIGHT_PROCEDURE, standing);
		expect(gate2).toMatchObject({ reached: true, passes: gate2!.contacts.length });
		expect(gate3!.contacts[0]).toMatchObject({ label: 'Gate 2', state: 'lapsed' });
		expect([gate3!.reached, gate3!.passes, gate4!.reached]).toEqual([false, 0, false]);
	});

	test('in any state the line is thick along released rungs below the first that is not, to its first open contact, and nowhere else', () => {
		fc.assert(
			fc.property(anyStanding, (standing) => {
				const rungs = rungsOf(NIGHT_PROCEDURE, standing);
				const last = rungs.findIndex(({ coil }) => coil !== 'released');
				rungs.forEach((rung, i) => {
					const open = rung.contacts.findIndex(({ state }) => state !== 'stands' && state !== 'not applicable');
					const reached = last === -1 || i <= last;
					const expected = !reached ? 0 : rung.coil === 'released' || open === -1 ? rung.contacts.length : open;
					expect([rung.reached, rung.passes]).toEqual([reached, expected]);
				});
			}),
		);
	});
});

describe('the drawing', () => {
	/** Thick pieces of a drawn ladder that lie level, by their height: where they begin and end. */
	const thick = (drawing: ReturnType<typeof ladder>) => {
		const byHeight = new Map<number, { from: number; to: number }>();
		for (const shape of paths(drawing.shapes)) {
			const [a, b] = pointsOf(shape);
			if (shape.pen !== 'power' || a === undefined || a[1] !== b?.[1]) continue;
			const before = byHeight.get(a[1]) ?? { from: Infinity, to: -Infinity };
			byHeight.set(a[1], { from: Math.min(before.from, a[0], b[0]), to: Math.max(before.to, a[0], b[0]) });
		}
		return [...byHeight.values()];
	};

	test('the thick line of the gate in work ends at the left bar of its first open contact', () => {
		const standing = standingOf(NIGHT_PROCEDURE, {
			gates: { 0: 'released', 1: 'released' },
			steps: stands('O2 analysers'),
		});
		const drawn = thick(ladder(NIGHT_PROCEDURE, standing, { width: 700 }));
		// Rails at 26 and 674; contacts 40 apart from 70 on, gap half width 7: the third contact is the first open one.
		expect(drawn).toEqual([
			{ from: 26, to: 674 },
			{ from: 26, to: 674 },
			{ from: 26, to: 70 + 2 * 40 - 7 },
		]);
	});

	test('a start-up that is released throughout is thick from rail to rail on every rung', () => {
		const all = Object.fromEntries(NIGHT_PROCEDURE.steps.map(({ id }) => [id, 'stands' as const]));
		const released = Object.fromEntries(NIGHT_PROCEDURE.gates.map(({ number }) => [number, 'released' as const]));
		const drawn = thick(
			ladder(NIGHT_PROCEDURE, standingOf(NIGHT_PROCEDURE, { steps: all, gates: released }), { width: 700 }),
		);
		expect(drawn).toEqual(NIGHT_PROCEDURE.gates.map(() => ({ from: 26, to: 674 })));
	});

	test.each([undefined, 2])('eight gates of thirty groups stay inside their rails, with gate %s opened', (inWork) => {
		const standing = standingOf(LARGE, { gates: { 0: 'released', 1: 'released' } });
		const drawing = ladder(LARGE, standing, { width: 744, ...(inWork === undefined ? {} : { inWork }) });
		const xs = paths(drawing.shapes).flatMap((path) => pointsOf(path).map(([x]) => x));
		expect([Math.min(...xs), Math.max(...xs)]).toEqual([26, 718]);
		expect(new Set(texts(drawing.shapes).map(({ text }) => text)).has('Group 29')).toBe(inWork === 2);
	});

	test('names of neighbouring contacts in work do not run into each other', () => {
		const drawing = ladder(LARGE, standingOf(LARGE, {}), { width: 744, inWork: 2 });
		const named = texts(drawing.shapes).filter(({ text }) => text.startsWith('Group'));
		for (const a of named)
			for (const b of named) if (a !== b && a.y === b.y) expect(Math.abs(a.x - b.x)).toBeGreaterThan(100);
	});

	test('any state at any width makes numbers that can be drawn', () => {
		fc.assert(
			fc.property(
				anyStanding,
				fc.integer({ min: 320, max: 2000 }),
				fc.option(fc.integer({ min: 0, max: 7 }), { nil: undefined }),
				(standing, width, inWork) => {
					const drawing = ladder(NIGHT_PROCEDURE, standing, { width, ...(inWork === undefined ? {} : { inWork }) });
					expect(numbersIn(drawing.shapes).every(Number.isFinite)).toBe(true);
				},
			),
			{ numRuns: 50 },
		);
	});
});
