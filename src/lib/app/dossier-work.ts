import { buildDossier, INKS, signIncrement, type Progress } from '../dossier';
import { sign } from '../identity';
import type { DossierAnswer, DossierJob } from './dossier-job';

/** The work itself, wherever it runs. */
export async function doDossierWork(job: DossierJob, progress: Progress): Promise<DossierAnswer> {
	if (job.does === 'build') return { built: await buildDossier(job.input, progress) };
	const { pdf, key, signature } = job;
	return { signed: await signIncrement(pdf, { ...signature, inks: INKS, sign: (bytes) => sign(bytes, key) }) };
}
