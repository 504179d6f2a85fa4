import {
	checkChain,
	millisecondsOf,
	type Certificate,
	type ChainAnswer,
	type Instant,
	type TrustList,
} from '../identity';
import type { SignedEvent } from './check-signatures';
import { nameOf } from './about-event';
import { checkOfFinding } from './pdf/chain-checks';
import { undecided, type Check } from './pdf/check';

type Bytes = Uint8Array<ArrayBuffer>;

/** What the judge knows of the world outside the record. */
export type Trust = {
	/** DER of the site root; undefined when neither the judge nor the file brings one. */
	readonly root: Bytes | undefined;
	readonly issuers: readonly Bytes[];
	readonly trustList: TrustList | undefined;
	readonly now: Instant;
	/** The record existed not later than this. */
	readonly provenBy: Instant | undefined;
};

/**
 * Every certificate that signed leads to the site root and was good when it signed. Each rule holds on an interval of
 * time, so it is asked for the first and the last event of a certificate; only when one fails, for each event.
 */
export async function checkCertificates(signed: readonly SignedEvent[], trust: Trust): Promise<readonly Check[]> {
	const { root } = trust;
	if (root === undefined) {
		const because = 'No site root is known: who signed is only what the record says.';
		return [undecided('site root vouches for the signers', because, { sub: 'NO_CERTIFICATE_CHAIN_FOUND' })];
	}
	const checks: Check[] = [];
	for (const { certificate, events } of byCertificate(signed))
		checks.push(...(await checkOne(certificate, events, { ...trust, root })));
	return checks;
}

type Anchored = Trust & { readonly root: Bytes };

async function checkOne(
	certificate: Certificate,
	events: readonly SignedEvent[],
	trust: Anchored,
): Promise<readonly Check[]> {
	const [first, last] = [events[0], events.at(-1)];
	const atLast = await ask(certificate, last, trust);
	const atFirst = first === last ? atLast : await ask(certificate, first, trust);
	const worst = atLast.findings.map((finding, i) =>
		finding.outcome === 'passed' ? (atFirst.findings[i] ?? finding) : finding,
	);
	const suspects = worst.every(({ outcome }) => outcome === 'passed') ? [] : await notGood(certificate, events, trust);
	return worst
		.filter(({ rule }) => rule !== 'certificate')
		.map((finding) => {
			const { name, because, facts, ...check } = checkOfFinding(finding);
			return {
				...check,
				name: `${whoseOf(certificate)}: ${name}`,
				because: finding.outcome === 'passed' || suspects.length === 0 ? because : `${because} ${aboutWhich(suspects)}`,
				facts: { ...facts, certificate: certificate.fingerprint, events: events.length },
			};
		});
}

async function notGood(
	certificate: Certificate,
	events: readonly SignedEvent[],
	trust: Anchored,
): Promise<readonly SignedEvent[]> {
	const asked = await Promise.all(
		events.map(async (signed) => ({ signed, answer: await ask(certificate, signed, trust) })),
	);
	return asked.filter(({ answer }) => answer.class !== 'TOTAL-PASSED').map(({ signed }) => signed);
}

const ask = (
	certificate: Certificate,
	signed: SignedEvent | undefined,
	{ root, issuers, trustList, now, provenBy }: Anchored,
): Promise<ChainAnswer> =>
	checkChain({
		certificate: certificate.der,
		issuers,
		root,
		times: { claimed: signed?.event.entered ?? now, now, provenBy },
		trustList,
	});

function byCertificate(
	signed: readonly SignedEvent[],
): readonly { readonly certificate: Certificate; readonly events: readonly SignedEvent[] }[] {
	const groups = new Map<string, SignedEvent[]>();
	const inTime = [...signed].sort((a, b) => millisecondsOf(a.event.entered) - millisecondsOf(b.event.entered));
	for (const one of inTime) {
		const { fingerprint } = one.signer.certificate;
		const group = groups.get(fingerprint);
		if (group === undefined) groups.set(fingerprint, [one]);
		else group.push(one);
	}
	return [...groups.values()].flatMap((events) => {
		const certificate = events[0]?.signer.certificate;
		return certificate === undefined ? [] : [{ certificate, events }];
	});
}

function whoseOf({ subject }: Certificate): string {
	switch (subject.kind) {
		case 'person':
			return `${subject.printedName} on ${subject.device}`;
		case 'device':
			return subject.label;
		case 'authority':
			return subject.name;
	}
}

const SHOWN = 5;

function aboutWhich(events: readonly SignedEvent[]): string {
	const names = events.slice(0, SHOWN).map(({ event }) => nameOf(event));
	const rest = events.length - names.length;
	return `It is about ${names.join(', ')}${rest > 0 ? ` and ${rest} more` : ''}.`;
}
