import { fail, ok, type Result } from '../base';
import { fromPem, readCertificate } from '../identity';
import { printInstant } from '../record';
import type { Store } from '../store';
import type { CheckedFile, FileToCheck } from './check-file';
import type { Clock } from './clock';
import type { Problem } from './problem';
import { startCheckWorker } from './start-check-worker';

type Bytes = Uint8Array<ArrayBuffer>;
type Progress = { readonly done: number; readonly all: number; readonly name: string };
type Brought = { readonly name: string; readonly arrayBuffer: () => Promise<ArrayBuffer> };
export type Checked = { readonly name: string; readonly report: CheckedFile };
type Answer = CheckedFile | { readonly stopped: string };

/** The site root that a judgement trusts: this tablet's own, or one that came by a file. */
export type TrustedRoot = {
	readonly name: string;
	/** SHA-256 of the certificate, to be compared with what the site says by another way. */
	readonly fingerprint: string;
	readonly own: boolean;
	readonly der: Bytes;
};

/** Files brought to be verified: one after the other beside the page, with a count, and to be stopped at any time. */
export class Archive {
	readonly #store: Store;
	readonly #clock: Clock;
	#checked = $state.raw<readonly Checked[]>([]);
	#progress = $state.raw<Progress>();
	/** Files that no judgement could be made of: the reader itself stopped. */
	#unread = $state.raw<readonly string[]>([]);
	/** Files that were left when somebody stopped the work. */
	#left = $state.raw(0);
	#given = $state.raw<TrustedRoot>();
	#own = $state.raw<TrustedRoot>();
	#worker: Worker | undefined;
	#brought: readonly Brought[] = [];

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

	get left(): number {
		return this.#left;
	}

	get root(): TrustedRoot | undefined {
		return this.#given ?? this.#own;
	}

	get ownRoot(): TrustedRoot | undefined {
		return this.#own;
	}

	async readOwnRoot(): Promise<Result<'read', Problem>> {
		const kept = await this.#store.site.read('root certificate');
		if (!kept.ok) return kept;
		this.#own = kept.value === undefined ? undefined : rootOf(kept.value, { own: true });
		return ok('read');
	}

	/** Judges by a root that came as a file, PEM or DER; what was judged before is judged again. */
	async trust(file: Brought): Promise<Result<'trusted', Problem>> {
		const bytes = new Uint8Array(await file.arrayBuffer());
		const pem = fromPem(bytes);
		const root = rootOf(pem.ok ? pem.value : bytes, { own: false });
		if (root === undefined) return fail({ kind: 'no-root-in-file', name: file.name });
		this.#given = root;
		await this.#again();
		return ok('trusted');
	}

	async trustOwn(): Promise<void> {
		this.#given = undefined;
		await this.#again();
	}

	async check(files: readonly Brought[]): Promise<void> {
		this.cancel();
		this.#checked = [];
		this.#unread = [];
		this.#left = 0;
		this.#brought = files;
		const worker = startCheckWorker();
		this.#worker = worker;
		await this.readOwnRoot();
		for (const [done, file] of files.entries()) {
			if (this.#worker !== worker) return;
			this.#progress = { done, all: files.length, name: file.name };
			const report = await this.#judge(worker, file);
			if (this.#worker !== worker) return;
			if ('stopped' in report) this.#unread = [...this.#unread, file.name];
			else this.#checked = [...this.#checked, { name: file.name, report }];
		}
		this.cancel();
	}

	/** What was judged so far stays. */
	cancel(): void {
		this.#worker?.terminate();
		this.#worker = undefined;
		if (this.#progress !== undefined) this.#left = this.#progress.all - this.#checked.length - this.#unread.length;
		this.#progress = undefined;
	}

	async #again(): Promise<void> {
		if (this.#brought.length > 0) await this.check(this.#brought);
	}

	async #judge(worker: Worker, file: Brought): Promise<Answer> {
		let bytes: Bytes;
		try {
			bytes = new Uint8Array(await file.arrayBuffer());
		} catch (thrown) {
			// The file was moved or taken away since it was chosen.
			return { stopped: String(thrown) };
		}
		return ask(worker, {
			name: file.name,
			bytes,
			root: this.root?.der,
			now: printInstant(this.#clock.now(), 0),
		});
	}
}

function rootOf(der: Bytes, { own }: { readonly own: boolean }): TrustedRoot | undefined {
	const certificate = readCertificate(der);
	if (!certificate.ok || certificate.value.subject.kind !== 'authority') return undefined;
	const { subject, fingerprint } = certificate.value;
	return { name: subject.name, fingerprint, own, der };
}

/** A worker that is stopped answers nothing more; whoever waits for it waits in vain and has gone on already. */
const ask = (worker: Worker, file: FileToCheck): Promise<Answer> =>
	new Promise((resolve) => {
		worker.onmessage = ({ data }: MessageEvent<Answer>) => resolve(data);
		worker.onerror = ({ message }) => resolve({ stopped: message });
		worker.postMessage(file);
	});
