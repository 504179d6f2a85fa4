import { rebuildDossier } from '../dossier';
import { BUILD } from '../demo';
import { verifyDossier, verifyRecord, type Report } from '../verify';
import { restate } from '../wording';

export type FileToCheck = {
	readonly name: string;
	readonly bytes: Uint8Array<ArrayBuffer>;
	/** DER of the site root that this tablet trusts, when it has one. */
	readonly root: Uint8Array<ArrayBuffer> | undefined;
	readonly now: string;
};

export type CheckedFile = Pick<Report, 'class' | 'sub' | 'outcome' | 'process' | 'startUp' | 'checks'>;

/** A dossier or a record, read back and judged check by check. */
export async function checkFile({ name, bytes, root, now }: FileToCheck): Promise<CheckedFile> {
	const isPdf = new TextDecoder('latin1').decode(bytes.subarray(0, 5)) === '%PDF-';
	if (!isPdf) return verifyRecord({ lines: [{ name, bytes }], root, now, restate });
	return verifyDossier(bytes, { root, now, rebuild: { writer: BUILD, build: rebuildDossier }, restate });
}
