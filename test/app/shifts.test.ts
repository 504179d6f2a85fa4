import 'fake-indexeddb/auto';
import { beforeAll, expect, test } from 'vitest';
import { Shifts } from '../../src/lib/app/shifts.svelte';
import { makeEntryKey, makeResumeCode, webRandom, type ResumeCode, type SigningKey } from '../../src/lib/identity';
import { freshName, tab } from '../support/open-stores';
import { TestClock } from '../support/tablet-clock';
import { value } from '../support/test-site';

const NOW = Date.parse('2026-12-01T22:00:00Z');
const MINUTE = 60_000;
const LOG = 'FM-1/2026-12-01';
let key: SigningKey;
let code: ResumeCode;

beforeAll(async () => {
	key = await makeEntryKey();
	code = value(await makeResumeCode('4719', { pin: '73905284', random: webRandom }));
});

async function begun(how: { readonly withCode: boolean }) {
	const name = freshName();
	const clock = new TestClock(NOW);
	const open = async () => value(await Shifts.open(await tab(name), clock, 'T-1'));
	const shifts = await open();
	const resume = how.withCode ? { resume: { ...code, wrong: 0 } } : {};
	value(
		await shifts.begin({ person: 'TechA', log: LOG, shiftKey: 'event', key, notAfter: NOW + 720 * MINUTE, ...resume }),
	);
	return { shifts, clock, again: open };
}

test('a shift goes on after the browser was killed, and ends after its twelve hours', async () => {
	const { clock, again } = await begun({ withCode: false });
	const shifts = await again();
	expect(shifts.signerOf('TechA', LOG)).toMatchObject({ shiftKey: 'event' });
	for (let at = 0; at < 719; at += 4) {
		clock.goOn(4 * MINUTE);
		await shifts.touched();
	}
	expect(shifts.stateOf('TechA', LOG)).toBe('none');
	expect((await again()).stateOf('TechA', LOG)).toBe('none');
});

test('after five minutes untouched nobody enters in that name without the code, not even after a reload', async () => {
	const { shifts, clock, again } = await begun({ withCode: true });
	clock.goOn(4 * MINUTE);
	await shifts.touched();
	clock.goOn(4 * MINUTE);
	expect(shifts.stateOf('TechA', LOG)).toBe('runs');
	clock.goOn(MINUTE);
	await shifts.touched();
	expect(shifts.signerOf('TechA', LOG)).toBeUndefined();
	const reloaded = await again();
	expect(reloaded.stateOf('TechA', LOG)).toBe('asks for the code');
	expect(await reloaded.goOn('TechA', '0000')).toEqual({ ok: false, error: { kind: 'wrong-code', left: 2 } });
	expect(await reloaded.goOn('TechA', '4719')).toEqual({ ok: true, value: 'runs' });
	expect(reloaded.signerOf('TechA', LOG)).toMatchObject({ shiftKey: 'event' });
});

test('three wrong codes, or an hour, and it must be the PIN', async () => {
	const { shifts, clock, again } = await begun({ withCode: true });
	clock.goOn(6 * MINUTE);
	for (const typed of ['1111', '2222', '3333']) await shifts.goOn('TechA', typed);
	expect(await shifts.goOn('TechA', '4719')).toEqual({ ok: false, error: { kind: 'code-used-up' } });
	expect((await again()).stateOf('TechA', LOG)).toBe('asks for the PIN');
	await shifts.resumed('TechA');
	expect(shifts.stateOf('TechA', LOG)).toBe('runs');
	clock.goOn(60 * MINUTE);
	expect(shifts.stateOf('TechA', LOG)).toBe('asks for the PIN');
});

test('somebody else at work on the tablet does not uncover the shift of who went away', async () => {
	const { shifts, clock } = await begun({ withCode: true });
	clock.goOn(6 * MINUTE);
	value(await shifts.begin({ person: 'TechB', log: LOG, shiftKey: 'other', key, notAfter: NOW + 720 * MINUTE }));
	clock.goOn(MINUTE);
	await shifts.touched();
	expect([shifts.stateOf('TechA', LOG), shifts.stateOf('TechB', LOG)]).toEqual(['asks for the code', 'runs']);
});

test('a shift that its person ended is over', async () => {
	const { shifts, again } = await begun({ withCode: true });
	value(await shifts.end('TechA'));
	expect([shifts.stateOf('TechA', LOG), shifts.endsAt('TechA')]).toEqual(['none', undefined]);
	expect((await again()).stateOf('TechA', LOG)).toBe('none');
});
