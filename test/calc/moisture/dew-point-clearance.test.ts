import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { CalcNote, CalcResult, Refusal } from '../../../src/lib/calc';
import { dewPointClearance } from '../../../src/lib/calc/moisture/dew-point-clearance';
import { agreesWith } from '../../support/printed';

/** A warm filter before feed: dry gas now, 20 % moisture to come, everything stated. Tests change one thing in it. */
const WARM = {
	surfaces: [
		{ name: 'hopper cone', temperature: { value: 84, unit: 'degC', U: 2 }, age: { value: 2, unit: 'min' } },
		{ name: 'filter roof', temperature: { value: 91, unit: 'degC', U: 2 }, age: 60 },
		{ name: 'duct to fan', temperature: { value: 96, unit: 'degC', U: 2 }, age: 60 },
	],
	waterVapour: { value: 2, unit: '%', U: 0.5 },
	predictedWaterVapour: { value: 20, unit: '%', U: 2 },
	pressure: { value: 985, unit: 'mbar(a)', U: 5 },
	gasTemperature: { value: 98, unit: 'degC' },
	margin: { value: 20, unit: 'K' },
};

function run(inputs: unknown): CalcResult {
	const result = dewPointClearance.run(inputs);
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
}
const valueOf = (inputs: unknown, name: string) => run(inputs).values[name]?.value ?? NaN;
const notesOf = (inputs: unknown, kind: string): readonly CalcNote[] =>
	run(inputs).notes.filter((note) => note.kind === kind);
const verdictOf = (inputs: unknown) => {
	const { verdict } = run(inputs);
	return { word: verdict?.word, reasons: verdict?.reasons.map((reason) => reason.kind) };
};
function refusalsOf(inputs: unknown): readonly Refusal[] {
	const result = dewPointClearance.run(inputs);
	if (result.ok) throw new Error('a result where a refusal was expected');
	return result.error;
}
const without = (...names: (keyof typeof WARM)[]) =>
	Object.fromEntries(Object.entries(WARM).filter(([name]) => !names.some((each) => each === name)));

describe('values', () => {
	// Independent: iapws 1.5, dew point of 20 % at 98 500 Pa is 59.7323 degC; so 84 - 59.7323 = 24.2677 K.
	test('20 % moisture at 985 mbar has its dew point at 59.73 degC, 24.27 K below the hopper cone', () => {
		expect(agreesWith(valueOf(WARM, 'predictedDewPoint') - 273.15, '59.7323')).toBe(true);
		expect(agreesWith(valueOf(WARM, 'predictedClearance'), '24.2677')).toBe(true);
		expect(valueOf(WARM, 'leastClearance')).toBe(valueOf(WARM, 'predictedClearance'));
		expect(notesOf(WARM, 'coldest-surface')).toMatchObject([{ name: 'hopper cone', of: 3 }]);
	});

	// Independent: iapws 1.5.4, slopes of _TSat_P at 0.20 and 98 500 Pa: 107.834 K per unit of x, 2.18951e-4 K/Pa. So U is
	// sqrt(2^2 + (107.834 x 0.02)^2 + (2.18951e-4 x 500)^2) = 2.94333 K.
	test('its uncertainty is that of wall, moisture and pressure together, and the budget says who contributes', () => {
		const { leastClearance } = run(WARM).values;
		expect(agreesWith(leastClearance?.U ?? NaN, '2.9433')).toBe(true);
		const budget = run(WARM).budget ?? [];
		expect(budget.map((row) => row.input)).toEqual(['surface', 'predictedWaterVapour', 'pressure']);
		expect(budget.reduce((sum, row) => sum + row.share, 0)).toBeCloseTo(1, 9);
	});

	test('a circuit fired with natural gas holds 32 to 38 % water: dew points of 70 to 75 degC', () => {
		const at = (x: number) =>
			valueOf({ ...WARM, predictedWaterVapour: x, pressure: 101_325 }, 'predictedDewPoint') - 273.15;
		expect(at(0.32)).toBeGreaterThan(70);
		expect(at(0.38)).toBeLessThan(75.1);
	});

	test('every surface, both states and the margin stand in the plot', () => {
		const [plot] = run(WARM).plots ?? [];
		expect(plot?.marks.map((mark) => [mark.kind, mark.label])).toEqual([
			['event', 'hopper cone'],
			['event', 'filter roof'],
			['event', 'duct to fan'],
			['limit', 'coldest surface less margin'],
			['guard', 'and less the uncertainty'],
		]);
		expect(plot?.marks.find((mark) => mark.kind === 'limit')?.at).toBeCloseTo(64, 9);
		const decides = plot?.curves.find((curve) => curve.decides);
		expect(decides).toMatchObject({ id: 'predicted', x: [20] });
		expect(agreesWith(decides?.y[0] ?? NaN, '59.7323')).toBe(true);
	});
});

describe('verdict', () => {
	test('margin and guard kept for both states: adequate', () => {
		expect(verdictOf(WARM)).toEqual({ word: 'adequate', reasons: ['clearance-kept', 'clearance-kept'] });
	});

	test('above the margin but inside the guard: not yet', () => {
		const tight = { ...WARM, margin: { value: 23, unit: 'K' } };
		expect(verdictOf(tight)).toEqual({ word: 'not yet', reasons: ['clearance-kept', 'inside-guard-band'] });
	});

	test('below the margin: not yet; below the dew point: it drips, not yet', () => {
		expect(verdictOf({ ...WARM, margin: 30 }).reasons).toEqual(['clearance-kept', 'below-margin']);
		const cold = { ...WARM, surfaces: [{ name: 'unlagged duct', temperature: { value: 50, unit: 'degC', U: 2 } }] };
		expect(verdictOf(cold)).toEqual({ word: 'not yet', reasons: ['clearance-kept', 'surface-below-dew-point'] });
	});

	test('dry enough now is not enough: without the state that comes with the feed nothing is shown', () => {
		expect(verdictOf(without('predictedWaterVapour'))).toEqual({
			word: 'cannot be shown',
			reasons: ['predicted-state-not-stated'],
		});
		expect(verdictOf({ ...WARM, predictedWaterVapour: 0 })).toEqual({
			word: 'cannot be shown',
			reasons: ['predicted-state-dry'],
		});
	});

	test('direction of caution: more doubt about moisture, wall or pressure never makes a clearance adequate', () => {
		const U = fc.double({ min: 0, max: 1, noNaN: true });
		fc.assert(
			fc.property(U, U, U, U, U, U, (x1, x2, t1, t2, p1, p2) => {
				const with_ = (x: number, t: number, p: number) => ({
					...WARM,
					surfaces: [{ name: 'cone', temperature: { value: 84, unit: 'degC', U: 6 * t } }],
					predictedWaterVapour: { value: 20, unit: '%', U: 6 * x },
					pressure: { value: 985, unit: 'mbar(a)', U: 20 * p },
				});
				const surer = with_(Math.min(x1, x2), Math.min(t1, t2), Math.min(p1, p2));
				const doubtful = with_(Math.max(x1, x2), Math.max(t1, t2), Math.max(p1, p2));
				if (verdictOf(doubtful).word === 'adequate') expect(verdictOf(surer).word).toBe('adequate');
			}),
		);
	});

	test('the upper bound of the predicted moisture decides: 20 +/- 2 % is adequate at 20 K, 20 +/- 10 % is not', () => {
		expect(verdictOf({ ...WARM, predictedWaterVapour: { value: 20, unit: '%', U: 10 } }).word).toBe('not yet');
	});

	test('a poorly known wall is the coldest one: 86 +/- 6 degC before 84 +/- 2 degC', () => {
		const surfaces = [...WARM.surfaces, { name: 'header', temperature: { value: 86, unit: 'degC', U: 6 } }];
		expect(notesOf({ ...WARM, surfaces }, 'coldest-surface')).toMatchObject([{ name: 'header' }]);
	});

	test('without a stated uncertainty the value is taken as the bound, and the result says so', () => {
		const bare = { ...WARM, predictedWaterVapour: 0.2, surfaces: [{ name: 'cone', temperature: 357.15 }] };
		expect(verdictOf({ ...bare, margin: 24 }).word).toBe('adequate');
		expect(notesOf(bare, 'uncertainty-not-stated')).toMatchObject([{ inputs: ['surface', 'predictedWaterVapour'] }]);
		expect(run(bare).values.leastClearance).not.toHaveProperty('U');
	});
});

describe('traps', () => {
	test('moisture on the dry basis is another number: 25 % of the dry gas is 20 % of the wet gas', () => {
		const dry = { ...without('predictedWaterVapour'), predictedWaterVapourDry: { value: 25, unit: '%' } };
		expect(valueOf(dry, 'predictedWaterVapour')).toBeCloseTo(0.2, 14);
		expect(agreesWith(valueOf(dry, 'predictedDewPoint') - 273.15, '59.7323')).toBe(true);
	});

	test('a humidity ratio needs the molar mass of the dry gas: 0.622 belongs to air only', () => {
		const byMass = { ...without('predictedWaterVapour'), predictedHumidityRatio: { value: 150, unit: 'g/kg' } };
		expect(refusalsOf(byMass)).toEqual([
			{ kind: 'missing-input', input: 'dryMolarMass', neededBy: 'predictedHumidityRatio' },
		]);
		// By hand: x = Y/(Y + 18.01528/M): air 0.15/(0.15 + 0.62198) = 0.19431; 40.81 g/mol 0.15/(0.15 + 0.44144) = 0.25362.
		const inAir = valueOf({ ...byMass, dryMolarMass: { value: 28.9644, unit: 'g/mol' } }, 'predictedWaterVapour');
		const inDioxide = valueOf({ ...byMass, dryMolarMass: { value: 40.81, unit: 'g/mol' } }, 'predictedWaterVapour');
		expect(agreesWith(inAir, '0.19431')).toBe(true);
		expect(agreesWith(inDioxide, '0.25362')).toBe(true);
	});

	test('a moisture stated on two bases is refused', () => {
		expect(refusalsOf({ ...WARM, predictedWaterVapourDry: 0.25 })).toMatchObject([{ kind: 'one-of', given: 2 }]);
	});

	test('percent typed as a fraction is refused: 20 is no mole fraction', () => {
		expect(refusalsOf({ ...WARM, predictedWaterVapour: 20 })).toMatchObject([
			{ kind: 'out-of-range', input: 'predictedWaterVapour', value: 20, max: 1 },
		]);
	});

	test('suction lowers the dew point: the gauge pressure needs the barometer', () => {
		const gauge = { ...without('pressure'), pressureGauge: { value: -80, unit: 'mbar(g)' } };
		expect(refusalsOf(gauge)).toMatchObject([{ kind: 'gauge-without-barometer', needs: 'barometer' }]);
		const known = { ...gauge, barometer: { value: 1013, unit: 'hPa(a)' } };
		expect(valueOf(known, 'predictedDewPoint')).toBeLessThan(
			valueOf({ ...WARM, pressure: 101_300 }, 'predictedDewPoint') - 1.5,
		);
	});

	test('below freezing the frost point counts, and the result says which it is', () => {
		const winter = {
			...WARM,
			surfaces: [{ name: 'unlagged duct', temperature: { value: -10, unit: 'degC', U: 1 } }],
			waterVapour: 0.001,
			pressure: 101_325,
			gasTemperature: { value: 5, unit: 'degC' },
		};
		// Independent: iapws 1.5, frost point of 0.1 % at 101 325 Pa is -20.1948 degC.
		expect(agreesWith(valueOf(winter, 'dewPoint') - 273.15, '-20.1948')).toBe(true);
		expect(notesOf(winter, 'frost-point')).toMatchObject([{ state: 'present' }]);
	});

	test('cold false air changes temperature and moisture at once: both states are computed from their own moisture', () => {
		const diluted = { ...WARM, waterVapour: 0.12, predictedWaterVapour: 0.2 };
		expect(valueOf(diluted, 'dewPoint')).toBeLessThan(valueOf(diluted, 'predictedDewPoint') - 8);
	});

	test('a predicted state drier than the present one is warned about', () => {
		const odd = { ...WARM, waterVapour: 0.25, predictedWaterVapour: 0.2 };
		expect(notesOf(odd, 'predicted-drier-than-present')).toHaveLength(1);
		expect(valueOf(odd, 'leastClearance')).toBe(valueOf(odd, 'clearance'));
	});
});

describe('refusals and warnings', () => {
	test('a gas below its own dew point is condensing already: refused', () => {
		expect(refusalsOf({ ...WARM, waterVapour: 0.3, gasTemperature: { value: 60, unit: 'degC' } })).toMatchObject([
			{ kind: 'already-condensing', input: 'waterVapour' },
		]);
	});

	test.each([
		['a negative moisture', { waterVapour: -0.01 }, 'out-of-range'],
		['a moisture above one', { waterVapour: 1.2 }, 'out-of-range'],
		['no surface at all', { surfaces: [] }, 'bad-input'],
		['a surface without name', { surfaces: [{ name: ' ', temperature: 350 }] }, 'bad-input'],
		['a surface named twice', { surfaces: [WARM.surfaces[0], WARM.surfaces[0]] }, 'surface-named-twice'],
		[
			'a wall colder than anything',
			{ surfaces: [{ name: 'a', temperature: { value: -300, unit: 'degC' } }] },
			'below-absolute-zero',
		],
		['a negative age', { surfaces: [{ name: 'a', temperature: 350, age: -1 }] }, 'out-of-range'],
		['a negative margin', { margin: -5 }, 'out-of-range'],
		['a pressure of zero', { pressure: 0 }, 'out-of-range'],
		[
			'steam above the critical pressure',
			{ predictedWaterVapour: 1, waterVapour: 0, pressure: 9e6, gasTemperature: 600 },
			undefined,
		],
		['acid without water', { waterVapour: 0, predictedWaterVapour: 0, sulphurTrioxide: 1e-5 }, 'acid-without-water'],
	])('%s', (_name, change, kind) => {
		const result = dewPointClearance.run({ ...WARM, ...change });
		expect(result.ok ? undefined : result.error.map((refusal) => refusal.kind)).toEqual(
			kind === undefined ? undefined : [kind],
		);
	});

	test('a missing margin is refused: it is the site that sets it', () => {
		expect(refusalsOf(without('margin'))).toEqual([{ kind: 'missing-input', input: 'margin' }]);
	});

	test('a wrong unit inside the table names its row', () => {
		const surfaces = [{ name: 'cone', temperature: { value: 84, unit: 'bar(g)' } }];
		expect(refusalsOf({ ...WARM, surfaces })).toMatchObject([
			{ kind: 'wrong-quantity', input: 'surfaces[0].temperature' },
		]);
	});

	test('a surface reading older than five minutes is warned about, one without age is remarked', () => {
		const surfaces = [
			{ name: 'cone', temperature: 360, age: 301 },
			{ name: 'roof', temperature: 365, age: 300 },
			{ name: 'duct', temperature: 370 },
		];
		expect(notesOf({ ...WARM, surfaces }, 'surface-reading-old')).toMatchObject([
			{ level: 'warning', surfaces: ['cone'] },
		]);
		expect(notesOf({ ...WARM, surfaces }, 'surface-reading-without-age')).toMatchObject([{ surfaces: ['duct'] }]);
	});

	test('a cold filter at start-up, and a gas below the dew point to come, are warned about', () => {
		expect(notesOf({ ...WARM, filter: 'cold' }, 'filter-cold')).toMatchObject([{ level: 'warning' }]);
		const cool = { ...WARM, gasTemperature: { value: 50, unit: 'degC' } };
		expect(notesOf(cool, 'gas-below-predicted-dew-point')).toMatchObject([{ level: 'warning' }]);
	});

	test('SO3: the acid dew point is a remark, a warning above the wall and when only estimated; it never makes a verdict', () => {
		const acid = { ...WARM, sulphurTrioxide: { value: 10, unit: 'ppm' } };
		expect(notesOf(acid, 'acid-dew-point')).toHaveLength(1);
		expect(notesOf(acid, 'acid-dew-point-above-wall')).toMatchObject([{ level: 'warning' }]);
		expect(notesOf(acid, 'sulphur-trioxide-estimated')).toHaveLength(1);
		expect(notesOf({ ...acid, sulphurTrioxideFrom: 'measured' }, 'sulphur-trioxide-estimated')).toEqual([]);
		expect(verdictOf(acid)).toEqual(verdictOf(WARM));
	});

	test('so little SO3 that one correlation would take a power of a negative number: that value is left out', () => {
		const trace = run({ ...WARM, sulphurTrioxide: 1e-9 }).values;
		expect(trace.acidDewPoint?.value).toBeGreaterThan(300);
		expect(trace.acidDewPointOkkes).toMatchObject({ value: null });
	});

	test('the real gas is said to have its dew point a little lower', () => {
		expect(notesOf(WARM, 'ideal-gas-dew-point')).toMatchObject([{ level: 'remark', realGasIsLowerBy: 0.1 }]);
	});

	test('whatever arrives, the answer is a result of finite numbers or a list of refusals', () => {
		const anything = fc.oneof(fc.jsonValue(), fc.double(), fc.constant(undefined));
		const names = dewPointClearance.inputs.map(({ name }) => name);
		const noise = fc.record(Object.fromEntries(names.map((name) => [name, anything])), { requiredKeys: [] });
		fc.assert(
			fc.property(noise, fc.boolean(), (inputs, onTop) => {
				const result = dewPointClearance.run(onTop ? { ...WARM, ...inputs } : inputs);
				if (!result.ok) expect(result.error.length).toBeGreaterThan(0);
				else
					for (const { value } of Object.values(result.value.values))
						expect(value === null || Number.isFinite(value)).toBe(true);
			}),
		);
	});
});
