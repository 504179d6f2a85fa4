import type { Plant } from '../plant';
import { checkQuantity } from './check-fields';
import { readCondition } from './condition';
import type { ProcedureFinding } from './finding';
import type { Permissive, Procedure } from './schema';

/** [P28] to [P31]: a permissive reads points that exist, as they are, and its condition compares like with like. */
export const checkPermissives = (procedure: Procedure, plant?: Plant): readonly ProcedureFinding[] =>
	(procedure.permissives ?? []).flatMap((permissive, i) => {
		const path = `permissives[${i}]`;
		const condition = readCondition(permissive);
		return [
			...readingsOf(permissive, path, plant),
			...factsOf(permissive, path, procedure),
			...(condition.ok ? [] : condition.error).map((finding) => ({
				kind: 'condition' as const,
				path: `${path}.condition`,
				finding,
			})),
		];
	});

function readingsOf({ readings }: Permissive, path: string, plant: Plant | undefined): readonly ProcedureFinding[] {
	return Object.entries(readings).flatMap(([name, use]): readonly ProcedureFinding[] => {
		const place = `${path}.readings.${name}`;
		const wrong = checkQuantity(use, { path: place });
		if (wrong.length > 0 || plant === undefined) return wrong;
		const point = plant.points.find(({ tag }) => tag === use.point);
		if (point === undefined) {
			const known = plant.points.map(({ tag }) => tag);
			return [{ kind: 'unknown-point', path: `${place}.point`, name: use.point, known }];
		}
		if (use.quantity === point.quantity && use.basis === point.basis) return [];
		const ofPoint = [point.quantity, ...(point.basis === undefined ? [] : [point.basis])].join(' ');
		return [{ kind: 'reading-disagrees-with-point', path: place, name, point: use.point, ofPoint }];
	});
}

function factsOf({ facts = {} }: Permissive, path: string, procedure: Procedure): readonly ProcedureFinding[] {
	return Object.entries(facts).flatMap(([name, fact]): readonly ProcedureFinding[] => {
		const place = `${path}.facts.${name}`;
		if ('stepStands' in fact) {
			const isKnown = procedure.steps.some(({ id }) => id === fact.stepStands);
			return isKnown ? [] : [{ kind: 'unknown-step', path: `${place}.stepStands`, name: fact.stepStands }];
		}
		const isKnown = procedure.plantEvents.some(({ id }) => id === fact.notGoingOn);
		return isKnown ? [] : [{ kind: 'unknown-plant-event', path: `${place}.notGoingOn`, name: fact.notGoingOn }];
	});
}
