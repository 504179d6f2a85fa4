import { beforeAll, expect, test } from 'vitest';
import { checkShiftKey, coveredBy, makeEntryKey, toJwk, type PublicKey, type ShiftKey } from '../../src/lib/identity';

let shift: ShiftKey;
let publicKey: PublicKey;

beforeAll(async () => {
	({ publicKey } = await makeEntryKey());
	const [notBefore, notAfter] = ['2026-05-04T16:00:00+02:00', '2026-05-05T04:00:00+02:00'];
	shift = { publicKey: await toJwk(publicKey), notBefore, notAfter, entriesOnly: true };
});

test('a shift key of twelve hours is the key that its entries are checked with', async () => {
	expect(await checkShiftKey(shift)).toEqual({ ok: true, value: publicKey });
});

test('a second more than twelve hours, an end before the beginning and a thing that is no key are refused', async () => {
	const longer = await checkShiftKey({ ...shift, notAfter: '2026-05-05T04:00:01+02:00' });
	expect(longer).toMatchObject({ ok: false, error: { kind: 'shift-too-long', atMost: 12 } });
	expect(await checkShiftKey({ ...shift, notAfter: shift.notBefore })).toEqual({
		ok: false,
		error: { kind: 'shift-ends-before-it-begins' },
	});
	expect(await checkShiftKey({ ...shift, publicKey: { kty: 'RSA' } })).toMatchObject({
		error: { kind: 'malformed-key' },
	});
});

test('a shift key covers entries of its person on its tablet in its time, to the second, in any time zone', () => {
	const owner = { person: 'P-01', device: 'T-1' };
	const entered = (at: string, who = owner) => coveredBy(shift, owner, { ...who, entered: at });
	expect(entered('2026-05-04T14:00:00Z')).toEqual({ ok: true, value: 'covered' });
	expect(entered('2026-05-05T02:00:00Z')).toEqual({ ok: true, value: 'covered' });
	const { notBefore, notAfter } = shift;
	expect(entered('2026-05-04T13:59:59Z')).toEqual({ ok: false, error: { kind: 'outside-shift', notBefore, notAfter } });
	expect(entered('2026-05-05T02:00:01Z')).toMatchObject({ error: { kind: 'outside-shift' } });
	const other = entered('2026-05-04T15:00:00Z', { person: 'P-02', device: 'T-1' });
	expect(other).toEqual({ ok: false, error: { kind: 'other-person', person: 'P-01' } });
	expect(entered('2026-05-04T15:00:00Z', { person: 'P-01', device: 'T-2' })).toMatchObject({
		error: { kind: 'other-device' },
	});
});
