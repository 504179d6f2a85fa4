import { fail, ok, type Result } from '../base';
import { readCertificate, type Certificate, type Role, type SigningKey } from '../identity';
import type { GateKeyRow, Store, Tablet as KeptTablet } from '../store';
import type { Clock } from './clock';
import type { Signer } from './logbook';
import type { Problem } from './problem';

export type TabletPerson = {
	readonly person: string;
	readonly name: string;
	readonly roles: readonly Role[];
	readonly certificate: Certificate;
	/** False after the tenth wrong PIN: to be enrolled again, in person. */
	readonly hasKey: boolean;
};

export const SITE_LOG = 'site';

/** This tablet: who is enrolled on it, who holds it now, whose shift was begun, and whether its screen is blanked. */
export class Tablet {
	readonly store: Store;
	readonly clock: Clock;
	readonly device: string;
	readonly #kept: KeptTablet;
	#people = $state.raw<readonly TabletPerson[]>([]);
	#person = $state.raw<string>();
	#shifts = $state.raw<{ readonly [personAndLog: string]: Signer }>({});
	#lastTouch = $state.raw(0);
	#now = $state.raw(0);
	/** PIN of everybody on a demonstration, shown where people are. */
	readonly demonstrationPin: string | undefined;
	readonly #stop: () => void;

	private constructor(of: {
		readonly store: Store;
		readonly clock: Clock;
		readonly kept: KeptTablet;
		readonly people: readonly TabletPerson[];
		readonly settings: Settings;
	}) {
		this.store = of.store;
		this.clock = of.clock;
		this.#kept = of.kept;
		this.device = of.kept.device;
		this.#people = of.people;
		this.#person = of.people.some(({ person }) => person === of.settings.person) ? of.settings.person : undefined;
		this.demonstrationPin = of.settings.demonstrationPin;
		this.#lastTouch = this.#now = of.clock.now();
		this.#stop = of.clock.every(IDLE_LOOK, () => (this.#now = of.clock.now()));
	}

	static async open(store: Store, clock: Clock): Promise<Result<Tablet, Problem>> {
		const kept = await store.site.read('tablet');
		if (!kept.ok) return kept;
		if (kept.value === undefined) return fail({ kind: 'no-site' });
		const rows = await store.gateKeys.list();
		if (!rows.ok) return rows;
		const settings = await settingsOf(store);
		if (!settings.ok) return settings;
		const device = kept.value.device;
		const people = rows.value.filter((row) => row.device === device).flatMap(personOf);
		return ok(new Tablet({ store, clock, kept: kept.value, people, settings: settings.value }));
	}

	close(): void {
		this.#stop();
	}

	get people(): readonly TabletPerson[] {
		return this.#people;
	}

	/** Who holds the tablet now. */
	get person(): TabletPerson | undefined {
		return this.#people.find(({ person }) => person === this.#person);
	}

	/** Nobody touched it for a while: what it shows is covered, what was typed is kept. */
	get isBlank(): boolean {
		return this.#now - this.#lastTouch >= BLANK_AFTER;
	}

	get tabletKey(): SigningKey {
		return this.#kept.key;
	}

	touched(): void {
		this.#lastTouch = this.#now = this.clock.now();
	}

	/** Two taps: the tablet changes hands, and what was typed stays with whom it belongs to. */
	async choose(person: string): Promise<void> {
		this.#person = person;
		this.touched();
		await writeSettings(this.store, { person });
	}

	shiftOf(person: string, log: string): Signer | undefined {
		return this.#shifts[JSON.stringify([person, log])];
	}

	keepShift(person: string, log: string, signer: Signer): void {
		this.#shifts = { ...this.#shifts, [JSON.stringify([person, log])]: signer };
	}

	/** The gate key of a person, opened for one act. The try is counted before it is made. */
	async openKey(person: string, pin: string): Promise<Result<SigningKey, Problem>> {
		const opened = await this.store.gateKeys.open({ person, device: this.device, pin, now: this.clock.now() });
		if (!opened.ok && opened.error.kind === 'destroyed')
			this.#people = this.#people.map((one) => (one.person === person ? { ...one, hasKey: false } : one));
		return opened;
	}
}

/** record.md: the screen blanks after five minutes. */
const BLANK_AFTER = 5 * 60_000;
const IDLE_LOOK = 5_000;

function personOf({ certificate: der, gateKey }: GateKeyRow): readonly TabletPerson[] {
	const certificate = readCertificate(der);
	if (!certificate.ok || certificate.value.subject.kind !== 'person') return [];
	const { person, printedName: name, roles } = certificate.value.subject;
	return [{ person, name, roles, certificate: certificate.value, hasKey: gateKey !== undefined }];
}

export type Settings = {
	readonly person?: string;
	readonly demonstrationPin?: string;
	/** By how much the demonstration was moved in time, so that its supplied trends can follow. */
	readonly demonstrationShift?: number;
};

export async function settingsOf(store: Store): Promise<Result<Settings, Problem>> {
	const read = await store.site.read('settings');
	return read.ok ? ok((read.value ?? {}) as Settings) : read;
}

export async function writeSettings(store: Store, change: Settings): Promise<Result<'saved', Problem>> {
	const before = await settingsOf(store);
	if (!before.ok) return before;
	return store.site.write('settings', { ...before.value, ...change });
}
