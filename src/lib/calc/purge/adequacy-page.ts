import type { CalculatorPage } from '../calculator';

export const ADEQUACY_PAGE: CalculatorPage = {
	area: 'purge',
	findBy: 'nitrogen N2 inerting purge adequate oxygen O2 readings hold trend enough place coverage',
	first: ['limit', 'guard', 'begins', 'temperature', 'pressure'],
	results: ['held', 'holdNeeded', 'forecast', 'volumeChanges', 'admitted', 'inLeakage'],
	formula: ['C(t) = C_f + (C_0 − C_f) e^{−λ t}', 'C_max + U ≤ C_limit'],
	explains: [
		'At every measured place the oxygen has to be below the limit less the guard, for as long as the hold, with fan and inert flow unbroken; every volume without analyser has to be swept, and its outlet read.',
		'The curve fitted to the readings gives the floor that the purge settles at and how fast it gets there. It can speak against a purge; it never speaks for one that the readings do not show.',
		'In a start-up its step binds all of this from the record: use it there. Here its tables and series are pasted as data, for looking back at a purge.',
	],
	cautions: ['inert', 'entry'],
};
