import type { Clock } from './clock';

/**
 * A new version of the app. It waits while a start-up is open in any tab, and is loaded when a person says so: nobody's work
 * is changed under their hands.
 */
export class AppUpdate {
	readonly #locks: LockManager | undefined;
	#waiting = $state.raw<ServiceWorker>();
	#isHeld = $state(false);

	constructor(clock: Clock, container: ServiceWorkerContainer | undefined, locks: LockManager | undefined) {
		this.#locks = locks;
		if (container === undefined) return;
		let hasVersion = container.controller !== null;
		// Some tab consented: every tab goes on in the new version, on the page where it is. The first version comes quietly.
		container.addEventListener('controllerchange', () => {
			if (hasVersion) location.reload();
			hasVersion = true;
		});
		void container.ready.then((registration) => {
			this.#look(registration);
			registration.addEventListener('updatefound', () => {
				const { installing } = registration;
				installing?.addEventListener('statechange', () => this.#look(registration));
			});
			// A tablet stays open for weeks. Without network nothing is found, and nothing is lost.
			clock.every(HOUR, () => void registration.update().catch(() => undefined));
		});
	}

	get isReady(): boolean {
		return this.#waiting !== undefined;
	}

	/** Consent was given while a start-up was open in some tab: it waits on. */
	get isHeld(): boolean {
		return this.#isHeld;
	}

	async load(): Promise<void> {
		const waiting = this.#waiting;
		if (waiting === undefined) return;
		if (this.#locks === undefined) {
			waiting.postMessage(TAKE_OVER);
			return;
		}
		await this.#locks.request(RECORD, { mode: 'exclusive', ifAvailable: true }, async (lock) => {
			this.#isHeld = lock === null;
			if (lock === null) return;
			waiting.postMessage(TAKE_OVER);
			// No start-up is opened until the page is gone.
			await new Promise((resolve) => setTimeout(resolve, 10_000));
		});
	}

	#look({ waiting }: ServiceWorkerRegistration): void {
		this.#waiting = waiting ?? undefined;
	}
}

const RECORD = 'gatehold: a start-up is open';
/** The service worker knows the same word. */
const TAKE_OVER = 'take over';
const HOUR = 3_600_000;

/** While a start-up is shown in this tab, no tab changes to a new version. @returns what lets go */
export function holdRecord(locks: LockManager | undefined): () => void {
	let letGo = (): void => undefined;
	const shown = new Promise<void>((resolve) => (letGo = resolve));
	void locks?.request(RECORD, { mode: 'shared' }, () => shown);
	return () => letGo();
}
