import type { Result } from '../base';
import type { ClosingSignature, DossierError, DossierInput, Progress, SignError } from '../dossier';
import type { SigningKey } from '../identity';
import { startDossierWorker } from './start-dossier-worker';

type Bytes = Uint8Array<ArrayBuffer>;

/** The key goes as a handle that no script can read; the worker ends with its one answer, and the handle with it. */
export type DossierJob =
	| { readonly does: 'build'; readonly input: DossierInput }
	| {
			readonly does: 'sign';
			readonly pdf: Bytes;
			readonly key: SigningKey;
			readonly signature: Omit<ClosingSignature, 'inks' | 'sign'>;
	  };

export type DossierAnswer =
	| { readonly built: Result<Bytes, DossierError> }
	| { readonly signed: Result<Bytes, SignError> }
	| { readonly stopped: string }
	| { readonly cancelled: true };

export type DossierProgress = {
	readonly part: Parameters<Progress>[0];
	readonly done: number;
	readonly of: number;
};

export type DossierTold = DossierProgress | DossierAnswer;

/** Runs one job; cancelled, it answers so at once and does nothing more. */
export type RunDossierJob = (
	job: DossierJob,
	progress: (told: DossierProgress) => void,
) => { readonly answer: Promise<DossierAnswer>; readonly cancel: () => void };

/** Beside the page, in a worker that ends with its answer. */
export const besideThePage: RunDossierJob = (job, progress) => {
	const worker = startDossierWorker();
	let end: (answer: DossierAnswer) => void = () => undefined;
	const answer = new Promise<DossierAnswer>((resolve) => {
		end = (told) => {
			worker.terminate();
			resolve(told);
		};
	});
	worker.onmessage = ({ data }: MessageEvent<DossierTold>) => {
		if ('part' in data) progress(data);
		else end(data);
	};
	worker.onerror = ({ message }) => end({ stopped: message });
	worker.postMessage(job);
	return { answer, cancel: () => end({ cancelled: true }) };
};
