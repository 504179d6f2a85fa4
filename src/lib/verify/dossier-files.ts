import { fromBase64, fromUtf8 } from '../base';

type Bytes = Uint8Array<ArrayBuffer>;
type Named = { readonly name: string; readonly bytes: Bytes };

/** What a dossier carries, by the names of its format (dossier/SPEC.md). */
export type DossierFiles = {
	readonly logs: readonly Named[];
	readonly manifest: Bytes | undefined;
	readonly root: Bytes | undefined;
	/** DER, in any order. */
	readonly certificates: readonly Bytes[];
	/** Photos and trends; events name them by hash. */
	readonly attachments: readonly Named[];
};

export const FORMAT_FILES = [
	'record.ndjson',
	'site.ndjson',
	'procedure.json',
	'plant.json',
	'root.pem',
	'certificates.pem',
	'manifest.json',
];

export function filesOf(attachments: readonly Named[]): DossierFiles {
	const bytesOf = (name: string): Bytes | undefined => attachments.find((file) => file.name === name)?.bytes;
	return {
		logs: attachments.filter(({ name }) => name === 'record.ndjson' || name === 'site.ndjson'),
		manifest: bytesOf('manifest.json'),
		root: certificatesIn(bytesOf('root.pem'))[0],
		certificates: certificatesIn(bytesOf('certificates.pem')),
		attachments: attachments.filter(({ name }) => !FORMAT_FILES.includes(name)),
	};
}

/** Every certificate of a PEM file (RFC 7468); what is none is left out, and whoever names it will miss it. */
function certificatesIn(pem: Bytes | undefined): readonly Bytes[] {
	if (pem === undefined) return [];
	const text = new TextDecoder('latin1').decode(pem);
	return [...text.matchAll(/-----BEGIN CERTIFICATE-----([\s\S]*?)-----END CERTIFICATE-----/g)].flatMap(
		([, body = '']) => {
			const der = fromBase64(body.replace(/\s/g, ''));
			return der === undefined ? [] : [der];
		},
	);
}

/** @returns undefined when the bytes are no text */
export function textOf(bytes: Bytes): string | undefined {
	try {
		return fromUtf8(bytes);
	} catch {
		return undefined;
	}
}
