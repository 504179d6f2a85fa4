/** Where time comes from: handed in, so that a test can let an hour pass. */
export type Clock = {
	/** Milliseconds since 1970-01-01T00:00Z. */
	readonly now: () => number;
	/** Calls again and again until the answer is called. */
	readonly every: (milliseconds: number, tick: () => void) => () => void;
	readonly after: (milliseconds: number, then: () => void) => () => void;
};

export const systemClock: Clock = {
	now: () => Date.now(),
	every: (milliseconds, tick) => {
		const timer = setInterval(tick, milliseconds);
		return () => clearInterval(timer);
	},
	after: (milliseconds, then) => {
		const timer = setTimeout(then, milliseconds);
		return () => clearTimeout(timer);
	},
};

/** Minutes east of UTC that this machine keeps at a moment. */
export const localOffset = (at: number): number => -new Date(at).getTimezoneOffset();
