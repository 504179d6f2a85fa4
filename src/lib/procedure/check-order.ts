import type { ProcedureFinding } from './finding';
import type { Procedure, Step } from './schema';

/** [P5] to [P9]: gates count from 0, every gate has steps, and nothing relies on itself or on a higher gate. */
export const checkOrder = (procedure: Procedure): readonly ProcedureFinding[] => [
	...gatesInOrder(procedure),
	...reliesUpward(procedure),
	...circles(procedure),
];

function gatesInOrder({ gates, steps }: Procedure): readonly ProcedureFinding[] {
	return gates.flatMap(({ number }, i): readonly ProcedureFinding[] => [
		...(number === i ? [] : [{ kind: 'gate-out-of-order' as const, path: `gates[${i}].number`, number, expected: i }]),
		...(steps.some(({ gate }) => gate === number)
			? []
			: [{ kind: 'gate-without-steps' as const, path: `gates[${i}]`, gate: number }]),
	]);
}

function reliesUpward({ steps }: Procedure): readonly ProcedureFinding[] {
	const gateOf = new Map(steps.map(({ id, gate }) => [id, gate]));
	return steps.flatMap((step, i) =>
		reliances(step).flatMap(({ list, k, on }): readonly ProcedureFinding[] => {
			const higher = gateOf.get(on);
			if (higher === undefined || higher <= step.gate) return [];
			const path = `steps[${i}].${list}[${k}]`;
			return [{ kind: 'relies-on-higher-gate', path, step: step.id, on, gate: step.gate, higher }];
		}),
	);
}

/** Every reliance that closes a circle, told from the step of it that the procedure names first. */
function circles({ steps }: Procedure): readonly ProcedureFinding[] {
	const byId = new Map(steps.map((step) => [step.id, step]));
	const indexOf = new Map(steps.map(({ id }, i) => [id, i]));
	const done = new Set<string>();
	const found: ProcedureFinding[] = [];

	const visit = (id: string, trail: readonly string[]): void => {
		const start = trail.indexOf(id);
		if (start !== -1) {
			found.push(circleFinding(trail.slice(start), byId, indexOf));
			return;
		}
		if (done.has(id)) return;
		for (const { on } of reliances(byId.get(id))) if (byId.has(on)) visit(on, [...trail, id]);
		done.add(id);
	};
	for (const { id } of steps) visit(id, []);
	return found;
}

function circleFinding(
	ring: readonly string[],
	byId: ReadonlyMap<string, Step>,
	indexOf: ReadonlyMap<string, number>,
): ProcedureFinding {
	const place = (id: string): number => indexOf.get(id) ?? 0;
	const first = ring.reduce((earliest, id) => (place(id) < place(earliest) ? id : earliest), ring[0] ?? '');
	const turned = [...ring.slice(ring.indexOf(first)), ...ring.slice(0, ring.indexOf(first))];
	const next = turned[1] ?? first;
	const step = reliances(byId.get(first)).find(({ on }) => on === next);
	const path = `steps[${place(first)}].${step?.list ?? 'redo'}[${step?.k ?? 0}]`;
	return { kind: 'circle', path, step: first, through: [...turned, first] };
}

type Reliance = { readonly list: 'redo' | 'waits'; readonly k: number; readonly on: string };

const reliances = (step: Step | undefined): readonly Reliance[] =>
	step === undefined
		? []
		: (['redo', 'waits'] as const).flatMap((list) => step[list].map((on, k) => ({ list, k, on })));
