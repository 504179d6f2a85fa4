import { fail, ok, type Result } from '../base';
import { readCertificate, type Certificate, type Role, type SigningKey } from '../identity';
import type { GateKeyRow, Store, Tablet as KeptTablet } from '../store';
import type { Clock } from './clock';
import type { Problem } from './problem';
import { COVER_AFTER, Shifts } from './shifts.svelte';

export type TabletPerson = {
	readonly person: string;
	readonly name: string;
	readonly roles: readonly Role[];
	readonly certificate: Certificate;
	/** False after the tenth wrong PIN: to be enrolled again, in person. */
	readonly hasKey: boolean;
	/** Wrong PINs in a row, shown to whoever looks next. */
	readonly wrongPins: number;
};

export const SITE_LOG = 'site';

/** This tablet: who is enrolled on it, who holds it now, whose shift runs, and whether its screen is covered. */
export class Tablet {
	readonly store: Store;
	readonly clock: Clock;
	readonly device: string;
	readonly #kept: KeptTablet;
	#people = $state.raw<readonly TabletPerson[]>([]);
	#person = $state.raw<string>();
	readonly shifts: Shifts;
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
		readonly shifts: Shifts;
	}) {
		this.store = of.store;
		this.clock = of.clock;
		this.#kept = of.kept;
		this.device = of.kept.device;
		this.#people = of.people;
		this.#person = of.people.some(({ person }) => person === of.settings.person) ? of.settings.person : undefined;
		this.demonstrationPin = of.settings.demonstrationPin;
		this.#lastTouch = this.#now = of.clock.now();
		this.shifts = of.shifts;
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
		const shifts = await Shifts.open(store, clock, device);
		if (!shifts.ok) return shifts;
		return ok(new Tablet({ store, clock, kept: kept.value, people, settings: settings.value, shifts: shifts.value }));
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
		return this.#now - this.#lastTouch >= COVER_AFTER;
	}

	/** Seconds until the screen is covered, once that is near: one touch puts it off. */
	get coversIn(): number | undefined {
		const left = COVER_AFTER - (this.#now - this.#lastTouch);
		return left > 0 && left <= WARNING ? Math.ceil(left / 1000) : undefined;
	}

	get tabletKey(): SigningKey {
		return this.#kept.key;
	}

	touched(): void {
		const wasCovered = this.clock.now() - this.#lastTouch >= COVER_AFTER;
		this.#lastTouch = this.#now = this.clock.now();
		void (wasCovered ? this.shifts.lookAgain() : this.shifts.touched());
	}

	/** Two taps: the tablet changes hands, and what was typed stays with whom it belongs to. */
	async choose(person: string): Promise<void> {
		this.#person = person;
		this.touched();
		await writeSettings(this.store, { person });
	}

	/** The gate key of a person, opened for one act. The try is counted before it is made. */
	async openKey(person: string, pin: string): Promise<Result<SigningKey, Problem>> {
		const opened = await this.store.gateKeys.open({ person, device: this.device, pin, now: this.clock.now() });
		await this.#lookAtPeople();
		if (opened.ok) await this.shifts.resumed(person);
		else if (opened.error.kind === 'destroyed') await this.shifts.end(person);
		return opened;
	}

	async #lookAtPeople(): Promise<void> {
		const rows = await this.store.gateKeys.list();
		if (rows.ok) this.#people = rows.value.filter((row) => row.device === this.device).flatMap(personOf);
	}
}

/** From here on the tablet says that it will cover itself (WCAG 2.2.1 asks for twenty seconds). */
const WARNING = 30_000;
const IDLE_LOOK = 5_000;

function personOf({ certificate: der, gateKey, tries }: GateKeyRow): readonly TabletPerson[] {
	const certificate = readCertificate(der);
	if (!certificate.ok || certificate.value.subject.kind !== 'person') return [];
	const { person, printedName: name, roles } = certificate.value.subject;
	return [
		{ person, name, roles, certificate: certificate.value, hasKey: gateKey !== undefined, wrongPins: tries.failures },
	];
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
