import { toBase64, utf8 } from '../../src/lib/base';
import {
	enrolDevice,
	makeEntryKey,
	sign,
	toJwk,
	webRandom,
	type Certificate,
	type Role,
	type SigningKey,
} from '../../src/lib/identity';
import {
	fromChecked,
	headCode,
	headsOf,
	headText,
	keyFor,
	nextEnvelope,
	textOf,
	type BodyOf,
	type EventKind,
	type RecordEvent,
} from '../../src/lib/record';
import { value, type TestPerson, type TestSigner, type TestSite } from './test-site';

export type Said = {
	readonly person: string;
	readonly device: string;
	readonly entered: string;
	readonly observed?: string;
	readonly log?: string;
	/** The gate key signs although the shift key could, or must not. */
	readonly with?: 'gate key' | 'shift key';
};

type Shift = { readonly id: string; readonly key: SigningKey };

/** Tablets with people's keys on them: they write real, signed events, and know only what they wrote or were given. */
export class SigningTablets {
	readonly certificates: Certificate[] = [];
	readonly signers = new Map<string, TestSigner>();
	readonly #site: TestSite;
	readonly #log: string;
	readonly #held = new Map<string, RecordEvent[]>();
	readonly #shifts = new Map<string, Shift>();
	readonly #devices = new Map<string, TestSigner>();

	constructor(site: TestSite, log: string) {
		this.#site = site;
		this.#log = log;
	}

	async enrol(person: TestPerson & { readonly device: string; readonly roles: readonly Role[] }): Promise<void> {
		const signer = await this.#site.enrol(person);
		this.signers.set(`${person.person} ${person.device}`, signer);
		this.certificates.push(signer.certificate);
	}

	async enrolTablet(device: string): Promise<void> {
		const key = await makeEntryKey();
		const validity = { notBefore: '2026-02-01T00:00:00Z', notAfter: '2028-01-31T00:00:00Z' };
		const { root } = this.#site;
		const issued = await enrolDevice(root, { device, label: `Tablet ${device}`, ...key, validity, random: webRandom });
		this.#devices.set(device, { certificate: value(issued), key });
		this.certificates.push(value(issued));
	}

	async say<K extends EventKind>(kind: K, body: BodyOf<K>, said: Said): Promise<RecordEvent> {
		const { person, device, entered, observed, log = this.#log } = said;
		const signer = this.#signer(person, device);
		const shift = this.#shifts.get(`${log} ${person} ${device}`);
		const withShift = said.with === undefined ? keyFor(kind) === 'entry key' : said.with === 'shift key';
		if (withShift && shift === undefined) throw new Error(`${person} began no shift on ${device}`);
		const draft = {
			...{ log, kind, body, person, device, entered, certificate: signer.certificate.fingerprint },
			...(observed === undefined ? {} : { observed }),
			...(withShift && shift !== undefined ? { shiftKey: shift.id } : {}),
		};
		const envelope = nextEnvelope(draft, this.held(device));
		const text = textOf(envelope);
		const signature = await sign(utf8(text), withShift && shift !== undefined ? shift.key : signer.key);
		const event = fromChecked(text, envelope, { signature });
		this.held(device).push(event);
		return event;
	}

	/** @param hours how long the entry key shall sign */
	async beginShift(person: string, device: string, entered: string, hours = 8): Promise<RecordEvent> {
		const key = await makeEntryKey();
		const notAfter = new Date(Date.parse(entered) + hours * 3_600_000).toISOString().replace('.000Z', 'Z');
		const publicKey = await toJwk(key.publicKey);
		const body = { publicKey, notBefore: entered, notAfter, entriesOnly: true } as const;
		const event = await this.say('shift key', body, { person, device, entered });
		this.#shifts.set(`${event.log} ${person} ${device}`, { id: event.id, key });
		return event;
	}

	/** The tablet countersigns how far its chain has got. */
	async signHead(person: string, device: string, entered: string): Promise<RecordEvent> {
		const { id: head, number } = this.heads(device).get(device) ?? { id: '', number: 0 };
		const key = this.#devices.get(device)?.key;
		const text = headText({ log: this.#log, device, number, head });
		const deviceSignature = key === undefined ? {} : { deviceSignature: await sign(utf8(text), key) };
		return this.say('chain head', { number, head, why: 'gate act', ...deviceSignature }, { person, device, entered });
	}

	held(device: string): RecordEvent[] {
		const held = this.#held.get(device) ?? [];
		this.#held.set(device, held);
		return held;
	}

	/** Last event of every chain of the start-up's log, as far as a tablet knows. */
	heads(device: string): ReadonlyMap<string, RecordEvent> {
		return headsOf(this.held(device).filter(({ log }) => log === this.#log));
	}

	codes(device: string): { readonly [tablet: string]: { readonly number: number; readonly code: string } } {
		return Object.fromEntries(
			[...this.heads(device)].map(([tablet, head]) => [tablet, { number: head.number, code: headCode(head) }]),
		);
	}

	/** Everything that one tablet holds reaches another. */
	give(from: string, to: string): void {
		const held = this.held(to);
		for (const event of this.held(from)) if (!held.includes(event)) held.push(event);
	}

	#signer(person: string, device: string): TestSigner {
		const signer = this.signers.get(`${person} ${device}`);
		if (signer === undefined) throw new Error(`${person} has no key on ${device}`);
		return signer;
	}
}

export const asText = (certificate: Certificate): string => toBase64(certificate.der);
