import { beforeAll, expect, test } from 'vitest';
import { canonicalJson } from '../../src/lib/base';
import {
	informsAbout,
	openTrustList,
	replaceTrustList,
	signTrustList,
	type SignedTrustList,
	type TrustList,
} from '../../src/lib/identity';
import { makeTestSite, testTrustList, type TestSite } from '../support/test-site';

let site: TestSite;
let list: TrustList;
let signed: SignedTrustList;

beforeAll(async () => {
	site = await makeTestSite();
	list = testTrustList(site, {
		sequence: 7,
		revocations: [{ certificate: 'ab'.repeat(32), at: '2026-05-11T03:00:00Z', reason: 'device lost' }],
	});
	signed = await signTrustList(list, site.root.key);
});

test('[C7] a signed trust list opens under its root, word for word', async () => {
	expect(await openTrustList(signed, site.root.certificate)).toEqual({ ok: true, value: list });
});

test('a list that was changed, or signed by another root, does not open', async () => {
	const text = signed.text.replace('"sequence":7', '"sequence":8');
	expect(await openTrustList({ ...signed, text }, site.root.certificate)).toMatchObject({
		error: { kind: 'wrong-signature' },
	});
	const other = await makeTestSite();
	expect(await openTrustList(signed, other.root.certificate)).toMatchObject({ error: { kind: 'wrong-signature' } });
});

test('a list that the root signed for another site, or that is no list, is refused', async () => {
	const elsewhere = await signTrustList({ ...list, site: 'Elsewhere' }, site.root.key);
	expect(await openTrustList(elsewhere, site.root.certificate)).toEqual({
		ok: false,
		error: { kind: 'of-another-site', site: 'Elsewhere' },
	});
	const broken = await signTrustList({ ...list, issued: 'yesterday' }, site.root.key);
	expect(await openTrustList(broken, site.root.certificate)).toMatchObject({
		error: { kind: 'unreadable-file', at: 'issued' },
	});
});

test('[C7] a tablet keeps the list with the highest number, and refuses to go back', () => {
	const newer = { ...list, sequence: 8, revocations: [] };
	expect(replaceTrustList(undefined, list)).toEqual({ ok: true, value: list });
	expect(replaceTrustList(list, newer)).toEqual({ ok: true, value: newer });
	expect(replaceTrustList(list, { ...list })).toEqual({ ok: true, value: list });
	expect(replaceTrustList(newer, list)).toEqual({
		ok: false,
		error: { kind: 'older-than-held', sequence: 7, held: 8 },
	});
});

test('[C7] two lists under one number are not two opinions but an alarm', () => {
	const other = { ...list, revocations: [] };
	expect(canonicalJson(other)).not.toBe(canonicalJson(list));
	expect(replaceTrustList(list, other)).toEqual({ ok: false, error: { kind: 'forked', sequence: 7 } });
});

test('a list informs about what lies before its issue and until it runs out', () => {
	expect(informsAbout(list, '2026-01-01T00:00:00Z')).toBe(true);
	expect(informsAbout(list, list.nextUpdate)).toBe(true);
	expect(informsAbout(list, '2026-05-17T00:00:01Z')).toBe(false);
});
