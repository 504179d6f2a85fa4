import {
	enrolDevice,
	enrolPerson,
	makeEntryKey,
	makeGateKey,
	makeSiteRoot,
	openGateKey,
	openSiteRoot,
	webRandom,
	type Certificate,
	type GateKey,
	type OpenSiteRoot,
	type Role,
	type SigningKey,
	type SiteRootFile,
} from '../identity';
import { must } from './must';

export type Person = { readonly person: string; readonly name: string; readonly roles: readonly Role[] };

/** One person's key on one tablet, with the PIN that opens it. The PINs of a demonstration live as long as its run. */
export type PersonKey = { readonly certificate: Certificate; readonly gateKey: GateKey; readonly pin: string };

/** An invented site with a root of its own: made for one run, so that nobody can mistake its signatures for real ones. */
export class DemoSite {
	readonly root: OpenSiteRoot;
	readonly rootFile: SiteRootFile;
	readonly #people = new Map<string, PersonKey>();
	readonly #devices = new Map<string, { readonly certificate: Certificate; readonly key: SigningKey }>();
	readonly #open = new Map<string, SigningKey>();
	readonly #validity: { readonly notBefore: string; readonly notAfter: string };
	readonly #pin: string | undefined;

	private constructor(root: OpenSiteRoot, rootFile: SiteRootFile, validity: DemoSite['validity'], pin?: string) {
		this.root = root;
		this.rootFile = rootFile;
		this.#validity = validity;
		this.#pin = pin;
	}

	get validity(): { readonly notBefore: string; readonly notAfter: string } {
		return this.#validity;
	}

	/**
	 * @param begins the day on which the story begins: root and certificates are a little older
	 * @param pin everybody's, where somebody shall act in their place afterwards; by default everybody has one of their own
	 */
	static async make(name: string, begins: string, pin?: string): Promise<DemoSite> {
		const before = (days: number): string =>
			new Date(Date.parse(begins) - days * 86_400_000).toISOString().replace('.000Z', 'Z');
		const passphrase = randomWords(8);
		const rootFile = must(await makeSiteRoot({ name, now: before(30), passphrase, random: webRandom }));
		const root = must(await openSiteRoot(rootFile, passphrase));
		return new DemoSite(root, rootFile, { notBefore: before(10), notAfter: before(-700) }, pin);
	}

	async enrol(person: Person, device: string): Promise<PersonKey> {
		const pin = this.#pin ?? randomDigits(8);
		const gateKey = must(await makeGateKey({ person: person.person, device, pin, random: webRandom }));
		const certificate = must(
			await enrolPerson(this.root, {
				person: person.person,
				printedName: person.name,
				roles: person.roles,
				device,
				publicKey: gateKey.publicKey,
				validity: this.#validity,
				random: webRandom,
			}),
		);
		const key = { certificate, gateKey, pin };
		this.#people.set(keyName(person.person, device), key);
		return key;
	}

	async enrolTablet(device: string): Promise<Certificate> {
		const key = await makeEntryKey();
		const issued = {
			device,
			label: `Tablet ${device}`,
			publicKey: key.publicKey,
			validity: this.#validity,
			random: webRandom,
		};
		const certificate = must(await enrolDevice(this.root, issued));
		this.#devices.set(device, { certificate, key });
		return certificate;
	}

	personKey(person: string, device: string): PersonKey {
		const key = this.#people.get(keyName(person, device));
		if (key === undefined) throw new Error(`${person} is not enrolled on ${device}`);
		return key;
	}

	/** The key of a person, opened by the PIN once and kept open for as long as the run takes. */
	async openKey(person: string, device: string): Promise<SigningKey> {
		const name = keyName(person, device);
		const { gateKey, pin } = this.personKey(person, device);
		const key = this.#open.get(name) ?? must(await openGateKey(gateKey, pin), `PIN of ${person}`);
		this.#open.set(name, key);
		return key;
	}

	/** Everybody's key on one tablet. */
	keysOn(device: string): readonly PersonKey[] {
		return [...this.#people.values()].filter(
			({ certificate: { subject } }) => subject.kind === 'person' && subject.device === device,
		);
	}

	tabletCertificate(device: string): Certificate | undefined {
		return this.#devices.get(device)?.certificate;
	}

	tabletKey(device: string): SigningKey {
		const tablet = this.#devices.get(device);
		if (tablet === undefined) throw new Error(`tablet ${device} is not enrolled`);
		return tablet.key;
	}

	get certificates(): readonly Certificate[] {
		return [...[...this.#people.values()], ...[...this.#devices.values()]].map(({ certificate }) => certificate);
	}
}

const keyName = (person: string, device: string): string => JSON.stringify([person, device]);

/** Digits that the PIN rules accept: no run, no day, no repetition. Drawn again until they do. */
function randomDigits(count: number): string {
	for (;;) {
		const digits = [...webRandom(count)].map((byte) => byte % 10).join('');
		if (
			new Set(digits).size >= 6 &&
			!/012|123|234|345|456|567|678|789|987|876|765|654|543|432|321|210|19|20/.test(digits)
		)
			return digits;
	}
}

const randomWords = (count: number): string =>
	[...webRandom(count * 4)]
		.map((byte, i) => (i % 4 === 3 ? ' ' : String.fromCharCode(97 + (byte % 26))))
		.join('')
		.trim();
