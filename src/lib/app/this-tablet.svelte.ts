import { fail, ok, type Result } from '../base';
import { printInstant } from '../record';
import { openStore, type StartUp, type StorageError, type Store } from '../store';
import type { Clock } from './clock';
import { playDemonstration, type ReadFile } from './demonstration';
import { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';
import { Tablet } from './tablet.svelte';
import { OWN_SITE, shownStorage } from './which-storage';

/** The app as it runs in this tab: the storage, the tablet once it has a site, and the start-ups that are open. */
export class ThisTablet {
	readonly store: Store;
	readonly clock: Clock;
	/** Whether what is shown is the tablet's own site, and no demonstration. */
	readonly isOwn: boolean;
	#tablet = $state.raw<Tablet>();
	#startUps = $state.raw<readonly StartUp[]>([]);
	#closed = $state.raw(false);
	readonly #open: Record<string, Promise<Result<OpenStartUp, Problem>>> = {};

	private constructor(store: Store, clock: Clock, isOwn: boolean) {
		this.isOwn = isOwn;
		this.store = store;
		this.clock = clock;
		store.onClosed(() => (this.#closed = true));
	}

	/** @param memory remembers which of a tablet's storages is shown: the demonstration's, or that of a site of its own */
	static async open(
		clock: Clock,
		memory: Pick<Storage, 'getItem' | 'setItem'>,
	): Promise<Result<ThisTablet, StorageError>> {
		const storage = shownStorage(memory);
		const store = await openStore(storage, { now: printInstant(clock.now(), 0) });
		return store.ok ? ok(await ThisTablet.on(store.value, clock, storage === OWN_SITE)) : store;
	}

	/** On a storage that is open. */
	static async on(store: Store, clock: Clock, isOwn = false): Promise<ThisTablet> {
		const here = new ThisTablet(store, clock, isOwn);
		await here.lookAgain();
		void store.reserve.keep();
		return here;
	}

	/** Absent on a tablet that belongs to no site yet. */
	get tablet(): Tablet | undefined {
		return this.#tablet;
	}

	/** Newest first. */
	get startUps(): readonly StartUp[] {
		return this.#startUps;
	}

	/** The storage was taken away under this tab: nothing more can be saved until it is loaded again. */
	get isClosed(): boolean {
		return this.#closed;
	}

	async lookAgain(): Promise<void> {
		const startUps = await this.store.events.listStartUps();
		if (startUps.ok) this.#startUps = startUps.value;
		if (this.#tablet !== undefined) return;
		const tablet = await Tablet.open(this.store, this.clock);
		if (tablet.ok) this.#tablet = tablet.value;
	}

	/** One object for a start-up, whatever page asks for it: shifts and what can be taken back live as long as the tab. */
	startUp(id: string): Promise<Result<OpenStartUp, Problem>> {
		const { tablet } = this;
		if (tablet === undefined) return Promise.resolve(fail({ kind: 'no-site' }));
		const opened = this.#open[id] ?? OpenStartUp.open(tablet, id);
		this.#open[id] = opened;
		return opened;
	}

	async startDemonstration(
		read: ReadFile,
		progress: Parameters<typeof playDemonstration>[3],
	): Promise<Result<string, Problem>> {
		const played = await playDemonstration(this.store, this.clock, read, progress);
		await this.lookAgain();
		return played;
	}
}
