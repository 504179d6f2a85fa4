import * as v from 'valibot';
import { fromBase64, fromUtf8, parseJson, sha256Hex } from '../base';
import { buildDossier } from './build-dossier';
import type { DossierInput } from './input';
import { parsePlant } from '../plant';
import { parseProcedure } from '../procedure';
import { allOf, parseEventLine } from '../record';
import { isLanguage } from '../wording';

type Bytes = Uint8Array<ArrayBuffer>;
type Files = readonly { readonly name: string; readonly mediaType: string | undefined; readonly bytes: Bytes }[];

/**
 * Writes the base of a dossier again, out of the files that it holds: what verify is given to compare the pages with, since it
 * knows no writer itself.
 *
 * @returns undefined when what the dossier holds is not enough, or is refused
 */
export async function rebuildDossier(files: Files): Promise<Bytes | undefined> {
	const input = inputOf(files);
	if (input === undefined) return undefined;
	const again = await buildDossier(input);
	return again.ok ? again.value : undefined;
}

/** The part of the table of contents that a writer needs. */
const ManifestSchema = v.object({
	language: v.pipe(v.string(), v.guard(isLanguage)),
	writer: v.string(),
	signatures: v.array(
		v.strictObject({
			field: v.string(),
			meaning: v.picklist(['performed', 'reviewed', 'accepted']),
			roles: v.array(v.string()),
		}),
	),
});

/** Everything that a dossier was written from lies inside it. */
function inputOf(files: Files): DossierInput | undefined {
	const text = (name: string): string | undefined => textOf(files.find((file) => file.name === name)?.bytes);
	const manifest = v.safeParse(ManifestSchema, jsonOf(text('manifest.json')));
	const procedure = parseProcedure(jsonOf(text('procedure.json')));
	const plant = parsePlant(jsonOf(text('plant.json')));
	const [root] = certificatesIn(text('root.pem'));
	if (!manifest.success || !procedure.ok || !plant.ok || root === undefined) return undefined;
	const lines = linesOf(text('record.ndjson'));
	const names = namesIn(lines);
	const { language, writer, signatures } = manifest.output;
	return {
		lines,
		siteLines: linesOf(text('site.ndjson')),
		procedure: procedure.value,
		plant: plant.value,
		root,
		certificates: certificatesIn(text('certificates.pem')),
		files: files.flatMap(({ name, mediaType, bytes }) => {
			const known = names.get(sha256Hex(bytes));
			if (!name.startsWith('attachment-') || mediaType === undefined || known === undefined) return [];
			return [{ name: known, mediaType, bytes }];
		}),
		language,
		writer,
		signatures,
	};
}

/** Inside a dossier an attachment is named by its hash; the events say what people call it. */
function namesIn(lines: readonly string[]): ReadonlyMap<string, string> {
	const events = lines.flatMap((line) => {
		const event = parseEventLine(line);
		return event.ok ? [event.value] : [];
	});
	const named = [
		...allOf(events, 'entry').flatMap(({ body }) => body.attachments ?? []),
		...allOf(events, 'note').flatMap(({ body }) => body.attachments ?? []),
		...allOf(events, 'series attached').map(({ body }) => body.attachment),
	];
	return new Map(named.map(({ hash, name }) => [hash, name]));
}

const linesOf = (text: string | undefined): readonly string[] => (text ?? '').split('\n').filter((line) => line !== '');

function textOf(bytes: Bytes | undefined): string | undefined {
	try {
		return bytes === undefined ? undefined : fromUtf8(bytes);
	} catch {
		return undefined;
	}
}

function jsonOf(text: string | undefined): unknown {
	const json = text === undefined ? undefined : parseJson(text);
	return json?.ok === true ? json.value : undefined;
}

function certificatesIn(pem: string | undefined): readonly Bytes[] {
	const found = (pem ?? '').matchAll(/-----BEGIN CERTIFICATE-----([\s\S]*?)-----END CERTIFICATE-----/g);
	return [...found].flatMap(([, body = '']) => fromBase64(body.replace(/\s/g, '')) ?? []);
}
