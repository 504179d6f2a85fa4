/** What a person is on a site. A certificate carries these words. */
export const ROLES = [
	'technician',
	'shift supervisor',
	'commissioning lead',
	'process engineer',
	'instrument engineer',
	'QA',
	'site administrator',
] as const;

export type Role = (typeof ROLES)[number];

/**
 * What a role may do. Which role releases which gate is data of the procedure: `release` only says that a procedure may
 * name the role for it.
 */
export const RIGHTS = [
	'enter',
	'release',
	'refuse',
	'answer a refusal',
	'agree not applicable',
	'dispose of a deviation',
	'withdraw an event',
	'record a finding',
	'confirm a re-judged value',
	'hand over',
	'seal',
	'approve a procedure',
	'approve plant data',
	'enrol',
	'issue a trust list',
] as const;

export type Right = (typeof RIGHTS)[number];

export const isRole = (text: string): text is Role => (ROLES as readonly string[]).includes(text);

export const may = (roles: readonly Role[], right: Right): boolean =>
	roles.some((role) => HOLDERS[right].includes(role));

export const rolesWith = (right: Right): readonly Role[] => HOLDERS[right];

const RELEASING: readonly Role[] = ['shift supervisor', 'commissioning lead', 'process engineer', 'QA'];

/** Enters and signs on plant; the site administrator only keeps people and keys. */
const ON_PLANT: readonly Role[] = ROLES.filter((role) => role !== 'site administrator');

/** The table roles x rights. */
const HOLDERS: { readonly [right in Right]: readonly Role[] } = {
	enter: ON_PLANT,
	release: RELEASING,
	refuse: RELEASING,
	'answer a refusal': RELEASING,
	'agree not applicable': RELEASING,
	'dispose of a deviation': RELEASING,
	'withdraw an event': RELEASING,
	// Whoever checks an instrument in the night records what was found.
	'record a finding': ON_PLANT,
	'confirm a re-judged value': ['instrument engineer'],
	'hand over': ON_PLANT,
	seal: ['QA', 'commissioning lead'],
	'approve a procedure': ['process engineer', 'QA'],
	'approve plant data': ['process engineer', 'instrument engineer'],
	enrol: ['site administrator', 'QA'],
	'issue a trust list': ['site administrator', 'QA'],
};
