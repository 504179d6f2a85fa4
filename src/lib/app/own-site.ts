import { canonicalJson, fail, ok, sha256Hex, toBase64, type Result } from '../base';
import {
	checkPin,
	enrolDevice,
	enrolPerson,
	makeEntryKey,
	makeGateKey,
	makeSiteRoot,
	may,
	openGateKey,
	openSiteRoot,
	printedName,
	signTrustList,
	webRandom,
	type Certificate,
	type GateKey,
	type OpenSiteRoot,
	type PinError,
	type Role,
	type SigningKey,
	type SiteRootFile,
} from '../identity';
import { copyOf, type Plant } from '../plant';
import { printInstant, signedEvent, type BodyOf, type Draft, type RecordEvent, type EventKind } from '../record';
import type { Store } from '../store';
import type { Problem } from './problem';
import { SITE_LOG, writeSettings } from './tablet.svelte';

export type FirstPerson = { readonly name: string; readonly roles: readonly Role[]; readonly pin: string };

/** A site as it begins: its name, one unit, the people of the first day, and the words that open its root again. */
export type NewSite = {
	readonly site: string;
	readonly unit: string;
	readonly device: string;
	readonly people: readonly FirstPerson[];
	readonly passphrase: string;
};

/** What is still wrong with what was typed, to be said beside the field. */
export type SiteObjection =
	| { readonly kind: 'not-a-name'; readonly at: 'site' | number }
	| { readonly kind: 'same-name'; readonly at: number }
	| { readonly kind: 'not-a-tag'; readonly at: 'unit' | 'device' }
	| { readonly kind: 'no-role'; readonly at: number }
	| { readonly kind: 'bad-pin'; readonly at: number; readonly error: PinError }
	| { readonly kind: 'nobody-enrols' }
	| { readonly kind: 'nobody-describes' };

export function objectionsToSite({
	site,
	unit,
	device,
	people,
}: Omit<NewSite, 'passphrase'>): readonly SiteObjection[] {
	const everyRole = people.flatMap(({ roles }) => roles);
	return [
		...(printedName(site).ok ? [] : [{ kind: 'not-a-name', at: 'site' } as const]),
		...(TAG.test(unit) ? [] : [{ kind: 'not-a-tag', at: 'unit' } as const]),
		...(TAG.test(device) ? [] : [{ kind: 'not-a-tag', at: 'device' } as const]),
		...people.flatMap((person, at) => objectionsToPerson(person, at, people)),
		...(may(everyRole, 'enrol') ? [] : [{ kind: 'nobody-enrols' } as const]),
		...(may(everyRole, 'approve plant data') ? [] : [{ kind: 'nobody-describes' } as const]),
	];
}

function objectionsToPerson(
	{ name, roles, pin }: FirstPerson,
	at: number,
	people: readonly FirstPerson[],
): readonly SiteObjection[] {
	const printed = printedName(name);
	const same = people.slice(0, at).some((other) => other.name.trim().toLowerCase() === name.trim().toLowerCase());
	const checked = checkPin(pin, { mode: 'pin only', known: name.split(/\s+/).filter((part) => part.length > 2) });
	return [
		...(printed.ok ? [] : [{ kind: 'not-a-name', at } as const]),
		...(printed.ok && same ? [{ kind: 'same-name', at } as const] : []),
		...(roles.length === 0 ? [{ kind: 'no-role', at } as const] : []),
		...(checked.ok ? [] : [{ kind: 'bad-pin', at, error: checked.error } as const]),
	];
}

const TAG = /^[A-Za-z0-9][A-Za-z0-9._-]{0,31}$/;

/**
 * Makes a site on this tablet: its own root, its first people with their keys, the tablet itself, and the description of one
 * unit as a copy of the demonstration's, whose values are all still to be replaced. Everything is signed by who may say it.
 *
 * @param now in milliseconds
 * @param at.utcOffsetMinutes plant time
 */
export async function beginSite(
	store: Store,
	asked: NewSite,
	at: { readonly now: number; readonly utcOffsetMinutes: number; readonly demonstration: Plant },
	progress: (done: number, of: number) => void,
): Promise<Result<Plant, Problem>> {
	const objections = objectionsToSite(asked);
	if (objections.length > 0) return fail({ kind: 'site-incomplete', n: objections.length });
	const of = asked.people.length + 2;
	progress(0, of);
	const made = await makeRoot(asked, at.now);
	if (!made.ok) return made;
	progress(1, of);
	const { root } = made.value;
	const validity = validityFrom(at.now);
	const people: Enrolled[] = [];
	for (const person of asked.people) {
		const enrolled = await enrol(person, { root, validity, device: asked.device, taken: people });
		if (!enrolled.ok) return enrolled;
		people.push(enrolled.value);
		progress(1 + people.length, of);
	}
	const key = await makeEntryKey();
	const label = `Tablet ${asked.device}`;
	const tablet = await enrolDevice(root, {
		device: asked.device,
		label,
		publicKey: key.publicKey,
		validity,
		random: webRandom,
	});
	if (!tablet.ok) return fail({ kind: 'site-refused', because: tablet.error.kind });

	const plant = copyOf(at.demonstration, {
		unit: asked.unit,
		site: asked.site.trim(),
		title: 'Grinding and drying in a closed circuit',
		utcOffsetMinutes: at.utcOffsetMinutes,
	});
	const events = await firstEvents({
		people,
		tablet: tablet.value,
		root,
		plant,
		validity,
		...at,
		device: asked.device,
	});
	const kept = await keepSite(store, { people, plant, events, root, rootFile: made.value.file });
	if (!kept.ok) return kept;
	const [first] = people;
	const settings = await writeSettings(store, first === undefined ? {} : { person: first.person });
	if (!settings.ok) return settings;
	// Last of all: whoever is interrupted before it has no site yet and begins again.
	const row = { device: asked.device, label, certificate: tablet.value.der, key };
	const saved = await store.site.write('tablet', row);
	progress(of, of);
	return saved.ok ? ok(plant) : saved;
}

type Enrolled = {
	readonly person: string;
	readonly name: string;
	readonly roles: readonly Role[];
	readonly device: string;
	readonly certificate: Certificate;
	readonly gateKey: GateKey;
	readonly key: SigningKey;
};

async function makeRoot({ site, passphrase }: NewSite, now: number) {
	const made = await makeSiteRoot({ name: site, now: utc(now), passphrase, random: webRandom });
	if (!made.ok) return fail({ kind: 'site-refused', because: made.error.kind } as const);
	const root = await openSiteRoot(made.value, passphrase);
	return root.ok
		? ok({ file: made.value, root: root.value })
		: fail({ kind: 'site-refused', because: root.error.kind } as const);
}

async function enrol(
	{ name, roles, pin }: FirstPerson,
	how: {
		readonly root: OpenSiteRoot;
		readonly validity: ReturnType<typeof validityFrom>;
		readonly device: string;
		readonly taken: readonly Enrolled[];
	},
): Promise<Result<Enrolled, Problem>> {
	const { root, validity, device } = how;
	const person = personId(
		name,
		how.taken.map((each) => each.person),
	);
	const gateKey = await makeGateKey({ person, device, pin, random: webRandom });
	if (!gateKey.ok) return fail({ kind: 'site-refused', because: gateKey.error.kind });
	const { publicKey } = gateKey.value;
	const certificate = await enrolPerson(root, {
		person,
		printedName: name,
		roles,
		device,
		publicKey,
		validity,
		random: webRandom,
	});
	if (!certificate.ok) return fail({ kind: 'site-refused', because: certificate.error.kind });
	const key = await openGateKey(gateKey.value, pin);
	if (!key.ok) return fail({ kind: 'site-refused', because: key.error.kind });
	return ok({
		person,
		name: name.trim(),
		roles,
		device,
		certificate: certificate.value,
		gateKey: gateKey.value,
		key: key.value,
	});
}

/** Short enough to stand in a table, never given twice: the last part of the name, numbered when it is taken. */
export function personId(name: string, taken: readonly string[]): string {
	const last = name.trim().split(/\s+/).at(-1) ?? '';
	const plain =
		last
			.normalize('NFKD')
			.replaceAll(/[^A-Za-z0-9]/g, '')
			.slice(0, 20) || 'Person';
	if (!taken.includes(plain)) return plain;
	for (let n = 2; ; n++) if (!taken.includes(`${plain}-${n}`)) return `${plain}-${n}`;
}

/** What the site says of itself first, each sentence signed by somebody who holds the right to say it. */
async function firstEvents(of: {
	readonly people: readonly Enrolled[];
	readonly tablet: Certificate;
	readonly root: OpenSiteRoot;
	readonly plant: Plant;
	readonly validity: ReturnType<typeof validityFrom>;
	readonly now: number;
	readonly device: string;
}): Promise<readonly RecordEvent[]> {
	const { people, tablet, root, plant, validity, now, device } = of;
	const log: RecordEvent[] = [];
	const say = async <K extends EventKind>(by: Enrolled, kind: K, body: BodyOf<K>): Promise<void> => {
		const draft: Draft<K> = {
			log: SITE_LOG,
			kind,
			body,
			person: by.person,
			device,
			entered: printInstant(now, plant.utcOffsetMinutes),
			certificate: by.certificate.fingerprint,
		};
		log.push(await signedEvent(draft, log, by.key));
	};
	const registrar = people.find(({ roles }) => may(roles, 'enrol'));
	const describer = people.find(({ roles }) => may(roles, 'approve plant data'));
	if (registrar === undefined || describer === undefined) throw new Error('the objections were not looked at');
	for (const { person, name, roles, certificate } of people)
		await say(registrar, 'person enrolled', {
			person,
			name,
			roles: [...roles],
			certificate: toBase64(certificate.der),
		});
	await say(registrar, 'device enrolled', { device, certificate: toBase64(tablet.der) });
	const list = {
		kind: 'trust list',
		v: 1,
		site: plant.site,
		sequence: 1,
		issued: validity.notBefore,
		nextUpdate: validity.notAfter,
		certificates: [],
		revocations: [],
	} as const;
	await say(registrar, 'trust list issued', { sequence: 1, list: { ...(await signTrustList(list, root.key)) } });
	await say(describer, 'plant described', { plant: pinned(plant), changedPoints: [] });
	return log;
}

export const pinned = (plant: Plant) => ({
	id: plant.unit,
	revision: plant.revision,
	hash: sha256Hex(canonicalJson(plant)),
});

async function keepSite(
	store: Store,
	of: {
		readonly people: readonly Enrolled[];
		readonly plant: Plant;
		readonly events: readonly RecordEvent[];
		readonly root: OpenSiteRoot;
		readonly rootFile: SiteRootFile;
	},
): Promise<Result<'saved', Problem>> {
	for (const { person, device, gateKey, certificate } of of.people) {
		const saved = await store.gateKeys.save({ person, device, gateKey, certificate: certificate.der });
		if (!saved.ok) return saved;
	}
	for (const event of of.events) {
		const saved = await store.events.append(event);
		if (!saved.ok) return saved;
	}
	const file = await store.site.write('root file', of.rootFile);
	if (!file.ok) return file;
	const root = await store.site.write('root certificate', of.root.certificate.der);
	if (!root.ok) return root;
	return store.site.write('plant', of.plant);
}

/** Certificates of people last two years at most. */
function validityFrom(now: number) {
	const end = new Date(now);
	end.setUTCFullYear(end.getUTCFullYear() + 2);
	return { notBefore: utc(now), notAfter: utc(end.getTime()) };
}

const utc = (at: number): string => printInstant(Math.floor(at / 1000) * 1000, 0);
