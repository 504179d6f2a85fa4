import { expect, test } from 'vitest';
import { utf8 } from '../../src/lib/base';
import { freshName, tab } from '../support/open-stores';
import { value } from '../support/test-site';

const bytes = utf8('door D-3 closed\n');
// printf 'door D-3 closed\n' | sha256sum
const hash = 'd20aec6d7b5b0a0098deb1a0c0ebe021bfbe309ebfc6a21157153b13ac454a84';

test('a photo is found by the hash of its bytes, with its name and media type', async () => {
	const store = await tab(freshName());
	const saved = value(await store.attachments.save(bytes, { name: 'door.jpg', mediaType: 'image/jpeg' }));
	expect(saved).toEqual({ hash, name: 'door.jpg', mediaType: 'image/jpeg', bytes: 16 });
	const { blob, ...attachment } = value(await store.attachments.read(hash))!;
	expect(attachment).toEqual(saved);
	expect([blob.type, new Uint8Array(await blob.arrayBuffer())]).toEqual(['image/jpeg', bytes]);
});

test('the same photo twice is kept once, under its first name', async () => {
	const store = await tab(freshName());
	const first = value(await store.attachments.save(bytes, { name: 'door.jpg', mediaType: 'image/jpeg' }));
	expect(await store.attachments.save(bytes, { name: 'again.jpg', mediaType: 'image/jpeg' })).toMatchObject({
		ok: true,
	});
	expect(value(await store.attachments.list())).toEqual([first]);
});

test('a photo that this tablet does not hold is absent, not empty', async () => {
	const store = await tab(freshName());
	expect(await store.attachments.read('0'.repeat(64))).toEqual({ ok: true, value: undefined });
});
