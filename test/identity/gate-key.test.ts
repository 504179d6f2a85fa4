import { createDecipheriv, createPrivateKey, createPublicKey, pbkdf2Sync } from 'node:crypto';
import { beforeAll, expect, test } from 'vitest';
import { canonicalJson, utf8 } from '../../src/lib/base';
import {
	checkSignature,
	makeGateKey,
	MIN_ITERATIONS,
	openGateKey,
	sign,
	webRandom,
	type GateKey,
	type WrappedKey,
} from '../../src/lib/identity';
import { value } from '../support/test-site';

const PIN = '83920174';
let key: GateKey;

beforeAll(async () => {
	key = value(await makeGateKey({ person: 'P-01', device: 'T-1', pin: PIN, random: webRandom }));
});

test('a gate key opens with its PIN, signs, and cannot be exported', async () => {
	const opened = value(await openGateKey(key, PIN));
	const bytes = utf8('Gate 2 released');
	const signature = await sign(bytes, opened);
	expect(await checkSignature({ bytes, alg: 'ES256', signature, publicKey: key.publicKey })).toEqual({
		ok: true,
		value: 'valid',
	});
	await expect(crypto.subtle.exportKey('pkcs8', opened.privateKey)).rejects.toThrow();
});

test('a wrong PIN is a wrong PIN, and nothing more is said', async () => {
	expect(await openGateKey(key, '83920175')).toEqual({ ok: false, error: { kind: 'wrong-pin' } });
	expect(await openGateKey(key, '')).toEqual({ ok: false, error: { kind: 'wrong-pin' } });
});

test('a PIN typed on a keyboard of full-width digits is the same PIN', async () => {
	expect(await openGateKey(key, '８３９２０１７４')).toMatchObject({ ok: true });
});

test('OpenSSL opens the same wrap from its description alone', () => {
	const { sealed, ...stated } = key.wrapped;
	const kek = pbkdf2Sync(PIN, Buffer.from(stated.salt, 'base64'), stated.iterations, 32, 'sha256');
	const bytes = Buffer.from(sealed, 'base64');
	const opening = createDecipheriv('aes-256-gcm', kek, Buffer.from(stated.iv, 'base64'));
	opening.setAAD(Buffer.from(canonicalJson(stated)));
	opening.setAuthTag(bytes.subarray(-16));
	const der = Buffer.concat([opening.update(bytes.subarray(0, -16)), opening.final()]);
	const publicKey = createPublicKey(createPrivateKey({ key: der, format: 'der', type: 'pkcs8' }));
	expect(publicKey.export({ format: 'der', type: 'spki' }).toString('base64')).toBe(key.publicKey);
});

const reopen = (changed: Partial<WrappedKey>) => openGateKey({ ...key, wrapped: { ...key.wrapped, ...changed } }, PIN);

test('a wrap with fewer iterations is refused, even under the right PIN', async () => {
	expect(await reopen({ iterations: 1000 })).toEqual({
		ok: false,
		error: { kind: 'weak-wrap', iterations: 1000, atLeast: MIN_ITERATIONS },
	});
	expect(await reopen({ iterations: NaN })).toMatchObject({ error: { kind: 'weak-wrap' } });
});

test('a changed parameter fails the seal', async () => {
	expect(await reopen({ iterations: MIN_ITERATIONS + 1 })).toEqual({ ok: false, error: { kind: 'wrong-pin' } });
	const of = { ...key.wrapped.of, person: 'P-02' };
	expect(await reopen({ of })).toEqual({ ok: false, error: { kind: 'wrong-pin' } });
});

test('a damaged wrap names the member that is damaged', async () => {
	expect(await reopen({ salt: 'AAAA' })).toMatchObject({ error: { kind: 'damaged-wrap', at: 'salt' } });
	expect(await reopen({ iv: '?' })).toMatchObject({ error: { kind: 'damaged-wrap', at: 'iv' } });
	expect(await reopen({ sealed: '?' })).toMatchObject({ error: { kind: 'damaged-wrap', at: 'sealed' } });
	expect(await reopen({ iterations: 1e9 })).toMatchObject({ error: { kind: 'damaged-wrap', at: 'iterations' } });
	const { publicKey } = value(await makeGateKey({ person: 'P-02', device: 'T-1', pin: PIN, random: webRandom }));
	expect(await openGateKey({ ...key, publicKey }, PIN)).toMatchObject({
		error: { kind: 'damaged-wrap', at: 'of.publicKey' },
	});
});

test('a PIN that anybody would try first makes no key', async () => {
	const made = await makeGateKey({ person: 'P-01', device: 'T-1', pin: '12345678', random: webRandom });
	expect(made).toEqual({ ok: false, error: { kind: 'pin-too-easy', because: 'a run' } });
});

test('nothing that is stored tells the PIN: the same PIN twice leaves nothing in common', async () => {
	const other = value(await makeGateKey({ person: 'P-01', device: 'T-1', pin: PIN, random: webRandom }));
	const [a, b] = [key.wrapped, other.wrapped];
	expect([a.salt === b.salt, a.iv === b.iv, a.sealed === b.sealed]).toEqual([false, false, false]);
	expect(JSON.stringify(a)).not.toContain(PIN);
});
