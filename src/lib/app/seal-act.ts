import { fail, ok, type Result } from '../base';
import { may } from '../identity';
import { gateSheet, headsOf, statementOf, type GateSheet, type Statement } from '../record';
import { declarationOf, sealStatement, statementVersion, type Say } from '../wording';
import { BUILD } from '../demo';
import { judgedAct, openKey, signHead } from './gate-acts';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';

/** What the sheet of the seal shows: the last gate as it stands, the sentence, and what the record holds by now. */
export type ShownSeal = { readonly sheet: GateSheet; readonly statement: Statement; readonly events: number };

export function sealSheetOf(startUp: OpenStartUp, say: Say): ShownSeal {
	const { procedure, standing, events, siteLog, tablet } = startUp;
	const gate = procedure.gates.at(-1)?.number ?? 0;
	const sheet = gateSheet(procedure, standing, [...events, ...siteLog], { gate, device: tablet.device });
	const statement = statementOf(sheet, {
		text: sealStatement(startUp.id, say),
		language: say.language,
		textVersion: statementVersion(say),
		build: BUILD,
		declaration: declarationOf(say),
	});
	return { sheet, statement, events: events.length };
}

/** Why who holds the tablet may not seal; said before anybody types a PIN. */
export function objectionsToSeal({ tablet: { person } }: OpenStartUp): readonly string[] {
	if (person === undefined || may(person.roles, 'seal')) return [];
	return [`${person.person} has no role that may seal`];
}

/** Signs the last event: the record takes no more. An attempt by somebody without the role is kept and changes nothing. */
export async function seal(
	startUp: OpenStartUp,
	how: { readonly pin: string; readonly shown: ShownSeal },
): Promise<Result<'signed', Problem>> {
	const kept = await startUp.keepHeld();
	if (!kept.ok) return kept;
	if (startUp.isSealed) return fail({ kind: 'sealed', startUp: startUp.id });
	if (how.shown.events !== startUp.log.length) return fail({ kind: 'sheet-changed' });
	const key = await openKey(startUp, how.pin);
	if (!key.ok) return key;
	const because = objectionsToSeal(startUp);
	if (because.length > 0) {
		const refused = await startUp.write(
			'refused act',
			{ act: 'seal', because: because.join('; ') },
			{ key: key.value },
		);
		return refused.ok ? fail({ kind: 'refused-act', because }) : refused;
	}
	const head = await signHead(startUp, 'seal', key.value);
	if (!head.ok) return head;
	const heads = Object.fromEntries(
		[...headsOf(startUp.log)].map(([device, { number, id }]) => [device, { number, id }]),
	);
	const sealed = await judgedAct(startUp, key.value, 'seal', 'sealed', { heads, statement: how.shown.statement });
	return sealed.ok ? ok('signed') : sealed;
}
