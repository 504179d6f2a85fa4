import type { ContactState } from '../ladder/states';

/** One thing about what the tablet keeps: how it stands, in a word, and what that means. */
export type StorageLine = {
	readonly name: string;
	readonly state: ContactState;
	readonly word: string;
	readonly said: string;
};
