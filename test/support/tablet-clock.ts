import type { Clock } from '../../src/lib/app';

/** A clock that goes on only when told to, so that ten seconds or an hour pass at once. */
export class TestClock implements Clock {
	#now: number;
	#timers: { readonly at: number; readonly every?: number; readonly then: () => void }[] = [];

	constructor(now: number) {
		this.#now = now;
	}

	readonly now = (): number => this.#now;

	readonly every = (milliseconds: number, tick: () => void): (() => void) =>
		this.#add({ at: this.#now + milliseconds, every: milliseconds, then: tick });

	readonly after = (milliseconds: number, then: () => void): (() => void) =>
		this.#add({ at: this.#now + milliseconds, then });

	goOn(milliseconds: number): void {
		const until = this.#now + milliseconds;
		for (;;) {
			const due = this.#timers.filter(({ at }) => at <= until).sort((a, b) => a.at - b.at)[0];
			if (due === undefined) break;
			this.#now = due.at;
			this.#timers = this.#timers.filter((timer) => timer !== due);
			if (due.every !== undefined) this.#timers.push({ ...due, at: due.at + due.every });
			due.then();
		}
		this.#now = until;
	}

	#add(timer: { readonly at: number; readonly every?: number; readonly then: () => void }): () => void {
		this.#timers.push(timer);
		return () => {
			this.#timers = this.#timers.filter(({ then }) => then !== timer.then);
		};
	}
}
