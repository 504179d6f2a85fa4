/** A person of this tablet, as lists show them. */
export type ShownPerson = {
	readonly person: string;
	readonly name: string;
	readonly roles: readonly string[];
	/** "certificate 14 Mar 2026 to 14 Mar 2027" */
	readonly certificate: string;
	/** "shift until 05:12", "no shift", or that the key is destroyed. */
	readonly said: string;
	/** "2 wrong PINs on this tablet since the last right one" */
	readonly warning?: string;
	/** Their key is whole: they can take the tablet and sign. */
	readonly hasKey: boolean;
	/** A shift of theirs runs here and can be ended. */
	readonly isInShift: boolean;
};
