import { ok, type Json, type Result } from '../base';
import type { DraftKey } from '../store';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';

/** What is half typed on a sheet that is no step. It is kept with every change, and belongs to whom typed it. */
export class SheetDraft<T extends object> {
	readonly #startUp: OpenStartUp;
	readonly #key: DraftKey;
	#typed = $state.raw<Partial<T>>({});
	#saving: Promise<unknown> = Promise.resolve();

	private constructor(startUp: OpenStartUp, key: DraftKey, typed: Partial<T>) {
		this.#startUp = startUp;
		this.#key = key;
		this.#typed = typed;
	}

	/** @param sheet its name among the drafts: "hand-over" */
	static async open<T extends object>(startUp: OpenStartUp, sheet: string): Promise<Result<SheetDraft<T>, Problem>> {
		const key = { startUp: startUp.id, step: sheet, person: startUp.tablet.person?.person ?? '' };
		const kept = await startUp.tablet.store.drafts.read(key);
		if (!kept.ok) return kept;
		return ok(new SheetDraft<T>(startUp, key, (kept.value?.typed ?? {}) as Partial<T>));
	}

	get typed(): Partial<T> {
		return this.#typed;
	}

	type(typed: Partial<T>): void {
		this.#typed = typed;
		const { store, clock } = this.#startUp.tablet;
		const row = { ...this.#key, typed: typed as unknown as Json, saved: this.#startUp.instant(clock.now()) };
		this.#saving = this.#saving.then(() => store.drafts.save(row));
	}

	/** It was signed, or given up. */
	async drop(): Promise<void> {
		this.#typed = {};
		await this.#saving;
		await this.#startUp.tablet.store.drafts.drop(this.#key);
	}
}
