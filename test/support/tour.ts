import type { Page } from 'playwright-core';
import { LIBRARY } from '../../src/lib/procedure';
import {
	confirmAll,
	declareWithoutCopy,
	demonstration,
	go,
	onStep,
	press,
	pressSave,
	release,
	shiftIfAsked,
	startUpOf,
	takeTablet,
	toLine,
	toStep,
	typeAll,
} from './app-hands';
import { routePatterns } from './routes';

/** Called on every stop of the tour, with its name: "line", "step 2.26 watch". */
export type Visit = (stop: string) => Promise<void>;

/**
 * Every page of the app as people meet it, once: empty, with the demonstration, with a gate ready, released, and after a fan
 * stop. Pages without parameters are found by themselves, so that a new one is on the tour as soon as it exists.
 */
export async function tour(page: Page, address: string, visit: Visit): Promise<void> {
	await page.goto(address);
	for (const path of topPlaces()) {
		if (await leadsTo(page, path)) await visit(`empty ${nameOf(path)}`);
	}
	await go(page, '/');
	await demonstration(page, address);
	await settled(page);
	await visit('line');
	await press(page.getByRole('button', { name: 'Outline' }));
	await visit('outline');
	const startUp = startUpOf(page);
	for (const path of topPlaces()) {
		if (await leadsTo(page, path)) await visit(nameOf(path));
	}
	await go(page, '/calculators/purge-adequacy');
	await settled(page);
	await visit('calculator');
	await go(page, startUp);
	await toStep(page, '2.26');
	await visit('step without a shift');
	await shiftIfAsked(page);
	for (const [kind, step] of stepOfEveryKind()) {
		await toStep(page, step);
		await visit(`step ${step} ${kind}`);
	}
	await go(page, `${startUp}/gate/2`);
	await visit('gate not ready');
	await finishGate2(page);
	await visit('line gate ready');
	await takeTablet(page, 'Imre Castellvor');
	for (const path of startUpPlaces(startUp)) {
		if (await leadsTo(page, path)) await visit(nameOf(path.slice(startUp.length)));
	}
	await go(page, `${startUp}/gate/2`);
	await visit('gate ready');
	await press(page.getByRole('button', { name: 'Refuse, say why' }));
	await visit('gate refusing');
	await press(page.getByRole('button', { name: 'Back', exact: true }));
	await declareWithoutCopy(page, 'no second place in reach');
	await release(page, 2);
	await page
		.getByRole('heading', { name: /Gate 3/ })
		.first()
		.waitFor();
	await fanStop(page, visit);
	for (const name of ['foreign-record.ndjson', 'damaged-record.ndjson']) {
		await go(page, '/archive');
		await page.locator('input[type=file]').first().setInputFiles(`static/demo/${name}`);
		await page.getByRole('progressbar').waitFor({ state: 'detached' });
		await page.getByText(name).first().waitFor();
		await visit(`archive ${name.replace(/-.*/, '')}`);
	}
}

/** Pages of the app that need no start-up: without parameters. */
const topPlaces = (): readonly string[] => routePatterns().filter((pattern) => !pattern.includes('['));

/** Pages of a start-up that need nothing else. */
const startUpPlaces = (startUp: string): readonly string[] =>
	routePatterns()
		.filter((pattern) => pattern.startsWith('/start-ups/[id]/') && pattern.split('[').length === 2)
		.map((pattern) => pattern.replace('/start-ups/[id]', startUp));

const nameOf = (path: string): string => (path === '/' ? 'today' : path.slice(1).replaceAll('/', ' '));

/** One step of every kind, at or before the purge where there is one. */
function stepOfEveryKind(): ReadonlyMap<string, string> {
	const kinds = new Map<string, string>();
	const steps = LIBRARY['inert-start-up']?.steps ?? [];
	for (const { kind, id } of [...steps.filter(({ gate }) => gate <= 2).reverse(), ...steps]) {
		if (!kinds.has(kind)) kinds.set(kind, id);
	}
	return kinds;
}

/** What is left of the purge of the demonstration, as TechA does it. */
export async function finishGate2(page: Page): Promise<void> {
	await onStep(page, '2.22', async () => {
		await press(page.getByRole('button', { name: 'measuring' }));
		await typeAll(page, ['3,1', '3,3', '6,4', '3.8']);
	});
	await onStep(page, '2.23', () => confirmAll(page));
	await onStep(page, '2.21', async () => {
		await press(page.getByRole('button', { name: 'Trends supplied with the demonstration' }));
		await press(page.getByRole('button', { name: 'purge-1.csv' }));
		await press(page.getByRole('button', { name: 'Keep this series' }));
	});
	for (const calculation of ['2.25', '2.27']) await onStep(page, calculation, () => pressSave(page));
	await onStep(page, '2.26', async () => {
		await press(page.getByRole('button', { name: 'Unbroken' }));
		await typeAll(page, ['3,1', '3,3', '6,3', '3,8']);
	});
	await toLine(page);
}

async function fanStop(page: Page, visit: Visit): Promise<void> {
	await takeTablet(page, 'Edda Varnholt');
	await go(page, `${startUpOf(page)}/happened`);
	await press(page.getByRole('button', { name: 'Process-gas fan stopped', exact: true }));
	await visit('happened fan-stop');
	await press(page.getByRole('button', { name: /^Record/ }));
	await page.waitForURL(/\/lapsed$/);
	await visit('lapsed fan-stop');
	await toLine(page);
	await visit('line fan-stop');
}

/** Whether an address leads to its page now: some lead elsewhere until the tablet has a site. */
async function leadsTo(page: Page, path: string): Promise<boolean> {
	await go(page, path, 1).catch(() => undefined);
	await settled(page);
	return new URL(page.url()).pathname === path;
}

/** Until nothing that a page fetches by itself is still on its way. */
async function settled(page: Page): Promise<void> {
	await page.locator('main').first().waitFor();
	await page.waitForLoadState('networkidle');
}
