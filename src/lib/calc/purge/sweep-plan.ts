import { exchangeRate } from './exchange-rate';
import { floor } from './floor';
import { leastInertFlow } from './least-inert-flow';
import { timeTo } from './time-to';

/** What a sweep starts from: flows and volume in the same state of gas. */
export type Sweeping = {
	readonly V: number;
	readonly K: number;
	readonly Q_I: number;
	readonly Q_L: number;
	readonly C0: number;
	readonly Ci: number;
	readonly Ct: number;
	/** Least volume changes, whatever the formula says. */
	readonly least: number;
};

/**
 * Plan of a sweep: time and inert gas from the mixing formula, but never less than the least volume changes. Above
 * 20.95 %/e = 7.7 % the formula asks for less than one volume, and a region of plug flow would not be exchanged once.
 *
 *     t = max( t_mixing, N_min V/Q_I );  gas = Q_I t;  N = Q_I t/V
 *
 * @param sweeping V [m³(n)], K [1], Q_I > 0 and Q_L [m³(n)/s], C0, Ci, Ct [1], N_min [1]
 * @returns rate [1/s], floor [1], times [s], gas [m³(n)], changes [1]; null where the target is unreachable
 *
 * Source: CEN/TR 15281 annex A, flow-through purging (from memory, verify), with the in-leakage of one mixed zone (derived).
 * Checked against: engineering check values A1 and A4 (test/calc/purge/sweep-plan.test.ts).
 */
export function sweepPlan({ V, K, Q_I, Q_L, C0, Ci, Ct, least }: Sweeping) {
	const rate = exchangeRate({ V, K, Q_I, Q_L });
	const settles = floor({ Q_I, Q_L, Ci });
	const timeByMixing = timeTo(Ct, { C0, floor: settles, rate });
	const time = timeByMixing === null ? null : Math.max(timeByMixing, (least * V) / Q_I);
	const gas = (seconds: number | null): number | null => (seconds === null ? null : Q_I * seconds);
	const changes = (seconds: number | null): number | null => (seconds === null ? null : (Q_I * seconds) / V);
	return {
		...{ rate, floor: settles, leastInertFlow: leastInertFlow(Ct, { Q_L, Ci }) },
		...{ timeByMixing, changesByMixing: changes(timeByMixing), gasByMixing: gas(timeByMixing) },
		...{ time, volumeChanges: changes(time), inertGas: gas(time) },
	};
}

export type SweepPlan = ReturnType<typeof sweepPlan>;
