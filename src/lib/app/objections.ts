import { objectionsTo } from '../record';
import type { ShownSheet } from './gate-acts';
import type { OpenStartUp } from './open-start-up.svelte';

/** Why a release by who holds the tablet would have no effect, said before anybody types a PIN. */
export function objectionsNow(startUp: OpenStartUp, shown: ShownSheet): readonly string[] {
	const { gate } = shown.sheet;
	const draft = startUp.draft('gate released', { gate, meaning: 'released', statement: shown.statement });
	return draft.ok ? objectionsTo(startUp.procedure, draft.value, startUp.events, startUp.siteLog) : [];
}
