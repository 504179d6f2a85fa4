import { fail, ok, type Result } from '../../base';
import { si } from '../../quantity';
import type { CalcResult, CalcValue, Plot, Refusal } from '../calculator';
import { defineCalculator } from '../define-calculator';
import { leakAtSuction } from './in-leakage';
import { normalVolume } from './normal-volume';
import type { PurgeNote } from './notes';
import { oxygenAfter } from './oxygen-after';
import { propagate, type Uncertain } from './propagate';
import { refuseMeter } from './shared-inputs';
import { sweepFields, sweepOutputs, type SweepInputs } from './sweep-inputs';
import { sweepPlan, type SweepPlan } from './sweep-plan';
import { sweepWarnings } from './sweep-warnings';

/**
 * Planning twin of the purge: how long, with how much inert gas, and whether at all.
 *
 *     V = Σ V_i (p/p_n)(T_n/T);  λ = K (Q_I + Q_L)/V;  C_ss = (x_air Q_L + Ci Q_I)/(Q_L + Q_I)
 *     t = ln((C0 − C_ss)/(Ct − C_ss))/λ, but not less than N_min V/Q_I;  inert gas = Q_I t
 *
 * @param inputs V_i [m³] > 0, T [K], p [Pa absolute] > 0, Q_I > 0 and Q_L [m³(n)/s], C0, Ci, Ct [1] ≤ 0.25, 0 < K ≤ 1
 * @returns λ [1/s], C_ss [1], t [s], volume changes [1], inert gas [m³(n)], each with U; "unreachable" instead of a number
 *
 * Source: sweep-through purging with mixing factor, CEN/TR 15281 annex A and NFPA 69 annex (from memory, verify); the
 * in-leakage is an oxygen balance (derived).
 * Checked against: Branan, Rules of Thumb for Chemical Engineers, purging chart; published 1 and 0.74 volumes
 * (test/calc/purge/sweep-purge.test.ts).
 */
export const sweepPurge = defineCalculator({
	id: 'sweep-purge',
	version: 1,
	title: 'Sweep purge, planned',
	answers: 'How long must we purge, how much inert gas does it take, and do we get there at all with this leak?',
	sources: [
		'CEN/TR 15281, annex A, flow-through purging (from memory, verify)',
		'NFPA 69, annexes on purging and mixing (from memory, verify)',
		'Oxygen balance of one mixed zone with in-leakage (derived)',
	],
	outputs: sweepOutputs,
	fields: sweepFields,
	compute,
});

type Computed = Result<Omit<CalcResult, 'calc' | 'constants' | 'inputs'>, readonly Refusal[]>;

function compute(given: SweepInputs): Computed {
	const refusals = refuse(given);
	if (refusals.length > 0) return fail(refusals);
	const { leak, notes } = leakNow(given);
	const least = given.minimumVolumeChanges?.value ?? (given.outletRead === 'every volume' ? 1 : 3);
	const inputs = uncertainInputs(given, leak);
	const plan = (x: readonly number[]) => planOf(x, least);
	const values = plan(inputs.map(({ x }) => x));
	const { U, budget } = propagate(plan, inputs);
	const left =
		given.stock === undefined || values.stockNeeded === null
			? null
			: given.stock.value - given.reserve.value - values.stockNeeded;
	const why = given.stock === undefined ? 'not-given' : 'unreachable';
	return ok({
		values: Object.fromEntries(
			sweepOutputs.map(({ name, unit }) => {
				const value = name === 'stockLeft' ? left : values[name];
				const width = name === 'stockLeft' ? undefined : U[name];
				return [name, valueOf(value, unit, name === 'stockLeft' ? why : 'unreachable', width)];
			}),
		),
		scope: 'in scope',
		notes: [...notes, ...sweepWarnings(given, { plan: values, least })] satisfies readonly PurgeNote[],
		budget: budget.filter(({ output }) => ['floor', 'time', 'inertGas'].includes(output)),
		plots: [plotOf(given, values)],
	});
}

const valueOf = (value: number | null, unit: string, because: string, U: number | undefined): CalcValue => ({
	...{ value, unit },
	...(U === undefined ? {} : { U }),
	...(value === null ? { because } : {}),
});

/** The whole plan from plain numbers in the order of `uncertainInputs`, so that its uncertainty is found by trying. */
function planOf(x: readonly number[], least: number) {
	const [T = 0, p = 0, Q_I = 0, Q_L = 0, K = 0, C0 = 0, Ci = 0, Ct = 0, ...V_i] = x;
	const size = V_i.reduce((sum, each) => sum + each, 0);
	const V = normalVolume(size, { temperature: si('temperature', T), pressure: si('pressure-absolute', p) });
	const plan = sweepPlan({ V, K, Q_I, Q_L, C0, Ci, Ct, least });
	return { normalVolume: V, ...plan, stockNeeded: plan.inertGas === null ? null : 2 * plan.inertGas };
}

function uncertainInputs(given: SweepInputs, leak: LeakNow): readonly Uncertain[] {
	return [
		{ input: 'temperature', symbol: 'T', unit: 'K', x: given.temperature.value, U: given.temperature.U },
		{ input: 'pressure', symbol: 'p', unit: 'Pa(a)', x: given.pressure.value, U: given.pressure.U },
		{ input: 'inertFlow', symbol: 'Q_I', unit: 'm3(n)/s', x: given.inertFlow.value, U: given.inertFlow.U },
		{ input: 'leak', symbol: 'Q_L', unit: 'm3(n)/s', x: leak.value, U: leak.U },
		{ input: 'mixing', symbol: 'K', unit: '1', x: given.mixing.value, U: given.mixing.U },
		{ input: 'startOxygen', symbol: 'C0', unit: '1', x: given.startOxygen.value, U: given.startOxygen.U },
		{ input: 'inertOxygen', symbol: 'Ci', unit: '1', x: given.inertOxygen.value, U: given.inertOxygen.U },
		{ input: 'target', symbol: 'Ct', unit: '1', x: given.target.value - given.guard.value },
		...given.volumes.map(({ id, volume }) => {
			return { input: `volumes.${id}`, symbol: 'V_i', unit: 'm3', x: volume.value, U: volume.U };
		}),
	];
}

function refuse(given: SweepInputs): readonly Refusal[] {
	const line = given.target.value - given.guard.value;
	const positive = (['inertFlow', 'pressure', 'mixing'] as const).map((input) =>
		given[input].value > 0 ? undefined : { kind: 'not-positive', input, value: given[input].value },
	);
	const refusals: readonly (Refusal | undefined)[] = [
		...positive,
		refuseMeter(given.meter, 'meter'),
		given.outlet.trim() === '' ? { kind: 'no-outlet', input: 'outlet' } : undefined,
		line > 0
			? undefined
			: { kind: 'guard-leaves-nothing', input: 'guard', limit: given.target.value, guard: given.guard.value },
		line < given.startOxygen.value
			? undefined
			: { kind: 'target-not-below-start', input: 'target', target: line, start: given.startOxygen.value },
	];
	return refusals.filter((refusal) => refusal !== undefined);
}

type LeakNow = { readonly value: number; readonly U?: number | undefined };

/** The leak at the suction of this purge: more suction draws in more air, less is not credited. */
function leakNow(given: SweepInputs): { readonly leak: LeakNow; readonly notes: readonly PurgeNote[] } {
	if (given.leak === undefined) return { leak: { value: 0 }, notes: [] };
	const { flow, suction: found = 0 } = given.leak;
	const now = given.suction?.value;
	if (found === 0 || now === undefined) {
		return { leak: flow, notes: flow.value > 0 ? [{ level: 'warning', kind: 'leak-without-suction' }] : [] };
	}
	if (now <= found) return { leak: flow, notes: [] };
	const factor = leakAtSuction(1, { found, now });
	const leak = { value: flow.value * factor, U: flow.U === undefined ? undefined : flow.U * factor };
	return { leak, notes: [{ level: 'warning', kind: 'leak-scaled-with-suction', found, now, leak: leak.value }] };
}

/** The oxygen of one mixed zone, drawn past the time needed; where the line is unreachable, until it has settled. */
function plotOf(given: SweepInputs, { rate, floor, time }: SweepPlan): Plot {
	const end = time === null ? 5 / rate : 1.25 * time;
	const x = Array.from({ length: 101 }, (_, i) => (i * end) / 100);
	const sweep = { C0: given.startOxygen.value, floor, rate };
	const { target, guard } = given;
	return {
		id: 'oxygen',
		title: 'Oxygen by the mixing formula',
		x: { label: 'time', unit: 's' },
		y: { label: 'oxygen', unit: '1' },
		curves: [
			{ id: 'plan', label: 'oxygen', kind: 'line', decides: true, x, y: x.map((t) => oxygenAfter(t, sweep)) },
			{ id: 'floor', label: 'floor', kind: 'line', x: [0, end], y: [floor, floor] },
		],
		marks: [
			{ kind: 'limit', label: 'limit', axis: 'y', at: target.value },
			...(guard.value > 0
				? [{ kind: 'guard', label: 'limit less guard', axis: 'y', at: target.value - guard.value } as const]
				: []),
			...(time === null ? [] : [{ kind: 'event', label: 'time needed', axis: 'x', at: time } as const]),
		],
	};
}
