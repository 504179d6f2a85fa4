import { fail, ok, type Result } from '../../base';
import type { CalcResult, Refusal } from '../calculator';
import { defineCalculator } from '../define-calculator';
import { pressureOf, staticPressure } from '../gas/static-pressure';
import { propagate, type Uncertain } from '../uncertainty';
import { acidDewPoints, acidNotes } from './clearance-acid';
import { CLEARANCE_INPUTS, type ClearanceGiven } from './clearance-inputs';
import { clearanceModel, coldestOf, type States } from './clearance-model';
import { stateNotes, stateRefusals, surfaceNotes } from './clearance-notes';
import { CLEARANCE_OUTPUTS, clearanceValues } from './clearance-outputs';
import { clearancePlot } from './clearance-plot';
import { clearanceVerdict } from './clearance-verdict';
import { statedMoisture, type Moisture } from './stated-moisture';
import { CLEARANCE_PAGE } from './clearance-page';

/**
 * Whether the coldest metal stays dry: how far its temperature is above the dew point of the gas, as it is now and as it
 * will be with feed on, when the fuel gives off its water.
 *
 *     clearance = T_coldest − T_dp(x_w, p),   adequate where clearance − U ≥ margin for both states
 *
 * The coldest surface is the one with the lowest T_s − U(T_s), and U enters as a guard: more doubt about moisture, pressure
 * or temperature never helps. A value without a stated U is taken as the bound it was meant to be, and the result says so.
 *
 * @param inputs surfaces by name, T_s [K] with U and age [s]; moisture of both states as x_w [1] wet, w [1] dry or Y [kg/kg];
 *   p [Pa absolute], or gauge with barometer; margin [K] of the site, 0 to 200
 * @returns dew points [K], clearances [K] with U, the coldest temperature [K], acid dew points [K] as a remark
 *
 * Source: IAPWS R7-97(2012) over water, R14-08(2011) over ice; JCGM 100:2008, 5.1.2; JCGM 106:2012, guarded acceptance.
 * Checked against: iapws 1.5.4 for the dew points, by hand for clearance and guard
 * (test/calc/moisture/dew-point-clearance.test.ts).
 */
export const dewPointClearance = defineCalculator({
	id: 'dew-point-clearance',
	version: 1,
	title: 'Dew-point clearance of the coldest surface',
	answers: 'Does the coldest metal stay dry, now and with feed on?',
	sources: [
		'IAPWS R7-97(2012), region 4',
		'IAPWS R14-08(2011), sublimation pressure',
		'JCGM 100:2008, 5.1.2; JCGM 106:2012, guarded acceptance (clause from memory, verify)',
		'Verhoff and Banchero, Chem. Eng. Prog. 70(8) (1974) 71-72, for the acid dew point',
	],
	fields: CLEARANCE_INPUTS,
	outputs: CLEARANCE_OUTPUTS,
	page: CLEARANCE_PAGE,
	compute,
});

type Computed = Omit<CalcResult, 'calc' | 'constants' | 'inputs'>;

function compute(given: ClearanceGiven): Result<Computed, readonly Refusal[]> {
	const pressure = staticPressure(given);
	const hasMolarMass = given.dryMolarMass !== undefined;
	const present = statedMoisture(
		{ wet: given.waterVapour, dry: given.waterVapourDry, byMass: given.humidityRatio },
		{ wet: 'waterVapour', dry: 'waterVapourDry', byMass: 'humidityRatio' },
		hasMolarMass,
	);
	const predicted = statedMoisture(
		{ wet: given.predictedWaterVapour, dry: given.predictedWaterVapourDry, byMass: given.predictedHumidityRatio },
		{ wet: 'predictedWaterVapour', dry: 'predictedWaterVapourDry', byMass: 'predictedHumidityRatio' },
		hasMolarMass,
	);
	if (!pressure.ok || !present.ok || !predicted.ok) {
		return fail([pressure, present, predicted].flatMap((each) => (each.ok ? [] : each.error)));
	}
	return clearanceOf(given, pressure.value, { present: present.value, predicted: predicted.value });
}

function clearanceOf(
	given: ClearanceGiven,
	pressure: readonly Uncertain[],
	states: States,
): Result<Computed, readonly Refusal[]> {
	const coldest = coldestOf(given.surfaces);
	const inputs: readonly Uncertain[] = [
		{ ...coldest.temperature, name: 'surface', symbol: 'T_s', unit: 'K' },
		...[states.present, states.predicted].flatMap((state) => (state === undefined ? [] : [state.input])),
		...(given.dryMolarMass === undefined
			? []
			: [{ ...given.dryMolarMass, name: 'dryMolarMass', symbol: 'M_dry', unit: 'kg/mol' }]),
		...pressure,
	];
	const model = clearanceModel(states);
	const values = Object.fromEntries(inputs.map((input) => [input.name, input.value]));
	const refusals = stateRefusals(given, states, values);
	if (refusals.length > 0) return fail(refusals);
	const now = model(values);
	const { U, budget, unstated } = propagate(model, inputs);
	// What is stated makes the guard; a value without U is a bound already.
	const guards = propagate(
		model,
		inputs.map((input) => ({ U: 0, ...input })),
	).U;
	const acid = acidDewPoints(given.sulphurTrioxide?.value, now, pressureOf(values));
	if (!acid.ok) return fail([acid.error]);
	const judged = (state: Moisture | undefined, name: string) => {
		const clearance = now[name];
		if (state === undefined) return undefined;
		return clearance === undefined ? 'dry' : { clearance, guard: guards[name] ?? 0 };
	};
	const margin = given.margin.value;
	return ok({
		values: clearanceValues({ ...now, ...acid.value }, U),
		verdict: clearanceVerdict({
			surface: coldest.name,
			margin,
			present: judged(states.present, 'clearance'),
			predicted: judged(states.predicted, 'predictedClearance'),
		}),
		scope: 'in scope',
		notes: [
			{ kind: 'coldest-surface', level: 'remark', name: coldest.name, of: given.surfaces.length },
			...surfaceNotes(given),
			...stateNotes(given, states, now),
			...acidNotes(given, acid.value, coldest.temperature.value),
			...(unstated.length > 0 ? [{ kind: 'uncertainty-not-stated', level: 'warning', inputs: unstated } as const] : []),
			{ kind: 'ideal-gas-dew-point', level: 'remark', realGasIsLowerBy: REAL_GAS },
		],
		budget: budget.filter((row) => row.output === 'leastClearance'),
		plots: [
			clearancePlot({
				now,
				margin,
				guard: guards.leastClearance ?? 0,
				pressure: pressureOf(values),
				surfaces: given.surfaces,
			}),
		],
	});
}

/** About how much lower [K] the dew point of the real gas is at 1 atm (CoolProp 8.0.0, enhancement factor 1.004 to 1.006). */
const REAL_GAS = 0.1;
