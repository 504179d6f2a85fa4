import { fail, ok, type Result } from '../base';
import { signedEvent, type Draft, type EventKind, type EventOf, type RecordEvent } from '../record';
import type { SigningKey } from '../identity';
import type { DraftKey, Store } from '../store';
import type { Problem } from './problem';

/** With what an event is signed: the shift's key and the event that delegated to it, or the gate key alone. */
export type Signer = { readonly key: SigningKey; readonly shiftKey?: string };

/**
 * Writes the next event of this tablet: made on top of what is stored now, signed, and kept. Another tab that was faster is
 * no error: the event is made anew on top of what it wrote.
 */
export async function writeEvent<K extends EventKind>(
	store: Store,
	draft: Draft<K>,
	signer: Signer,
	from: { readonly draft?: DraftKey } = {},
): Promise<Result<EventOf<K>, Problem>> {
	let last: Result<EventOf<K>, Problem> = fail({ kind: 'chain-moved-on', head: null });
	for (let tries = 0; tries < TRIES; tries++) {
		const read = await store.events.readLog(draft.log);
		if (!read.ok) return read;
		const event = await signOn(read.value.events, draft, signer);
		const kept = await store.events.append(event, from);
		if (kept.ok) return ok(event as EventOf<K>);
		last = kept;
		if (kept.error.kind !== 'chain-moved-on') break;
	}
	return last;
}

const TRIES = 5;

export const signOn = <K extends EventKind>(
	known: readonly RecordEvent[],
	draft: Draft<K>,
	{ key, shiftKey }: Signer,
): Promise<RecordEvent> => signedEvent({ ...draft, ...(shiftKey === undefined ? {} : { shiftKey }) }, known, key);
