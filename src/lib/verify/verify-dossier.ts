import { sameBytes } from '../base';
import type { Instant, TrustList } from '../identity';
import { checkManifest, readManifest } from './manifest';
import { filesOf } from './dossier-files';
import { failed, passed, undecided, type Check } from './pdf/check';
import { checkPdf } from './pdf/check-pdf';
import type { SignatureReport } from './pdf/check-signature';
import { readPdf } from './pdf/read-pdf';
import { makeReport, type Report } from './report';
import type { Restate } from './check-statements';
import { judgeRecord } from './verify-record';

type Bytes = Uint8Array<ArrayBuffer>;
type Named = { readonly name: string; readonly mediaType: string | undefined; readonly bytes: Bytes };

/** Writes the base of a dossier again, out of what the dossier holds. Handed in, so that the reader knows no writer. */
export type Rebuild = {
	/** Program and version: another version may well write other bytes for the same record. */
	readonly writer: string;
	/** @returns undefined when what the dossier holds is not enough, or is refused */
	readonly build: (files: readonly Named[]) => Promise<Bytes | undefined>;
};

export type DossierQuestion = {
	/** DER of the site root as the judge knows it. */
	readonly root?: Bytes | undefined;
	readonly trustList?: TrustList | undefined;
	readonly now: Instant;
	/** The file existed not later than this: an archive receipt. */
	readonly provenBy?: Instant | undefined;
	readonly rebuild?: Rebuild | undefined;
	readonly restate?: Restate | undefined;
};

export type DossierReport = Report & {
	/** False when the bytes are not a PDF at all. */
	readonly isPdf: boolean;
	readonly signatures: readonly SignatureReport[];
};

/**
 * Reads a dossier back: the file and its closing signatures; then, out of the state that nobody can have changed since, the
 * record inside, event by event; then whether the pages are what this record makes.
 */
export async function verifyDossier(bytes: Bytes, question: DossierQuestion): Promise<DossierReport> {
	const { root, trustList, now, provenBy } = question;
	const reading = readPdf(bytes);
	const files = filesOf(reading.attachments);
	const manifest = readManifest(files.manifest);
	const required = manifest?.signatures ?? [];
	const record = await judgeRecord({
		lines: files.logs,
		attachments: files.attachments,
		certificates: files.certificates,
		root,
		rootInFile: files.root,
		trustList,
		now,
		provenBy,
		restate: question.restate,
	});
	// The newest list that the record brings is the list that the closing signatures are asked against as well.
	const pdf = await checkPdf(reading, {
		root: root ?? files.root,
		trustList: record.trustList,
		now,
		provenBy,
		required,
	});
	const checks = [
		...pdf.checks,
		...checkManifest(manifest, reading.attachments, record.about),
		...record.checks,
		await checkRebuilt(reading.base, reading.attachments, manifest?.writer, question.rebuild),
	];
	return { ...makeReport(checks, record.about), isPdf: reading.isPdf, signatures: pdf.signatures };
}

/** The writer being deterministic, what people read on the pages is what this record makes, or somebody drew on them. */
async function checkRebuilt(
	base: Bytes | undefined,
	files: readonly Named[],
	writtenBy: string | undefined,
	rebuild: Rebuild | undefined,
): Promise<Check> {
	const name = 'pages are those that the record makes';
	if (base === undefined || writtenBy === undefined) return undecided(name, 'There is nothing to compare.');
	if (rebuild === undefined)
		return undecided(name, 'Nobody wrote them again: the pages were not compared with the record.');
	const facts = { writtenBy, writer: rebuild.writer };
	if (writtenBy !== rebuild.writer)
		return undecided(name, `Written by ${writtenBy}; this is ${rebuild.writer}, which may set them otherwise.`, {
			facts,
		});
	const again = await rebuild.build(files);
	if (again === undefined) return failed(name, 'What the file holds does not make a dossier again.', { facts });
	const whole = upToEnd(again);
	if (sameBytes(whole, base))
		return passed(name, `Written again from the record: the same ${base.length} bytes.`, { facts });
	const at = base.findIndex((byte, i) => byte !== whole[i]);
	return failed(name, `Written again from the record, they differ from byte ${at === -1 ? base.length : at} on.`, {
		facts,
	});
}

/** Without the line end that may follow %%EOF. */
function upToEnd(bytes: Bytes): Bytes {
	let to = bytes.length;
	while (bytes[to - 1] === 0x0a || bytes[to - 1] === 0x0d) to--;
	return bytes.subarray(0, to);
}
