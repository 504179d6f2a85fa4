import { utf8 } from '../base';
import { sign, type SigningKey } from '../identity';
import { fromChecked, type EventKind, type RecordEvent } from './event';
import { nextEnvelope, textOf, type Draft } from './write';

/** Writes the next event of a tablet and signs its exact text. Storing it is the caller's: first durable, then shown. */
export async function signedEvent<K extends EventKind>(
	draft: Draft<K>,
	known: readonly RecordEvent[],
	key: SigningKey,
): Promise<RecordEvent> {
	const envelope = nextEnvelope(draft, known);
	const text = textOf(envelope);
	return fromChecked(text, envelope, { signature: await sign(utf8(text), key) });
}
