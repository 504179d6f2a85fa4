import { expect, test } from 'vitest';
import { runCalculator } from '../../../src/lib/calc';
import { agreesWith, agreesWithin } from '../../support/printed';
import cases from '../../vectors/stock/bottles.json';

const run = (inputs: object) => {
	const result = runCalculator('inert-stock@1', inputs);
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
};
const BUNDLE = {
	bottles: 12,
	waterVolume: { value: 50, unit: 'L', U: 0.5 },
	pressure: { value: 185, unit: 'bar(g)', U: 3 },
	leastPressure: { value: 5, unit: 'bar(g)' },
	temperature: { value: 15, unit: 'degC', U: 2 },
};

// Independent: CoolProp 8.0.0 (test/vectors/stock/bottles.json).
test.each(cases)('$bottles bottles of $litres L at $bar bar and $celsius degC hold $content m3(n)', (each) => {
	const { values } = run({
		bottles: each.bottles,
		waterVolume: { value: each.litres, unit: 'L' },
		pressure: { value: each.bar, unit: 'bar(g)' },
		leastPressure: { value: each.least, unit: 'bar(g)' },
		temperature: { value: each.celsius, unit: 'degC' },
	});
	expect(agreesWithin(values.content!.value!, each.content, 2.5e-4)).toBe(true);
	expect(agreesWithin(values.usable!.value!, each.usable, 2.5e-4)).toBe(true);
	expect(agreesWithin(values.contentMass!.value!, each.mass, 2.5e-4)).toBe(true);
});

test('an ideal gas would promise a seventh more at 300 bar', () => {
	const { values } = run({ ...BUNDLE, pressure: { value: 299, unit: 'bar(g)' } });
	const more = values.ideal!.value! / values.content!.value! - 1;
	expect(more).toBeGreaterThan(0.13);
	expect(more).toBeLessThan(0.15);
});

// By hand: 20 kg / 1.976813 kg/m3 = 10.117 m3(n).
test('carbon dioxide is told by weight, never by its pressure', () => {
	const { values, notes } = run({
		gas: 'carbon dioxide',
		temperature: BUNDLE.temperature,
		mass: { value: 20, unit: 'kg', U: 0.2 },
	});
	expect(agreesWith(values.usable!.value!, '10.117')).toBe(true);
	expect(notes.map(({ kind }) => kind)).toEqual(['carbon-dioxide-discharge']);
	const byPressure = runCalculator('inert-stock@1', { ...BUNDLE, gas: 'carbon dioxide' });
	expect(byPressure).toEqual({ ok: false, error: [{ kind: 'carbon-dioxide-by-weight', input: 'mass' }] });
});

test('a stock is judged against this purge and one repeat, with the reserve kept', () => {
	const usable = run(BUNDLE).values.usable!.value!;
	const kinds = (purge: number, reserve = 0) =>
		run({
			...BUNDLE,
			purge: { value: purge, unit: 'm3(n)' },
			reserve: { value: reserve, unit: 'm3(n)' },
		}).notes.map(({ kind }) => kind);
	expect(kinds(usable / 2.1)).toEqual(['bottles-at-rest']);
	expect(kinds(usable / 1.9)).toEqual(['stock-without-repeat', 'bottles-at-rest']);
	expect(kinds(usable * 1.1)).toEqual(['stock-too-small', 'bottles-at-rest']);
	expect(kinds(usable / 2.1, usable / 2)).toEqual(['stock-without-repeat', 'bottles-at-rest']);
});

test('what is drawn at present lasts as long as the usable gas less the reserve', () => {
	const { values } = run({
		...BUNDLE,
		reserve: { value: 10, unit: 'm3(n)' },
		flow: { value: 60, unit: 'm3(n)/h' },
	});
	expect(values.lasts!.value! / 60).toBeCloseTo(values.usable!.value! - 10, 9);
	expect(values.usable!.U!).toBeGreaterThan(0);
});

test('without size or pressure there is no stock, and no pressure to stop at above the one that is there', () => {
	const bare = runCalculator('inert-stock@1', { temperature: BUNDLE.temperature });
	expect(bare).toMatchObject({
		ok: false,
		error: [
			{ kind: 'missing-input', input: 'waterVolume' },
			{ kind: 'missing-input', input: 'pressure' },
		],
	});
	const stop = runCalculator('inert-stock@1', { ...BUNDLE, leastPressure: { value: 190, unit: 'bar(g)' } });
	expect(stop).toMatchObject({ ok: false, error: [{ kind: 'stop-above-pressure' }] });
});
