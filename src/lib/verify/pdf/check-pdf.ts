import { fileVerdictOf, outcomeOf, type Check, type Outcome, type Verdict } from './check';
import { checkComplete, checkNothingFollows, checkOneRoot } from './check-file';
import { judgeUpdate, type SignatureReport } from './check-signature';
import type { PdfQuestion } from './question';
import type { PdfReading } from './read-pdf';

export type PdfReport = Verdict & {
	readonly outcome: Outcome;
	/** Everything that was checked: the file, then its signatures in their order. */
	readonly checks: readonly Check[];
	readonly signatures: readonly SignatureReport[];
};

/** Judges a file: what it is, that nothing but signatures was added to it, and each signature. */
export async function checkPdf(reading: PdfReading, question: PdfQuestion): Promise<PdfReport> {
	const { file } = reading;
	if (file === undefined) return report(reading.checks, []);
	const updates: Check[] = [];
	const signatures: SignatureReport[] = [];
	for (let revision = 1; revision < file.revisions.length; revision++) {
		const judged = await judgeUpdate(file, revision, { ...question, earlier: signatures.at(-1)?.claimed });
		updates.push(judged.update);
		if (judged.signature !== undefined) signatures.push(judged.signature);
	}
	const required = question.required ?? [];
	const ofFile = [...checkComplete(file, required), checkNothingFollows(file, signatures), checkOneRoot(signatures)];
	return report([...reading.checks, ...updates, ...ofFile], signatures);
}

function report(ofFile: readonly Check[], signatures: readonly SignatureReport[]): PdfReport {
	const checks = [...ofFile, ...signatures.flatMap((signature) => signature.checks)];
	return { ...fileVerdictOf(checks), outcome: outcomeOf(checks), checks, signatures };
}
