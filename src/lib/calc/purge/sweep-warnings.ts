import { allowedOxygen } from './allowed-oxygen';
import type { PurgeNote } from './notes';
import type { SweepInputs } from './sweep-inputs';
import type { SweepPlan } from './sweep-plan';

/** What a plan has to say besides its numbers: nothing of it changes a number. */
export function sweepWarnings(
	given: SweepInputs,
	{ plan, least }: { plan: SweepPlan; least: number },
): readonly PurgeNote[] {
	return [
		...aboutFloor(given, plan),
		...(plan.changesByMixing !== null && plan.changesByMixing < least
			? [{ level: 'remark', kind: 'least-volume-changes-decide', byMixing: plan.changesByMixing, least } as const]
			: []),
		...(given.mixing.value > 0.9 && given.mixingFrom === 'assumed'
			? [{ level: 'warning', kind: 'mixing-assumed-good', mixing: given.mixing.value } as const]
			: []),
		...aboutFuel(given),
		...(given.gas === 'carbon dioxide' ? [{ level: 'warning', kind: 'carbon-dioxide-discharge' } as const] : []),
		...aboutStock(given, plan),
	];
}

function aboutFloor({ target, guard }: SweepInputs, plan: SweepPlan): readonly PurgeNote[] {
	const accept = target.value - guard.value;
	const { floor, time, leastInertFlow } = plan;
	if (time === null) return [{ level: 'remark', kind: 'unreachable', floor, target: accept, leastInertFlow }];
	// Within 1 % of the line a small error of the leak decides between an hour and never.
	return floor > 0.99 * accept ? [{ level: 'warning', kind: 'floor-close-to-line', floor, accept, place: null }] : [];
}

function aboutFuel({ limitingOxygen, oxygenTrip, target, unburntGas }: SweepInputs): readonly PurgeNote[] {
	const notes: PurgeNote[] = [];
	if (limitingOxygen !== undefined) {
		const allowed = allowedOxygen(limitingOxygen.value, oxygenTrip === 'proved' ? 'monitored' : 'not monitored');
		// 12 % − 2 % is 10 % for people, and 0.09999999999999999 for the processor.
		if (target.value > allowed * (1 + 1e-12)) {
			const facts = { target: target.value, allowed, limitingOxygen: limitingOxygen.value };
			notes.push({ level: 'warning', kind: 'above-allowed-oxygen', ...facts });
		}
	}
	if (unburntGas !== undefined && unburntGas.value > 0.01) {
		notes.push({ level: 'warning', kind: 'unburnt-gas-limit-applies', place: null, fraction: unburntGas.value });
	}
	return notes;
}

function aboutStock({ stock, reserve }: SweepInputs, { inertGas }: SweepPlan): readonly PurgeNote[] {
	if (stock === undefined || inertGas === null) return [];
	const usable = stock.value - reserve.value;
	const facts = { usable, purge: inertGas, ratio: usable / inertGas };
	if (usable < inertGas) return [{ level: 'warning', kind: 'stock-too-small', ...facts }];
	return usable < 2 * inertGas ? [{ level: 'warning', kind: 'stock-without-repeat', ...facts }] : [];
}
