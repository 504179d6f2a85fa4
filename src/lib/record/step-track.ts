import type { LapsedBy, Step } from '../procedure';
import type { Cause } from './answer';
import type { EntryFact } from './entry-facts';
import type { Facts } from './facts';
import { voids } from './findings';
import { MINUTE, type Millis } from './instants';
import { lapses } from './plant-facts';

/** What a table row, or a whole step without rows, was last seen to be. `broken` is for good: it must be seen again. */
type Piece = {
	readonly entry: EntryFact;
	readonly passes: boolean;
	readonly observed: Millis;
	readonly oldest: Millis;
	broken?: { readonly at: Millis; readonly cause: InnerCause };
};

/** A cause with its times still as numbers; the answer prints them. */
export type InnerCause =
	| {
			readonly kind: 'plant event';
			readonly event: string;
			readonly what: string;
			readonly item: string | undefined;
			readonly begin: Millis;
			readonly end: Millis;
	  }
	| { readonly kind: 'age' | 'watch gap'; readonly minutes: number; readonly since: Millis }
	| { readonly kind: 'age counts again'; readonly minutes: number; readonly since: Millis; readonly gate: number }
	| {
			readonly kind: 'instrument finding';
			readonly event: string;
			readonly instrument: string;
			readonly lastGood: Millis;
	  }
	| Exclude<Cause, { kind: 'plant event' | 'age' | 'watch gap' | 'age counts again' | 'instrument finding' }>;

export type TrackState = 'not yet' | 'stands' | 'failed' | 'lapsed' | 'waits' | 'not applicable';

export type TrackStatus = {
	readonly state: TrackState;
	readonly since: Millis | undefined;
	readonly why: readonly InnerCause[];
	/** A lapsed watch: the gate comes back with the reading, without a signature (ST6). */
	readonly gap: boolean;
	readonly rows: readonly string[];
};

/** One step through the course of time, as the facts have it. Moved forward by play, instant by instant. */
export class StepTrack {
	readonly step: Step;
	/** Whether this start type asks for the step. */
	readonly required: boolean;
	/** Row names of a table; one nameless row for every other step. */
	readonly #rows: readonly string[];
	readonly #pieces = new Map<string, Piece>();
	entry: EntryFact | undefined;
	everPassed = false;
	/** The age stopped counting against the step's own gate: the gate it lasts until was released on this proof. */
	spent = false;
	status: TrackStatus = NOT_YET;

	constructor(step: Step, required: boolean) {
		this.step = step;
		this.required = required;
		this.#rows = step.kind === 'line-up' || step.kind === 'coverage' ? step.rows.map((row) => row.id) : [''];
		if (!required) this.status = { ...NOT_YET, state: 'not applicable', why: [] };
	}

	/** How long a proof may stand, in milliseconds; Infinity when age does not matter. */
	get life(): Millis {
		const { validity } = this.step;
		switch (validity.kind) {
			case 'once':
				return (validity.ageMinutes ?? Infinity) * MINUTE;
			case 'fresh at release':
				return validity.atMostMinutes * MINUTE;
			case 'watch':
				return validity.everyMinutes * MINUTE;
			case 'while':
				return Infinity;
		}
	}

	/** The gate whose release ends the age. */
	get until(): number | undefined {
		const { validity } = this.step;
		return validity.kind === 'fresh at release'
			? this.step.gate
			: validity.kind === 'while'
				? undefined
				: validity.until;
	}

	get isWatch(): boolean {
		return this.step.validity.kind === 'watch';
	}

	ranOut(at: Millis): boolean {
		return this.entry !== undefined && at >= this.entry.observed + this.life;
	}

	/** Standing, waiting or not asked for: good enough for what relies on it to stay as it is. */
	get up(): boolean {
		return this.status.state === 'stands' || this.status.state === 'waits' || this.status.state === 'not applicable';
	}

	take(entry: EntryFact, inheritsSpentAge: boolean): void {
		const gapBefore = this.#gapThatNeedsFlow(entry);
		this.entry = entry;
		this.spent = inheritsSpentAge;
		if (entry.outcome !== 'pass' && entry.outcome !== 'fail') return;
		const rows =
			entry.rows.length === 0
				? this.#rows.map((row) => ({ row, passes: entry.outcome === 'pass', observed: entry.observed }))
				: entry.rows;
		for (const { row, passes, observed } of rows) {
			const oldest = entry.rows.length === 0 ? entry.oldest : Math.min(observed, entry.observed);
			this.#pieces.set(row, { entry, passes, observed, oldest });
		}
		if (gapBefore) this.break(entry.observed, { kind: 'flow not shown', entry: entry.id });
		if (entry.outcome === 'pass') this.everPassed = true;
	}

	/** A passing reading closes a watch gap only with an unbroken flow trend, where the procedure asks for one (ST6). */
	#gapThatNeedsFlow(next: EntryFact): boolean {
		const { validity } = this.step;
		if (validity.kind !== 'watch' || validity.gapNeedsFlow !== true || this.entry === undefined) return false;
		const gap = this.status.state === 'lapsed' || next.observed >= this.entry.observed + this.life;
		return gap && next.flow !== 'unbroken';
	}

	/** Breaks what stands, for good: it must be observed again. */
	break(at: Millis, cause: InnerCause): void {
		for (const piece of this.#pieces.values()) if (piece.passes) piece.broken ??= { at, cause };
	}

	/** Plant events, findings, changed points and age, as far as they have come to pass (ST2, ST4, ST7). */
	wear(now: Millis, facts: Facts): void {
		for (const [row, piece] of this.#pieces) {
			if (!piece.passes || piece.broken !== undefined) continue;
			const cause = this.#wornBy(piece, row === '' ? undefined : row, now, facts);
			if (cause !== undefined) piece.broken = cause;
		}
		const agesNow = Math.min(now, facts.agesUntil);
		if (this.entry?.outcome === 'pass' && !this.isWatch && !this.spent && this.ranOut(agesNow)) {
			const since = this.entry.observed + this.life;
			this.break(since, { kind: 'age', minutes: this.life / MINUTE, since });
		}
	}

	#wornBy(piece: Piece, row: string | undefined, now: Millis, facts: Facts): Piece['broken'] {
		for (const fact of facts.plantEvents) {
			if (fact.begin > now || piece.oldest >= fact.voidsBefore) continue;
			if (!this.step.lapsedBy.some((by: LapsedBy) => lapses(fact, by, row))) continue;
			const { event, what, item, begin, end } = fact;
			return { at: Math.max(begin, piece.observed), cause: { kind: 'plant event', event, what, item, begin, end } };
		}
		const instruments = piece.entry.instruments ?? this.step.instruments;
		for (const finding of facts.findings) {
			const { event, instrument, lastGood } = finding;
			const cause: InnerCause = { kind: 'instrument finding', event, instrument, lastGood };
			if (this.step.checks === instrument) {
				if (piece.observed <= finding.observed && finding.observed <= now) return { at: finding.observed, cause };
			} else if (instruments.includes(instrument) && voids(finding, piece.entry)) return { at: piece.observed, cause };
		}
		for (const { event, point, at } of facts.pointsChanged)
			if (at <= now && piece.observed < at && piece.entry.readings.some((reading) => reading.point === point))
				return { at, cause: { kind: 'measuring point changed', event, point } };
		return undefined;
	}

	/** The state at an instant, after everything that breaks was applied. */
	settle(now: Millis, facts: Facts, waitsFor: readonly string[]): void {
		if (this.required) this.status = this.#state(now, facts, waitsFor);
	}

	#state(now: Millis, facts: Facts, waitsFor: readonly string[]): TrackStatus {
		const { entry } = this;
		if (entry === undefined) return NOT_YET;
		const status = (
			state: TrackState,
			since: Millis,
			why: readonly InnerCause[],
			more?: Partial<TrackStatus>,
		): TrackStatus => ({ state, since, why, gap: false, rows: [], ...more });
		switch (entry.outcome) {
			case 'fail':
				return status('failed', entry.observed, [{ kind: 'outcome', entry: entry.id, outcome: 'fail' }], {
					rows: this.#rowsThat((piece) => piece?.passes !== true),
				});
			case 'not applicable':
				if (entry.agreed !== undefined && entry.agreed <= now) return status('not applicable', entry.agreed, []);
				return status(this.everPassed ? 'lapsed' : 'not yet', entry.observed, [
					{ kind: 'not agreed', entry: entry.id },
				]);
			case 'try':
			case 'cannot do':
				return status(
					this.everPassed ? 'lapsed' : 'not yet',
					entry.observed,
					[{ kind: 'outcome', entry: entry.id, outcome: entry.outcome }],
					{ gap: this.isWatch },
				);
			case 'pass':
				return this.#stateOfProof(entry, now, facts, waitsFor, status);
		}
	}

	#stateOfProof(
		entry: EntryFact,
		now: Millis,
		facts: Facts,
		waitsFor: readonly string[],
		status: (state: TrackState, since: Millis, why: readonly InnerCause[], more?: Partial<TrackStatus>) => TrackStatus,
	): TrackStatus {
		const failing = this.#rowsThat((piece) => piece?.passes === false);
		if (failing.length > 0)
			return status('failed', entry.observed, [{ kind: 'rows missing', rows: failing }], { rows: failing });
		const missing = this.#rowsThat((piece) => piece === undefined);
		if (missing.length > 0)
			return status('not yet', entry.observed, [{ kind: 'rows missing', rows: missing }], { rows: missing });
		const broken = [...this.#pieces.values()].flatMap((piece) => piece.broken ?? []);
		if (broken.length > 0) {
			const rows = this.#rowsThat((piece) => piece?.broken !== undefined);
			const causes = new Map(broken.map(({ cause }) => [JSON.stringify(cause), cause]));
			const since = Math.min(...broken.map(({ at }) => at));
			return status('lapsed', since, [...causes.values()], {
				gap: this.isWatch,
				rows: rows.length === this.#rows.length ? [] : rows,
			});
		}
		if (this.isWatch && !this.spent && this.ranOut(Math.min(now, facts.agesUntil))) {
			const since = entry.observed + this.life;
			return status('lapsed', since, [{ kind: 'watch gap', minutes: this.life / MINUTE, since: entry.observed }], {
				gap: true,
			});
		}
		if (waitsFor.length > 0)
			return status(
				'waits',
				entry.observed,
				waitsFor.map((step) => ({ kind: 'relies on', step })),
			);
		return status('stands', entry.observed, []);
	}

	#rowsThat(holds: (piece: Piece | undefined) => boolean): readonly string[] {
		return this.#rows.filter((row) => row !== '' && holds(this.#pieces.get(row)));
	}
}

const NOT_YET: TrackStatus = {
	state: 'not yet',
	since: undefined,
	why: [{ kind: 'not proved' }],
	gap: false,
	rows: [],
};
