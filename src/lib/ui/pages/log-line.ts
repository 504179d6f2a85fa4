/** One event of the log, in words. */
export type LogLine = {
	readonly event: string;
	/** When it was observed, plant time. */
	readonly seen: string;
	/** "entered 21:40, 22 min late" */
	readonly late?: string;
	readonly what: string;
	readonly step?: string;
	readonly value?: string;
	readonly who: string;
	readonly tablet: string;
	/** Superseded or withdrawn: what became of it. */
	readonly gone?: string;
	readonly canWithdraw?: true;
};
