import { ok, type Result } from '../base';
import type { Plant } from '../plant';
import { libraryFor, type Procedure } from '../procedure';
import { printInstant, type RecordEvent } from '../record';
import { approveProcedure, findingsAgainst, isApproved, openNewStartUp } from './new-start-up';
import { plantOn } from './plant-book.svelte';
import type { Problem } from './problem';
import { SITE_LOG, type Tablet } from './tablet.svelte';

/** A start-up while it is being opened: on which plant, by which procedure, of what kind. Typed words outlive a reload. */
export class OpenDesk {
	readonly #tablet: Tablet;
	readonly plant: Plant;
	readonly procedure: Procedure;
	#site = $state.raw<readonly RecordEvent[]>([]);
	#startType = $state<string>();
	#title = $state('');
	problem = $state.raw<Problem>();
	busy = $state(false);

	private constructor(tablet: Tablet, plant: Plant, procedure: Procedure) {
		this.#tablet = tablet;
		this.plant = plant;
		this.procedure = procedure;
	}

	static async open(tablet: Tablet): Promise<Result<OpenDesk, Problem>> {
		const plant = await plantOn(tablet);
		if (!plant.ok) return plant;
		const [procedure] = libraryFor(plant.value);
		if (procedure === undefined) throw new Error('the library is empty');
		const desk = new OpenDesk(tablet, plant.value, procedure);
		const draft = await tablet.store.drafts.read(KEY);
		if (draft.ok && draft.value !== undefined) {
			const typed = draft.value.typed as { readonly title: string; readonly startType?: string };
			desk.#title = typed.title;
			desk.#startType = typed.startType;
		}
		return desk.#look();
	}

	async #look(): Promise<Result<OpenDesk, Problem>> {
		const site = await this.#tablet.store.events.readLog(SITE_LOG);
		if (!site.ok) return site;
		this.#site = site.value.events;
		return ok(this);
	}

	get startType(): string | undefined {
		return this.#startType;
	}

	set startType(startType: string | undefined) {
		this.#startType = startType;
		void this.#keep();
	}

	get title(): string {
		return this.#title;
	}

	set title(title: string) {
		this.#title = title;
		void this.#keep();
	}

	/** How many steps a kind of start asks for. */
	stepsOf(startType: string): number {
		const without = this.procedure.startTypes.find(({ id }) => id === startType)?.without ?? [];
		return this.procedure.steps.length - without.length;
	}

	/** Items of the plant description that are still the demonstration's: the lowest gate waits for them. */
	get left(): number {
		return this.plant.copied?.toReplace.length ?? 0;
	}

	get isApproved(): boolean {
		return this.plant.demonstration || isApproved(this.procedure, this.#site);
	}

	get findings(): number {
		return findingsAgainst(this.procedure, this.plant).length;
	}

	get isReady(): boolean {
		return this.#startType !== undefined && this.#title.trim() !== '' && this.isApproved && this.findings === 0;
	}

	async approve(pin: string): Promise<void> {
		const { plant, procedure } = this;
		await this.#do(approveProcedure(this.#tablet, { plant, procedure, pin }));
		await this.#look();
	}

	/** @returns the id of the start-up that was opened */
	async openNew(pin: string): Promise<string | undefined> {
		const { plant, procedure, title } = this;
		const startType = this.#startType ?? '';
		const present = this.#tablet.person === undefined ? [] : [this.#tablet.person.person];
		const opened = await this.#do(openNewStartUp(this.#tablet, { plant, procedure, startType, title, present }, pin));
		if (opened === undefined) return undefined;
		await this.#tablet.store.drafts.drop(KEY);
		return opened;
	}

	async #do<T>(act: Promise<Result<T, Problem>>): Promise<T | undefined> {
		this.busy = true;
		const done = await act;
		this.busy = false;
		this.problem = done.ok ? undefined : done.error;
		return done.ok ? done.value : undefined;
	}

	async #keep(): Promise<void> {
		const typed = { title: this.#title, ...(this.#startType === undefined ? {} : { startType: this.#startType }) };
		const saved = printInstant(this.#tablet.clock.now(), 0);
		const kept = await this.#tablet.store.drafts.save({ ...KEY, typed, saved });
		if (!kept.ok) this.problem = kept.error;
	}
}

const KEY = { startUp: 'new', step: 'start-up', person: '' } as const;
