import { expect, test } from 'vitest';
import { fromBase64, toBase64, utf8 } from '../../src/lib/base';
import { checkSignature, fromJwk, makeEntryKey, sign, toJwk } from '../../src/lib/identity';

// Source: RFC 7515, appendix A.3: a signature with ES256, its key as JWK, and the octets that were signed.
const JWK = {
	kty: 'EC',
	crv: 'P-256',
	x: 'f83OJ3D2xF1Bg8vub9tLe1gHMzV76e8Tus9uPHvRVEU',
	y: 'x_FEzRu9m36HLN_tue659LNpXW6pCyStikYjKIWI5a0',
} as const;
const SIGNED =
	'eyJhbGciOiJFUzI1NiJ9.eyJpc3MiOiJqb2UiLA0KICJleHAiOjEzMDA4MTkzODAsDQogImh0dHA6Ly9leGFtcGxlLmNvbS9pc19yb290Ijp0cnVlfQ';
const SIGNATURE = 'DtEhU3ljbEg8L38VWAfUAqOyKAM6-Xx-F4GawxaepmXFCgfTjDxw5djxLa8ISlSApmWQxfKTUJqPP3-Kg6NU1Q';

const published = async () => ({
	bytes: utf8(SIGNED),
	alg: 'ES256',
	signature: toBase64(new Uint8Array(Buffer.from(SIGNATURE, 'base64url'))),
	publicKey: (await fromJwk(JWK))!,
});

test('the signature of RFC 7515 A.3 holds, and fails over one other byte', async () => {
	const claim = await published();
	expect(await checkSignature(claim)).toEqual({ ok: true, value: 'valid' });
	expect(await checkSignature({ ...claim, bytes: utf8(`${SIGNED}.`) })).toEqual({
		ok: false,
		error: { kind: 'wrong-signature' },
	});
});

test('a key goes through a JSON Web Key and back, and nothing but a public P-256 key is one', async () => {
	expect(await toJwk((await fromJwk(JWK))!)).toEqual(JWK);
	for (const wrong of [
		{ ...JWK, d: 'AQ' },
		{ ...JWK, crv: 'P-384' },
		{ ...JWK, x: JWK.y },
		{ ...JWK, kty: 'oct' },
		{ kty: 'EC', crv: 'P-256', x: JWK.x },
		'a key',
		null,
	]) {
		expect(await fromJwk(wrong)).toBeUndefined();
	}
});

test('an entry key signs what it alone can sign, and cannot be exported', async () => {
	const [key, other] = [await makeEntryKey(), await makeEntryKey()];
	const bytes = utf8('O2 hopper 7.6 %');
	const signature = await sign(bytes, key);
	expect(fromBase64(signature)).toHaveLength(64);
	expect(await checkSignature({ bytes, alg: 'ES256', signature, publicKey: key.publicKey })).toEqual({
		ok: true,
		value: 'valid',
	});
	expect(await checkSignature({ bytes, alg: 'ES256', signature, publicKey: other.publicKey })).toEqual({
		ok: false,
		error: { kind: 'wrong-signature' },
	});
	await expect(crypto.subtle.exportKey('pkcs8', key.privateKey)).rejects.toThrow();
});

test('an algorithm that is not on the list is refused before anything is computed', async () => {
	const claim = await published();
	for (const alg of ['none', 'HS256', 'es256', 'RS256', '']) {
		expect(await checkSignature({ ...claim, alg })).toEqual({
			ok: false,
			error: { kind: 'algorithm-not-allowed', alg, allowed: ['ES256'] },
		});
	}
});

test('what is no signature and what is no key are told apart from a wrong signature', async () => {
	const claim = await published();
	const tooShort = await checkSignature({ ...claim, signature: claim.signature.slice(0, 84) });
	expect(tooShort).toMatchObject({ ok: false, error: { kind: 'malformed-signature' } });
	expect(await checkSignature({ ...claim, signature: 'not base64!' })).toMatchObject({
		error: { kind: 'malformed-signature' },
	});
	expect(await checkSignature({ ...claim, publicKey: 'MAAA' })).toMatchObject({ error: { kind: 'malformed-key' } });
});

test('anybody can make a second valid signature of the same bytes: signatures name nothing', async () => {
	// Source: SEC 2, section 2.4.2, order n of the curve P-256.
	const n = 0xffffffff00000000ffffffffffffffffbce6faada7179e84f3b9cac2fc632551n;
	const claim = await published();
	const [r, s] = [fromBase64(claim.signature)!.subarray(0, 32), fromBase64(claim.signature)!.subarray(32)];
	const twin = (n - BigInt(`0x${Buffer.from(s).toString('hex')}`)).toString(16).padStart(64, '0');
	const signature = Buffer.concat([r, Buffer.from(twin, 'hex')]).toString('base64');
	expect(signature).not.toBe(claim.signature);
	expect(await checkSignature({ ...claim, signature })).toEqual({ ok: true, value: 'valid' });
});
