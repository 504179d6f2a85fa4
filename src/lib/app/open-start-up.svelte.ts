import { fail, ok, type Result } from '../base';
import { parsePlant, type Plant } from '../plant';
import { parseProcedure, type Procedure, type Step } from '../procedure';
import {
	allOf,
	parseEventLine,
	printEventLine,
	printInstant,
	standing,
	type BodyOf,
	type Draft,
	type EventKind,
	type EventOf,
	type RecordEvent,
	type Standing,
} from '../record';
import type { Draft as KeptDraft } from '../store';
import type { ShiftState } from './shifts.svelte';
import { signOn, writeEvent, type Signer } from './logbook';
import type { Problem } from './problem';
import { SITE_LOG, type Tablet, type TabletPerson } from './tablet.svelte';
import { NO_TRENDS, trendsOf, type Trends } from './trend-files';

/** Written durably and shown as saved, but for a few seconds still to be taken back. */
export type Held = { readonly event: RecordEvent; readonly until: number };

export type Seen = {
	readonly observed?: string;
	/** Who signs, when it is not who holds the tablet. */
	readonly by?: TabletPerson;
};

const TAKE_BACK = 10_000;
const TICK = 10_000;

/** One start-up as it is open on this tablet: its record, what stands by it now, and the writing of what comes next. */
export class OpenStartUp {
	readonly id: string;
	readonly tablet: Tablet;
	readonly procedure: Procedure;
	readonly plant: Plant;
	readonly opened: EventOf<'start-up opened'>;
	#log = $state.raw<readonly RecordEvent[]>([]);
	#site = $state.raw<readonly RecordEvent[]>([]);
	#trends = $state.raw(NO_TRENDS);
	#held = $state.raw<Held>();
	#now = $state.raw(0);
	#saved = $state.raw<string>();
	#stops: (() => void)[] = [];
	#letGo: (() => void) | undefined;
	#keeping: Promise<Result<'kept', Problem>> | undefined;

	/** Everything that this tablet knows of the start-up, what may still be taken back included. */
	readonly events: readonly RecordEvent[] = $derived(
		this.#held === undefined ? this.#log : [...this.#log, this.#held.event],
	);
	readonly standing: Standing = $derived.by(() => this.standingAt(this.instant()));

	private constructor(tablet: Tablet, opened: EventOf<'start-up opened'>, procedure: Procedure, plant: Plant) {
		this.id = opened.log;
		this.tablet = tablet;
		this.opened = opened;
		this.procedure = procedure;
		this.plant = plant;
		this.#now = tablet.clock.now();
	}

	static async open(tablet: Tablet, id: string): Promise<Result<OpenStartUp, Problem>> {
		const read = await tablet.store.events.readLog(id);
		if (!read.ok) return read;
		const opened = allOf(read.value.events, 'start-up opened')[0];
		if (opened === undefined) return fail({ kind: 'no-such-start-up', startUp: id });
		const procedure = parseProcedure(opened.body.documents?.procedure);
		const plant = parsePlant(opened.body.documents?.plant);
		if (!procedure.ok) return fail({ kind: 'start-up-unreadable', startUp: id, what: 'procedure' });
		if (!plant.ok) return fail({ kind: 'start-up-unreadable', startUp: id, what: 'plant description' });
		const startUp = new OpenStartUp(tablet, opened, procedure.value, plant.value);
		await startUp.#takeUpHeld();
		const loaded = await startUp.reload();
		if (!loaded.ok) return loaded;
		startUp.#watch();
		return ok(startUp);
	}

	close(): void {
		this.#letGo?.();
		for (const stop of this.#stops) stop();
		this.#stops = [];
	}

	/** The tablet that it is open on. */
	get device(): string {
		return this.tablet.device;
	}

	get log(): readonly RecordEvent[] {
		return this.#log;
	}

	get siteLog(): readonly RecordEvent[] {
		return this.#site;
	}

	get trends(): Trends {
		return this.#trends;
	}

	/** What can still be taken back. */
	get held(): Held | undefined {
		return this.#held;
	}

	/** When something was last made durable, in this session. */
	get saved(): string | undefined {
		return this.#saved;
	}

	/**
	 * The moment that is shown, in milliseconds: whole seconds, as everything is judged and printed by. What happened "just now"
	 * would else have happened after the moment that is judged.
	 */
	get now(): number {
		return wholeSecond(this.#now);
	}

	get isSealed(): boolean {
		return this.standing.sealed !== undefined;
	}

	/** Now, or a moment of the clock, as plant local time. */
	instant(at = this.#now): string {
		return printInstant(wholeSecond(at), this.plant.utcOffsetMinutes);
	}

	standingAt(instant: string): Standing {
		return standing(this.procedure, this.events, this.#site, instant);
	}

	stepOf(id: string): Result<Step, Problem> {
		const step = this.procedure.steps.find((one) => one.id === id);
		return step === undefined ? fail({ kind: 'no-such-step', step: id }) : ok(step);
	}

	/** The certificate and the shift of who holds the tablet: entries are signed with the shift's key. */
	entrySigner(): Result<Signer, Problem> {
		const { person } = this.tablet;
		if (person === undefined) return fail({ kind: 'nobody-chosen' });
		const shift = this.tablet.shifts.signerOf(person.person, this.id);
		if (shift !== undefined) return ok(shift);
		const isOver = this.shiftState === 'none';
		return fail({ kind: isOver ? 'no-shift' : 'shift-covered', person: person.name });
	}

	/** Of who holds the tablet, in this start-up. */
	get shiftState(): ShiftState {
		const { person } = this.tablet;
		return person === undefined ? 'none' : this.tablet.shifts.stateOf(person.person, this.id);
	}

	draft<K extends EventKind>(kind: K, body: BodyOf<K>, seen: Seen = {}): Result<Draft<K>, Problem> {
		const { device, clock } = this.tablet;
		const person = seen.by ?? this.tablet.person;
		if (person === undefined) return fail({ kind: 'nobody-chosen' });
		if (this.isSealed && !MAY_FOLLOW_SEAL.has(kind)) return fail({ kind: 'sealed', startUp: this.id });
		const entered = this.instant(clock.now());
		const { observed } = seen;
		return ok({
			log: SITE_KINDS.has(kind) ? SITE_LOG : this.id,
			kind,
			body,
			person: person.person,
			device,
			entered,
			certificate: person.certificate.fingerprint,
			...(observed === undefined || observed === entered ? {} : { observed }),
		});
	}

	/** Signs and keeps an event now. What could still be taken back is kept first, so that the order stays as it happened. */
	async write<K extends EventKind>(
		kind: K,
		body: BodyOf<K>,
		signer: Signer,
		seen?: Seen,
	): Promise<Result<EventOf<K>, Problem>> {
		const flushed = await this.keepHeld();
		if (!flushed.ok) return flushed;
		const draft = this.draft(kind, body, seen);
		if (!draft.ok) return draft;
		const written = await writeEvent(this.tablet.store, draft.value, signer);
		if (written.ok) await this.#wasSaved();
		return written;
	}

	/** Signs an event and keeps it so that it can be taken back for ten seconds; then it is part of the record. */
	async hold<K extends EventKind>(kind: K, body: BodyOf<K>, seen?: Seen): Promise<Result<'saved', Problem>> {
		const signer = this.entrySigner();
		if (!signer.ok) return signer;
		const flushed = await this.keepHeld();
		if (!flushed.ok) return flushed;
		const draft = this.draft(kind, body, seen);
		if (!draft.ok) return draft;
		const event = await signOn(this.#log, draft.value, signer.value);
		const kept = await this.tablet.store.drafts.save(this.#heldDraft(event));
		if (!kept.ok) return kept;
		const { clock } = this.tablet;
		this.#held = { event, until: clock.now() + TAKE_BACK };
		this.#letGo = clock.after(TAKE_BACK, () => void this.keepHeld());
		await this.#wasSaved();
		return ok('saved');
	}

	/** Within ten seconds a slip of the finger is no entry. */
	async takeBack(): Promise<Result<'taken back' | 'nothing', Problem>> {
		if (this.#held === undefined) return ok('nothing');
		this.#letGo?.();
		const dropped = await this.tablet.store.drafts.drop(this.#heldKey());
		if (!dropped.ok) return dropped;
		this.#held = undefined;
		return ok('taken back');
	}

	/** What could still be taken back becomes part of the record. */
	keepHeld(): Promise<Result<'kept', Problem>> {
		// The ten seconds may run out while something else is saved: both wait for the one writing.
		this.#keeping ??= this.#writeHeld().finally(() => (this.#keeping = undefined));
		return this.#keeping;
	}

	async #writeHeld(): Promise<Result<'kept', Problem>> {
		const held = this.#held;
		if (held === undefined) return ok('kept');
		this.#letGo?.();
		const kept = await this.tablet.store.events.append(held.event, { draft: this.#heldKey() });
		const again = !kept.ok && kept.error.kind === 'chain-moved-on' ? await this.#signAgain(held.event) : kept;
		if (!again.ok) return again;
		this.#held = undefined;
		return this.reload();
	}

	async reload(): Promise<Result<'kept', Problem>> {
		const { store } = this.tablet;
		const [log, site] = await Promise.all([store.events.readLog(this.id), store.events.readLog(SITE_LOG)]);
		if (!log.ok) return log;
		if (!site.ok) return site;
		const { utcOffsetMinutes } = this.plant;
		this.#trends = await trendsOf(log.value.events, this.#trends, { store, utcOffsetMinutes });
		this.#log = log.value.events;
		this.#site = site.value.events;
		this.#now = this.tablet.clock.now();
		return ok('kept');
	}

	/** Another tab was faster: the same words are signed again on top of what it wrote. */
	async #signAgain(event: RecordEvent): Promise<Result<unknown, Problem>> {
		const signer = this.tablet.shifts.signerOf(event.person, this.id);
		if (signer === undefined) return fail({ kind: 'no-shift', person: event.person });
		const { log, kind, body, person, device, entered, observed, certificate } = event;
		const draft: Draft = {
			log,
			kind,
			body,
			person,
			device,
			entered,
			...(observed === undefined ? {} : { observed }),
			...(certificate === undefined ? {} : { certificate }),
		};
		return writeEvent(this.tablet.store, draft, signer, { draft: this.#heldKey() });
	}

	/** On reopening, what was saved and not taken back is kept: its signature was made before. */
	async #takeUpHeld(): Promise<void> {
		const { store } = this.tablet;
		const draft = await store.drafts.read(this.#heldKey());
		if (!draft.ok || draft.value === undefined) return;
		const event = parseEventLine((draft.value.typed as { readonly line: string }).line);
		if (!event.ok) return;
		const kept = await store.events.append(event.value, { draft: this.#heldKey() });
		if (!kept.ok) this.#held = { event: event.value, until: this.tablet.clock.now() };
	}

	#heldKey() {
		return { startUp: this.id, step: 'held', person: this.tablet.device };
	}

	#heldDraft(event: RecordEvent): KeptDraft {
		return { ...this.#heldKey(), typed: { line: printEventLine(event) }, saved: event.entered };
	}

	async #wasSaved(): Promise<void> {
		const { clock } = this.tablet;
		this.#saved = this.instant(clock.now());
		await this.reload();
	}

	/** The clock goes on, and what another tab writes is read. */
	#watch(): void {
		const { clock, store } = this.tablet;
		this.#stops.push(clock.every(TICK, () => (this.#now = clock.now())));
		this.#stops.push(
			store.events.watch(this.id, (events) => {
				if (events !== this.#log.length) void this.reload();
			}),
		);
	}
}

const wholeSecond = (at: number): number => Math.floor(at / 1000) * 1000;

/** What changes nothing of what stood at the seal; a finding stands in the site's log. */
const MAY_FOLLOW_SEAL: ReadonlySet<EventKind> = new Set([
	'addendum',
	'chain head',
	'copy made',
	'copy received',
	'instrument finding',
	'shift key',
]);
/** A finding is about the instrument, in every start-up. */
const SITE_KINDS: ReadonlySet<EventKind> = new Set(['instrument finding']);
