import type { ResultClass, SubIndication } from '../identity';
import { fileVerdictOf, outcomeOf, type Check, type Outcome } from './pdf/check';
import type { Counts, ProcessResult } from './process-result';

/**
 * The whole answer. Integrity (`class`, `outcome`) says whether this is what was recorded and by whom; `process` says whether
 * the procedure was met. Neither says that readings, clocks or people were right.
 */
export type Report = {
	readonly format: 'gatehold-verification/1';
	/** Of integrity, in the words of ETSI EN 319 102-1. */
	readonly class: ResultClass;
	readonly sub?: SubIndication;
	readonly outcome: Outcome;
	readonly process: ProcessResult;
	readonly startUp?: string;
	readonly counts: Counts;
	/** How many checks came out how. */
	readonly checked: { readonly [outcome in Outcome]: number };
	readonly checks: readonly Check[];
};

export function makeReport(
	checks: readonly Check[],
	about: { readonly process: ProcessResult; readonly counts: Counts; readonly startUp: string | undefined },
): Report {
	const count = (outcome: Outcome): number => checks.filter((check) => check.outcome === outcome).length;
	return {
		format: 'gatehold-verification/1',
		...fileVerdictOf(checks),
		outcome: outcomeOf(checks),
		process: about.process,
		...(about.startUp === undefined ? {} : { startUp: about.startUp }),
		counts: about.counts,
		checked: { passed: count('passed'), failed: count('failed'), undecided: count('undecided') },
		checks,
	};
}
