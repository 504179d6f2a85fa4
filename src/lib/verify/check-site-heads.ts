import type { EventOf, RecordEvent } from '../record';
import { failed, passed, undecided, type Check } from './pdf/check';

/** The opening pins the state of the site log that the start-up rests on; that state is here. */
export function checkSiteHeads(
	opened: EventOf<'start-up opened'> | undefined,
	site: readonly RecordEvent[],
): readonly Check[] {
	const name = 'site log is the one that the opening rests on';
	const pinned = Object.entries(opened?.body.siteHeads ?? {});
	if (pinned.length === 0) return [];
	if (site.length === 0) return [undecided(name, 'The site log is not here.')];
	const ids = new Set(site.map(({ id }) => id));
	const gone = pinned.filter(([, head]) => !ids.has(head)).map(([device]) => device);
	if (gone.length === 0) return [passed(name, `Its ${pinned.length} heads are here.`)];
	return [
		failed(name, `The head that it names of ${gone.join(', ')} is not here.`, { facts: { devices: gone.join(', ') } }),
	];
}
