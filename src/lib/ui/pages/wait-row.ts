/** A line of what waits for somebody, or of what runs out. */
export type WaitRow = {
	readonly id: string;
	readonly href: string;
	readonly mark: 'next' | 'lapsed' | 'blocks' | 'stands' | 'unknown' | 'ready' | 'refused';
	/** Part of its time that is left, 1 to 0. */
	readonly left?: number;
	readonly title: string;
	readonly said: string;
	readonly when: string;
};
