import { fail, ok, type Result } from '../../base';
import { si } from '../../quantity';
import type { CalcResult, CalcValue, Plot, Refusal } from '../calculator';
import { OXYGEN_IN_AIR } from '../constants';
import { defineCalculator } from '../define-calculator';
import { propagate, type Numbers, type Uncertain } from '../uncertainty';
import { leakAtSuction } from './in-leakage';
import { normalVolume } from './normal-volume';
import type { PurgeNote } from './notes';
import { oxygenAfter } from './oxygen-after';
import { refuseMeter } from './shared-inputs';
import { sweepFields, sweepOutputs, type SweepInputs } from './sweep-inputs';
import { sweepPlan, type SweepPlan } from './sweep-plan';
import { sweepWarnings } from './sweep-warnings';
import { SWEEP_PAGE } from './sweep-page';

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
 * (test/calc/purge/sweep-plan.test.ts).
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
	page: SWEEP_PAGE,
	compute,
});

type Computed = Result<Omit<CalcResult, 'calc' | 'constants' | 'inputs'>, readonly Refusal[]>;

function compute(given: SweepInputs): Computed {
	const refusals = refuse(given);
	if (refusals.length > 0) return fail(refusals);
	const { leak, notes } = leakNow(given);
	const least = given.minimumVolumeChanges?.value ?? (given.outletRead === 'every volume' ? 1 : 3);
	const inputs = uncertainInputs(given, leak);
	const values = planOf(Object.fromEntries(inputs.map(({ name, value }) => [name, value])), least);
	const { U, budget, unstated } = propagate((at) => numbersOf(planOf(at, least)), inputs);
	const left = stockLeft(given, values);
	return ok({
		values: Object.fromEntries(
			sweepOutputs.map(({ name, unit }) => [
				name,
				name === 'stockLeft' ? { ...left, unit } : valueOf(values[name], unit, U[name]),
			]),
		),
		scope: 'in scope',
		notes: [
			...notes,
			...sweepWarnings(given, { plan: values, least }),
			...(unstated.length > 0 ? [{ level: 'warning', kind: 'uncertainty-not-stated', inputs: unstated } as const] : []),
		] satisfies readonly PurgeNote[],
		budget: budget.filter(({ output }) => ['floor', 'time', 'inertGas'].includes(output)),
		plots: [plotOf(given, values)],
	});
}

const valueOf = (value: number | null, unit: string, U: number | undefined): CalcValue => ({
	...{ value, unit },
	...(U === undefined || U === 0 ? {} : { U }),
	...(value === null ? { because: 'unreachable' } : {}),
});

function stockLeft({ stock, reserve }: SweepInputs, { stockNeeded }: Plan): Omit<CalcValue, 'unit'> {
	if (stock === undefined) return { value: null, because: 'not-given' };
	if (stockNeeded === null) return { value: null, because: 'unreachable' };
	return { value: stock.value - reserve.value - stockNeeded };
}

type Plan = ReturnType<typeof planOf>;

/** The whole plan from plain numbers, so that its uncertainty is found by trying. */
function planOf(at: Numbers, least: number) {
	const { temperature: T = 0, pressure: p = 0, inertFlow: Q_I = 0, leak: Q_L = 0, mixing: K = 0 } = at;
	const { startOxygen: C0 = 0, inertOxygen: Ci = 0, target: Ct = 0 } = at;
	const size = Object.entries(at).reduce((sum, [name, V_i]) => (name.startsWith(VOLUME) ? sum + V_i : sum), 0);
	const V = normalVolume(size, { temperature: si('temperature', T), pressure: si('pressure-absolute', p) });
	const plan = sweepPlan({ V, K, Q_I, Q_L, C0, Ci, Ct, least });
	return { normalVolume: V, ...plan, stockNeeded: plan.inertGas === null ? null : 2 * plan.inertGas };
}

const VOLUME = 'volumes.';

/** What is unreachable has no uncertainty either. */
const numbersOf = (plan: Plan): Numbers =>
	Object.fromEntries(Object.entries(plan).flatMap(([name, value]) => (value === null ? [] : [[name, value]])));

function uncertainInputs(given: SweepInputs, leak: LeakNow): readonly Uncertain[] {
	const of = (name: string, symbol: string, unit: string, { value, U }: LeakNow): Uncertain => ({
		...{ name, symbol, unit, value },
		...(U === undefined ? {} : { U }),
	});
	const { startOxygen: start } = given;
	return [
		of('temperature', 'T', 'K', given.temperature),
		of('pressure', 'p', 'Pa(a)', given.pressure),
		of('inertFlow', 'Q_I', 'm3(n)/s', given.inertFlow),
		of('leak', 'Q_L', 'm3(n)/s', leak),
		of('mixing', 'K', '1', given.mixing),
		// Air is what it is; an oxygen that was read has its uncertainty stated, or not.
		of('startOxygen', 'C0', '1', start.value === OXYGEN_IN_AIR ? { U: 0, ...start } : start),
		of('inertOxygen', 'Ci', '1', given.inertOxygen),
		of('target', 'Ct', '1', { value: given.target.value - given.guard.value, U: 0 }),
		...given.volumes.map(({ id, volume }) => of(`${VOLUME}${id}`, 'V_i', 'm3', volume)),
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
	if (given.leak === undefined) return { leak: { value: 0, U: 0 }, notes: [] };
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
