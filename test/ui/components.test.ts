import { afterAll, beforeAll, expect, test } from 'vitest';
import { openGallery, type Gallery } from './gallery/open-gallery';

let gallery: Gallery;
beforeAll(async () => {
	gallery = await openGallery();
}, 120_000);
afterAll(() => gallery.close());

test('a reading is typed on the keypad, judged against its limit as it is typed, and saved by one press', async () => {
	const { page, show, told } = gallery;
	await show('reading', 'phone');
	await page.getByRole('button', { name: '3', exact: true }).click();
	await page.getByRole('button', { name: '9', exact: true }).click();
	expect(await page.getByRole('status').filter({ hasText: 'limit' }).textContent()).toContain('Outside the limit');
	await page.getByRole('button', { name: 'Erase' }).click();
	await page.getByRole('button', { name: 'Erase' }).click();
	for (const key of ['5', '2']) await page.getByRole('button', { name: key, exact: true }).click();
	expect(await page.getByRole('status').filter({ hasText: 'limit' }).textContent()).toContain('Inside the limit');
	await page.getByRole('button', { name: 'Save' }).click();
	expect(await told()).toEqual(['save']);
});

test('a hardware keyboard types the same, with a decimal comma, and Enter saves', async () => {
	const { page, show, told } = gallery;
	await show('reading', 'tablet');
	await page.getByRole('textbox').first().focus();
	await page.keyboard.type('52,5');
	await page.keyboard.press('Enter');
	expect(await told()).toEqual(['save']);
});

test('what is no number cannot be saved', async () => {
	const { page, show, told } = gallery;
	await show('reading', 'tablet');
	await page.getByRole('textbox').first().focus();
	await page.keyboard.type('5,2,5');
	await page.keyboard.press('Enter');
	expect(await page.getByRole('button', { name: 'Save' }).isDisabled()).toBe(true);
	expect(await told()).toEqual([]);
});

test('a step that does not apply is said so with its reason, and as nothing else', async () => {
	const { page, show, told } = gallery;
	await show('reading', 'tablet');
	await page.getByRole('button', { name: 'Not applicable' }).click();
	await page.getByRole('button', { name: 'Not fitted on this unit' }).click();
	await page.getByRole('button', { name: 'Ask for agreement: not applicable' }).click();
	await page.getByRole('button', { name: 'Cannot do' }).click();
	await page.getByRole('button', { name: 'No access' }).click();
	await page.getByRole('button', { name: 'Save: cannot do' }).click();
	expect(await told()).toEqual(['not applicable: Not fitted on this unit', 'cannot do: No access']);
});

test('an act on an entry needs a reason and the PIN of who signs it', async () => {
	const { page, show, told } = gallery;
	await show('earlier entries', 'tablet');
	const sign = page.getByRole('button', { name: 'Withdraw with PIN' });
	await page.getByLabel('PIN').fill('73905284');
	expect(await sign.isDisabled()).toBe(true);
	await page.getByRole('button', { name: 'Mistyped' }).click();
	await page.getByRole('button', { name: 'Imre Castellvor' }).click();
	await sign.click();
	expect(await told()).toEqual(['SupA: Mistyped']);
	expect(await page.getByLabel('PIN').inputValue()).toBe('');
});

test('a column of a trend is said to be another point, or left out', async () => {
	const { page, show, told } = gallery;
	await show('series', 'tablet');
	await page.getByLabel('AT-211 is').selectOption('');
	await page.getByText('Read as it was found').click();
	await page.getByRole('button', { name: '1.5' }).click();
	expect(await told()).toEqual(['columns 5', 'reading']);
});

test('a line-up row is kept by one touch, the next row follows, and no choice is marked before', async () => {
	const { page, show, told } = gallery;
	await show('line-up', 'tablet');
	const choices = page.getByRole('group', { name: 'Seen at' });
	expect(
		await choices.getByRole('button').evaluateAll((all) => all.map((each) => each.getAttribute('aria-pressed'))),
	).toEqual([null, null, null]);
	for (const row of ['DR-21', 'DR-22', 'DR-23'])
		await page
			.getByRole('group', { name: `Seen at ${row}` })
			.getByRole('button', { name: 'shut and bolted' })
			.click();
	await page.getByRole('button', { name: 'Undo last' }).click();
	expect(await page.getByRole('group', { name: 'Seen at DR-23' }).isVisible()).toBe(true);
	await page.getByRole('group', { name: 'Seen at DR-23' }).getByRole('button', { name: 'open' }).click();
	expect(await page.getByText('open, differs').isVisible()).toBe(true);
	await page.getByRole('button', { name: 'Save' }).click();
	expect(await told()).toEqual(['save']);
});

test('a release needs the declaration and the PIN; a refusal needs the PIN and a reason', async () => {
	const { page, show, told } = gallery;
	await show('sign', 'tablet');
	const release = page.getByRole('button', { name: 'Release Gate 2' });
	await page.getByLabel('PIN').fill('73905284');
	expect(await release.isDisabled()).toBe(true);
	await page.getByRole('checkbox').check();
	await release.click();
	expect(await told()).toEqual(['released with 8 signs']);
	expect(await page.getByLabel('PIN').inputValue()).toBe('');
	await page.getByRole('button', { name: 'Refuse, say why' }).click();
	await page.getByLabel('PIN').fill('73905284');
	expect(await page.getByRole('button', { name: 'Refuse', exact: true }).isDisabled()).toBe(true);
	await page.getByLabel('Why is it refused?').fill('hopper 7.6 against 7.7');
	await page.getByRole('button', { name: 'Refuse', exact: true }).click();
	expect((await told())[1]).toBe('refused with 8 signs: hopper 7.6 against 7.7');
});

test('a gate that is not ready offers no release, whatever is filled in', async () => {
	const { page, show } = gallery;
	await show('sign not ready', 'tablet');
	await page.getByLabel('PIN').fill('73905284');
	await page.getByRole('checkbox').check();
	expect(await page.getByRole('button', { name: 'Release Gate 2' }).isDisabled()).toBe(true);
});

test('a fan stop is recorded by two touches, and what the plant needs stands before anything is asked', async () => {
	const { page, show, told } = gallery;
	await show('happened', 'phone');
	await page.getByRole('button', { name: 'Process-gas fan stopped' }).click();
	await page.getByRole('button', { name: 'Record: Process-gas fan stopped' }).click();
	expect(JSON.parse((await told())[0] ?? '')).toEqual({ what: 'fan-stop', begin: '2026-03-15T02:30:00+01:00' });
});

test('the ladder is walked by keyboard: Enter on a contact opens its steps, on a coil its hold point', async () => {
	const { page, show, told } = gallery;
	await show('stopped ladder', 'tablet');
	await page.getByRole('button', { name: 'Fan flow: 02:11' }).focus();
	await page.keyboard.press('Enter');
	await page.getByRole('button', { name: 'Hold point of gate 2' }).focus();
	await page.keyboard.press('Enter');
	expect(await told()).toEqual(['contact 2 Fan flow', 'gate 2']);
});

test('the title of a start-up says where its line ends', async () => {
	const { page, show } = gallery;
	const titles: string[] = [];
	for (const scene of ['start-up', 'line-up ladder', 'stopped ladder', 'ended ladder'] as const) {
		await show(scene, 'tablet');
		titles.push((await page.locator('h1:not(.unseen)').first().textContent()) ?? '');
	}
	expect(titles).toEqual([
		'Fuel mill 1 stops at purge, Gate 2',
		'Fuel mill 1 stops at deviation D-1, Gate 1',
		'Fuel mill 1 stops at fan flow, Gate 2',
		'Fuel mill 1: every gate is released',
	]);
});

test('the tablet is taken by one touch, without a PIN; a destroyed key cannot take it', async () => {
	const { page, show, told } = gallery;
	await show('person switch', 'phone');
	await page.getByRole('button', { name: 'Sven Mertens' }).click();
	await page.getByRole('button', { name: 'End the shift of Ada Brandt' }).click();
	expect(await page.getByRole('button', { name: 'Tove Lindgren' }).isDisabled()).toBe(true);
	expect(await told()).toEqual(['SupA takes', 'TechA ends']);
});

test('the power line runs on when more stands and is withdrawn when it lapses; who wants no motion sees none', async () => {
	const { page, show } = gallery;
	const moving = () => page.evaluate(() => document.getAnimations().map(({ effect }) => effect?.getTiming().duration));
	await show('moving ladder', 'tablet');
	expect(await moving()).toEqual([]);
	await page.getByRole('button', { name: 'Move' }).click();
	expect(new Set(await moving())).toEqual(new Set([500, 200]));
	await page.waitForFunction(() => document.getAnimations().length === 0);
	await page.getByRole('button', { name: 'Move' }).click();
	expect(new Set(await moving())).toEqual(new Set([250]));
	await page.waitForFunction(() => document.getAnimations().length === 0);
	await page.emulateMedia({ reducedMotion: 'reduce' });
	await page.getByRole('button', { name: 'Move' }).click();
	expect(await moving()).toEqual([]);
	await page.emulateMedia({ reducedMotion: null });
});

test('on a phone three words stand at the thumb; the third opens the other places and shuts again', async () => {
	const { page, show } = gallery;
	await show('start-up places', 'phone');
	const places = page.getByRole('navigation', { name: 'Places of start-up FM-1/2026-03-14' });
	expect(await places.getByRole('link').allTextContents()).toEqual(['Line', 'Something happened']);
	await places.getByRole('button', { name: 'More' }).click();
	expect(await places.getByRole('link', { name: 'Lapsed 14' }).getAttribute('aria-current')).toBe('page');
	await page.keyboard.press('Escape');
	expect(await places.getByRole('link', { name: 'Lapsed 14' }).isVisible()).toBe(false);
});
