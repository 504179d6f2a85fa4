import { sayBytes, type StorageFacts } from '$lib/app';
import type { StorageLine } from '$lib/ui';
import { offsetMinutes } from '$lib/record';
import { momentsAt, type Say } from '$lib/wording';

/** How safe the record is, line by line: the room, the browser's promise, and the newest copy of each start-up. */
export function storageLines(facts: StorageFacts, say: Say): readonly StorageLine[] {
	return [roomLine(facts, say), promiseLine(facts, say), ...copyLines(facts, say)];
}

function roomLine({ usage, quota, isScarce }: StorageFacts, say: Say): StorageLine {
	const name = say('settings.storage.room');
	if (usage === undefined || quota === undefined)
		return {
			name,
			state: 'unknown',
			word: say('settings.storage.unknown'),
			said: say('settings.storage.does not say'),
		};
	return {
		name,
		state: isScarce ? 'lapsed' : 'stands',
		word: say(`settings.storage.${isScarce ? 'scarce' : 'enough'}`, { used: sayBytes(usage) }),
		said: say('settings.storage.of', { quota: sayBytes(quota) }),
	};
}

function promiseLine({ persisted }: StorageFacts, say: Say): StorageLine {
	const kept = persisted === true ? 'persisted' : 'not persisted';
	return {
		name: say('settings.storage.kept'),
		state: persisted === true ? 'stands' : 'lapsed',
		word: say(`settings.storage.${kept}`),
		said: say(`settings.storage.${kept} means`),
	};
}

const copyLines = ({ copies }: StorageFacts, say: Say): readonly StorageLine[] =>
	copies.map((copy) => {
		const { startUp, title, newest, onlyHere } = copy;
		return {
			name: `${startUp}, ${title}`,
			state: newest === undefined || onlyHere > 0 ? 'not yet' : 'stands',
			word:
				newest === undefined
					? say('settings.copy.none')
					: say('settings.copy.made', { at: momentsAt(offsetMinutes(newest.at), say).full(newest.at), to: newest.to }),
			said: saidOf(copy, say),
		};
	});

function saidOf({ newest, onlyHere, demonstration }: StorageFacts['copies'][number], say: Say): string {
	if (onlyHere > 0) return say('settings.copy.only here', { n: onlyHere });
	if (newest !== undefined) return say('settings.copy.all');
	return say(demonstration ? 'settings.copy.demonstration' : 'settings.copy.elsewhere');
}
