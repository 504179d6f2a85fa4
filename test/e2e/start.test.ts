import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync } from 'node:fs';
import { createServer } from 'node:http';
import { get } from 'node:https';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { freePort, refusedStart, served } from '../support/served';

describe('npm start', () => {
	test('serves the page on this machine, under both its addresses, and forbids what a page can forbid', async () => {
		await served(async (address) => {
			const port = new URL(address).port;
			expect(address).toBe(`http://localhost:${port}`);
			for (const host of ['localhost', '127.0.0.1']) {
				const response = await fetch(`http://${host}:${port}/`);
				expect(response.status).toBe(200);
				expect(Object.fromEntries(response.headers)).toMatchObject({
					'content-security-policy': "frame-ancestors 'none'; object-src 'none'; base-uri 'none'",
					'x-content-type-options': 'nosniff',
					'referrer-policy': 'no-referrer',
					'cross-origin-opener-policy': 'same-origin',
					'cross-origin-resource-policy': 'same-origin',
				});
				const page = await response.text();
				expect(page).toMatch(
					/content-security-policy" content="default-src 'none';[^"]*script-src 'self' 'sha256-[^ ']+';/,
				);
			}
		});
	});

	test('does not answer other machines', async () => {
		await served(async (address) => {
			const outward = '127.0.0.2';
			await expect(fetch(`http://${outward}:${new URL(address).port}/`)).rejects.toThrow('fetch failed');
		});
	});

	test('refuses other machines without https, and says why', async () => {
		const { said, exitCode } = await refusedStart({ HOST: '0.0.0.0' });
		expect(exitCode).toBe(1);
		expect(said).toContain('Browsers give storage and cryptography to https or localhost');
	});

	test.each([
		[{ PORT: 'mill' }, 'PORT must be a number from 1 to 65535, not "mill".'],
		[{ PORT: '70000' }, 'PORT must be a number from 1 to 65535, not "70000".'],
		[{ TLS_CERT: 'cert.pem' }, 'TLS_CERT and TLS_KEY come together: the files of one certificate and its key.'],
		[{ TLS_CERT: 'no-such.pem', TLS_KEY: 'no-such.key' }, 'TLS_CERT: there is no file no-such.pem.'],
	])('refuses %j with one clear line', async (env, says) => {
		expect(await refusedStart(env)).toEqual({ said: says, exitCode: 1 });
	});

	test('refuses an old Node in words', async () => {
		const old = "Object.defineProperty(process, 'versions', { value: { ...process.versions, node: '20.18.3' } })";
		const env = { NODE_OPTIONS: `--import=data:text/javascript,${encodeURIComponent(old)}` };
		expect(await refusedStart(env)).toEqual({
			said: 'Gatehold needs Node 20.19 or newer; this is Node 20.18.3.',
			exitCode: 1,
		});
	});

	test('says which port to take when its own is taken', async () => {
		const port = await freePort();
		const other = createServer().listen(port, '127.0.0.1');
		try {
			const { said, exitCode } = await refusedStart({ PORT: String(port) });
			expect(said.split('\n').at(-1)).toBe(`Port ${port} is taken. Choose another: PORT=${port + 1} npm start`);
			expect(exitCode).toBe(1);
		} finally {
			other.close();
		}
	});

	test('serves other machines over https with a certificate', async () => {
		const folder = mkdtempSync(join(tmpdir(), 'gatehold-tls-'));
		const [cert, key] = [join(folder, 'cert.pem'), join(folder, 'key.pem')];
		const request = ['req', '-x509', '-newkey', 'ec', '-pkeyopt', 'ec_paramgen_curve:P-256', '-nodes', '-days', '1'];
		const names = ['-subj', '/CN=localhost', '-addext', 'subjectAltName=DNS:localhost,IP:127.0.0.1'];
		execFileSync('openssl', [...request, '-keyout', key, '-out', cert, ...names], { stdio: 'ignore' });
		await served(
			async (address) => {
				expect(address).toMatch(/^https:\/\/127\.0\.0\.2:/);
				const { status, hsts } = await headOverTls(`${address}/`, cert);
				expect(status).toBe(200);
				expect(hsts).toBe('max-age=31536000');
			},
			{ HOST: '127.0.0.2', TLS_CERT: cert, TLS_KEY: key },
		);
	});
});

const headOverTls = (address: string, cert: string): Promise<{ status: number | undefined; hsts: unknown }> =>
	new Promise((resolve, reject) => {
		const options = { ca: readFileSync(cert), servername: 'localhost', agent: false };
		get(address, options, (response) => {
			response.resume();
			resolve({ status: response.statusCode, hsts: response.headers['strict-transport-security'] });
		}).on('error', reject);
	});
