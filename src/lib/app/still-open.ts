import { ok, type Result } from '../base';
import { allOf, otherTablets, type GateStanding } from '../record';
import { attachmentsOf } from './dossier-input';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';

/** What is still open in a start-up: nothing of it forbids the seal, all of it is read before somebody seals. */
export type StillOpen = {
	readonly gates: readonly { readonly gate: number; readonly title: string; readonly state: GateStanding['state'] }[];
	readonly deviations: readonly { readonly id: string; readonly title: string }[];
	readonly refusals: readonly { readonly gate: number; readonly reason: string }[];
	readonly lapsed: number;
	readonly goingOn: readonly { readonly title: string; readonly begin: string }[];
	readonly tablets: readonly { readonly device: string; readonly lastHeard: string | null }[];
};

export function stillOpen({ procedure, standing, events, tablet }: OpenStartUp): StillOpen {
	const titles = new Map(allOf(events, 'deviation raised').map(({ body }) => [body.deviation, body.title]));
	return {
		gates: standing.gates
			.filter(({ state }) => state !== 'released')
			.map(({ gate, state }) => ({
				gate,
				state,
				title: procedure.gates.find(({ number }) => number === gate)?.title ?? '',
			})),
		deviations: standing.deviations
			.filter(({ state }) => state === 'open')
			.map(({ deviation }) => ({ id: deviation, title: titles.get(deviation) ?? '' })),
		refusals: standing.gates.flatMap(({ gate, why }) =>
			why.flatMap((each) => (each.kind === 'refusal' && !each.answered ? [{ gate, reason: each.reason }] : [])),
		),
		lapsed: standing.steps.filter(({ state }) => state === 'lapsed' || state === 'failed').length,
		goingOn: standing.plantEvents
			.filter(({ end, withdrawn }) => end === null && withdrawn !== true)
			.map(({ what, begin }) => ({
				title: procedure.plantEvents.find(({ id }) => id === what)?.title ?? what,
				begin,
			})),
		tablets: otherTablets(
			events.filter(({ log }) => log === standing.startUp),
			tablet.device,
		).map(({ device, lastHeard }) => ({ device, lastHeard })),
	};
}

/** What only the tablet's storage knows: values half typed and not saved, and files that events name and that are not here. */
export async function leftOnTablet(
	startUp: OpenStartUp,
): Promise<Result<{ readonly halfTyped: readonly string[]; readonly notHere: readonly string[] }, Problem>> {
	const { store } = startUp.tablet;
	const steps = new Set(startUp.procedure.steps.map(({ id }) => id));
	const drafts = await store.drafts.list(startUp.id);
	if (!drafts.ok) return drafts;
	const held = await store.attachments.list();
	if (!held.ok) return held;
	const here = new Set(held.value.map(({ hash }) => hash));
	return ok({
		halfTyped: [...new Set(drafts.value.map(({ step }) => step).filter((step) => steps.has(step)))],
		notHere: attachmentsOf(startUp.events).flatMap(({ hash, name }) => (here.has(hash) ? [] : [name])),
	});
}
