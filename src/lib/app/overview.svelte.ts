import type { StartUp } from '../store';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';
import type { ThisTablet } from './this-tablet.svelte';

/** One start-up of a list: what is known at once, and the start-up itself when it has been opened, or why it was not. */
export type Listed = StartUp & { readonly startUp?: OpenStartUp; readonly problem?: Problem };

/** Start-ups of this tablet in a list, opened one after the other, so that the first is seen while others are still read. */
export class Overview {
	readonly #here: ThisTablet;
	#opened = $state.raw<{ readonly [id: string]: Pick<Listed, 'startUp' | 'problem'> }>({});

	constructor(here: ThisTablet) {
		this.#here = here;
	}

	/** Running ones first, sealed ones after them; both newest first. */
	readonly listed: readonly Listed[] = $derived.by(() => {
		const all = this.#here.startUps.map((row) => ({ ...row, ...this.#opened[row.id] }));
		return [...all.filter(({ sealed }) => !sealed), ...all.filter(({ sealed }) => sealed)];
	});

	get running(): readonly Listed[] {
		return this.listed.filter(({ sealed }) => !sealed);
	}

	/** Opens those that are listed and not open yet, as many as are shown. */
	async open(ids: readonly string[]): Promise<void> {
		for (const id of ids) {
			if (this.#opened[id] !== undefined) continue;
			const startUp = await this.#here.startUp(id);
			this.#opened = {
				...this.#opened,
				[id]: startUp.ok ? { startUp: startUp.value } : { problem: startUp.error },
			};
		}
	}
}
