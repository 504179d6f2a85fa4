import { join } from 'node:path';
import type { Page } from 'playwright-core';
import * as v from 'valibot';
import { DEMONSTRATION_PIN } from '../../src/lib/app';
import { PlayFileSchema, type Act } from '../../src/lib/demo';
import { LIBRARY, type Step } from '../../src/lib/procedure';
import {
	confirmAll,
	declareWithoutCopy,
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
import { DEMO, readDemo } from './demo-files';
import { LETTERS } from './demonstration-rows';

/** The acts of the demonstration's story, done by hand on the app's screens. */

const STORY = v.parse(PlayFileSchema, readDemo('start-up.json'));
const NAMES = new Map(
	(readDemo('people.json') as { people: { person: string; name: string }[] }).people.map(({ person, name }) => [
		person,
		name,
	]),
);
const PROCEDURE = LIBRARY[STORY.procedure];
const VOLUMES = new Map(
	(readDemo('plant.json') as { volumes: { id: string; title: string }[] }).volumes.map(({ id, title }) => [id, title]),
);

/** When the demonstration is taken up, in its own time. */
export const TAKEN_UP = '2026-03-14T21:33:00+01:00';

/** A hold of so many minutes is touched twice: where it begins, and where it is over. */
type Beat = { readonly at: string; readonly act: Act; readonly begins?: true };

const isHold = (act: Act): act is Extract<Act, { do: 'enter' }> & { from: string } =>
	act.do === 'enter' && act.from !== undefined && stepOf(act.step).kind === 'timed hold';

/** What people do between two moments of the story, in order: "2026-03-14T21:31:00". */
export function beats(from: string, until: string): readonly Beat[] {
	const all = STORY.acts.flatMap((act): readonly Beat[] => [
		...(isHold(act) ? [{ at: act.from, act, begins: true } as const] : []),
		{ at: act.at, act },
	]);
	return all.filter(({ at }) => at >= from && at < until).sort((a, b) => a.at.localeCompare(b.at));
}

function stepOf(id: string): Step {
	const step = PROCEDURE?.steps.find((each) => each.id === id);
	if (step === undefined) throw new Error(`no step ${id}`);
	return step;
}

const nameOf = (person: string): string => NAMES.get(person) ?? person;

/** Lets the clock of the page go on; whoever comes back to a covered screen uncovers it. */
export async function letPassUntil(page: Page, local: string): Promise<void> {
	const left = Date.parse(`${local}+01:00`) - (await page.evaluate(() => Date.now()));
	if (left > 0) await page.clock.fastForward(left);
	const uncover = page.getByRole('button', { name: 'Uncover' });
	if (await uncover.isVisible()) await press(uncover);
}

/**
 * Left out: what changes no state of a gate or step. The attempt to withdraw the fan stop is refused whoever makes it, and a
 * second tablet is not in reach of one browser: what the story does on it is done on the first.
 */
const WITHOUT_EFFECT: ReadonlySet<Act['do']> = new Set(['note', 'copy', 'fact', 'withdraw event']);

/** One act of the story by its person, at its time. */
export async function perform(page: Page, { at, act, begins }: Beat): Promise<void> {
	await letPassUntil(page, at);
	if (WITHOUT_EFFECT.has(act.do)) return;
	await takeTablet(page, nameOf(act.by));
	if (begins === true && act.do === 'enter') return beginHold(page, act.step);
	switch (act.do) {
		case 'start shift':
			await toStep(page, '2.26');
			return shiftIfAsked(page);
		case 'enter':
			return onStep(page, act.step, () => enter(page, act));
		case 'calculate':
			return onStep(page, act.step, async () => {
				await noteIfAny(page, act.note);
				await pressSave(page);
			});
		case 'attach':
			return onStep(page, act.step, async () => {
				await page.locator('input[type=file][accept*=csv]').setInputFiles(join(DEMO, act.file));
				await press(page.getByRole('button', { name: 'Keep this series' }));
			});
		case 'event':
			return plantEvent(page, act);
		case 'release':
			await go(page, `${startUpOf(page)}/gate/${act.gate}`);
			return releaseGate(page, act);
		case 'refuse':
			await go(page, `${startUpOf(page)}/gate/${act.gate}`);
			return refuseGate(page, act);
		case 'hand over':
			return handOver(page, act);
		case 'find':
			return findBad(page, act);
		case 'answer':
			return answer(page, act);
		case 'raise':
			return raise(page, act);
		case 'dispose':
			return dispose(page, act);
		default:
			throw new Error(`no hand for "${act.do}"`);
	}
}

/** Both sign; the shifts of the others who come begin with their own first entry. */
async function handOver(page: Page, act: Extract<Act, { do: 'hand over' }>): Promise<void> {
	await go(page, `${startUpOf(page)}/hand-over`);
	await page.getByLabel('What else the coming shift must know').fill(act.summary);
	const open = page.getByRole('checkbox', { checked: false });
	for (let left = await open.count(); left > 0; left--) await press(open.first());
	const comes = nameOf(act.to.find((person) => person.startsWith('Sup')) ?? act.to[0] ?? '');
	await press(page.getByRole('group', { name: 'Who comes?' }).getByRole('button', { name: comes }));
	await page.getByLabel(`PIN of ${nameOf(act.by)}`).fill(DEMONSTRATION_PIN);
	await page.getByLabel(`PIN of ${comes}`).fill(DEMONSTRATION_PIN);
	await press(page.getByRole('button', { name: 'Hand over, both sign' }));
	await page.getByText(/The shift was handed over/).waitFor();
}

async function findBad(page: Page, act: Extract<Act, { do: 'find' }>): Promise<void> {
	await go(page, `${startUpOf(page)}/finding`);
	await shiftIfAsked(page);
	await press(page.getByRole('button', { name: act.instrument, exact: true }));
	await page.getByLabel(/^As-found error/).fill(act.error);
	await page.getByLabel(/^Tolerance/).fill(act.tolerance);
	if (act.note !== undefined) await page.getByLabel('What was seen, if you like').fill(act.note);
	await page.getByLabel('PIN').last().fill(DEMONSTRATION_PIN);
	await press(page.getByRole('button', { name: `Sign: ${act.instrument} is bad` }));
	await page.waitForURL(/\/lapsed$/);
}

async function answer(page: Page, act: Extract<Act, { do: 'answer' }>): Promise<void> {
	await go(page, `${startUpOf(page)}/gate/${act.gate}`);
	await page.getByLabel('The answer, in words').fill(act.words);
	await page.getByLabel('PIN').first().fill(DEMONSTRATION_PIN);
	await press(page.getByRole('button', { name: 'Answer the refusal' }));
	await page.getByLabel('The answer, in words').waitFor({ state: 'detached' });
}

async function raise(page: Page, act: Extract<Act, { do: 'raise' }>): Promise<void> {
	await toStep(page, act.step ?? '2.26');
	await shiftIfAsked(page);
	await press(page.getByRole('article').getByRole('button', { name: 'Deviation', exact: true }));
	await page.getByLabel('What is not as required?').fill(act.title);
	await press(page.getByRole('button', { name: 'Raise deviation' }));
	await page.getByLabel('What is not as required?').waitFor({ state: 'detached' });
}

async function dispose(page: Page, act: Extract<Act, { do: 'dispose' }>): Promise<void> {
	await go(page, `${startUpOf(page)}/deviations`);
	await press(page.getByRole('button', { name: new RegExp(`^${act.deviation} `) }));
	await press(page.getByRole('button', { name: act.disposition, exact: true }));
	await page.getByLabel('What was done and seen').fill(act.reason ?? '');
	await page.getByLabel('PIN').last().fill(DEMONSTRATION_PIN);
	await press(page.getByRole('button', { name: 'Sign the disposition' }));
	await page.getByLabel('What was done and seen').waitFor({ state: 'detached' });
}

async function beginHold(page: Page, step: string): Promise<void> {
	await toStep(page, step);
	await shiftIfAsked(page);
	await press(page.getByRole('button', { name: 'The hold begins now' }));
	await page.getByRole('timer').waitFor();
}

type Enter = Extract<Act, { do: 'enter' }>;

async function noteIfAny(page: Page, note: string | undefined): Promise<void> {
	if (note === undefined) return;
	const article = page.getByRole('article');
	await press(article.getByRole('button', { name: 'Note', exact: true }));
	await article.getByLabel('Note', { exact: true }).last().fill(note);
}

async function enter(page: Page, act: Enter): Promise<void> {
	const step = stepOf(act.step);
	await noteIfAny(page, act.note);
	if (act.observed !== undefined) {
		await press(page.getByRole('article').getByRole('button', { name: 'Seen earlier' }));
		await page.getByLabel(/^When was it seen/).fill(timeOf(act.observed));
	}
	switch (step.kind) {
		case 'confirm':
		case 'review point':
			return confirmAll(page);
		case 'choice': {
			const option = step.options.find(({ id }) => id === act.choice);
			await press(page.getByRole('radio', { name: option?.title ?? '', exact: true }));
			return pressSave(page);
		}
		case 'timed hold':
			// The hold began some seconds after its minute, as every touch does.
			await page.clock.fastForward(20_000);
			await page.getByText('the time is over').waitFor();
			return typeAll(page, readings(act, step.fields ?? []));
		case 'reading':
			return typeAll(page, readings(act, step.fields));
		case 'quick sheet':
			await press(page.getByRole('button', { name: 'measuring', exact: true }));
			return typeAll(page, readings(act, step.fields));
		case 'watch':
			await press(page.getByRole('button', { name: FLOWS[act.flow ?? 'not looked at'], exact: true }));
			return typeAll(page, readings(act, step.fields));
		case 'line-up':
			return lineUp(page, act, step);
		case 'coverage':
			return coverage(page, act, step);
		default:
			throw new Error(`no hand for a step of the kind ${step.kind}`);
	}
}

const FLOWS = { unbroken: 'Unbroken', broken: 'Broken', 'not looked at': 'Not looked at' } as const;

const readings = (act: Enter, fields: readonly { readonly id: string }[]): readonly string[] =>
	fields.map(({ id }) => {
		const value = act.values?.[id];
		return (typeof value === 'string' ? value : value?.typed) ?? '';
	});

async function lineUp(page: Page, act: Enter, step: Extract<Step, { kind: 'line-up' }>): Promise<void> {
	for (const row of step.rows) {
		const group = page.getByRole('group', { name: `Seen at ${row.element ?? row.title}`, exact: true });
		const found = act.rows?.[row.id];
		const seen = typeof found === 'string' ? found : found?.found;
		if (seen === undefined || !(await group.isVisible())) continue;
		await press(group.getByRole('button', { name: seen, exact: true }));
	}
	await pressSave(page);
}

async function coverage(page: Page, act: Enter, step: Extract<Step, { kind: 'coverage' }>): Promise<void> {
	for (const row of step.rows) {
		const found = act.rows?.[row.id];
		if (found === undefined) continue;
		const answer = typeof found === 'string' ? found : found.found;
		const item = page.getByRole('listitem').filter({
			has: page.getByRole('group', { name: VOLUMES.get(row.volume) ?? row.volume, exact: true }),
		});
		const word = `${answer.slice(0, 1).toUpperCase()}${answer.slice(1)}`;
		await press(item.getByRole('button', { name: word, exact: true }));
		if (typeof found !== 'string' && found.reading !== undefined)
			await item.getByRole('textbox').fill(found.reading.typed);
	}
	await pressSave(page);
}

const timeOf = (local: string): string => local.slice(11, 16);

async function plantEvent(page: Page, act: Extract<Act, { do: 'event' }>): Promise<void> {
	await go(page, `${startUpOf(page)}/happened`);
	await shiftIfAsked(page);
	const kind = PROCEDURE?.plantEvents.find(({ id }) => id === act.what);
	await press(page.getByRole('button', { name: kind?.title ?? act.what, exact: true }));
	await page.getByLabel('or at').fill(timeOf(act.begin));
	if (act.end !== undefined) {
		await press(page.getByRole('button', { name: 'is over' }));
		await page.getByLabel('over at').fill(timeOf(act.end));
	}
	if (act.item !== undefined) await page.getByLabel('Where, or which item').fill(act.item);
	if (act.note !== undefined) await page.getByLabel('Words, if you like').fill(act.note);
	await press(page.getByRole('button', { name: /^Record/ }));
	await page.waitForURL(/\/lapsed$/);
}

/** Where the rules object the sheet offers no release, and says why: that is the end of it. */
async function releaseGate(page: Page, act: Extract<Act, { do: 'release' }>): Promise<void> {
	await declareWithoutCopy(page, act.copySkipped ?? 'no second place in reach');
	await page.getByLabel('PIN').last().fill('00000000');
	if (await page.getByRole('button', { name: `Release Gate ${act.gate}` }).isDisabled()) {
		await page
			.getByText(/performed/)
			.first()
			.waitFor();
		return toLine(page);
	}
	await release(page, act.gate);
	await page.waitForURL((url) => url.pathname === startUpOf(page));
}

async function refuseGate(page: Page, act: Extract<Act, { do: 'refuse' }>): Promise<void> {
	await press(page.getByRole('button', { name: 'Refuse, say why' }));
	await page.getByLabel('Why is it refused?').fill(act.reason);
	for (const name of act.names) {
		const chip = page.getByRole('button', { name, exact: true });
		if (await chip.isVisible()) await press(chip);
	}
	await page.getByLabel('PIN').last().fill(DEMONSTRATION_PIN);
	await press(page.getByRole('button', { name: 'Refuse', exact: true }));
	await page.waitForURL((url) => url.pathname === startUpOf(page));
}

/** What the screens say: the gates as a row writes them, and the steps to prove again. */
export async function standingShown(page: Page): Promise<{ readonly gates: string; readonly list: readonly string[] }> {
	await toLine(page);
	const outline = page.getByRole('button', { name: 'Outline' });
	if (await outline.isVisible()) await press(outline);
	const states = await page.locator('ol.outline li.coil .state').allInnerTexts();
	await go(page, `${startUpOf(page)}/lapsed`);
	await page.getByRole('heading', { level: 1 }).waitFor();
	const items = await page.locator('ol.list .what .note').allInnerTexts();
	return {
		gates: states.map(letterOf).join(''),
		list: items.map((text) => text.replace(/,.*/, '')).sort(),
	};
}

const SAID: readonly (readonly [RegExp, keyof typeof LETTERS])[] = [
	[/^\d+ of \d+$|^not ready$/, 'not ready'],
	[/^ready to be released$/, 'ready'],
	[/lapsed/, 'lapsed'],
	[/^released/, 'released'],
	[/^held/, 'held'],
	[/^refused/, 'refused'],
];

function letterOf(text: string): string {
	const [, state] = SAID.find(([says]) => says.test(text)) ?? [];
	return state === undefined ? `"${text}"` : LETTERS[state];
}
