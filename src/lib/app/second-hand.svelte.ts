import type { Clock } from './clock';

/** The moment by the second, for what counts down before somebody's eyes. */
export class SecondHand {
	readonly #clock: Clock;
	#now = $state.raw(0);

	constructor(clock: Clock) {
		this.#clock = clock;
		this.#now = clock.now();
	}

	get now(): number {
		return this.#now;
	}

	run(): () => void {
		return this.#clock.every(1000, () => (this.#now = this.#clock.now()));
	}
}
