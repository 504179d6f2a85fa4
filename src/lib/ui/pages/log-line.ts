/** Words by which the log is narrowed. */
export const LOG_GROUPS = ['all', 'entries', 'plant events', 'gate acts', 'deviations'] as const;

/** One event of the log, in words. */
export type LogLine = {
	readonly event: string;
	/** One of the words above; anything else is seen under all alone. */
	readonly group: string;
	/** When it was observed, plant time. */
	readonly seen: string;
	/** "entered 21:40, 22 min late" */
	readonly late?: string;
	readonly isLate?: boolean;
	readonly what: string;
	/** The step or the hold point that it belongs to. */
	readonly step?: string;
	readonly gate?: number;
	readonly value?: string;
	readonly who: string;
	readonly tablet: string;
	/** Superseded, withdrawn, without effect: what became of it. */
	readonly gone?: string;
	/** It does not count any more. */
	readonly isGone?: boolean;
	readonly canWithdraw?: true;
};
