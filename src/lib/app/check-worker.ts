import { checkFile, type FileToCheck } from './check-file';

/** Runs beside the page, so that a long check leaves it free and can be stopped. */
self.addEventListener('message', ({ data }: MessageEvent<FileToCheck>) => {
	checkFile(data).then(
		({ class: result, sub, outcome, process, startUp, checks }) =>
			self.postMessage({ class: result, sub, outcome, process, startUp, checks }),
		(thrown: unknown) => self.postMessage({ stopped: String(thrown) }),
	);
});
