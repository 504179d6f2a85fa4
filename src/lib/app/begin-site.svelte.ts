import { webRandom, type Role } from '../identity';
import type { Plant } from '../plant';
import { printInstant } from '../record';
import { openStore, type Store } from '../store';
import type { Result } from '../base';
import { localOffset, type Clock } from './clock';
import { beginSite, objectionsToSite, type SiteObjection } from './own-site';
import type { Problem } from './problem';
import { spokenWords } from './spoken-words';
import { OWN_SITE } from './which-storage';

/** One of the first people, as far as typed. */
export type PersonTyped = {
	readonly name: string;
	readonly roles: readonly Role[];
	readonly pin: string;
	/** The PIN again: two that differ are a slip of the finger. */
	readonly again: string;
};

type Kept = {
	readonly site: string;
	readonly unit: string;
	readonly device: string;
	readonly people: readonly { readonly name: string; readonly roles: readonly Role[] }[];
};

/** The beginning of an own site while it is being typed: all but PINs and words outlives a reload. */
export class BeginSite {
	readonly #store: Store;
	readonly #clock: Clock;
	site = $state('');
	unit = $state('');
	device = $state('T-1');
	people = $state.raw<readonly PersonTyped[]>([FIRST]);
	/** They open the site's root, stand on paper, and are kept nowhere else. */
	readonly words = spokenWords(7, webRandom);
	progress = $state.raw<{ readonly done: number; readonly of: number }>();
	problem = $state.raw<Problem>();

	/** @param store where what was typed is kept until the site has a storage of its own */
	constructor(store: Store, clock: Clock) {
		this.#store = store;
		this.#clock = clock;
	}

	/** Minutes east of UTC, as this tablet's own clock has it. */
	get utcOffsetMinutes(): number {
		return localOffset(this.#clock.now());
	}

	/** "+01:00" */
	get plantTime(): string {
		return printInstant(this.#clock.now(), this.utcOffsetMinutes).slice(-'+00:00'.length);
	}

	get objections(): readonly SiteObjection[] {
		return objectionsToSite(this);
	}

	/** Whether a person's PIN was typed twice alike. */
	differs(at: number): boolean {
		const person = this.people[at];
		return person !== undefined && person.pin !== person.again;
	}

	change(at: number, change: Partial<PersonTyped>): void {
		this.people = this.people.map((person, i) => (i === at ? { ...person, ...change } : person));
		void this.keep();
	}

	add(): void {
		const second: readonly Role[] = this.people.length === 1 ? ['shift supervisor'] : ['technician'];
		this.people = [...this.people, { ...FIRST, roles: second }];
		void this.keep();
	}

	remove(at: number): void {
		this.people = this.people.filter((_, i) => i !== at);
		void this.keep();
	}

	async takeUp(): Promise<void> {
		const draft = await this.#store.drafts.read(KEY);
		if (!draft.ok || draft.value === undefined) return;
		const kept = draft.value.typed as Kept;
		this.site = kept.site;
		this.unit = kept.unit;
		this.device = kept.device;
		this.people = kept.people.map((person) => ({ ...FIRST, ...person }));
	}

	async keep(): Promise<void> {
		const { site, unit, device } = this;
		const people = this.people.map(({ name, roles }) => ({ name, roles: [...roles] }));
		const saved = printInstant(this.#clock.now(), 0);
		const kept = await this.#store.drafts.save({ ...KEY, typed: { site, unit, device, people }, saved });
		if (!kept.ok) this.problem = kept.error;
	}

	/** Makes the site in a storage of its own, so that no demonstration stands among its people and records. */
	async make(demonstration: Plant): Promise<boolean> {
		this.problem = undefined;
		const now = this.#clock.now();
		const store = await openStore(OWN_SITE, { now: printInstant(now, 0) });
		if (!store.ok) {
			this.problem = store.error;
			return false;
		}
		const held = await store.value.site.read('tablet');
		if (!held.ok || held.value !== undefined) {
			store.value.close();
			this.problem = held.ok ? { kind: 'site-exists' } : held.error;
			return false;
		}
		const asked = {
			site: this.site,
			unit: this.unit,
			device: this.device,
			people: this.people.map(({ name, roles, pin }) => ({ name, roles, pin })),
			passphrase: this.words,
		};
		const made: Result<Plant, Problem> = await beginSite(
			store.value,
			asked,
			{ now, utcOffsetMinutes: this.utcOffsetMinutes, demonstration },
			(done, of) => (this.progress = { done, of }),
		);
		store.value.close();
		if (!made.ok) {
			this.progress = undefined;
			this.problem = made.error;
			return false;
		}
		await this.#store.drafts.drop(KEY);
		return true;
	}
}

const KEY = { startUp: 'begin', step: 'site', person: '' } as const;

/** Whoever begins a site enrols others, describes the plant and leads; roles are changed with a touch. */
const FIRST: PersonTyped = {
	name: '',
	roles: ['site administrator', 'process engineer', 'commissioning lead'],
	pin: '',
	again: '',
};
