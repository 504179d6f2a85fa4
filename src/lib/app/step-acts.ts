import { fail, ok, type Result } from '../base';
import { may } from '../identity';
import { millis } from '../record';
import { judgedAct } from './gate-acts';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';
import type { Tablet, TabletPerson } from './tablet.svelte';

type Done = Promise<Result<'signed', Problem>>;

/** Who signs an act on a step, if not who holds the tablet, and the PIN of that key. */
export type StepSigner = { readonly person?: string; readonly pin: string };

/** An entry is never edited: it is withdrawn with a reason, and stays in the record. */
export const withdrawEntry = (startUp: OpenStartUp, entry: string, reason: string, signer: StepSigner): Done =>
	onEntry(startUp, entry, signer, (key, by) =>
		judgedAct(startUp, key, 'withdrawal', 'entry withdrawn', { entry, reason }, { by }),
	);

/** A releasing role agrees that a step does not apply here; only then it counts. */
export const agreeNotApplicable = (startUp: OpenStartUp, entry: string, reason: string, signer: StepSigner): Done =>
	onEntry(startUp, entry, signer, (key, by) =>
		judgedAct(startUp, key, 'entry', 'not applicable agreed', { entry, ...(reason === '' ? {} : { reason }) }, { by }),
	);

/** Who of the people enrolled here may agree, by role. */
export const mayAgree = ({ people }: Tablet): readonly TabletPerson[] =>
	people.filter(({ roles, hasKey }) => hasKey && may(roles, 'agree not applicable'));

/** The notice is given by voice; the record keeps when it was given and when the witness is due. */
export function inviteWitness(startUp: OpenStartUp, step: string): Promise<Result<'saved', Problem>> {
	const found = startUp.stepOf(step);
	if (!found.ok) return Promise.resolve(found);
	if (found.value.kind !== 'witness point') return Promise.resolve(fail({ kind: 'no-such-step', step }));
	const { party, noticeMinutes } = found.value;
	const due = startUp.instant(startUp.tablet.clock.now() + noticeMinutes * 60_000);
	return startUp.hold('witness invited', { step, party, due });
}

/** Signed by the witness where the witness is enrolled on this tablet; else by who holds it. */
export async function witnessAttended(startUp: OpenStartUp, step: string, witness: string, signer?: StepSigner): Done {
	const body = { step, witness };
	if (signer !== undefined)
		return signedAct(startUp, signer, async (key, by) => {
			const written = await startUp.write('witness attended', body, { key }, { by });
			return written.ok ? ok('signed') : written;
		});
	const own = startUp.entrySigner();
	if (!own.ok) return own;
	const written = await startUp.write('witness attended', body, own.value);
	return written.ok ? ok('signed') : written;
}

/** The witness waives, or stayed away after due notice: a concession, signed with the PIN. */
export const witnessWaived = (
	startUp: OpenStartUp,
	said: { readonly step: string; readonly by: string; readonly reason: string },
	signer: StepSigner,
): Done =>
	signedAct(startUp, signer, async (key, by) => {
		const written = await startUp.write('witness waived', said, { key }, { by });
		return written.ok ? ok('signed') : written;
	});

/** Before the notice has run out, nobody can be said to have stayed away. */
export const noticeHasRunOut = (startUp: OpenStartUp, due: string): boolean => startUp.now >= millis(due);

type Act = (key: Parameters<typeof judgedAct>[1], by: TabletPerson) => Done;

/** An act on an entry names it by its id: what could still be taken back gets its final one first. */
async function onEntry(startUp: OpenStartUp, entry: string, signer: StepSigner, act: Act): Done {
	const kept = await startUp.keepHeld();
	if (!kept.ok) return kept;
	return startUp.log.some(({ id }) => id === entry) ? signedAct(startUp, signer, act) : fail({ kind: 'sheet-changed' });
}

async function signedAct({ tablet }: OpenStartUp, { person = tablet.person?.person, pin }: StepSigner, act: Act): Done {
	if (person === undefined) return fail({ kind: 'nobody-chosen' });
	const by = tablet.people.find((one) => one.person === person);
	if (by === undefined) return fail({ kind: 'not-enrolled-here', person });
	const key = await tablet.openKey(person, pin);
	return key.ok ? act(key.value, by) : key;
}
