import { fail, fromBase64, ok, utf8, type Result } from '../base';
import {
	checkShiftKey,
	coveredBy,
	fromPem,
	readCertificate,
	type Certificate,
	type OutsideShiftKey,
	type PublicKey,
	type ShiftKeyError,
} from '../identity';
import { allOf, isOf, keyFor, type EventOf, type RecordEvent } from '../record';

type Bytes = Uint8Array<ArrayBuffer>;

/** Certificates by fingerprint: those that came with the record, and those that its site log holds. */
export type Certificates = ReadonlyMap<string, Certificate>;

export function certificatesOf(given: readonly Bytes[], events: readonly RecordEvent[]): Certificates {
	const enrolled = [...allOf(events, 'person enrolled'), ...allOf(events, 'device enrolled')].flatMap(({ body }) =>
		body.certificate === undefined ? [] : derOf(body.certificate),
	);
	const read = [...given, ...enrolled].flatMap((der) => {
		const certificate = readCertificate(der);
		return certificate.ok ? [certificate.value] : [];
	});
	return new Map(read.map((certificate) => [certificate.fingerprint, certificate]));
}

/** Base64 of the DER, or PEM. */
function derOf(text: string): readonly Bytes[] {
	const der = fromBase64(text);
	if (der !== undefined) return [der];
	const pem = fromPem(utf8(text));
	return pem.ok ? [pem.value] : [];
}

/** Whose signature an event should carry, and with which key it is checked. */
export type Signer = {
	readonly certificate: Certificate;
	readonly publicKey: PublicKey;
	readonly shiftKey?: EventOf<'shift key'>;
};

export type NoSigner =
	| { readonly kind: 'names-no-certificate' }
	| { readonly kind: 'certificate-not-here'; readonly fingerprint: string }
	| { readonly kind: 'shift-key-not-here'; readonly event: string }
	| { readonly kind: 'shift-key-comes-later'; readonly number: number }
	| { readonly kind: 'shift-key-of-another-certificate' }
	| { readonly kind: 'needs-gate-key' }
	| ShiftKeyError
	| OutsideShiftKey;

/**
 * The key that should have signed an event: that of the certificate it names, or the entry key that this certificate's
 * key made valid for a shift, in an event before it on the same tablet.
 */
export async function signerOf(
	event: RecordEvent,
	certificates: Certificates,
	byId: ReadonlyMap<string, RecordEvent>,
): Promise<Result<Signer, NoSigner>> {
	if (event.certificate === undefined) return fail({ kind: 'names-no-certificate' });
	const certificate = certificates.get(event.certificate);
	if (certificate === undefined) return fail({ kind: 'certificate-not-here', fingerprint: event.certificate });
	if (event.shiftKey === undefined) return ok({ certificate, publicKey: certificate.publicKey });
	if (keyFor(event.kind) === 'gate key') return fail({ kind: 'needs-gate-key' });
	const shiftKey = byId.get(event.shiftKey);
	if (shiftKey === undefined || !isOf(shiftKey, 'shift key') || shiftKey.log !== event.log)
		return fail({ kind: 'shift-key-not-here', event: event.shiftKey });
	if (shiftKey.certificate !== event.certificate) return fail({ kind: 'shift-key-of-another-certificate' });
	const covered = coveredBy(shiftKey.body, shiftKey, event);
	if (!covered.ok) return covered;
	if (shiftKey.number >= event.number) return fail({ kind: 'shift-key-comes-later', number: shiftKey.number });
	const publicKey = await checkShiftKey(shiftKey.body);
	return publicKey.ok ? ok({ certificate, publicKey: publicKey.value, shiftKey }) : publicKey;
}
