import { ok, sha256Hex, type Result } from '../base';
import type { Database } from './db';
import type { Attachment, KeptAttachment } from './rows';
import { attempt, type StorageError } from './storage-error';

export type Attachments = {
	/** Before the event that names it. The same bytes again are the same attachment: the first name stays. */
	readonly save: (
		bytes: Uint8Array<ArrayBuffer>,
		as: { readonly name: string; readonly mediaType: string },
	) => Promise<Result<Attachment, StorageError>>;
	readonly read: (hash: string) => Promise<Result<KeptAttachment | undefined, StorageError>>;
	readonly list: () => Promise<Result<readonly Attachment[], StorageError>>;
};

export const attachments = (db: Database): Attachments => ({
	save: (bytes, { name, mediaType }) => {
		const attachment = { hash: sha256Hex(bytes), name, mediaType, bytes: bytes.length };
		const blob = new Blob([bytes], { type: mediaType });
		return attempt(() =>
			db.transaction('rw', db.attachments, async () => {
				const held = await db.attachments.get(attachment.hash);
				if (held === undefined) await db.attachments.add({ ...attachment, blob });
				return ok(attachment);
			}),
		);
	},
	read: (hash) => attempt(async () => ok(await db.attachments.get(hash))),
	list: () =>
		attempt(async () => ok((await db.attachments.toArray()).map(({ blob: _blob, ...attachment }) => attachment))),
});
