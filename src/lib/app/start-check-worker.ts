/** In a file of its own: the bundler finds a worker by this very expression. */
export const startCheckWorker = (): Worker =>
	new Worker(new URL('./check-worker.ts', import.meta.url), { type: 'module' });
