/// <reference lib="webworker" />
import { build, files, version } from '$service-worker';

/**
 * Keeps the whole app on the tablet, so that it runs where no server answers: a reload and a deep link too. A new version
 * waits until every tab of the old one is closed; nobody's work is changed under their hands.
 */
const worker = self as unknown as ServiceWorkerGlobalScope;

const CACHE = `gatehold ${version}`;
/** One page of files: every address of the app begins with it. */
const SHELL = '/';

worker.addEventListener('install', (event) => {
	event.waitUntil(caches.open(CACHE).then((cache) => cache.addAll([SHELL, ...build, ...files])));
});

worker.addEventListener('activate', (event) => {
	event.waitUntil(
		caches
			.keys()
			.then((names) => Promise.all(names.filter((name) => name !== CACHE).map((name) => caches.delete(name)))),
	);
});

worker.addEventListener('fetch', (event) => {
	const { request } = event;
	if (request.method !== 'GET' || new URL(request.url).origin !== worker.location.origin) return;
	event.respondWith(answer(request));
});

async function answer(request: Request): Promise<Response> {
	const cache = await caches.open(CACHE);
	const kept = await cache.match(request.mode === 'navigate' ? SHELL : request, { ignoreVary: true });
	return kept ?? fetch(request);
}
