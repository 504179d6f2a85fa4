import { allOf, millis } from '../record';
import type { Step } from '../procedure';
import type { OpenStartUp } from './open-start-up.svelte';

type Rounds = Extract<Step, { readonly kind: 'quick sheet' | 'watch' }>;
type Kept = { readonly minutes: number; readonly since: string };

/**
 * When the next round of readings is due. It follows from what was read last and how often it is to be read, so that a
 * reload, another page or a flat battery changes nothing. A watch has its time from the procedure.
 */
export class ReadingTimer {
	readonly #startUp: OpenStartUp;
	readonly #step: Rounds;
	#kept = $state.raw<Kept>();
	#now = $state.raw(0);
	#wasLeft: number | undefined;

	constructor(startUp: OpenStartUp, step: Rounds) {
		this.#startUp = startUp;
		this.#step = step;
		this.#now = startUp.tablet.clock.now();
	}

	/** Ticks until the answer is called; rings once whenever a reading becomes due. */
	run(ring: () => void): () => void {
		const { store, clock } = this.#startUp.tablet;
		void store.drafts.read(this.#key()).then((kept) => {
			if (kept.ok && kept.value !== undefined) this.#kept = kept.value.typed as Kept;
		});
		return clock.every(SECOND, () => {
			this.#now = clock.now();
			const left = this.secondsLeft;
			if (left !== undefined && left <= 0 && this.#wasLeft !== undefined && this.#wasLeft > 0) ring();
			this.#wasLeft = left;
		});
	}

	/** The moment shown, by the second. */
	get now(): number {
		return this.#now;
	}

	/** Rounds that were entered and not withdrawn. */
	get rounds(): number {
		const { events } = this.#startUp;
		const withdrawn = allOf(events, 'entry withdrawn').map(({ body }) => body.entry);
		return allOf(events, 'entry').filter(({ id, body }) => body.step === this.#step.id && !withdrawn.includes(id))
			.length;
	}

	get everyMinutes(): number | undefined {
		const { validity } = this.#step;
		return validity.kind === 'watch' ? validity.everyMinutes : this.#kept?.minutes;
	}

	/** Negative when it is overdue; absent while nobody waits for a reading. */
	get secondsLeft(): number | undefined {
		const due = this.#due();
		return due === undefined ? undefined : Math.ceil((due - this.#now) / SECOND);
	}

	/** A quick sheet is read as often as somebody chooses, or not again. */
	async choose(minutes: number | undefined): Promise<void> {
		const { tablet } = this.#startUp;
		const since = this.#startUp.instant(tablet.clock.now());
		this.#wasLeft = undefined;
		if (minutes === undefined) {
			this.#kept = undefined;
			await tablet.store.drafts.drop(this.#key());
			return;
		}
		this.#kept = { minutes, since };
		await tablet.store.drafts.save({ ...this.#key(), typed: { minutes, since }, saved: since });
	}

	#due(): number | undefined {
		const found = this.#startUp.standing.steps.find(({ step }) => step === this.#step.id);
		if (this.#step.validity.kind === 'watch') {
			const gap = found?.why.find(({ kind }) => kind === 'watch gap');
			if (gap?.kind === 'watch gap') return millis(gap.since) + gap.minutes * MINUTE;
			return found?.until === undefined || found.until === 'unknown' ? undefined : millis(found.until);
		}
		if (this.#kept === undefined) return undefined;
		const last = found?.observed === undefined ? 0 : millis(found.observed);
		return Math.max(last, millis(this.#kept.since)) + this.#kept.minutes * MINUTE;
	}

	#key() {
		const { id, tablet } = this.#startUp;
		return { startUp: id, step: `timer ${this.#step.id}`, person: tablet.device };
	}
}

const SECOND = 1000;
const MINUTE = 60_000;
