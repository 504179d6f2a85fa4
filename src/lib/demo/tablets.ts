import { utf8 } from '../base';
import { makeEntryKey, sign, toJwk, type SigningKey } from '../identity';
import {
	headCode,
	headsOf,
	headText,
	keyFor,
	objectionsTo,
	signedEvent,
	type BodyOf,
	type Draft,
	type EventKind,
	type EventOf,
	type RecordEvent,
} from '../record';
import type { Procedure } from '../procedure';
import type { DemoSite } from './demo-site';

export const SITE_LOG = 'site';

export type Said = {
	readonly person: string;
	readonly device: string;
	readonly entered: string;
	readonly observed?: string;
	readonly log?: string;
};

/** The tablets of the story: each holds what it wrote and what was copied to it, and signs with the keys of its people. */
export class Tablets {
	readonly #site: DemoSite;
	readonly #startUp: string;
	readonly #held = new Map<string, RecordEvent[]>();
	readonly #shifts = new Map<string, { readonly id: string; readonly key: SigningKey }>();

	constructor(site: DemoSite, startUp: string) {
		this.#site = site;
		this.#startUp = startUp;
	}

	held(device: string): RecordEvent[] {
		const held = this.#held.get(device) ?? [];
		this.#held.set(device, held);
		return held;
	}

	startUp(device: string): readonly RecordEvent[] {
		return this.held(device).filter(({ log }) => log === this.#startUp);
	}

	siteLog(device: string): readonly RecordEvent[] {
		return this.held(device).filter(({ log }) => log !== this.#startUp);
	}

	async say<K extends EventKind>(kind: K, body: BodyOf<K>, said: Said): Promise<EventOf<K>> {
		const draft = this.#draft(kind, body, said);
		const event = await signedEvent(draft, this.held(said.device), await this.#keyFor(draft));
		this.held(said.device).push(event);
		return event as EventOf<K>;
	}

	/** Why the rules would give an act no effect; empty when it may be signed. */
	objections<K extends EventKind>(procedure: Procedure, kind: K, body: BodyOf<K>, said: Said): readonly string[] {
		return objectionsTo(procedure, this.#draft(kind, body, said), this.startUp(said.device), this.siteLog(said.device));
	}

	async beginShift(said: Said): Promise<void> {
		const key = await makeEntryKey();
		const notAfter = hoursAfter(said.entered, 12);
		const body = {
			publicKey: await toJwk(key.publicKey),
			notBefore: said.entered,
			notAfter,
			entriesOnly: true,
		} as const;
		const { id } = await this.say('shift key', body, said);
		this.#shifts.set(shiftName(said), { id, key });
	}

	/** The tablet countersigns how far its chain has got, so that a cut tail is seen. */
	async signHead(why: BodyOf<'chain head'>['why'], said: Said): Promise<void> {
		const own = headsOf(this.startUp(said.device)).get(said.device);
		if (own === undefined) return;
		const head = { log: this.#startUp, device: said.device, number: own.number, head: own.id };
		const deviceSignature = await sign(utf8(headText(head)), this.#site.tabletKey(said.device));
		await this.say('chain head', { number: own.number, head: own.id, why, deviceSignature }, said);
	}

	/** Number and head code of every chain, as they are compared by eye or by radio. */
	headCodes(device: string): BodyOf<'copy made'>['heads'] {
		return Object.fromEntries(
			[...headsOf(this.startUp(device))].map(([tablet, head]) => [
				tablet,
				{ number: head.number, code: headCode(head) },
			]),
		);
	}

	give(from: string, to: string): void {
		const held = this.held(to);
		const known = new Set(held.map(({ id }) => id));
		for (const event of this.held(from)) if (!known.has(event.id)) held.push(event);
	}

	#draft<K extends EventKind>(kind: K, body: BodyOf<K>, said: Said): Draft<K> {
		const { person, device, entered, observed, log = this.#startUp } = said;
		const { certificate } = this.#site.personKey(person, device);
		const shift = this.#shiftFor(kind, { ...said, log });
		return {
			log,
			kind,
			body,
			person,
			device,
			entered,
			certificate: certificate.fingerprint,
			...(observed === undefined || observed === entered ? {} : { observed }),
			...(shift === undefined ? {} : { shiftKey: shift.id }),
		};
	}

	#shiftFor(kind: EventKind, said: Said): { readonly id: string; readonly key: SigningKey } | undefined {
		const inStartUp = said.log === undefined || said.log === this.#startUp;
		return keyFor(kind) === 'entry key' && inStartUp ? this.#shifts.get(shiftName(said)) : undefined;
	}

	/** The shift's key where it may sign and a shift was begun; else the gate key, opened by its PIN for this one signature. */
	async #keyFor(draft: Draft): Promise<SigningKey> {
		const shift = draft.shiftKey === undefined ? undefined : this.#shifts.get(shiftName(draft));
		if (shift !== undefined) return shift.key;
		return this.#site.openKey(draft.person, draft.device);
	}
}

const shiftName = ({ person, device }: { readonly person: string; readonly device: string }): string =>
	JSON.stringify([person, device]);

function hoursAfter(instant: string, hours: number): string {
	const offset = instant.slice(19);
	const sign = offset.startsWith('-') ? -1 : 1;
	const minutes = offset === 'Z' ? 0 : sign * (Number(offset.slice(1, 3)) * 60 + Number(offset.slice(4, 6)));
	return new Date(Date.parse(instant) + (hours * 60 + minutes) * 60_000).toISOString().slice(0, 19) + offset;
}
