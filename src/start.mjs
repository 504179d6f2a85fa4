/**
 * Serves the built app: `npm start`. PORT chooses the port. Only this machine is served, unless HOST comes together
 * with TLS_CERT and TLS_KEY: without https a browser gives an app from another machine neither storage nor cryptography.
 */
import { existsSync, readFileSync } from 'node:fs';
import http from 'node:http';
import https from 'node:https';
import { URL } from 'node:url';

const MINIMUM_NODE = [20, 19];
const LOCAL = ['localhost', '127.0.0.1', '::1'];

/** What a meta element in the page cannot say; the policy for scripts stands in svelte.config.js. */
const HEADERS = {
	'Content-Security-Policy': "frame-ancestors 'none'; object-src 'none'; base-uri 'none'",
	'X-Content-Type-Options': 'nosniff',
	'Referrer-Policy': 'no-referrer',
	'Cross-Origin-Opener-Policy': 'same-origin',
	'Cross-Origin-Resource-Policy': 'same-origin',
	'Permissions-Policy': 'camera=(self), geolocation=(), microphone=()',
};

/** @typedef {{ port: number, host: string | undefined, tls: { cert: Buffer, key: Buffer } | undefined }} Settings */

try {
	demandNode(process.versions.node);
	const settings = readSettings(process.env);
	const { buildIfStale } = await import('./build.mjs');
	if (buildIfStale('app')) console.log('The app was built anew.');
	await serve(settings);
} catch (error) {
	console.error(error instanceof Error ? error.message : error);
	process.exitCode = 1;
}

/** @param {string} version */
function demandNode(version) {
	const [major = 0, minor = 0] = version.split('.').map(Number);
	const [needMajor = 0, needMinor = 0] = MINIMUM_NODE;
	if (major > needMajor || (major === needMajor && minor >= needMinor)) return;
	throw new Error(`Gatehold needs Node ${needMajor}.${needMinor} or newer; this is Node ${version}.`);
}

/**
 * @param {NodeJS.ProcessEnv} env
 * @returns {Settings}
 */
function readSettings({ PORT, HOST, TLS_CERT, TLS_KEY }) {
	const port = PORT === undefined || PORT === '' ? 3000 : Number(PORT);
	if (!Number.isInteger(port) || port < 1 || port > 65_535)
		throw new Error(`PORT must be a number from 1 to 65535, not "${PORT}".`);
	if ((TLS_CERT === undefined) !== (TLS_KEY === undefined))
		throw new Error('TLS_CERT and TLS_KEY come together: the files of one certificate and its key.');
	const tls =
		TLS_CERT !== undefined && TLS_KEY !== undefined
			? { cert: readNamed('TLS_CERT', TLS_CERT), key: readNamed('TLS_KEY', TLS_KEY) }
			: undefined;
	const host = HOST === undefined || HOST === '' || LOCAL.includes(HOST) ? undefined : HOST;
	if (host !== undefined && tls === undefined) {
		throw new Error(
			`HOST=${host} would serve other machines over http. Browsers give storage and cryptography to https or localhost\n` +
				'alone, so nothing could be kept or signed there. Set TLS_CERT and TLS_KEY too, or leave HOST away.',
		);
	}
	return { port, host, tls };
}

/**
 * @param {string} setting
 * @param {string} path
 */
function readNamed(setting, path) {
	if (!existsSync(path)) throw new Error(`${setting}: there is no file ${path}.`);
	return readFileSync(path);
}

/** @param {Settings} settings */
async function serve({ port, host, tls }) {
	const address = `${tls ? 'https' : 'http'}://${host ?? 'localhost'}:${port}`;
	// Read by the handler when it is loaded.
	process.env.ORIGIN = address;
	const built = new URL('../build/app/handler.js', import.meta.url);
	const { handler } = /** @type {{ handler: http.RequestListener }} */ (await import(built.href));
	const headers = tls ? { ...HEADERS, 'Strict-Transport-Security': 'max-age=31536000' } : HEADERS;

	/** @type {http.RequestListener} */
	const answer = (request, response) => {
		for (const [name, value] of Object.entries(headers)) response.setHeader(name, value);
		handler(request, response);
	};
	// A browser may look for localhost under either address.
	for (const at of host === undefined ? ['127.0.0.1', '::1'] : [host]) {
		await listen(tls ? https.createServer(tls, answer) : http.createServer(answer), port, at);
	}
	console.log(`Gatehold is at ${address}`);
}

/**
 * @param {http.Server | https.Server} server
 * @param {number} port
 * @param {string} host
 */
function listen(server, port, host) {
	return new Promise((resolve, reject) => {
		server.once('listening', resolve);
		server.once('error', (/** @type {NodeJS.ErrnoException} */ error) => {
			if (error.code === 'EADDRINUSE')
				reject(new Error(`Port ${port} is taken. Choose another: PORT=${port + 1} npm start`));
			else if (host === '::1' && (error.code === 'EADDRNOTAVAIL' || error.code === 'EAFNOSUPPORT')) resolve(undefined);
			else reject(error);
		});
		server.listen(port, host);
	});
}
