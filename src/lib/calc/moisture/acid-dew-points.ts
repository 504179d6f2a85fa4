import { fail, ok, type Result } from '../../base';
import { QUANTITIES } from '../../quantity';
import { answered } from '../answered';
import type { CalcNote, CalcResult, OutputSpec, Plot, Refusal } from '../calculator';
import { defineCalculator } from '../define-calculator';
import { pressureInputs, pressureOf, staticPressure } from '../gas/static-pressure';
import { choice, measured, optional, withDefault, type Given } from '../read-inputs';
import { propagate, type Numbers, type Uncertain } from '../uncertainty';
import { acidDewPoint, acidDewPointOkkes } from './acid-dew-point';
import { ACID_PAGE } from './acid-page';
import { dewPoint } from './dew-point';

const INPUTS = {
	sulphurTrioxide: measured({
		...{ quantity: 'fraction', from: 'typed', typedIn: 'ppm', min: 1e-9, max: 0.01 },
		symbol: 'x_a',
		label: 'SO3 and H2SO4',
		means: 'SO3 and H2SO4 together, as mole fraction of the wet gas; a few percent of the SO2 become SO3',
	}),
	sulphurTrioxideFrom: withDefault(
		choice(['measured', 'estimated'], { label: 'SO3 is', means: 'where the SO3 is known from', from: 'typed' }),
		'estimated',
	),
	waterVapour: measured({
		...{ quantity: 'water-vapour', from: 'reading', min: 1e-4, max: 0.6 },
		symbol: 'x_w',
		label: 'Moisture, wet',
		means: 'moisture of the gas, as mole of water per mole of wet gas',
	}),
	...pressureInputs('of the gas'),
	wall: optional(
		measured({
			...{ quantity: 'temperature', from: 'reading', min: 200, max: 900 },
			symbol: 'T_s',
			label: 'Coldest surface',
			means: 'temperature of the coldest metal that the gas touches',
		}),
	),
};

const output = (name: string, symbol: string, means: string, quantity: keyof typeof QUANTITIES): OutputSpec => ({
	...{ name, symbol, means, quantity },
	unit: QUANTITIES[quantity],
});
const OUTPUTS: readonly OutputSpec[] = [
	output('higher', 'T_a', 'the higher of the two acid dew points', 'temperature'),
	output('verhoff', 'T_VB', 'acid dew point by Verhoff and Banchero', 'temperature'),
	output('okkes', 'T_Ok', 'acid dew point by Okkes', 'temperature'),
	output('apart', 'ΔT', 'how far the two correlations are apart', 'temperature-difference'),
	output('waterDewPoint', 'T_w', 'dew point of the water alone', 'temperature'),
	output('clearance', 'ΔT_s', 'coldest surface above the higher acid dew point', 'temperature-difference'),
];

/**
 * Sulphuric-acid dew point by two correlations side by side: their distance shows how little is known.
 *
 *     1000/T = 2.276 − 0.0294 ln p_w − 0.0858 ln p_a + 0.0062 ln p_w ln p_a     (mmHg, K)
 *     t = 203.25 + 27.6 lg p_w + 10.83 lg p_a + 1.06 (lg p_a + 8)^2.19          (atm, °C)
 *
 * @param inputs x_a, SO3 and H2SO4 [1] of the wet gas, 10⁻⁹ to 0.01; x_w [1], 10⁻⁴ to 0.6; p [Pa absolute]; T_s [K]
 * @returns both acid dew points and the higher [K], their distance [K], the dew point of water [K], the clearance [K]
 *
 * Source: Verhoff and Banchero, Chem. Eng. Prog. 70(8) (1974) 71-72; Okkes, Hydrocarbon Processing, July 1987 (coefficients
 * from a public copy).
 * Checked against: a published worked example, 402 K, and a second program (test/calc/moisture/acid-dew-points.test.ts).
 */
export const acidDewPoints = defineCalculator({
	id: 'acid-dew-points',
	version: 1,
	title: 'Sulphuric-acid dew point, two correlations',
	answers: 'Below which temperature does sulphuric acid attack the metal?',
	sources: [
		'Verhoff and Banchero, Chem. Eng. Prog. 70(8) (1974) 71-72',
		'Okkes, Hydrocarbon Processing, July 1987 (coefficients from a public copy; citation from memory, verify)',
		'IAPWS R7-97(2012) for the dew point of water',
	],
	fields: INPUTS,
	outputs: OUTPUTS,
	page: ACID_PAGE,
	compute,
});

type AcidGiven = Given<typeof INPUTS>;

function compute(given: AcidGiven): Result<Omit<CalcResult, 'calc' | 'constants' | 'inputs'>, readonly Refusal[]> {
	const pressure = staticPressure(given);
	if (!pressure.ok) return pressure;
	const inputs: readonly Uncertain[] = [
		{ ...given.sulphurTrioxide, name: 'sulphurTrioxide', symbol: 'x_a', unit: '1' },
		{ ...given.waterVapour, name: 'waterVapour', symbol: 'x_w', unit: '1' },
		...pressure.value,
		...(given.wall === undefined ? [] : [{ ...given.wall, name: 'wall', symbol: 'T_s', unit: 'K' }]),
	];
	const at = Object.fromEntries(inputs.map(({ name, value }) => [name, value]));
	const water = dewPoint(given.waterVapour.value, pressureOf(at));
	const first = acidDewPoint(given.waterVapour.value * pressureOf(at), given.sulphurTrioxide.value * pressureOf(at));
	if (!water.ok) return fail([{ ...water.error, input: 'waterVapour' }]);
	if (!first.ok) return fail([first.error]);
	const values = modelOf(at);
	const { U, budget, unstated } = propagate(modelOf, inputs);
	return ok({
		values: answered(OUTPUTS, values, U, BECAUSE),
		scope: 'in scope',
		notes: notesOf(given, values, unstated),
		budget: budget.filter((row) => row.output === 'higher'),
		plots: [plotOf(given, at)],
	});
}

/** From the values of the inputs to all results; what a correlation cannot say is left out. */
function modelOf(at: Numbers): Numbers {
	const { sulphurTrioxide: xa = NaN, waterVapour: xw = NaN, wall } = at;
	const p = pressureOf(at);
	const first = acidDewPoint(xw * p, xa * p);
	const second = acidDewPointOkkes(xw * p, xa * p);
	const water = dewPoint(xw, p);
	const found = [first, second].flatMap((each) => (each.ok ? [each.value] : []));
	const higher = Math.max(...found);
	return {
		higher,
		...(first.ok ? { verhoff: first.value } : {}),
		...(second.ok ? { okkes: second.value } : {}),
		...(first.ok && second.ok ? { apart: Math.abs(first.value - second.value) } : {}),
		...(water.ok && water.value.kind !== 'none' ? { waterDewPoint: water.value.temperature } : {}),
		...(wall === undefined ? {} : { clearance: wall - higher }),
	};
}

function notesOf(
	given: AcidGiven,
	{ higher = NaN, clearance, apart }: Numbers,
	unstated: readonly string[],
): readonly CalcNote[] {
	const wall = given.wall?.value;
	return [
		{ kind: 'acid-dew-point-no-proof', level: 'warning' },
		...(clearance !== undefined && clearance < 0 && wall !== undefined
			? [{ kind: 'acid-dew-point-above-wall', level: 'warning', temperature: higher, wall } as const]
			: []),
		...(given.sulphurTrioxideFrom === 'estimated'
			? [{ kind: 'sulphur-trioxide-estimated', level: 'warning' } as const]
			: []),
		...(unstated.length > 0 ? [{ kind: 'uncertainty-not-stated', level: 'warning', inputs: unstated } as const] : []),
		...(apart === undefined ? [] : [{ kind: 'correlations-apart', level: 'remark', apart } as const]),
	];
}

/** Both correlations from a tenth to ten times the SO3 stated: the unknown that dominates. */
function plotOf({ sulphurTrioxide }: AcidGiven, at: Numbers): Plot {
	const x = Array.from({ length: 61 }, (_, i) => sulphurTrioxide.value * 10 ** (i / 30 - 1));
	const curve = (id: 'verhoff' | 'okkes', label: string) => ({
		...{ id, label, kind: 'line' as const, x: x.map((each) => each * 1e6) },
		y: x.map((each) => (modelOf({ ...at, sulphurTrioxide: each })[id] ?? NaN) - CELSIUS),
	});
	return {
		id: 'acid',
		title: 'Acid dew point over SO3',
		x: { label: 'SO3 and H2SO4', unit: 'ppm' },
		y: { label: 'acid dew point', unit: 'degC' },
		curves: [curve('verhoff', 'Verhoff'), curve('okkes', 'Okkes')],
		marks: [{ kind: 'event', label: 'as stated', axis: 'x', at: sulphurTrioxide.value * 1e6 }],
	};
}

const CELSIUS = 273.15;
const BECAUSE = {
	okkes: 'less than 1e-8 atm of SO3: outside the correlation',
	apart: 'one correlation alone',
	clearance: 'no surface stated',
};
