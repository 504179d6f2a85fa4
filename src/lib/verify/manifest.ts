import * as v from 'valibot';
import { canonicalJson, parseJson, sha256Hex, type Json } from '../base';
import { isRole, type Role } from '../identity';
import { allOf, type RecordEvent } from '../record';
import { offences } from './about-event';
import { FORMAT_FILES, textOf } from './dossier-files';
import { failed, passed, type Check } from './pdf/check';

type Bytes = Uint8Array<ArrayBuffer>;
type Named = { readonly name: string; readonly bytes: Bytes };

/** The table of contents of a dossier: who wrote it, who must sign it, and every file by its hash. */
const ManifestSchema = v.object({
	format: v.literal('gatehold-dossier/1'),
	writer: v.string(),
	startUp: v.string(),
	sealed: v.string(),
	signatures: v.array(
		v.object({ field: v.string(), roles: v.array(v.custom<Role>((role) => typeof role === 'string' && isRole(role))) }),
	),
	files: v.array(v.object({ name: v.string(), bytes: v.number(), sha256: v.string() })),
});

export type Manifest = v.InferOutput<typeof ManifestSchema>;

export function readManifest(bytes: Bytes | undefined): Manifest | undefined {
	const text = bytes === undefined ? undefined : textOf(bytes);
	const json = text === undefined ? undefined : parseJson(text);
	const read = v.safeParse(ManifestSchema, json?.ok === true ? json.value : undefined);
	return read.success ? read.output : undefined;
}

/** What lies in the file is what its table of contents says, and the record is the one that it was made for. */
export function checkManifest(
	manifest: Manifest | undefined,
	files: readonly Named[],
	{ events }: { readonly events: readonly RecordEvent[] },
): readonly Check[] {
	if (manifest === undefined) {
		const because = 'There is no table of contents that can be read: this is no dossier, or not any more.';
		return [failed('dossier has its table of contents', because, { sub: 'SIGNED_DATA_NOT_FOUND' })];
	}
	return [
		passed('dossier has its table of contents', `${manifest.files.length} files, written by ${manifest.writer}.`),
		...checkFiles(manifest, files),
		checkRecord(manifest, events),
		...checkDocumentsBeside(files, events),
	];
}

function checkFiles(manifest: Manifest, files: readonly Named[]): readonly Check[] {
	const name = 'attachments are those of the table of contents';
	const listed = new Map(manifest.files.map((file) => [file.name, file]));
	const here = new Map(files.map((file) => [file.name, file.bytes]));
	const missing = manifest.files
		.filter((file) => !here.has(file.name))
		.map((file) =>
			failed(name, `${file.name} is not here.`, { facts: { file: file.name }, sub: 'SIGNED_DATA_NOT_FOUND' }),
		);
	const others = files
		.filter((file) => file.name !== 'manifest.json')
		.flatMap(({ name: file, bytes }) => {
			const said = listed.get(file);
			if (said === undefined) return [failed(name, `${file} is not in it.`, { facts: { file } })];
			if (said.sha256 === sha256Hex(bytes) && said.bytes === bytes.length) return [];
			return [failed(name, `${file} has another hash.`, { facts: { file }, sub: 'HASH_FAILURE' })];
		});
	return offences(name, [...missing, ...others], `${files.length} files, each with its hash.`);
}

function checkRecord({ startUp, sealed }: Manifest, events: readonly RecordEvent[]): Check {
	const name = 'record is the one that the dossier was made of';
	const seal = allOf(events, 'sealed').find(({ log }) => log === startUp);
	if (seal?.id === sealed) return passed(name, `Start-up ${startUp}, sealed as ${sealed.slice(0, 16)}.`);
	return failed(name, `The dossier is of ${startUp}, sealed as ${sealed.slice(0, 16)}; the record inside is not.`);
}

/** Procedure and plant lie beside the record for people's programs; the ones that count are those inside it. */
function checkDocumentsBeside(files: readonly Named[], events: readonly RecordEvent[]): readonly Check[] {
	const name = 'documents beside the record are those inside it';
	const documents = allOf(events, 'start-up opened')[0]?.body.documents ?? {};
	const beside = files.filter(
		(file) => FORMAT_FILES.includes(file.name) && file.name.endsWith('.json') && file.name !== 'manifest.json',
	);
	const bad = beside.flatMap(({ name: file, bytes }) => {
		const inside = documents[file.replace('.json', '')];
		if (inside !== undefined && textOf(bytes) === canonicalJson(inside as Json)) return [];
		return [failed(name, `${file} is not the one that the record holds.`, { facts: { file } })];
	});
	return offences(name, bad, `${beside.length} of them.`);
}
