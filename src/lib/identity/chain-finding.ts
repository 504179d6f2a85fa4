import type { SubIndication } from './result-class';

/** One rule and what it found. `sub` is there when it did not pass; `facts` say it in data, a sentence is made elsewhere. */
export type ChainFinding = {
	readonly rule:
		'certificate' | 'path' | 'constraints' | 'algorithms' | 'claimed time' | 'validity' | 'revocation' | 'scope';
	readonly outcome: 'passed' | 'failed' | 'undecided';
	readonly sub?: SubIndication;
	readonly facts: { readonly [fact: string]: string };
};
