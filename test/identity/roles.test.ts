import { expect, test } from 'vitest';
import { may, RIGHTS, ROLES, rolesWith } from '../../src/lib/identity';

test('a technician enters and hands over, and releases, disposes, withdraws and seals nothing', () => {
	expect(RIGHTS.filter((right) => may(['technician'], right))).toEqual(['enter', 'record a finding', 'hand over']);
});

test('a shift supervisor may release, refuse, answer, dispose and withdraw, and does not seal', () => {
	const rights = RIGHTS.filter((right) => may(['shift supervisor'], right));
	expect(rights).toEqual([
		'enter',
		'release',
		'refuse',
		'answer a refusal',
		'agree not applicable',
		'dispose of a deviation',
		'withdraw an event',
		'record a finding',
		'hand over',
	]);
});

test('the site administrator keeps people and trust lists and does nothing on the plant', () => {
	expect(RIGHTS.filter((right) => may(['site administrator'], right))).toEqual(['enrol', 'issue a trust list']);
});

test('only an instrument engineer confirms a value judged again', () => {
	expect(rolesWith('confirm a re-judged value')).toEqual(['instrument engineer']);
});

test('two roles have the rights of both, and no role has none', () => {
	expect(may(['technician', 'site administrator'], 'enrol')).toBe(true);
	expect(RIGHTS.some((right) => may([], right))).toBe(false);
	expect(ROLES.every((role) => RIGHTS.some((right) => may([role], right)))).toBe(true);
});
