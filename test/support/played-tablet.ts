import { fromUtf8, utf8 } from '../../src/lib/base';
import { DEMONSTRATION_PIN, keepPlayed } from '../../src/lib/app/demonstration';
import { shiftTimes } from '../../src/lib/app/shift-times';
import { playStartUp } from '../../src/lib/demo';
import type { Store } from '../../src/lib/store';
import { value } from './test-site';

type Bytes = Uint8Array<ArrayBuffer>;

/** The tablet on which the story of the demonstration ends. */
export const DEVICE = 'T-2';

/**
 * Plays the whole story of the demonstration up to the seal, moved in time so that its last act lies some minutes before
 * now, and gives the store what the tablet holds on which it ends. Runs in Node and in a page.
 *
 * @param held every file of static/demo that the story names
 * @returns the id of the start-up
 */
export async function playUpToTheSeal(store: Store, held: ReadonlyMap<string, Bytes>, now: number): Promise<string> {
	const whole = JSON.parse(fromUtf8(fileOf(held, 'start-up.json'))) as {
		readonly acts: readonly { readonly at: string; readonly do: string }[];
	};
	const acts = whole.acts.filter((act) => act.do !== 'seal' && act.do !== 'sign');
	const shift = Math.floor((now - Date.parse(`${acts.at(-1)?.at ?? ''}+01:00`)) / 60_000 - 5) * 60_000;
	const moved = new Map(
		[...held].map(([name, bytes]) => [
			name,
			/\.(json|csv)$/.test(name) ? utf8(shiftTimes(fromUtf8(bytes), shift)) : bytes,
		]),
	);
	moved.set('start-up.json', utf8(shiftTimes(JSON.stringify({ ...whole, acts }), shift)));
	const played = await playStartUp({ read: (name) => fileOf(moved, name) }, { pin: DEMONSTRATION_PIN });
	value(await keepPlayed(store, played, DEVICE));
	const settings = { person: 'QA', demonstrationPin: DEMONSTRATION_PIN, demonstrationShift: shift };
	value(await store.site.write('settings', settings));
	return played.play.startUp;
}

function fileOf(held: ReadonlyMap<string, Bytes>, name: string): Bytes {
	const bytes = held.get(name);
	if (bytes === undefined) throw new Error(`no file ${name}`);
	return bytes;
}
