import type { Certificate, Instant } from '../../identity';
import { chainChecks, VOUCHED } from './chain-checks';
import { checkName, checkShown, checkWhen } from './claim-checks';
import { failed, passed, undecided, verdictOf, type Check, type Verdict } from './check';
import type { PdfFile } from './pdf-file';
import type { PdfQuestion } from './question';
import { shownTexts } from './shown-text';
import { checkCoverage, checkDigest, checkKey, readContents } from './signature-checks';
import {
	appearanceOf,
	readSignatureDictionary,
	type SignatureDictionary,
	type SignatureField,
} from './signature-field';
import { readUpdate } from './update';

export type SignatureReport = Verdict & {
	readonly field: string;
	/** Which state of the file it made; the first state, which nobody signed, is 0. */
	readonly revision: number;
	readonly signer: Certificate | undefined;
	readonly name: string | undefined;
	readonly reason: string | undefined;
	/** By the clock of the signer. */
	readonly claimed: Instant | undefined;
	readonly checks: readonly Check[];
};

type Question = PdfQuestion & { readonly earlier: Instant | undefined };

/** What an update changed, and whether the signature that it brought is good. */
export async function judgeUpdate(
	file: PdfFile,
	revision: number,
	question: Question,
): Promise<{ readonly update: Check; readonly signature: SignatureReport | undefined }> {
	const { field, signature, trespasses } = readUpdate(file, revision);
	const { from = 0, to = 0 } = file.revisions[revision] ?? {};
	const name = `update ${revision} is one signature and nothing else`;
	const said = { facts: { from, to }, ...(field === undefined ? {} : { field: field.name }) };
	const update =
		trespasses.length === 0
			? passed(name, `Bytes ${from} to ${to} fill the field ${field?.name ?? ''}.`, said)
			: failed(name, `Bytes ${from} to ${to}: ${trespasses.join('; ')}.`, { ...said, sub: 'FORMAT_FAILURE' });
	if (field === undefined || signature === undefined) return { update, signature: undefined };
	const dictionary = readSignatureDictionary(signature);
	const { checks, signer } = await judgeSignature(file, { revision, field, dictionary, question });
	const { claimed, reason, name: shown } = dictionary;
	const about = { field: field.name, revision, signer, name: shown, reason, claimed, checks };
	return { update, signature: { ...verdictOf([update, ...checks]), ...about } };
}

type OneSignature = {
	readonly revision: number;
	readonly field: SignatureField;
	readonly dictionary: SignatureDictionary;
	readonly question: Question;
};

async function judgeSignature(
	file: PdfFile,
	one: OneSignature,
): Promise<{ readonly checks: readonly Check[]; readonly signer: Certificate | undefined }> {
	const { revision, dictionary, question } = one;
	const field = one.field.name;
	const coverage = checkCoverage(file, revision, field, dictionary);
	const { checks: format, cms } = readContents(file, field, dictionary);
	const when = checkWhen(field, dictionary, question.earlier);
	if (cms === undefined) return { checks: [coverage, ...format, ...when], signer: undefined };
	const digest = checkDigest(file, field, dictionary, cms);
	const { checks: key, certificate: signer } = await checkKey(field, cms);
	const bytes = [coverage, ...format, digest, ...key];
	if (signer === undefined) return { checks: [...bytes, ...when], signer };
	const appearance = appearanceOf(file, one.field, revision);
	const texts = appearance === undefined ? undefined : shownTexts(file, appearance, revision);
	const claims = [checkName(field, dictionary, signer), checkShown(field, texts, dictionary, signer), ...when];
	const { claimed } = dictionary;
	if (claimed === undefined) return { checks: [...bytes, ...claims], signer };
	const trust = await checkTrust(field, { signer, claimed, others: cms.otherCertificates, question });
	return { checks: [...bytes, ...claims, ...trust], signer };
}

async function checkTrust(
	field: string,
	about: {
		readonly signer: Certificate;
		readonly claimed: Instant;
		readonly others: readonly Uint8Array<ArrayBuffer>[];
		readonly question: Question;
	},
): Promise<readonly Check[]> {
	const { signer, claimed, others, question } = about;
	const { root, now, provenBy, trustList } = question;
	if (root === undefined) {
		const because = 'No site root was given: who signed is only what the file says.';
		return [undecided(VOUCHED, because, { field, sub: 'NO_CERTIFICATE_CHAIN_FOUND' })];
	}
	const roles = question.required?.find((required) => required.field === field)?.roles;
	const scope = roles === undefined ? undefined : { roles };
	return chainChecks(field, {
		certificate: signer.der,
		others,
		root,
		times: { claimed, now, provenBy },
		trustList,
		scope,
	});
}
