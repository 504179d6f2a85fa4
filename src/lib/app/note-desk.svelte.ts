import type { Problem } from './problem';
import { note } from './entries';
import type { OpenStartUp } from './open-start-up.svelte';

/** A note apart from any step, as it is being written: kept with every letter, gone from here once it is in the record. */
export class NoteDesk {
	readonly #startUp: OpenStartUp;
	#text = $state('');
	#problem = $state.raw<Problem>();
	#busy = $state(false);
	#saving: Promise<unknown> = Promise.resolve();

	constructor(startUp: OpenStartUp) {
		this.#startUp = startUp;
		this.#saving = this.#takeUp();
	}

	get text(): string {
		return this.#text;
	}

	get problem(): Problem | undefined {
		return this.#problem;
	}

	get canSave(): boolean {
		return !this.#busy && this.#text.trim() !== '';
	}

	type(text: string): void {
		this.#text = text;
		this.#problem = undefined;
		const { tablet } = this.#startUp;
		const row = { ...this.#key(), typed: text, saved: this.#startUp.instant(tablet.clock.now()) };
		this.#saving = this.#saving
			.then(() => tablet.store.drafts.save(row))
			.then((kept) => {
				if (!kept.ok) this.#problem = kept.error;
			});
	}

	async save(): Promise<boolean> {
		if (!this.canSave) return false;
		this.#busy = true;
		await this.#saving;
		const written = await note(this.#startUp, { text: this.#text.trim() });
		if (written.ok) {
			await this.#startUp.tablet.store.drafts.drop(this.#key());
			this.#text = '';
		}
		this.#problem = written.ok ? undefined : written.error;
		this.#busy = false;
		return written.ok;
	}

	async #takeUp(): Promise<void> {
		const kept = await this.#startUp.tablet.store.drafts.read(this.#key());
		if (kept.ok && typeof kept.value?.typed === 'string' && this.#text === '') this.#text = kept.value.typed;
	}

	#key() {
		return { startUp: this.#startUp.id, step: 'note', person: this.#startUp.tablet.person?.person ?? '' };
	}
}
