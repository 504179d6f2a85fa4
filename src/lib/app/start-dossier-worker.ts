/** In a file of its own: the bundler finds a worker by this very expression. */
export const startDossierWorker = (): Worker =>
	new Worker(new URL('./dossier-worker.ts', import.meta.url), { type: 'module' });
