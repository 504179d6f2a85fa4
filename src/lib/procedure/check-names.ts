import type { Plant } from '../plant';
import { fieldsOf } from './fields';
import type { ProcedureFinding, UnknownThing } from './finding';
import type { Procedure, Step } from './schema';

/** What the names of a procedure are checked against: the site's roles, and the unit when it is known. */
export type Against = { readonly roles: readonly string[]; readonly plant?: Plant };

/** [P3] and [P4]: every id is given once, and every name answers to something. */
export const checkNames = (procedure: Procedure, against: Against): readonly ProcedureFinding[] => [
	...duplicates(procedure),
	...namesOfGates(procedure, against),
	...procedure.steps.flatMap((step, i) => namesOfStep(step, `steps[${i}]`, procedure, against)),
	...namesOfEvents(procedure),
	...namesOfStartTypes(procedure),
];

/** Reports a name that is not in the list of known ones. */
function unknown(
	thing: UnknownThing,
	{ name, path, step }: { readonly name: string; readonly path: string; readonly step?: string },
	known: readonly string[],
): readonly ProcedureFinding[] {
	if (known.includes(name)) return [];
	return [{ kind: `unknown-${thing}`, path, name, known, ...(step === undefined ? {} : { step }) }];
}

const ids = (items: readonly { readonly id: string }[] | undefined): readonly string[] =>
	(items ?? []).map(({ id }) => id);

function namesOfGates({ gates, permissives }: Procedure, { roles }: Against): readonly ProcedureFinding[] {
	return gates.flatMap((gate, i) => [
		...gate.signatures.flatMap((signature, s) =>
			signature.roles.flatMap((name, k) =>
				unknown('role', { name, path: `gates[${i}].signatures[${s}].roles[${k}]` }, roles),
			),
		),
		...(gate.refusers ?? []).flatMap((name, k) => unknown('role', { name, path: `gates[${i}].refusers[${k}]` }, roles)),
		...(gate.permissives ?? []).flatMap((name, k) =>
			unknown('permissive', { name, path: `gates[${i}].permissives[${k}]` }, ids(permissives)),
		),
	]);
}

function namesOfStep(step: Step, path: string, procedure: Procedure, against: Against): readonly ProcedureFinding[] {
	const named = (thing: UnknownThing, at: string, name: string, known: readonly string[]) =>
		unknown(thing, { name, path: `${path}.${at}`, step: step.id }, known);
	const { validity } = step;
	const gateNumbers = procedure.gates.map(({ number }) => String(number));
	return [
		...named('gate', 'gate', String(step.gate), gateNumbers),
		...('until' in validity ? named('gate', 'validity.until', String(validity.until), gateNumbers) : []),
		...(validity.kind === 'while'
			? named('permissive', 'validity.permissive', validity.permissive, ids(procedure.permissives))
			: []),
		...(step.roles ?? []).flatMap((name, k) => named('role', `roles[${k}]`, name, against.roles)),
		...step.lapsedBy.flatMap((by, k) =>
			typeof by === 'string'
				? named('plant-event', `lapsedBy[${k}]`, by, ids(procedure.plantEvents))
				: named('plant-event', `lapsedBy[${k}].event`, by.event, ids(procedure.plantEvents)),
		),
		...step.redo.flatMap((name, k) => named('step', `redo[${k}]`, name, ids(procedure.steps))),
		...step.waits.flatMap((name, k) => named('step', `waits[${k}]`, name, ids(procedure.steps))),
		...(against.plant === undefined ? [] : namesOfPlant(step, named, against.plant)),
	];
}

type Named = (thing: UnknownThing, at: string, name: string, known: readonly string[]) => readonly ProcedureFinding[];

function namesOfPlant(step: Step, named: Named, plant: Plant): readonly ProcedureFinding[] {
	const tags = (items: readonly { readonly tag: string }[]): readonly string[] => items.map(({ tag }) => tag);
	const places = [...ids(plant.volumes), ...ids(plant.surroundings), ...ids(plant.ducts), ...tags(plant.inertSources)];
	const anywhere = [...places, ...tags(plant.elements), ...tags(plant.points), ...tags(plant.venturis)];
	const instrument = (at: string, name: string) => named('instrument', at, name, ids(plant.instruments));
	const point = (at: string, name: string | undefined) =>
		name === undefined ? [] : named('point', at, name, tags(plant.points));
	return [
		...(step.where ?? []).flatMap((name, k) => named('place', `where[${k}]`, name, anywhere)),
		...step.instruments.flatMap((name, k) => instrument(`instruments[${k}]`, name)),
		...(step.checks === undefined ? [] : instrument('checks', step.checks)),
		...fieldsOf(step).flatMap((field, k) => point(`fields[${k}].point`, field.point)),
		...(step.kind === 'series'
			? [
					...step.points.flatMap((name, k) => point(`points[${k}]`, name)),
					...step.flows.flatMap((name, k) => point(`flows[${k}]`, name)),
				]
			: []),
		...(step.kind === 'line-up'
			? step.rows.flatMap(({ element }, k) =>
					element === undefined ? [] : named('element', `rows[${k}].element`, element, tags(plant.elements)),
				)
			: []),
		...(step.kind === 'coverage'
			? step.rows.flatMap((row, k) => [
					...named('volume', `rows[${k}].volume`, row.volume, ids(plant.volumes)),
					...point(`rows[${k}].point`, row.point),
				])
			: []),
	];
}

function namesOfEvents({ plantEvents }: Procedure): readonly ProcedureFinding[] {
	return plantEvents.flatMap(({ short, long }, i) => [
		...(short === undefined
			? []
			: unknown('plant-event', { name: short.countsAs, path: `plantEvents[${i}].short.countsAs` }, ids(plantEvents))),
		...(long === undefined
			? []
			: unknown(
					'plant-event',
					{ name: long.countsAlsoAs, path: `plantEvents[${i}].long.countsAlsoAs` },
					ids(plantEvents),
				)),
	]);
}

function namesOfStartTypes({ startTypes, steps, plantEvents }: Procedure): readonly ProcedureFinding[] {
	return startTypes.flatMap(({ without, excludedBy }, i) => [
		...without.flatMap((name, k) => unknown('step', { name, path: `startTypes[${i}].without[${k}]` }, ids(steps))),
		...excludedBy.flatMap((name, k) =>
			unknown('plant-event', { name, path: `startTypes[${i}].excludedBy[${k}]` }, ids(plantEvents)),
		),
	]);
}

function duplicates({ steps, plantEvents, permissives, startTypes }: Procedure): readonly ProcedureFinding[] {
	return [
		...twice(ids(steps), 'steps'),
		...twice(ids(plantEvents), 'plantEvents'),
		...twice(ids(permissives), 'permissives'),
		...twice(ids(startTypes), 'startTypes'),
		...steps.flatMap((step, i) =>
			partsOf(step).flatMap(([list, names]) => twice(names, `steps[${i}].${list}`, step.id)),
		),
	];
}

/** The lists inside a step whose items have ids of their own. */
const partsOf = (step: Step): readonly (readonly [string, readonly string[]])[] => [
	['fields', ids(fieldsOf(step))],
	...(step.kind === 'confirm' ? ([['confirms', ids(step.confirms)]] as const) : []),
	...(step.kind === 'line-up' || step.kind === 'coverage' ? ([['rows', ids(step.rows)]] as const) : []),
	...(step.kind === 'choice' ? ([['options', ids(step.options)]] as const) : []),
];

const twice = (names: readonly string[], list: string, step?: string): readonly ProcedureFinding[] =>
	names.flatMap((id, i) => {
		const first = names.indexOf(id);
		if (first === i) return [];
		const place = { path: `${list}[${i}]`, ...(step === undefined ? {} : { step }) };
		return [{ kind: 'duplicate-id' as const, ...place, id, first: `${list}[${first}]` }];
	});
