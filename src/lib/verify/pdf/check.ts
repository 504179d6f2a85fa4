import { classOf, type ResultClass, type SubIndication } from '../../identity';

export type Outcome = 'passed' | 'failed' | 'undecided';

/** One thing that was checked, and why it came out so. Every check is reported, not the first that failed. */
export type Check = {
	readonly name: string;
	readonly outcome: Outcome;
	/** A sentence; `facts` holds what it is made of. */
	readonly because: string;
	readonly facts: { readonly [fact: string]: string | number };
	/** The signature field that it is about. */
	readonly field?: string;
	/** In the words of ETSI EN 319 102-1, when it did not pass and the standard has a word for it. */
	readonly sub?: SubIndication;
};

/** Failed if one failed, undecided if one is, passed only if all did - and never over nothing. */
export function outcomeOf(checks: readonly Check[]): Outcome {
	if (checks.some(({ outcome }) => outcome === 'failed')) return 'failed';
	return checks.length === 0 || checks.some(({ outcome }) => outcome === 'undecided') ? 'undecided' : 'passed';
}

/** In the words of ETSI EN 319 102-1; the standard has no word for everything that we check. */
export type Verdict = { readonly class: ResultClass; readonly sub?: SubIndication };

/**
 * The class of one signature. What the standard has a word for keeps the class that the standard gives it; a check that it
 * does not know and that failed is TOTAL-FAILED, because the rules that it broke are those that the file was written by.
 */
export function verdictOf(checks: readonly Check[]): Verdict {
	const bad = checks.filter(({ outcome }) => outcome !== 'passed');
	const worst = bad.find((check) => classFor(check) === 'TOTAL-FAILED') ?? bad[0];
	if (worst === undefined) return { class: checks.length === 0 ? 'INDETERMINATE' : 'TOTAL-PASSED' };
	return { class: classFor(worst), ...(worst.sub === undefined ? {} : { sub: worst.sub }) };
}

/** The class of a whole file: stricter, because one signature by the wrong person fails it. */
export function fileVerdictOf(checks: readonly Check[]): Verdict {
	const outcome = outcomeOf(checks);
	const worst = { passed: 'TOTAL-PASSED', undecided: 'INDETERMINATE', failed: 'TOTAL-FAILED' } as const;
	const sub = checks.find((check) => check.sub !== undefined && classOf(check.sub) === worst[outcome])?.sub;
	return { class: worst[outcome], ...(sub === undefined ? {} : { sub }) };
}

function classFor({ sub, outcome }: Check): ResultClass {
	if (sub !== undefined) return classOf(sub);
	return outcome === 'failed' ? 'TOTAL-FAILED' : 'INDETERMINATE';
}

type Said = Omit<Check, 'name' | 'outcome' | 'because' | 'facts'> & { readonly facts?: Check['facts'] };

export const passed = (name: string, because: string, said: Said = {}): Check => ({
	name,
	outcome: 'passed',
	because,
	facts: {},
	...said,
});

export const failed = (name: string, because: string, said: Said = {}): Check => ({
	name,
	outcome: 'failed',
	because,
	facts: {},
	...said,
});

export const undecided = (name: string, because: string, said: Said = {}): Check => ({
	name,
	outcome: 'undecided',
	because,
	facts: {},
	...said,
});
