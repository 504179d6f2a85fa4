import { allOf, type EventOf, type RecordEvent } from '../../record';
import type { Step } from '../../procedure';
import type { Names } from '../../wording';
import type { DossierInput } from '../input';

/** Everything that has an id and a name. What has no name is called by its id. */
export type StoryNames = Names & {
	readonly person: (id: string) => string;
	readonly roles: (id: string) => readonly string[];
	readonly step: (id: string) => Step | undefined;
	readonly stepTitle: (id: string) => string;
	readonly gateTitle: (gate: number) => string;
	readonly point: (tag: string) => string;
};

export function namesOf(
	input: DossierInput,
	opened: EventOf<'start-up opened'>,
	site: readonly RecordEvent[],
): StoryNames {
	const { procedure, plant } = input;
	const enrolled = new Map(allOf(site, 'person enrolled').map(({ body }) => [body.person, body]));
	const taking = new Map(opened.body.people.map((each) => [each.person, each]));
	const steps = new Map(procedure.steps.map((step) => [step.id, step]));
	return {
		person: (id) => taking.get(id)?.name ?? enrolled.get(id)?.name ?? id,
		roles: (id) => taking.get(id)?.roles ?? enrolled.get(id)?.roles ?? [],
		step: (id) => steps.get(id),
		stepTitle: (id) => steps.get(id)?.title ?? id,
		gateTitle: (gate) => procedure.gates.find(({ number }) => number === gate)?.title ?? String(gate),
		point: (tag) => plant.points.find((point) => point.tag === tag)?.title ?? tag,
		plantEvent: (what) => procedure.plantEvents.find(({ id }) => id === what)?.title ?? what,
		permissive: (id) => procedure.permissives?.find((each) => each.id === id)?.title ?? id,
	};
}
