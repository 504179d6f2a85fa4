import { VOUCHED } from './chain-checks';
import { failed, passed, type Check, type Outcome } from './check';
import type { SignatureReport } from './check-signature';
import type { PdfFile } from './pdf-file';
import type { RequiredSignature } from './question';
import { signatureFields } from './signature-field';

/** A file from which the last signature was cut off is whole in every other way: only the open field tells. */
export function checkComplete(file: PdfFile, required: readonly RequiredSignature[]): readonly Check[] {
	const fields = signatureFields(file, file.revisions.length - 1) ?? [];
	const signed = new Set(fields.filter(({ value }) => value !== undefined).map(({ name }) => name));
	const wanted = new Set([...fields.map(({ name }) => name), ...required.map(({ field }) => field)]);
	if (wanted.size === 0) {
		return [failed('a signature is asked for', 'The file has no field for one.', { sub: 'SIGNED_DATA_NOT_FOUND' })];
	}
	return [...wanted].map((field) => {
		const name = `field ${field} is signed`;
		if (signed.has(field)) return passed(name, 'It holds a signature.', { field });
		return failed(name, 'It is open: the file is not complete, or its end was cut off.', { field });
	});
}

/** What follows the last signature was signed by nobody. */
export function checkNothingFollows(file: PdfFile, signatures: readonly SignatureReport[]): Check {
	const name = 'nothing follows the last signature';
	const last = signatures.at(-1);
	if (last === undefined) return failed(name, 'There is no signature.', { sub: 'SIGNED_DATA_NOT_FOUND' });
	const from = file.revisions[last.revision]?.to ?? 0;
	const to = file.bytes.length;
	if (from === to) return passed(name, 'It covers the file to its end.');
	return failed(name, `${to - from} bytes follow it.`, { facts: { from, to }, sub: 'FORMAT_FAILURE' });
}

/** All who sign one dossier belong to one site: a file signed under two roots was put together. */
export function checkOneRoot(signatures: readonly SignatureReport[]): Check {
	const name = 'one root vouches for all signers or for none';
	const whose = (outcome: Outcome) =>
		signatures.filter(({ checks }) => checks.some((check) => check.name === VOUCHED && check.outcome === outcome));
	const [known, unknown] = [whose('passed'), whose('undecided')];
	if (known.length === 0 || unknown.length === 0) return passed(name, 'No signature stands apart.');
	const strangers = unknown.map(({ field }) => field).join(', ');
	return failed(name, `Not under the root of the others: ${strangers}.`, { facts: { strangers } });
}
