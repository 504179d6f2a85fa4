import { unreachable, utf8 } from '../base';
import { checkSignature, may, type Certificate, type SubIndication } from '../identity';
import { headText, isOf, rightFor, type EventOf, type RecordEvent } from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import { failed, undecided, type Check } from './pdf/check';
import { signerOf, type Certificates, type NoSigner, type Signer } from './signer';

/** An event whose signature holds, and by whom it is. */
export type SignedEvent = { readonly event: RecordEvent; readonly signer: Signer };

/** Every event is signed over its kept text, by the key it names, by the person and on the tablet that it says. */
export async function checkSignatures(
	events: readonly RecordEvent[],
	certificates: Certificates,
): Promise<{ readonly checks: readonly Check[]; readonly signed: readonly SignedEvent[] }> {
	const byId = new Map(events.map((event) => [event.id, event]));
	const signed: SignedEvent[] = [];
	const bad: Check[] = [];
	for (const event of events) {
		const signer = await signerOf(event, certificates, byId);
		if (!signer.ok) {
			bad.push(noSigner(event, signer.error));
			continue;
		}
		const { signature } = event;
		const { publicKey } = signer.value;
		const valid =
			signature === undefined
				? undefined
				: await checkSignature({ bytes: utf8(event.text), alg: 'ES256', signature, publicKey });
		if (valid?.ok === true) signed.push({ event, signer: signer.value });
		else bad.push(notSigned(event, valid?.error.kind));
	}
	const held = 'ES256 over the kept text, by the key of the certificate or of the shift that it names.';
	const heads = await checkHeads(events, certificates);
	return {
		checks: [
			...offences(SIGNED, bad, held, { events: signed.length }),
			...checkPersons(signed),
			...checkRights(signed),
			...heads.checks,
		],
		signed: [...signed, ...heads.signed],
	};
}

const SIGNED = 'events are signed by the key that they name';

function notSigned(event: RecordEvent, because: string | undefined): Check {
	const facts = { ...aboutEvent(event), because: because ?? 'unsigned' };
	switch (because) {
		case undefined:
			return failed(SIGNED, `${nameOf(event)} carries no signature.`, { facts, sub: 'SIGNED_DATA_NOT_FOUND' });
		case 'malformed-signature':
			return failed(SIGNED, `The signature of ${nameOf(event)} is not one.`, { facts, sub: 'FORMAT_FAILURE' });
		default: {
			const said = `The signature of ${nameOf(event)} was not made over it by this key.`;
			return failed(SIGNED, said, { facts, sub: 'SIG_CRYPTO_FAILURE' });
		}
	}
}

function noSigner(event: RecordEvent, error: NoSigner): Check {
	const who = nameOf(event);
	const facts = { ...aboutEvent(event), because: error.kind };
	const broken = (says: string, sub: SubIndication = 'SIG_CONSTRAINTS_FAILURE'): Check =>
		failed(SIGNED, says, { facts, sub });
	switch (error.kind) {
		case 'names-no-certificate':
			return broken(`${who} names no certificate: nobody signed it.`, 'SIGNED_DATA_NOT_FOUND');
		case 'certificate-not-here':
			return undecided(SIGNED, `The certificate that ${who} names is not here.`, {
				facts,
				sub: 'NO_SIGNING_CERTIFICATE_FOUND',
			});
		case 'shift-key-not-here':
			return broken(`The shift key that ${who} names is not here.`);
		case 'shift-key-comes-later':
			return broken(`${who} comes before the shift key that it names, number ${error.number}.`);
		case 'shift-key-of-another-certificate':
			return broken(`${who} names a shift key that another certificate stands for.`);
		case 'needs-gate-key':
			return broken(`${who} is signed with a shift key, which signs entries only; this needs the gate key.`);
		case 'shift-too-long':
			return broken(`The shift key of ${who} is for ${error.hours} h; at most ${error.atMost} h are allowed.`);
		case 'shift-ends-before-it-begins':
			return broken(`The shift key of ${who} ends before it begins.`);
		case 'malformed-key':
			return broken(`The shift key of ${who} is not ${error.expected}.`, 'FORMAT_FAILURE');
		case 'other-person':
			return broken(`${who} by ${event.person} is signed with the shift key of ${error.person}.`);
		case 'other-device':
			return broken(`${who} is signed with a shift key of tablet ${error.device}.`);
		case 'outside-shift':
			return broken(
				`${who}, entered ${event.entered}, lies outside its shift key (${error.notBefore} to ${error.notAfter}).`,
			);
		default:
			return unreachable(error);
	}
}

/** The person and the tablet inside the signed text are those of the certificate. */
function checkPersons(signed: readonly SignedEvent[]): readonly Check[] {
	const name = 'signers are who the events say';
	const bad = signed.flatMap(({ event, signer: { certificate } }) => {
		const { subject } = certificate;
		const person = subject.kind === 'person' ? subject.person : undefined;
		const device = subject.kind === 'authority' ? undefined : subject.device;
		if (person === event.person && device === event.device) return [];
		const because = `${nameOf(event)} is by ${event.person} on ${event.device}; it is signed under the certificate of ${person ?? 'nobody'} on ${device ?? 'no tablet'}.`;
		const facts = { ...aboutEvent(event), person: event.person, certified: person ?? '' };
		return [failed(name, because, { facts, sub: 'SIG_CONSTRAINTS_FAILURE' })];
	});
	return offences(name, bad, 'Person and tablet of each event are those of its certificate.');
}

/** Nobody did what their certified roles do not allow; what the procedure asks for besides is judged with the gates. */
function checkRights(signed: readonly SignedEvent[]): readonly Check[] {
	const name = 'signers had the right by their certificates';
	const bad = signed.flatMap(({ event, signer: { certificate } }) => {
		const right = rightFor(event.kind);
		const roles = certificate.subject.kind === 'person' ? certificate.subject.roles : [];
		if (may(roles, right)) return [];
		const certified = roles.join(', ');
		const because = `${nameOf(event)} needs the right to ${right}; ${event.person} is certified as ${certified}.`;
		const facts = { ...aboutEvent(event), right, certified };
		return [failed(name, because, { facts, sub: 'SIG_CONSTRAINTS_FAILURE' })];
	});
	return offences(name, bad, 'Each event is of a kind that its signer may make.');
}

/** A tablet's own key countersigns the state of its chain. */
async function checkHeads(
	events: readonly RecordEvent[],
	certificates: Certificates,
): Promise<{ readonly checks: readonly Check[]; readonly signed: readonly SignedEvent[] }> {
	const name = 'chain heads are countersigned by their tablets';
	const heads = events.filter((event): event is EventOf<'chain head'> => isOf(event, 'chain head'));
	const bad: Check[] = [];
	const signed: SignedEvent[] = [];
	for (const event of heads) {
		if (event.body.deviceSignature === undefined) continue;
		const own = [...certificates.values()].filter(
			({ subject }) => subject.kind === 'device' && subject.device === event.device,
		);
		const certificate = await signerOfHead(event, event.body.deviceSignature, own);
		const facts = aboutEvent(event);
		if (certificate !== undefined) signed.push({ event, signer: { certificate, publicKey: certificate.publicKey } });
		else if (own.length > 0) {
			const because = `${nameOf(event)} is not countersigned by its tablet.`;
			bad.push(failed(name, because, { facts, sub: 'SIG_CRYPTO_FAILURE' }));
		} else {
			const because = `No certificate of tablet ${event.device} is here.`;
			bad.push(undecided(name, because, { facts, sub: 'NO_SIGNING_CERTIFICATE_FOUND' }));
		}
	}
	const held = `${signed.length} of ${heads.length} chain heads carry a countersignature.`;
	return { checks: offences(name, bad, held), signed };
}

async function signerOfHead(
	{ log, device, body: { number, head } }: EventOf<'chain head'>,
	signature: string,
	own: readonly Certificate[],
): Promise<Certificate | undefined> {
	const bytes = utf8(headText({ log, device, number, head }));
	for (const certificate of own) {
		const { publicKey } = certificate;
		if ((await checkSignature({ bytes, alg: 'ES256', signature, publicKey })).ok) return certificate;
	}
	return undefined;
}
