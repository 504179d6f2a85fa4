import type { Store } from '../store';
import type { Clock } from './clock';
import { printInstant } from '../record';
import type { CheckedFile, FileToCheck } from './check-file';
import { startCheckWorker } from './start-check-worker';

type Progress = { readonly done: number; readonly all: number; readonly name: string };
export type Checked = { readonly name: string; readonly report: CheckedFile };
type Answer = CheckedFile | { readonly stopped: string };

/** Files brought to be verified: one after the other beside the page, with a count, and to be stopped at any time. */
export class Archive {
	readonly #store: Store;
	readonly #clock: Clock;
	#checked = $state.raw<readonly Checked[]>([]);
	#progress = $state.raw<Progress>();
	/** Files that no judgement could be made of: the reader itself stopped. */
	#unread = $state.raw<readonly string[]>([]);
	#worker: Worker | undefined;

	constructor(store: Store, clock: Clock) {
		this.#store = store;
		this.#clock = clock;
	}

	get checked(): readonly Checked[] {
		return this.#checked;
	}

	get progress(): Progress | undefined {
		return this.#progress;
	}

	get unread(): readonly string[] {
		return this.#unread;
	}

	async check(
		files: readonly { readonly name: string; readonly arrayBuffer: () => Promise<ArrayBuffer> }[],
	): Promise<void> {
		this.cancel();
		this.#checked = [];
		this.#unread = [];
		const worker = startCheckWorker();
		this.#worker = worker;
		const root = await this.#store.site.read('root certificate');
		for (const [done, file] of files.entries()) {
			if (this.#worker !== worker) return;
			this.#progress = { done, all: files.length, name: file.name };
			const report = await ask(worker, {
				name: file.name,
				bytes: new Uint8Array(await file.arrayBuffer()),
				root: root.ok ? root.value : undefined,
				now: printInstant(this.#clock.now(), 0),
			});
			if (this.#worker !== worker) return;
			if ('stopped' in report) this.#unread = [...this.#unread, file.name];
			else this.#checked = [...this.#checked, { name: file.name, report }];
		}
		this.cancel();
	}

	cancel(): void {
		this.#worker?.terminate();
		this.#worker = undefined;
		this.#progress = undefined;
	}
}

/** A worker that is stopped answers nothing more; whoever waits for it waits in vain and has gone on already. */
const ask = (worker: Worker, file: FileToCheck): Promise<Answer> =>
	new Promise((resolve) => {
		worker.onmessage = ({ data }: MessageEvent<Answer>) => resolve(data);
		worker.onerror = ({ message }) => resolve({ stopped: message });
		worker.postMessage(file);
	});
