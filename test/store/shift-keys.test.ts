import { beforeAll, expect, test } from 'vitest';
import { makeEntryKey, makeGateKey, sign, webRandom, type SigningKey } from '../../src/lib/identity';
import type { ShiftKeyRow } from '../../src/lib/store';
import { freshName, tab } from '../support/open-stores';
import { value } from '../support/test-site';

const OWNER = { person: 'P-01', device: 'T-1' };
const HOUR = 3_600_000;
const NOW = Date.UTC(2026, 4, 4, 22);
let key: SigningKey;

beforeAll(async () => {
	key = await makeEntryKey();
});

const row = (more: Partial<ShiftKeyRow> = {}): ShiftKeyRow => ({
	...OWNER,
	log: 'FM-1/2026-05-04',
	shiftKey: 'e'.repeat(64),
	key,
	notAfter: NOW + 12 * HOUR,
	touched: NOW,
	...more,
});

test('the key of a shift is there for the next tab, signs, and cannot be exported', async () => {
	const name = freshName();
	value(await (await tab(name)).shiftKeys.save(row()));
	const [kept] = value(await (await tab(name)).shiftKeys.list('T-1', NOW));
	expect(kept).toMatchObject({ person: 'P-01', shiftKey: 'e'.repeat(64) });
	await expect(crypto.subtle.exportKey('pkcs8', kept!.key.privateKey)).rejects.toThrow();
	expect(await sign(new Uint8Array([1]), kept!.key)).toMatch(/^[A-Za-z0-9+/]+=*$/);
});

test('a shift that has ended leaves no key behind', async () => {
	const store = await tab(freshName());
	value(await store.shiftKeys.save(row()));
	expect(value(await store.shiftKeys.list('T-1', NOW + 12 * HOUR))).toEqual([]);
	expect(value(await store.shiftKeys.list('T-1', NOW))).toEqual([]);
});

test('a shift ends in one start-up or in all, and only its own person', async () => {
	const store = await tab(freshName());
	const logsOf = async () => value(await store.shiftKeys.list('T-1', NOW)).map(({ person, log }) => `${person} ${log}`);
	for (const log of ['A', 'B']) value(await store.shiftKeys.save(row({ log })));
	value(await store.shiftKeys.save(row({ person: 'P-02', log: 'A' })));
	value(await store.shiftKeys.drop({ ...OWNER, log: 'A' }));
	expect(await logsOf()).toEqual(['P-01 B', 'P-02 A']);
	value(await store.shiftKeys.drop(OWNER));
	expect(await logsOf()).toEqual(['P-02 A']);
});

test('with the tenth wrong PIN the keys of the shifts go too', async () => {
	const store = await tab(freshName());
	const gateKey = value(await makeGateKey({ ...OWNER, pin: '83920174', random: webRandom }));
	value(await store.gateKeys.save({ ...OWNER, gateKey, certificate: new Uint8Array([0x30, 0x00]) }));
	value(await store.shiftKeys.save(row()));
	for (let tries = 1; tries <= 10; tries++)
		await store.gateKeys.open({ ...OWNER, pin: '00000000', now: NOW + tries * HOUR });
	expect(value(await store.shiftKeys.list('T-1', NOW))).toEqual([]);
});
