import { fail, ok, type Result } from '../../base';
import type { CalcNote, CalcResult, Refusal, Verdict } from '../calculator';
import { answered } from '../answered';
import { P_N, T_N } from '../constants';
import { defineCalculator } from '../define-calculator';
import { propagate, type Numbers, type Uncertain } from '../uncertainty';
import { DECAY_INPUTS, DECAY_OUTPUTS, pressureAt, type DecayGiven } from './decay-inputs';
import { PRESSURE_DECAY_PAGE } from './pressure-decay-page';

/**
 * Tightness by pressure decay, with the temperature taken out: a colder gas loses pressure without any leak, a warmer one
 * hides it.
 *
 *     Δp_c = p₁ − p₂ T₁/T₂,   f = Δp_c/p₁,   T_f = (p₁T₂/(p₂T₁) − 1)/t,   q_L = (V/t) f (p₁/p_n)(T_n/T₁)
 *
 * @param inputs p₁, p₂ [Pa absolute], or gauge with the barometer of each moment; T₁, T₂ [K]; V > 0 [m³]; t > 0 [s]
 * @returns Δp_c [Pa], f [1], T_f [1/s], q_L [m³(n)/s], each with U; a verdict where the allowed leak is given
 *
 * Source: ideal gas in a rigid volume; the hourly leak rate T_f as in ISO 10648-2:1994 (from memory, verify).
 * Checked against: the difference of the amounts in Python's exact fractions (test/calc/tightness/pressure-decay.test.ts).
 */
export const pressureDecay = defineCalculator({
	id: 'pressure-decay',
	version: 1,
	title: 'Tightness by pressure decay',
	answers: 'Is this enclosure tight, with the temperature taken out?',
	sources: [
		'Ideal gas in a rigid volume',
		'ISO 10648-2:1994, hourly leak rate (from memory, verify)',
		'JCGM 100:2008, 5.1.2; JCGM 106:2012, guarded acceptance (clause from memory, verify)',
	],
	fields: DECAY_INPUTS,
	outputs: DECAY_OUTPUTS,
	page: PRESSURE_DECAY_PAGE,
	compute,
});

function compute(given: DecayGiven): Result<Omit<CalcResult, 'calc' | 'constants' | 'inputs'>, readonly Refusal[]> {
	const before = pressureAt(given, 'Start');
	const after = pressureAt(given, 'End');
	const swing = Math.abs(given.temperatureEnd.value - given.temperatureStart.value);
	if (!before.ok || !after.ok) return fail([before, after].flatMap((each) => (each.ok ? [] : each.error)));
	if (swing > MOST_SWING)
		return fail([{ kind: 'temperature-swing', input: 'temperatureEnd', swing, most: MOST_SWING }]);
	const inputs: readonly Uncertain[] = [
		...before.value,
		...after.value,
		{ ...given.temperatureStart, name: 'temperatureStart', symbol: 'T_1', unit: 'K' },
		{ ...given.temperatureEnd, name: 'temperatureEnd', symbol: 'T_2', unit: 'K' },
		{ ...given.volume, name: 'volume', symbol: 'V', unit: 'm3' },
		{ U: 0, ...given.duration, name: 'duration', symbol: 't', unit: 's' },
	];
	const values = decay(Object.fromEntries(inputs.map(({ name, value }) => [name, value])));
	const { U, budget, unstated } = propagate(decay, inputs);
	const { correctedDrop = NaN, startPressure = NaN } = values;
	if (correctedDrop < -(U.correctedDrop ?? 0)) {
		return fail([{ kind: 'pressure-rose', input: 'temperatureEnd', drop: correctedDrop, U: U.correctedDrop ?? null }]);
	}
	const notes: readonly CalcNote[] = [
		...notesOf(given, { swing, correctedDrop, U: U.correctedDrop, startPressure }),
		...(unstated.length > 0 ? [{ kind: 'uncertainty-not-stated', level: 'warning', inputs: unstated } as const] : []),
	];
	const verdict = verdictOf(given, values.leak ?? NaN, U.leak);
	return ok({
		values: answered(DECAY_OUTPUTS, values, U),
		...(verdict === undefined ? {} : { verdict }),
		scope: notes.some(({ level }) => level === 'outside scope') ? 'outside scope' : 'in scope',
		notes,
		budget: budget.filter((row) => row.output === 'leak'),
	});
}

function decay(at: Numbers): Numbers {
	const { temperatureStart: T1 = NaN, temperatureEnd: T2 = NaN, volume: V = NaN, duration: t = NaN } = at;
	const p1 = at.pressureStart ?? (at.gaugeStart ?? NaN) + (at.barometerStart ?? NaN);
	const p2 = at.pressureEnd ?? (at.gaugeEnd ?? NaN) + (at.barometerEnd ?? NaN);
	const correctedDrop = p1 - (p2 * T1) / T2;
	const lost = correctedDrop / p1;
	return {
		correctedDrop,
		rawDrop: p1 - p2,
		lost,
		hourlyRate: ((p1 * T2) / (p2 * T1) - 1) / t,
		leak: (V / t) * lost * (p1 / P_N) * (T_N / T1),
		startPressure: p1,
	};
}

type Facts = {
	readonly swing: number;
	readonly correctedDrop: number;
	readonly U: number | undefined;
	readonly startPressure: number;
};

function notesOf({ walls }: DecayGiven, { swing, correctedDrop, U, startPressure }: Facts): readonly CalcNote[] {
	const notes: CalcNote[] = [];
	if (walls === 'flexible') notes.push({ kind: 'walls-flexible', level: 'outside scope' });
	if (Math.abs(correctedDrop) > MOST_CHANGE * startPressure)
		notes.push({
			kind: 'pressure-changed-much',
			level: 'outside scope',
			part: correctedDrop / startPressure,
			most: MOST_CHANGE,
		});
	if (swing > SWING_TO_NOTE) notes.push({ kind: 'temperature-moved', level: 'warning', swing });
	if (U !== undefined && correctedDrop < 1.5 * U)
		notes.push({ kind: 'drop-inside-uncertainty', level: 'warning', drop: correctedDrop, U });
	return notes;
}

/** Adequate when the leak and its uncertainty together are within what is allowed. */
function verdictOf({ allowedLeak }: DecayGiven, leak: number, U: number | undefined): Verdict | undefined {
	if (allowedLeak === undefined) return undefined;
	const facts = { leak, allowed: allowedLeak.value };
	if (U === undefined)
		return { word: 'cannot be shown', reasons: [{ kind: 'leak-without-uncertainty', level: 'reason', ...facts }] };
	const kind =
		leak + U <= allowedLeak.value ? 'leak-within' : leak <= allowedLeak.value ? 'leak-inside-guard' : 'leak-beyond';
	return { word: kind === 'leak-within' ? 'adequate' : 'not yet', reasons: [{ kind, level: 'reason', ...facts, U }] };
}

/** A change of more makes one thermometer no temperature of all the gas (common practice). */
const MOST_SWING = 1;
const SWING_TO_NOTE = 0.5;
/** Common practice of pressure-decay tests: beyond it the leak is no longer that of the start pressure. */
const MOST_CHANGE = 0.1;
