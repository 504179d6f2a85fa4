import { beforeAll, expect, test } from 'vitest';
import { makeGateKey, NO_TRIES, webRandom, type GateKey } from '../../src/lib/identity';
import type { Store } from '../../src/lib/store';
import { freshName, tab } from '../support/open-stores';
import { value } from '../support/test-site';

const PIN = '83920174';
const OWNER = { person: 'P-01', device: 'T-1' };
const HOUR = 3_600_000;
const NOW = Date.UTC(2026, 4, 4, 10);
const certificate = new Uint8Array([0x30, 0x00]);
let gateKey: GateKey;

beforeAll(async () => {
	gateKey = value(await makeGateKey({ ...OWNER, pin: PIN, random: webRandom }));
});

const opens = (store: Store, pin: string, now: number) => store.gateKeys.open({ ...OWNER, pin, now });

async function enrolled(name = freshName()): Promise<Store> {
	const store = await tab(name);
	value(await store.gateKeys.save({ ...OWNER, gateKey, certificate }));
	return store;
}

test('the right PIN opens the gate key, and earlier wrong tries are forgotten', async () => {
	const store = await enrolled();
	expect(await opens(store, '00000000', NOW)).toEqual({ ok: false, error: { kind: 'wrong-pin', left: 9 } });
	expect(await opens(store, PIN, NOW)).toMatchObject({ ok: true, value: { publicKey: gateKey.publicKey } });
	expect(value(await store.gateKeys.mayTry(OWNER, NOW))).toEqual({ kind: 'may-try', left: 10 });
	expect(value(await store.gateKeys.list())).toEqual([
		{ ...OWNER, gateKey, certificate, tries: { ...NO_TRIES, latest: NOW } },
	]);
});

test('a try counts before it is made: whoever pulls the plug has used it up', async () => {
	const name = freshName();
	const first = await enrolled(name);
	const guess = opens(first, '00000000', NOW);
	// Another tab sees the count as soon as the first transaction is through, long before the PIN is stretched.
	const other = await tab(name);
	await untilTriesLeft(other, 9);
	first.close();
	expect(await guess).toEqual({ ok: false, error: { kind: 'wrong-pin', left: 9 } });
	expect(value(await other.gateKeys.mayTry(OWNER, NOW))).toEqual({ kind: 'may-try', left: 9 });
});

test('two tabs that guess at once use up two tries', async () => {
	const name = freshName();
	const tabs = [await enrolled(name), await tab(name)];
	const answers = await Promise.all(tabs.map((store) => opens(store, '00000000', NOW)));
	expect(answers.map((answer) => !answer.ok && answer.error)).toEqual(
		expect.arrayContaining([
			{ kind: 'wrong-pin', left: 9 },
			{ kind: 'wrong-pin', left: 8 },
		]),
	);
});

test('after three wrong PINs the tablet makes one wait, also for the right one, and says how long', async () => {
	const store = await enrolled();
	for (const left of [9, 8, 7]) expect(await opens(store, '00000000', NOW)).toMatchObject({ error: { left } });
	expect(await opens(store, PIN, NOW)).toEqual({ ok: false, error: { kind: 'wait', milliseconds: 30_000, left: 7 } });
	expect(await opens(store, PIN, NOW + 30_000)).toMatchObject({ ok: true });
});

test('the tenth wrong PIN in a row destroys the key, and the right PIN comes too late', async () => {
	const store = await enrolled();
	for (let tries = 1; tries <= 9; tries++)
		expect(await opens(store, '00000000', NOW + tries * HOUR)).toMatchObject({ error: { kind: 'wrong-pin' } });
	expect(await opens(store, '00000000', NOW + 10 * HOUR)).toEqual({ ok: false, error: { kind: 'destroyed' } });
	expect(await opens(store, PIN, NOW + 11 * HOUR)).toEqual({ ok: false, error: { kind: 'destroyed' } });
	const [row] = value(await store.gateKeys.list());
	expect(row).toEqual({ ...OWNER, certificate, tries: { failures: 10, latest: NOW + 10 * HOUR } });

	value(await store.gateKeys.save({ ...OWNER, gateKey, certificate }));
	expect(await opens(store, PIN, NOW + 12 * HOUR)).toMatchObject({ ok: true });
});

test('somebody without a key on this tablet is told so', async () => {
	const store = await enrolled();
	expect(await store.gateKeys.open({ person: 'P-02', device: 'T-1', pin: PIN, now: NOW })).toEqual({
		ok: false,
		error: { kind: 'no-gate-key' },
	});
});

async function untilTriesLeft(store: Store, left: number): Promise<void> {
	for (;;) {
		const may = value(await store.gateKeys.mayTry(OWNER, NOW));
		if (may.kind === 'may-try' && may.left === left) return;
		await new Promise((resolve) => setTimeout(resolve, 1));
	}
}
