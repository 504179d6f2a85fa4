/// <reference lib="webworker" />
import { build, files, version } from '$service-worker';

/**
 * Keeps the whole app on the tablet, so that it runs where no server answers: a reload and a deep link too. A new version
 * waits until every tab of the old one is closed, or until a person consents while no start-up is open.
 */
const worker = self as unknown as ServiceWorkerGlobalScope;

const CACHE = `gatehold ${version}`;
/** One page of files: every address of the app begins with it. */
const SHELL = '/';

worker.addEventListener('install', (event) => {
	event.waitUntil(keepAll());
});

worker.addEventListener('activate', (event) => {
	event.waitUntil(dropOld().then(() => worker.clients.claim()));
});

worker.addEventListener('message', ({ data }) => {
	if (data === 'take over') void worker.skipWaiting();
});

worker.addEventListener('fetch', (event) => {
	const { request } = event;
	if (request.method !== 'GET' || new URL(request.url).origin !== worker.location.origin) return;
	event.respondWith(answer(request));
});

/** All or nothing: a version of which one file is missing is not installed. Names of built files change with their content. */
async function keepAll(): Promise<void> {
	const cache = await caches.open(CACHE);
	const fresh = [SHELL, ...files].map((path) => new Request(path, { cache: 'reload' }));
	await cache.addAll([...fresh, ...build]);
}

async function dropOld(): Promise<void> {
	const names = await caches.keys();
	await Promise.all(names.filter((name) => name !== CACHE).map((name) => caches.delete(name)));
}

async function answer(request: Request): Promise<Response> {
	const cache = await caches.open(CACHE);
	const kept = await cache.match(request.mode === 'navigate' ? SHELL : request, { ignoreVary: true });
	return kept ?? fetch(request);
}
