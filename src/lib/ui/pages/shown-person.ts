/** A person as lists show them. */
export type ShownPerson = {
	readonly person: string;
	readonly name: string;
	readonly roles: readonly string[];
	/** "certificate until 14 Mar 2027" */
	readonly certificate: string;
	/** Their shift key is on this tablet. */
	readonly isHere: boolean;
};
