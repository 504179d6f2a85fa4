import { canonicalJson, readableCode, sha256Hex, utf8, type Json } from '../base';
import { printEventLine } from '../record';
import { fingerprintOf, toPem } from '../identity';
import type { DossierInput } from './input';
import type { Attachment } from './pdf/attach';
import type { Story } from './story/story';

/** What travels inside the dossier, and the digest that stands for all of it (SPEC.md, D2 to D6). */
export type Manifest = {
	/** SHA-256 of manifest.json, in hexadecimal. */
	readonly digest: string;
	readonly code: string;
	/** Every file but the manifest itself, in the order of their names. */
	readonly files: readonly { readonly name: string; readonly bytes: number; readonly sha256: string }[];
	readonly attachments: readonly Attachment[];
};

export function manifestOf(story: Story): Manifest {
	const { input, say } = story;
	const parts = filesOf(story);
	const files = parts
		.map(({ name, bytes, mediaType }) => ({ name, mediaType, bytes: bytes.length, sha256: sha256Hex(bytes) }))
		.sort((a, b) => (a.name < b.name ? -1 : 1));
	const manifest = {
		format: 'gatehold-dossier/1',
		writer: input.writer,
		language: input.language,
		startUp: story.opened.log,
		sealed: story.sealed.id,
		demonstration: isDemonstration(story),
		signatures: input.signatures as unknown as Json,
		files,
	};
	const bytes = utf8(canonicalJson(manifest));
	const digest = sha256Hex(bytes);
	const own: Attachment = {
		name: 'manifest.json',
		mediaType: 'application/json',
		description: say('file.manifest'),
		relation: 'Data',
		bytes,
	};
	return { digest, code: readableCode(digest, 16), files, attachments: [...parts, own] };
}

export const isDemonstration = ({ input, opened }: Story): boolean =>
	input.plant.demonstration || input.procedure.demonstration === true || opened.body.demonstration === true;

function filesOf(story: Story): readonly Attachment[] {
	const { input, say } = story;
	const json = (name: string, value: unknown, description: string): Attachment => ({
		name,
		mediaType: 'application/json',
		description,
		relation: 'Data',
		bytes: utf8(canonicalJson(value as Json)),
	});
	const lines = (name: string, events: Story['events'], description: string): Attachment => ({
		name,
		mediaType: 'application/x-ndjson',
		description,
		relation: 'Source',
		bytes: utf8(events.map((event) => `${printEventLine(event)}\n`).join('')),
	});
	return [
		lines('record.ndjson', story.events, say('file.record')),
		...(story.site.length === 0 ? [] : [lines('site.ndjson', story.site, say('file.site'))]),
		json('procedure.json', input.procedure, say('file.procedure')),
		json('plant.json', input.plant, say('file.plant')),
		pem('root.pem', [input.root], say('file.root')),
		...(input.certificates.length === 0
			? []
			: [pem('certificates.pem', certificatesOf(input), say('file.certificates'))]),
		...input.files.map(({ name, mediaType, bytes }) => ({
			name: attachmentName(name, bytes),
			mediaType,
			description: say('file.attachment', { name }),
			relation: 'Supplement' as const,
			bytes,
		})),
	];
}

const pem = (name: string, certificates: readonly Uint8Array[], description: string): Attachment => ({
	name,
	mediaType: 'application/x-pem-file',
	description,
	relation: 'Data',
	bytes: utf8(certificates.map(toPem).join('')),
});

/** Each once, in the order of their fingerprints: who hands them in has no say in the bytes. */
const certificatesOf = ({ certificates }: DossierInput): readonly Uint8Array[] =>
	[...new Map(certificates.map((der) => [fingerprintOf(der) as string, der]))]
		.sort(([a], [b]) => (a < b ? -1 : 1))
		.map(([, der]) => der);

/** Named by its hash, which is how the events name it; the ending tells people what it is. */
function attachmentName(name: string, bytes: Uint8Array): string {
	const ending = /\.([A-Za-z0-9]{1,8})$/.exec(name)?.[1]?.toLowerCase();
	return `attachment-${sha256Hex(bytes)}${ending === undefined ? '' : `.${ending}`}`;
}
