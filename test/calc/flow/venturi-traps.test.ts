import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { venturiFlow } from '../../../src/lib/calc/flow/venturi-flow';
import { agreesWith, agreesWithin } from '../../support/printed';
import { CIRCUIT, factsOf, kindsOf, refusalsOf, run, valueOf } from './venturi-support';

const { composition: _, ...WITHOUT_GAS } = CIRCUIT;
const { pressure: __, ...WITHOUT_PRESSURE } = CIRCUIT;
const { dp: ___, ...WITHOUT_DP } = CIRCUIT;

describe('traps', () => {
	test('moisture left out: 4.3 % more mass and 20 % more "dry" gas than there is, and the result warns', () => {
		const moist = { ...CIRCUIT, dp: 800 };
		const dry = { ...moist, composition: { N2: 0.775, CO2: 0.125, O2: 0.1 } };
		const ratio = (name: string) => (valueOf(dry, name) ?? NaN) / (valueOf(moist, name) ?? NaN);
		expect(agreesWithin(ratio('massFlow'), 1.0434, 1e-3)).toBe(true);
		expect(agreesWithin(ratio('normalFlowDry'), 1.198, 1e-3)).toBe(true);
		expect(kindsOf(dry)).toContain('moisture-not-stated');
		expect(kindsOf(moist)).not.toContain('moisture-not-stated');
	});

	test('a dry analysis with the moisture beside it is the same gas as the moist composition', () => {
		const dry = { ...CIRCUIT, composition: { N2: 0.775, CO2: 0.125, O2: 0.1 }, waterVapour: 0.2 };
		for (const name of ['massFlow', 'normalFlowDry', 'molarMass', 'viscosity']) {
			expect(agreesWithin(valueOf(dry, name) ?? NaN, valueOf(CIRCUIT, name) ?? NaN, 1e-12)).toBe(true);
		}
	});

	test('moisture given in the composition and again beside it is refused: it would be taken out twice', () => {
		expect(refusalsOf({ ...CIRCUIT, waterVapour: 0.2 })).toEqual([
			{ kind: 'moisture-given-twice', inputs: ['composition.H2O', 'waterVapour'] },
		]);
	});

	test('a gauge pressure without barometer is refused, with it the flow is that of the absolute pressure', () => {
		const gauge = { ...WITHOUT_PRESSURE, pressureGauge: { value: -28.25, unit: 'mbar(g)' } };
		expect(refusalsOf(gauge)).toEqual([
			{ kind: 'gauge-without-barometer', input: 'pressureGauge', needs: 'barometer' },
		]);
		const known = { ...gauge, barometer: { value: 1013.25, unit: 'hPa(a)' } };
		expect(agreesWithin(valueOf(known, 'massFlow') ?? NaN, valueOf(CIRCUIT, 'massFlow') ?? NaN, 1e-12)).toBe(true);
	});

	test('a gauge unit typed into the absolute pressure is refused by its unit', () => {
		expect(refusalsOf({ ...CIRCUIT, pressure: { value: 985, unit: 'mbar(g)' } })).toMatchObject([
			{ kind: 'wrong-quantity', input: 'pressure', unit: 'mbar(g)' },
		]);
	});

	test('80 mmH2O, 7.84532 mbar and 784.532 Pa are one difference pressure and one flow', () => {
		const flows = [
			{ value: 80, unit: 'mmH2O' },
			{ value: '7,84532', unit: 'mbar' },
			{ value: 784.532, unit: 'Pa' },
		].map((dp) => valueOf({ ...CIRCUIT, dp }, 'massFlow') ?? NaN);
		expect(agreesWithin(flows[0] ?? NaN, flows[2] ?? NaN, 1e-12)).toBe(true);
		expect(agreesWithin(flows[1] ?? NaN, flows[2] ?? NaN, 1e-12)).toBe(true);
	});

	test('a root taken in the transmitter and again in the control system proves nothing', () => {
		const root = { ...WITHOUT_DP, signal: { value: 12, unit: 'mA' }, dpSpan: 3200, transmitter: 'root' };
		expect(run(root).scope).toBe('in scope');
		const twice = { ...root, controlSystem: 'root' };
		expect(kindsOf(twice)).toContain('root-taken-twice');
		expect(run(twice).scope).toBe('outside scope');
	});

	test('a gauge beside the transmitter shows what the transmitter really sends', () => {
		const both = (mA: number) => ({ ...CIRCUIT, dp: 800, signal: { value: mA, unit: 'mA' }, dpSpan: 3200 });
		expect(factsOf(both(8), 'characteristic-seen')).toMatchObject({ seen: 'linear', level: 'remark' });
		expect(factsOf(both(12), 'characteristic-seen')).toMatchObject({ seen: 'root', level: 'outside scope' });
		expect(factsOf(both(15.31), 'characteristic-seen')).toMatchObject({ seen: 'root twice', level: 'outside scope' });
	});

	test('temperature taken downstream is warned about, with how much colder the gas can be there', () => {
		const note = factsOf({ ...CIRCUIT, temperatureTaken: 'downstream' }, 'temperature-from-downstream');
		// By hand: 368.15 (1 - (1 - 800/98500)^(0.36174/1.36174)) = 0.80 K at the throat.
		expect(agreesWith(Number(note.colderByAtMost), '0.80')).toBe(true);
	});

	test('below Re_D 2e5 the constant coefficient is not used: 20 Pa in the circuit', () => {
		const slow = { ...CIRCUIT, dp: 20 };
		expect(valueOf(slow, 'dischargeCoefficient')).toBeLessThan(0.985);
		expect(factsOf(slow, 'coefficient-not-of-the-standard')).toMatchObject({
			from: 'indicative table',
			constant: 0.985,
		});
	});

	test('far below the table the constant is shown without an uncertainty, and flagged', () => {
		const slower = { ...CIRCUIT, dp: { value: 1, unit: 'Pa', U: 0.1 } };
		expect(factsOf(slower, 'coefficient-not-of-the-standard')).toMatchObject({ from: 'below the table', U: null });
		expect(run(slower).values.massFlow).not.toHaveProperty('U');
	});

	test('water or dust in an impulse line: a zero of 10 Pa on 80 Pa is 6 % of the flow', () => {
		const note = factsOf({ ...CIRCUIT, dp: 80, dpZero: 10 }, 'zero-shifted');
		expect(agreesWith(Number(note.flowError) * 100, '6')).toBe(true);
		expect(note.level).toBe('outside scope');
		expect(factsOf({ ...CIRCUIT, dpZero: -0.5 }, 'zero-shifted').level).toBe('remark');
	});

	test('every limit of the standard that a tube leaves is named: fluids never warns, we do', () => {
		expect(factsOf({ ...CIRCUIT, pipeDiameter: 1.5, throatDiameter: 0.9 }, 'outside-limit')).toMatchObject({
			limit: 'D',
			value: 1.5,
			max: 1.2,
			edition: 'ISO 5167-4:2003, 5.5.4',
		});
		expect(factsOf({ ...CIRCUIT, throatDiameter: 0.9 }, 'outside-limit')).toMatchObject({ limit: 'beta', value: 0.75 });
	});

	test('a rectangular duct is refused: it needs a field traverse', () => {
		expect(refusalsOf({ ...CIRCUIT, crossSection: 'rectangular' })).toMatchObject([{ kind: 'rectangular-duct' }]);
	});

	test('a Venturi nozzle is no choice of type', () => {
		expect(refusalsOf({ ...CIRCUIT, type: 'venturi_nozzle' })).toMatchObject([{ kind: 'bad-input', input: 'type' }]);
	});

	test('reverse flow: a negative difference pressure is refused, alone and in a series', () => {
		expect(refusalsOf({ ...CIRCUIT, dp: -50 })).toMatchObject([{ kind: 'negative-difference-pressure', value: -50 }]);
		expect(refusalsOf({ ...WITHOUT_DP, dpSeries: [100, -20, 90] })).toMatchObject([
			{ kind: 'negative-difference-pressure', input: 'dpSeries[1]' },
		]);
	});

	test('near zero the low-flow cut-off makes the flow zero, prints itself, and proves nothing', () => {
		const nearZero = { ...CIRCUIT, dp: 15, dpSpan: 2000 };
		expect(valueOf(nearZero, 'massFlow')).toBe(0);
		expect(factsOf(nearZero, 'below-low-flow-cut-off')).toMatchObject({ level: 'outside scope', cutOff: 20, dp: 15 });
		expect(valueOf({ ...nearZero, dp: -15 }, 'massFlow')).toBe(0);
		expect(refusalsOf({ ...nearZero, dp: -25 })).toMatchObject([{ kind: 'negative-difference-pressure' }]);
		expect(factsOf({ ...CIRCUIT, dpSpan: 2000 }, 'low-flow-cut-off')).toMatchObject({ level: 'remark', part: 0.01 });
	});

	test('noise about zero in a series counts as zero below the cut-off, and as reverse flow beyond it', () => {
		const noisy = { ...WITHOUT_DP, dpSeries: [30, -5, 40, 35], dpSpan: 1000 };
		// By hand: (sqrt 30 + 0 + sqrt 40 + sqrt 35)/4 = 4.429465, squared 19.6202.
		expect(agreesWith(valueOf(noisy, 'differencePressure') ?? NaN, '19.6202')).toBe(true);
		expect(refusalsOf({ ...noisy, dpSeries: [30, -15, 40, 35] })).toMatchObject([{ input: 'dpSeries[1]' }]);
	});

	test('a series is averaged by its roots', () => {
		const dpSeries = [400, 520, 610, 480, 350, 700, 560, 430, 500, 450];
		const inputs = { ...WITHOUT_DP, dpSeries };
		expect(agreesWith(Math.sqrt(valueOf(inputs, 'differencePressure') ?? NaN), '22.255103')).toBe(true);
		expect(agreesWith(Number(factsOf(inputs, 'mean-of-roots').overread) * 100, '0.4744')).toBe(true);
	});

	test('diameters of the drawing in a hot duct: with the expansion of steel the flow is 0.18 % larger at 95 degC', () => {
		const grown = { ...CIRCUIT, thermalExpansion: 1.2e-5 };
		// By hand: 2 x 1.2e-5 x 75 K = 0.180 %.
		const ratio = (valueOf(grown, 'massFlow') ?? NaN) / (valueOf(CIRCUIT, 'massFlow') ?? NaN);
		expect(agreesWith((ratio - 1) * 100, '0.180')).toBe(true);
		expect(kindsOf(CIRCUIT)).toContain('diameters-taken-as-hot');
		expect(kindsOf(grown)).not.toContain('diameters-taken-as-hot');
		expect(valueOf(grown, 'beta')).toBeCloseTo(0.6, 14);
	});
});

describe('refusals', () => {
	test.each([
		['a throat as wide as the pipe', { throatDiameter: 1.2 }, 'throat-not-smaller'],
		['a difference pressure above the pressure', { dp: 120_000 }, 'difference-above-pressure'],
		['a throat pressure below three quarters', { dp: 30_000 }, 'pressure-ratio-too-low'],
		['an isentropic exponent below one', { isentropicExponent: 0.9 }, 'out-of-range'],
		['a temperature of 0 K', { temperature: 0 }, 'below-absolute-zero'],
		['a pressure of zero', { pressure: 0 }, 'out-of-range'],
		['millimetres typed as metres', { pipeDiameter: 1200 }, 'out-of-range'],
		['a composition in percent', { composition: { N2: 80, H2O: 20 } }, 'percent-for-fraction'],
		['a composition that does not add up', { composition: { N2: 0.6, H2O: 0.2 } }, 'fractions-do-not-add-up'],
		['a difference pressure beyond the span', { dp: 1100, dpSpan: 1000 }, 'above-span'],
		['two sources of difference pressure', { dpSeries: [800, 810] }, 'one-of'],
		['two sources of pressure', { pressureGauge: -2000, barometer: 101_325 }, 'one-of'],
		['a misspelt input', { presure: 98_500 }, 'unknown-input'],
	])('%s', (_name, change, kind) => {
		expect(refusalsOf({ ...CIRCUIT, ...change }).map((refusal) => refusal.kind)).toEqual([kind]);
	});

	test('moisture above saturation: liquid is present, and the dew point is named', () => {
		const wet = { ...CIRCUIT, temperature: { value: 50, unit: 'degC' } };
		const [refusal] = refusalsOf(wet);
		expect(refusal?.kind).toBe('liquid-present');
		// Independent: iapws 1.5, dew point of 20 % at 98 500 Pa is 59.7323 degC.
		expect(agreesWith(Number(refusal?.dewPoint) - 273.15, '59.7323')).toBe(true);
	});

	test('nothing to calculate from: density, viscosity and exponent are asked for, or the composition', () => {
		expect(refusalsOf(WITHOUT_GAS)).toEqual(
			['density', 'viscosity', 'isentropicExponent'].map((input) => ({
				kind: 'missing-input',
				input,
				or: 'composition',
			})),
		);
		expect(refusalsOf(WITHOUT_DP)).toMatchObject([{ kind: 'one-of', given: 0 }]);
		expect(refusalsOf(WITHOUT_PRESSURE)).toMatchObject([{ kind: 'one-of', given: 0 }]);
	});

	test('outside the fits of heat capacity and viscosity these two are asked for, not extrapolated', () => {
		const refusals = refusalsOf({ ...CIRCUIT, temperature: 700 });
		expect(refusals.map((refusal) => refusal.orGive)).toEqual(['viscosity', 'isentropicExponent']);
		expect(run({ ...CIRCUIT, temperature: 700, viscosity: 3.2e-5, isentropicExponent: 1.33 }).scope).toBe('in scope');
	});

	test.each([3.5, 21.6])('a signal of %d mA is a fault, not a measurement', (mA) => {
		const inputs = { ...WITHOUT_DP, signal: { value: mA, unit: 'mA' }, dpSpan: 2000 };
		expect(refusalsOf(inputs)).toMatchObject([{ kind: 'signal-fault', input: 'signal' }]);
	});

	test('a signal without the span of its transmitter says nothing', () => {
		expect(refusalsOf({ ...WITHOUT_DP, signal: { value: 12, unit: 'mA' } })).toMatchObject([
			{ kind: 'missing-input', input: 'dpSpan', neededBy: 'signal' },
		]);
	});
});

describe('outside scope: shown, and proves no step', () => {
	test.each([
		['less than 5 % of the span', { dp: 90, dpSpan: 2000 }, 'dp-low-in-span'],
		['a transmitter without certificate', { dpCalibration: 'none' }, 'no-calibration-certificate'],
		['dust through a tube that was never calibrated in service', { dust: 'present' }, 'dust-laden'],
		['a throat worn or built up', { throatCondition: 'worn or built up' }, 'throat-changed'],
		['less straight pipe than asked for', { straightLength: 6, straightLengthNeeded: 10 }, 'straight-length-short'],
	])('%s', (_name, change, kind) => {
		expect(factsOf({ ...CIRCUIT, ...change }, kind).level).toBe('outside scope');
		expect(run({ ...CIRCUIT, ...change }).scope).toBe('outside scope');
	});

	test('a flow pulsating by more than a tenth', () => {
		const steady = { ...WITHOUT_DP, dpSeries: [95, 105, 95, 105].map((dp) => 8 * dp) };
		const pulsating = { ...WITHOUT_DP, dpSeries: [85, 115, 85, 115].map((dp) => 8 * dp) };
		expect(run(steady).scope).toBe('in scope');
		expect(factsOf(pulsating, 'pulsating-flow')).toMatchObject({ level: 'outside scope', limit: 0.1 });
	});

	test('dust through a tube calibrated in service, and straight pipe enough, are inside', () => {
		const good = { dust: 'present', flowCalibration: 'in service', straightLength: 12, straightLengthNeeded: 10 };
		expect(run({ ...CIRCUIT, ...good, dpCalibration: 'valid', throatCondition: 'as drawn' }).scope).toBe('in scope');
	});

	test('what nobody stated about the installation is listed', () => {
		expect(factsOf(CIRCUIT, 'installation-not-stated').inputs).toEqual([
			'dpCalibration',
			'dust',
			'throatCondition',
			'straightLength',
			'straightLengthNeeded',
		]);
	});
});

describe('notes and plot', () => {
	test('a sum of fractions a little off one is closed, and the result says by how much', () => {
		const note = factsOf(
			{ ...CIRCUIT, composition: { N2: 0.617, CO2: 0.1, O2: 0.08, H2O: 0.2 } },
			'composition-normalised',
		);
		expect(note.sum).toBeCloseTo(0.997, 12);
	});

	test('a density that does not fit the composition is used and warned about', () => {
		const note = factsOf({ ...CIRCUIT, density: 1.29 }, 'density-and-composition-disagree');
		expect(note).toMatchObject({ level: 'warning', given: 1.29 });
		expect(valueOf({ ...CIRCUIT, density: 1.29 }, 'density')).toBe(1.29);
	});

	test('a liquid has no normal flow, and the result says why', () => {
		const water = {
			type: 'as_cast',
			pipeDiameter: 0.2,
			throatDiameter: 0.1,
			pressure: 300_000,
			dp: 20_000,
			temperature: 293.15,
			density: 998.2,
			viscosity: 0.0010016,
			isentropicExponent: 1e9,
		};
		expect(run(water).values.normalFlowWet).toEqual({
			value: null,
			unit: 'm3(n)/s',
			because: 'the density is not that of a gas at this state',
		});
	});

	test('the working point lies on the curve of the plot', () => {
		const [plot] = run({ ...CIRCUIT, dpSpan: 2000 }).plots ?? [];
		const [curve, now] = plot?.curves ?? [];
		expect(now?.y[0]).toBeCloseTo((valueOf(CIRCUIT, 'volumeFlow') ?? NaN) * 3600, 6);
		expect(curve?.x.at(-1)).toBe(2000);
		expect(curve?.y.every((y, i) => i === 0 || y > (curve.y[i - 1] ?? Infinity))).toBe(true);
		expect(plot?.marks).toEqual([{ kind: 'limit', label: '5 % of span', axis: 'x', at: 100 }]);
	});

	test('whatever arrives, the answer is a result of finite numbers or a list of refusals', () => {
		const anything = fc.oneof(fc.jsonValue(), fc.double(), fc.constant(undefined));
		const inputs = fc.record(Object.fromEntries(venturiFlow.inputs.map(({ name }) => [name, anything])), {
			requiredKeys: [],
		});
		fc.assert(
			fc.property(inputs, fc.boolean(), (noise, onTop) => {
				const result = venturiFlow.run(onTop ? { ...CIRCUIT, ...noise } : noise);
				if (!result.ok) expect(result.error.length).toBeGreaterThan(0);
				else
					for (const { value } of Object.values(result.value.values))
						expect(value === null || Number.isFinite(value)).toBe(true);
			}),
		);
	});
});
