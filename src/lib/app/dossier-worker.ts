import type { DossierJob, DossierTold } from './dossier-job';
import { doDossierWork } from './dossier-work';

/** Writes and signs beside the page: a sheet after the other, and the page stays free. */
self.addEventListener('message', ({ data }: MessageEvent<DossierJob>) => {
	doDossierWork(data, (part, done, of) => tell({ part, done, of })).then(tell, (thrown: unknown) =>
		tell({ stopped: String(thrown) }),
	);
});

const tell = (told: DossierTold): void => self.postMessage(told);
