import { allOf, type EventOf } from '../record';
import type { OpenStartUp } from './open-start-up.svelte';

/** An entry of a step and what became of it. */
export type EnteredBefore = {
	readonly entry: EventOf<'entry'>;
	/** The one that counts now, an older one, or gone. */
	readonly fate:
		| { readonly kind: 'counts' | 'older' }
		| { readonly kind: 'superseded'; readonly by: EventOf<'entry'> }
		| { readonly kind: 'withdrawn'; readonly by: EventOf<'entry withdrawn'> };
	readonly agreed?: EventOf<'not applicable agreed'>;
};

/** Everything that was entered on a step, newest first: an entry is never edited, only followed by another. */
export function enteredBefore({ events, standing }: OpenStartUp, step: string): readonly EnteredBefore[] {
	const counting = standing.steps.find((one) => one.step === step)?.entry;
	const withdrawals = allOf(events, 'entry withdrawn');
	const agreements = allOf(events, 'not applicable agreed');
	const entries = allOf(events, 'entry').filter(({ body }) => body.step === step);
	const fateOf = (entry: EventOf<'entry'>): EnteredBefore['fate'] => {
		const withdrawal = withdrawals.find(({ body }) => body.entry === entry.id);
		if (withdrawal !== undefined) return { kind: 'withdrawn', by: withdrawal };
		const later = entries.find(({ body }) => body.supersedes === entry.id);
		if (later !== undefined) return { kind: 'superseded', by: later };
		return { kind: entry.id === counting ? 'counts' : 'older' };
	};
	return [...entries]
		.sort((a, b) => b.observedAt - a.observedAt || b.clock - a.clock)
		.map((entry) => {
			const agreed = agreements.find(({ body }) => body.entry === entry.id);
			return { entry, fate: fateOf(entry), ...(agreed === undefined ? {} : { agreed }) };
		});
}

/** The entry that says "not applicable" and still waits for a releasing role. */
export function waitsForAgreement(startUp: OpenStartUp, step: string): EventOf<'entry'> | undefined {
	const cause = startUp.standing.steps.find((one) => one.step === step)?.why.find(({ kind }) => kind === 'not agreed');
	if (cause?.kind !== 'not agreed') return undefined;
	return allOf(startUp.events, 'entry').find(({ id }) => id === cause.entry);
}

/** How far a witness point has got: invited, and what came of it since. */
export type Invitation = {
	readonly invited: EventOf<'witness invited'>;
	readonly attended?: EventOf<'witness attended'>;
	readonly waived?: EventOf<'witness waived'>;
};

export function invitationOf({ events }: OpenStartUp, step: string): Invitation | undefined {
	const invited = allOf(events, 'witness invited')
		.filter(({ body }) => body.step === step)
		.at(-1);
	if (invited === undefined) return undefined;
	const since = <E extends { readonly body: { readonly step: string }; readonly clock: number }>(
		answers: readonly E[],
	) => answers.filter(({ body, clock }) => body.step === step && clock > invited.clock).at(-1);
	const [attended, waived] = [since(allOf(events, 'witness attended')), since(allOf(events, 'witness waived'))];
	return { invited, ...(attended === undefined ? {} : { attended }), ...(waived === undefined ? {} : { waived }) };
}
