import 'fake-indexeddb/auto';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { beforeAll, describe, expect, test } from 'vitest';
import {
	agreeNotApplicable,
	beginShift,
	DEMONSTRATION_PIN,
	enter,
	enteredBefore,
	invitationOf,
	inviteWitness,
	mayAgree,
	noticeHasRunOut,
	OpenStartUp,
	playDemonstration,
	Tablet,
	waitsForAgreement,
	withdrawEntry,
	witnessAttended,
	witnessWaived,
} from '../../src/lib/app';
import { openStore } from '../../src/lib/store';
import { freshName } from '../support/open-stores';
import { TestClock } from '../support/tablet-clock';
import { value } from '../support/test-site';

const DEMO = join(import.meta.dirname, '../../static/demo');
const read = async (name: string): Promise<Uint8Array<ArrayBuffer>> => new Uint8Array(await readFile(join(DEMO, name)));
const clock = new TestClock(Date.parse('2026-12-01T12:00:20Z'));
const pin = DEMONSTRATION_PIN;
let startUp: OpenStartUp;

beforeAll(async () => {
	const store = value(await openStore(freshName(), { now: '2026-12-01T12:00:20Z' }));
	const id = value(await playDemonstration(store, clock, read, () => undefined));
	startUp = value(await OpenStartUp.open(value(await Tablet.open(store, clock)), id));
	await startUp.tablet.choose('TechA');
	value(await beginShift(startUp, pin));
}, 180_000);

const stateOf = (step: string): string | undefined => startUp.standing.steps.find((one) => one.step === step)?.state;
const fates = (step: string): readonly string[] => enteredBefore(startUp, step).map(({ fate }) => fate.kind);

async function later(minutes: number): Promise<void> {
	clock.goOn(minutes * 60_000);
	value(await startUp.reload());
}

describe('a step that does not apply', () => {
	test('waits until a releasing role agrees with a PIN of its own, on the same tablet', async () => {
		value(await enter(startUp, '3.1', { outcome: 'not applicable', reason: 'no lifting gear on this mill' }));
		const asked = waitsForAgreement(startUp, '3.1');
		expect(asked?.body).toMatchObject({ outcome: 'not applicable', reason: 'no lifting gear on this mill' });
		expect(stateOf('3.1')).toBe('not yet');
		expect(mayAgree(startUp.tablet).map(({ person }) => person)).not.toContain('TechA');
		const wrong = await agreeNotApplicable(startUp, asked?.id ?? '', '', { person: 'SupA', pin: '11223345' });
		expect(wrong).toMatchObject({ error: { kind: 'wrong-pin', left: 9 } });
		value(await agreeNotApplicable(startUp, asked?.id ?? '', 'seen', { person: 'SupA', pin }));
		expect(stateOf('3.1')).toBe('not applicable');
		expect(waitsForAgreement(startUp, '3.1')).toBeUndefined();
		expect(startUp.log.at(-1)).toMatchObject({ kind: 'not applicable agreed', person: 'SupA' });
		expect(startUp.tablet.person?.person).toBe('TechA');
	});
});

describe('an entry that was mistyped', () => {
	test('is withdrawn with its reason and the PIN: it stays in the record, and the one before counts again', async () => {
		value(await enter(startUp, '3.1', { values: { 'PT-272': '74' } }));
		expect(stateOf('3.1')).toBe('stands');
		await later(1);
		value(await enter(startUp, '3.1', { values: { 'PT-272': '7,4' } }));
		expect(stateOf('3.1')).toBe('failed');
		const [mistyped] = enteredBefore(startUp, '3.1');
		value(await withdrawEntry(startUp, mistyped?.entry.id ?? '', 'Mistyped', { pin }));
		expect(fates('3.1').slice(0, 2)).toEqual(['withdrawn', 'counts']);
		expect(stateOf('3.1')).toBe('stands');
	});
});

describe('a witness point', () => {
	test('keeps the notice; before it has run out nobody stayed away', async () => {
		value(await inviteWitness(startUp, '7.5'));
		value(await startUp.keepHeld());
		const invited = invitationOf(startUp, '7.5')?.invited;
		const due = invited?.body.due ?? '';
		expect(invited?.body).toMatchObject({ step: '7.5', party: 'Head of operation of the lime works' });
		expect(noticeHasRunOut(startUp, due)).toBe(false);
		await later(121);
		expect(noticeHasRunOut(startUp, due)).toBe(true);
		// The screen was covered meanwhile.
		value(await beginShift(startUp, pin));
	});

	test('is attended: the witness signs with a PIN of their own where they are enrolled', async () => {
		value(await witnessAttended(startUp, '7.5', 'Imre Castellvor', { person: 'SupA', pin }));
		expect(invitationOf(startUp, '7.5')?.attended).toMatchObject({
			person: 'SupA',
			body: { witness: 'Imre Castellvor' },
		});
	});

	test('asked for again, it can be waived, and the PIN of who records that signs it', async () => {
		value(await inviteWitness(startUp, '7.5'));
		expect(invitationOf(startUp, '7.5')?.attended).toBeUndefined();
		value(await witnessWaived(startUp, { step: '7.5', by: 'Plant head', reason: 'seen yesterday' }, { pin }));
		expect(invitationOf(startUp, '7.5')?.waived).toMatchObject({ person: 'TechA', body: { reason: 'seen yesterday' } });
	});
});
