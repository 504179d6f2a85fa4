import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { svelte, vitePreprocess } from '@sveltejs/vite-plugin-svelte';
import type { Page } from 'playwright-core';
import { build } from 'vite';
import { expect, test } from 'vitest';
import { DEMONSTRATION_PIN } from '../../src/lib/app';
import { fromBase64 } from '../../src/lib/base';
import { toPem } from '../../src/lib/identity';
import { withChromium } from '../support/chromium.mjs';
import { demoFiles } from '../support/demo-files';
import { PdfJudges, readPdfsig } from '../support/pdf-judges';
import type { InPage } from '../support/play-in-page';
import { served } from '../support/served';

const HOUSE = join(import.meta.dirname, '../..');
/** Pictures of the way are written where this names a folder. */
const PICTURES = process.env.DOSSIER_PICTURES;

test('a start-up is sealed, signed by three people, saved and verified without a server, and other programs agree', async () => {
	const script = await bundled();
	const folder = mkdtempSync(join(tmpdir(), 'gatehold-dossier-'));
	try {
		await withChromium(async (browser) => {
			const page = await browser.newPage();
			page.setDefaultTimeout(30_000);
			const complaints: string[] = [];
			page.on('pageerror', (error) => complaints.push(String(error)));
			const address = await served(async (at) => {
				await page.goto(at);
				await page.evaluate(() => navigator.serviceWorker.ready.then(() => undefined));
				await page.evaluate(script);
				const id = await inPage(page, 'play', [...demoFiles().keys()]);
				return `${at}/start-ups/${encodeURIComponent(id)}/dossier`;
			});

			await page.goto(address);
			await page.getByRole('heading', { name: 'The record is complete and not sealed' }).waitFor();
			await picture(page, 'seal');
			await page.getByRole('checkbox').check();
			await page.getByLabel('PIN').fill(DEMONSTRATION_PIN);
			await page.getByRole('button', { name: 'Seal the record' }).click();
			await page.getByRole('button', { name: 'Make the dossier' }).click();
			await page.getByRole('heading', { name: 'The dossier waits to be performed' }).waitFor({ timeout: 90_000 });
			await sign(page, 'performed', 'Edda Varnholt', '11223345');
			await page.getByText('That PIN is wrong. 9 tries are left. Nothing was signed.').waitFor();
			await sign(page, 'performed', 'Edda Varnholt');
			await page.getByRole('heading', { name: 'The dossier waits to be reviewed' }).waitFor();
			await page.reload();
			await page.getByRole('heading', { name: 'The dossier waits to be reviewed' }).waitFor();
			await picture(page, 'reviewed');
			await sign(page, 'reviewed', 'Tove Arrensdal');
			await page.getByRole('heading', { name: 'The dossier waits to be accepted' }).waitFor();
			await sign(page, 'accepted', 'Imre Castellvor');
			await page.getByRole('heading', { name: 'The dossier is closed' }).waitFor();
			await page.getByRole('heading', { name: 'This is what was signed' }).waitFor({ timeout: 90_000 });
			await picture(page, 'closed');

			const download = page.waitForEvent('download');
			await page.getByRole('button', { name: 'Save the PDF' }).click();
			const file = join(folder, 'start-up.pdf');
			await (await download).saveAs(file);

			// The same file, brought to the archive beside a record that somebody damaged.
			await page.goto(new URL('/archive', address).href);
			await page.getByText(/^FM-1\/.*Dossier verified|Dossier verified .*: passed/).waitFor();
			await picture(page, 'archive');
			const damaged = join(HOUSE, 'static/demo/damaged-record.ndjson');
			await page.locator('input[type=file]').first().setInputFiles([file, damaged]);
			await page.getByRole('heading', { name: 'Files: 2' }).waitFor({ timeout: 120_000 });
			await picture(page, 'archive-passed');
			await page.getByRole('button', { name: /damaged-record/ }).click();
			await page.getByRole('heading', { name: 'This is not what was signed' }).waitFor();
			await picture(page, 'archive-failed');
			expect(complaints).toEqual([]);

			await page.evaluate(script);
			const root = fromBase64(await inPage(page, 'root'))!;
			judge(new Uint8Array(readFileSync(file)), root, { file, pem: join(folder, 'root.pem') });
		});
	} finally {
		rmSync(folder, { recursive: true, force: true });
	}
}, 400_000);

function judge(
	pdf: Uint8Array<ArrayBuffer>,
	root: Uint8Array<ArrayBuffer>,
	at: { readonly file: string; readonly pem: string },
): void {
	const judges = new PdfJudges(root);
	try {
		expect(readPdfsig(judges.pdfsig(pdf))).toEqual({ valid: 3, mismatch: 0, trusted: 3, total: 1 });
		expect(judges.qpdf(pdf)).toMatchObject({ status: 0 });
	} finally {
		judges.dismiss();
	}
	writeFileSync(at.pem, toPem(root));
	const command = ['run', '--silent', 'gatehold', '--', 'verify', at.file, '--root', at.pem, '--json'];
	const { status, stdout } = spawnSync('npm', command, { cwd: HOUSE, encoding: 'utf8', maxBuffer: 64 << 20 });
	const [report] = JSON.parse(stdout) as { class: string; checks: { outcome: string }[] }[];
	expect(report?.checks.filter(({ outcome }) => outcome !== 'passed')).toEqual([]);
	expect({ status, class: report?.class }).toEqual({ status: 0, class: 'TOTAL-PASSED' });
}

async function sign(page: Page, meaning: string, name: string, pin = DEMONSTRATION_PIN): Promise<void> {
	await page.getByRole('button', { name, exact: true }).click();
	await page.getByLabel('PIN').fill(pin);
	await page.getByRole('button', { name: `Sign: ${meaning}` }).click();
}

const inPage = <Name extends keyof InPage>(
	page: Page,
	name: Name,
	...given: Parameters<InPage[Name]>
): Promise<string> =>
	page.evaluate(
		([method, args]) =>
			(globalThis as unknown as { inPage: Record<string, (...of: readonly unknown[]) => Promise<string>> }).inPage[
				method
			]!(...args),
		[name as string, given as readonly unknown[]] as const,
	);

/** The store and the story as a script of its own, run in the page of the real app. */
async function bundled(): Promise<string> {
	const entry = join(import.meta.dirname, '../support/play-in-page.ts');
	const built = await build({
		configFile: false,
		plugins: [svelte({ preprocess: vitePreprocess(), configFile: false })],
		logLevel: 'error',
		publicDir: false,
		build: { write: false, minify: false, lib: { entry, formats: ['iife'], name: 'page' } },
	});
	const [output] = [built].flat();
	if (output === undefined || !('output' in output)) throw new Error('the script was not built');
	return output.output[0].code;
}

async function picture(page: Page, name: string): Promise<void> {
	if (PICTURES === undefined) return;
	for (const [size, viewport] of Object.entries({ wide: [1280, 800], upright: [800, 1280], phone: [390, 844] })) {
		await page.setViewportSize({ width: viewport[0]!, height: viewport[1]! });
		await page.screenshot({ path: join(PICTURES, `${name}.${size}.png`), fullPage: true });
	}
	await page.setViewportSize({ width: 1280, height: 800 });
}
