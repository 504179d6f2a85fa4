import { createServer } from 'node:http';
import { mkdtempSync, rmSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { BrowserContext, Page } from 'playwright-core';
import { build } from 'vite';
import type { TestPage } from '../faults/page';
import { startChromium } from './chromium.mjs';

/** Where the page under test is, and what it was told has been saved. */
export type Served = { readonly address: string; readonly saved: Set<string>; readonly drafts: number[] };

/** Serves the page with the real store, and listens to what it reports as saved. */
export async function servedTablet<T>(use: (served: Served) => Promise<T>): Promise<T> {
	const script = await bundled();
	const saved = new Set<string>();
	const drafts: number[] = [];
	const server = createServer((request, response) => {
		const [path, said = ''] = (request.url ?? '').split('?');
		if (path === '/saved') saved.add(said);
		if (path === '/draft') drafts.push(Number(said));
		response.setHeader('content-type', path === '/page.js' ? 'text/javascript' : 'text/html; charset=utf-8');
		response.end(path === '/page.js' ? script : '<!doctype html><script src="/page.js"></script>');
	});
	await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
	try {
		return await use({ address: `http://localhost:${(server.address() as AddressInfo).port}/`, saved, drafts });
	} finally {
		server.closeAllConnections();
		server.close();
	}
}

export type Tab = {
	readonly page: Page;
	readonly ask: <Name extends keyof TestPage>(
		name: Name,
		...given: Parameters<TestPage[Name]>
	) => Promise<Awaited<ReturnType<TestPage[Name]>>>;
};

export async function openTab(context: BrowserContext, address: string): Promise<Tab> {
	const page = await context.newPage();
	await page.goto(address);
	const ask: Tab['ask'] = (name, ...given) =>
		page.evaluate(
			([method, args]) =>
				(globalThis as unknown as { tablet: Record<string, (...of: readonly unknown[]) => never> }).tablet[method]!(
					...args,
				),
			[name as string, given as readonly unknown[]] as const,
		);
	return { page, ask };
}

/** A browser that may be killed and started again on the same profile; none is left behind. */
export async function withProfile<T>(
	use: (start: (under?: readonly string[]) => ReturnType<typeof startChromium>, profile: string) => Promise<T>,
): Promise<T> {
	const profile = mkdtempSync(join(tmpdir(), 'gatehold-profile-'));
	const started: Awaited<ReturnType<typeof startChromium>>[] = [];
	try {
		return await use(async (under) => {
			const browser = await startChromium(profile, under);
			started.push(browser);
			return browser;
		}, profile);
	} finally {
		for (const browser of started) await browser.kill();
		rmSync(profile, { recursive: true, force: true, maxRetries: 5 });
	}
}

async function bundled(): Promise<string> {
	const built = await build({
		configFile: false,
		logLevel: 'error',
		publicDir: false,
		build: {
			write: false,
			minify: false,
			lib: { entry: join(import.meta.dirname, '../faults/page.ts'), formats: ['iife'], name: 'page' },
		},
	});
	const [output] = [built].flat();
	if (output === undefined || !('output' in output)) throw new Error('the page was not built');
	return output.output[0].code;
}
