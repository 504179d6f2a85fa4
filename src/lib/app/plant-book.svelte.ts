import { canonicalJson, fail, ok, type Result } from '../base';
import { may, rolesWith } from '../identity';
import { changedPoints, checkPlant, parsePlant, replacedBy, withValues, type Plant, type PlantFinding } from '../plant';
import { allOf, printInstant } from '../record';
import { writeEvent } from './logbook';
import { pinned } from './own-site';
import type { Problem } from './problem';
import { SITE_LOG, type Tablet } from './tablet.svelte';

/** Changes of the description that are typed but not approved: by item, then by the path of the value inside it. */
export type PlantChanges = { readonly [item: string]: { readonly [path: string]: string } };

/** The description of the unit on this tablet, and what is being replaced in it. Typed values outlive a reload. */
export class PlantBook {
	readonly #tablet: Tablet;
	#approved: Plant;
	#changes = $state.raw<PlantChanges>({});
	problem = $state.raw<Problem>();
	/** As it would be approved now. */
	readonly plant: Plant;

	private constructor(tablet: Tablet, approved: Plant, changes: PlantChanges) {
		this.#tablet = tablet;
		this.#approved = $state.raw(approved);
		this.#changes = changes;
		this.plant = $derived(withChanges(this.#approved, this.#changes));
	}

	static async open(tablet: Tablet): Promise<Result<PlantBook, Problem>> {
		const plant = await plantOn(tablet);
		if (!plant.ok) return plant;
		const draft = await tablet.store.drafts.read(KEY);
		const changes = draft.ok && draft.value !== undefined ? (draft.value.typed as PlantChanges) : {};
		return ok(new PlantBook(tablet, plant.value, changes));
	}

	/** As it was approved last. */
	get approved(): Plant {
		return this.#approved;
	}

	get changes(): PlantChanges {
		return this.#changes;
	}

	/** A demonstration is looked at; the description of a site's own unit is written. */
	get isOwn(): boolean {
		return !this.approved.demonstration;
	}

	get left(): readonly string[] {
		return (this.approved.copied?.toReplace ?? []).filter((item) => !Object.hasOwn(this.#changes, item));
	}

	get findings(): readonly PlantFinding[] {
		return checkPlant(this.plant);
	}

	/** Values as typed for an item; empty when they were found to be the unit's own as they stand. */
	async replace(item: string, typed: { readonly [path: string]: string }): Promise<void> {
		const limit = this.approved.limits.find(({ id }) => item === `limits/${id}`);
		// A limit that somebody of the site stands for has the site as its source, in the words typed.
		const source = limit?.source.kind === 'demonstration' ? { 'source/kind': 'site' } : {};
		await this.#keep({ ...this.#changes, [item]: { ...typed, ...source } });
	}

	async leave(item: string): Promise<void> {
		const { [item]: _left, ...rest } = this.#changes;
		await this.#keep(rest);
	}

	/** Makes what was typed the next revision, signed by who may approve plant data; proofs that read a changed point lapse. */
	async approve(pin: string): Promise<Result<'signed', Problem>> {
		const signed = await this.#approve(pin);
		this.problem = signed.ok ? undefined : signed.error;
		return signed;
	}

	async #approve(pin: string): Promise<Result<'signed', Problem>> {
		const { person, store, clock, device } = this.#tablet;
		if (person === undefined) return fail({ kind: 'nobody-chosen' });
		if (!may(person.roles, 'approve plant data'))
			return fail({ kind: 'no-right', person: person.name, roles: rolesWith('approve plant data') });
		const before = this.approved;
		const entered = printInstant(Math.floor(clock.now() / 1000) * 1000, before.utcOffsetMinutes);
		const items = Object.keys(this.#changes);
		const after = replacedBy({ ...this.plant, revision: before.revision + 1 }, items, person.person, entered);
		const shape = parsePlant(JSON.parse(canonicalJson(after)));
		if (!shape.ok) return fail({ kind: 'plant-refused', at: shape.error[0]?.path ?? '' });
		const key = await this.#tablet.openKey(person.person, pin);
		if (!key.ok) return key;
		// The document before the event that pins it: an event without its document could not be opened by any start-up.
		const kept = await store.site.write('next plant', after);
		if (!kept.ok) return kept;
		const draft = {
			log: SITE_LOG,
			kind: 'plant described' as const,
			body: { plant: pinned(after), changedPoints: [...changedPoints(before, after)] },
			person: person.person,
			device,
			entered,
			certificate: person.certificate.fingerprint,
		};
		const written = await writeEvent(store, draft, { key: key.value });
		if (!written.ok) return written;
		const saved = await store.site.write('plant', after);
		if (!saved.ok) return saved;
		this.#approved = after;
		this.#changes = {};
		await store.drafts.drop(KEY);
		return ok('signed');
	}

	async #keep(changes: PlantChanges): Promise<void> {
		this.#changes = changes;
		const saved = printInstant(this.#tablet.clock.now(), 0);
		const kept = await this.#tablet.store.drafts.save({ ...KEY, typed: changes, saved });
		this.problem = kept.ok ? undefined : kept.error;
	}
}

const KEY = { startUp: 'plant', step: 'changes', person: '' } as const;

/**
 * The unit that this tablet knows: of its own site, else the one that the newest start-up was opened on. A revision that was
 * signed and not yet put in its place, because the plug was pulled between, is put there now.
 */
export async function plantOn({ store }: Tablet): Promise<Result<Plant, Problem>> {
	const own = await store.site.read('plant');
	if (!own.ok) return own;
	const next = await store.site.read('next plant');
	if (!next.ok) return next;
	if (own.value !== undefined && next.value !== undefined && next.value.revision > own.value.revision) {
		const site = await store.events.readLog(SITE_LOG);
		if (!site.ok) return site;
		const { hash } = pinned(next.value);
		if (allOf(site.value.events, 'plant described').some(({ body }) => body.plant.hash === hash)) {
			const saved = await store.site.write('plant', next.value);
			return saved.ok ? ok(next.value) : saved;
		}
	}
	if (own.value !== undefined) return ok(own.value);
	const startUps = await store.events.listStartUps();
	if (!startUps.ok) return startUps;
	for (const { id } of startUps.value) {
		const log = await store.events.readLog(id);
		if (!log.ok) return log;
		const plant = parsePlant(allOf(log.value.events, 'start-up opened')[0]?.body.documents?.plant);
		if (plant.ok) return plant;
	}
	return fail({ kind: 'no-plant' });
}

const withChanges = (plant: Plant, changes: PlantChanges): Plant =>
	Object.entries(changes).reduce((after, [item, typed]) => withValues(after, item, typed), plant);
