import { sha256Hex } from '../base';
import { allOf, type RecordEvent } from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import { failed, undecided, type Check } from './pdf/check';

type Bytes = Uint8Array<ArrayBuffer>;
type Named = { readonly hash: string; readonly name: string; readonly bytes: number };

/** Photos and trends are named by their hash: what lies beside the record is what the events name. */
export function checkAttachments(
	events: readonly RecordEvent[],
	files: readonly { readonly name: string; readonly bytes: Bytes }[],
): readonly Check[] {
	const name = 'attachments are those that the events name';
	const byHash = new Map(files.map(({ bytes }) => [sha256Hex(bytes), bytes.length]));
	const byName = new Set(files.map((file) => file.name));
	const named = events.flatMap((event) => attachmentsOf(event).map((attachment) => ({ event, attachment })));
	const bad = named.flatMap(({ event, attachment }) => {
		const length = byHash.get(attachment.hash);
		if (length === attachment.bytes) return [];
		const facts = { ...aboutEvent(event), attachment: attachment.name, hash: attachment.hash };
		const called = `${attachment.name} of ${nameOf(event)}`;
		if (length !== undefined)
			return [failed(name, `${called} has ${length} bytes; the event says ${attachment.bytes}.`, { facts })];
		return byName.has(attachment.name)
			? [failed(name, `${called} is here and has another hash.`, { facts, sub: 'HASH_FAILURE' })]
			: [undecided(name, `${called} is not here.`, { facts, sub: 'SIGNED_DATA_NOT_FOUND' })];
	});
	return offences(name, bad, `${named.length} named, each here with its hash.`);
}

const attachmentsOf = (event: RecordEvent): readonly Named[] => [
	...allOf([event], 'entry').flatMap(({ body }) => body.attachments ?? []),
	...allOf([event], 'note').flatMap(({ body }) => body.attachments ?? []),
	...allOf([event], 'addendum').flatMap(({ body }) => body.attachments ?? []),
	...allOf([event], 'series attached').map(({ body }) => body.attachment),
];
