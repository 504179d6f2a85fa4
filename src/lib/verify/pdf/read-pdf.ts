import { sha256Hex } from '../../base';
import { findActiveContent } from './active-content';
import { readAttachments, type Attachment } from './attachments';
import { failed, passed, type Check } from './check';
import { attempt } from './damage';
import { readPdfFile, type PdfFile } from './pdf-file';
import { signatureFields } from './signature-field';

type Bytes = Uint8Array<ArrayBuffer>;

/** A file read back, before anybody asks who signed it. */
export type PdfReading = {
	/** What was found about the file itself. */
	readonly checks: readonly Check[];
	/** False when the bytes are not a PDF at all, and there is nothing to judge. */
	readonly isPdf: boolean;
	/** Out of the first state, and out of no other. */
	readonly attachments: readonly Attachment[];
	/** The first state, to its %%EOF: what a writer that is given the record again must write. */
	readonly base: Bytes | undefined;
	/** Undefined when the file could not be read to its end; the checks say where. */
	readonly file: PdfFile | undefined;
};

/** Reads any bytes, and always answers. */
export function readPdf(bytes: Bytes): PdfReading {
	const isPdf = new TextDecoder('latin1').decode(bytes.subarray(0, 5)) === '%PDF-';
	const file = attempt(() => readPdfFile(bytes));
	if (!file.ok) {
		const { at, expected } = file.error;
		const because = isPdf ? `At byte ${at} it is damaged: ${expected} expected.` : 'It does not begin with %PDF-.';
		const check = failed(READABLE, because, { facts: { at, expected }, sub: 'FORMAT_FAILURE' });
		return { checks: [check], isPdf, attachments: [], base: undefined, file: undefined };
	}
	const attachments = readAttachments(file.value);
	const states = file.value.revisions.length;
	const readable = `Every byte belongs to an object that the cross-references name, in ${states} states.`;
	return {
		checks: [
			passed(READABLE, readable, { facts: { bytes: bytes.length, states } }),
			checkEnd(file.value),
			checkActive(file.value),
			checkForm(file.value),
			attachments.ok
				? passed('attachments', `Read from the first state: ${attachments.value.map(({ name }) => name).join(', ')}.`, {
						facts: Object.fromEntries(attachments.value.map((found) => [found.name, sha256Hex(found.bytes)])),
					})
				: failed('attachments', `At byte ${attachments.error.at}: ${attachments.error.expected} expected.`, {
						facts: { at: attachments.error.at, expected: attachments.error.expected },
						sub: 'FORMAT_FAILURE',
					}),
		],
		isPdf,
		attachments: attachments.ok ? attachments.value : [],
		base: baseOf(file.value),
		file: file.value,
	};
}

const READABLE = 'file can be read to the last byte';

function checkEnd({ bytes, revisions }: PdfFile): Check {
	const name = 'file ends where its last state ends';
	const rest = bytes.length - (revisions.at(-1)?.to ?? 0);
	if (rest === 0) return passed(name, 'Nothing follows %%EOF.');
	return failed(name, `${rest} bytes follow the last %%EOF.`, { facts: { rest }, sub: 'FORMAT_FAILURE' });
}

function checkActive(file: PdfFile): Check {
	const name = 'nothing in it acts';
	const found = findActiveContent(file);
	if (found.length === 0) return passed(name, 'No program, no link to a file, no encryption, no packed objects.');
	const places = found.map(({ object, what }) => `${what} in object ${object}`).join(', ');
	return failed(name, `It holds ${places}.`, { facts: { found: places }, sub: 'FORMAT_FAILURE' });
}

function checkForm(file: PdfFile): Check {
	const name = 'form holds signature fields and nothing else';
	const fields = signatureFields(file, 0);
	const sub = 'FORMAT_FAILURE';
	if (fields === undefined) return failed(name, 'Something else stands in the form of the first state.', { sub });
	const early = fields.filter(({ value }) => value !== undefined).map((field) => field.name);
	if (early.length > 0) return failed(name, `Filled before the first update: ${early.join(', ')}.`, { sub });
	const facts = { fields: fields.map((field) => field.name).join(', ') };
	return passed(name, `${fields.length} fields, all of them open in the first state.`, { facts });
}

function baseOf({ bytes, text, revisions }: PdfFile): Bytes | undefined {
	const to = revisions[0]?.to;
	return to === undefined ? undefined : bytes.slice(0, text.lastIndexOf('%%EOF', to) + '%%EOF'.length);
}
