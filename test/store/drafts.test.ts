import { expect, test } from 'vitest';
import { LOG, NOON } from '../support/kept-events';
import { freshName, tab } from '../support/open-stores';
import { value } from '../support/test-site';

const draft = {
	startUp: LOG,
	step: 'G2-03',
	person: 'P-01',
	typed: {
		rows: [
			{ place: 'AT-211', o2: '4,9' },
			{ place: 'AT-212', o2: '' },
		],
		note: 'half a sent',
	},
	saved: NOON,
};

test('what was half typed is there again after the browser was closed, exactly as typed', async () => {
	const name = freshName();
	const before = await tab(name);
	await before.drafts.save({ ...draft, typed: { note: 'ha' } });
	await before.drafts.save(draft);
	before.close();
	const after = await tab(name);
	expect(await after.drafts.read(draft)).toEqual({ ok: true, value: draft });
});

test('everyone has a draft of their own, and each is dropped alone', async () => {
	const store = await tab(freshName());
	const theirs = { ...draft, person: 'P-02', typed: { note: 'mine' } };
	const elsewhere = { ...draft, startUp: 'SU-0002' };
	for (const one of [draft, theirs, elsewhere]) await store.drafts.save(one);
	await store.drafts.drop(draft);
	expect(value(await store.drafts.list(LOG))).toEqual([theirs]);
	expect(value(await store.drafts.list())).toEqual([theirs, elsewhere]);
});
