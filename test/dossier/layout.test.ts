import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Shape, TextShape } from '../../src/lib/drawing';
import { FACES, measure } from '../../src/lib/dossier/fonts/faces';
import { Flow, STYLES } from '../../src/lib/dossier/layout/flow';
import { AREA } from '../../src/lib/dossier/layout/sheet';
import { table } from '../../src/lib/dossier/layout/table';
import { wrap } from '../../src/lib/dossier/layout/wrap';

const texts = (shapes: readonly Shape[]): readonly TextShape[] =>
	shapes.filter((shape): shape is TextShape => shape.kind === 'text');
const ON_SHEET = {
	top: AREA.y - 1,
	bottom: AREA.y + AREA.height + 1,
	left: AREA.x - 1,
	right: AREA.x + AREA.width + 1,
};

const offSheet = (shapes: readonly Shape[]): readonly string[] =>
	texts(shapes)
		.filter(({ x, y, text, voice, size, anchor }) => {
			const width = measure(text, voice, size);
			const left = anchor === 'end' ? x - width : x;
			return y < ON_SHEET.top || y > ON_SHEET.bottom || left < ON_SHEET.left || left + width > ON_SHEET.right;
		})
		.map(({ text }) => text);

describe('a table of 600 rows', () => {
	const flow = new Flow();
	flow.newSheet('Entries');
	const columns = [{ head: 'Step', width: 60 }, { head: 'What' }, { head: 'Value', width: 80, align: 'end' as const }];
	table(
		flow,
		columns,
		Array.from({ length: 600 }, (_, i) => ({
			cells: [`${i}`, `Oxygen at place ${i}, read at the plant by hand`, `7.${i}`],
			...(i % 7 === 0 ? { notes: [`note of row ${i}`] } : {}),
		})),
	);

	test('goes on over its sheets with its head on every one, and no row is lost or told twice', () => {
		expect(flow.sheets.length).toBeGreaterThan(10);
		for (const { shapes, title } of flow.sheets) {
			const written = texts(shapes).map(({ text }) => text);
			expect(title).toBe('Entries');
			expect(written.slice(0, 3)).toEqual(['Step', 'What', 'Value']);
		}
		const all = flow.sheets.flatMap(({ shapes }) => texts(shapes).map(({ text }) => text));
		expect(all.filter((text) => /^\d+$/.test(text))).toEqual(Array.from({ length: 600 }, (_, i) => `${i}`));
		expect(all.filter((text) => text.startsWith('note of row'))).toHaveLength(86);
	});

	test('keeps everything inside the frame of every sheet', () => {
		expect(flow.sheets.flatMap(({ shapes }) => offSheet(shapes))).toEqual([]);
	});

	test('keeps a row with the first of its notes', () => {
		for (const { shapes } of flow.sheets) {
			const written = texts(shapes).map(({ text }) => text);
			const notes = written.filter((text) => text.startsWith('note of row')).map((text) => text.slice(12));
			for (const row of notes) expect(written).toContain(row);
		}
	});
});

test('a cell that is higher than a sheet goes over it line by line, and none of it is lost', () => {
	const flow = new Flow();
	flow.newSheet('Long');
	const words = Array.from({ length: 900 }, (_, i) => `word${i}`);
	table(
		flow,
		[
			{ head: 'Step', width: 60 },
			{ head: 'What', width: 100 },
		],
		[{ cells: ['1', words.join(' ')] }],
	);
	expect(flow.sheets.length).toBeGreaterThan(3);
	const told = flow.sheets
		.flatMap(({ shapes }) => texts(shapes).flatMap(({ text }) => text.split(' ')))
		.filter((text) => text.startsWith('word'));
	expect(told).toEqual(words);
	expect(flow.sheets.flatMap(({ shapes }) => offSheet(shapes))).toEqual([]);
});

test('a heading goes over with what follows it', () => {
	const flow = new Flow();
	flow.newSheet('Sheet');
	while (flow.room > 60) flow.write('a line', STYLES.body);
	flow.heading('Plant events', { with: 80 });
	flow.write('none', STYLES.body);
	const last = texts(flow.sheets.at(-1)!.shapes).map(({ text }) => text);
	expect([flow.sheets.length, last]).toEqual([2, ['Plant events', 'none']]);
});

describe('a line', () => {
	const letters = fc.stringMatching(/^[a-zA-Z0-9 ,.\-äöüß]{0,120}$/);

	test('is never wider than its column, and no letter is lost', () => {
		fc.assert(
			fc.property(letters, fc.integer({ min: 30, max: 300 }), (text, width) => {
				const lines = wrap(text, width, { voice: 'text', size: 9 });
				expect(lines.every((line) => line.length < 2 || measure(line, 'text', 9) <= width)).toBe(true);
				expect(lines.join('').replaceAll(' ', '')).toBe(text.replaceAll(' ', ''));
			}),
		);
	});

	test('breaks at a space, never inside a tag, a number or a value with its unit', () => {
		const words = ['AT-213', '-3,1\u00a0mbar(g)', '52\u00a0400\u00a0m³/h', 'bump-tested'];
		for (const width of [40, 60, 80, 100]) {
			const lines = wrap(words.join(' '), width, { voice: 'text', size: 9 });
			for (const word of words.slice(0, 3))
				if (measure(word, 'text', 9) <= width) expect(lines.join('\n')).toContain(word);
		}
	});

	test('a hash that is wider than its column breaks anywhere', () => {
		const hash = '0123456789abcdef'.repeat(4);
		const lines = wrap(hash, 60, { voice: 'text', size: 9 });
		expect(lines.length).toBeGreaterThan(4);
		expect(lines.join('')).toBe(hash);
	});

	test('line ends that were typed are kept', () => {
		expect(wrap('one\ntwo\r\nthree', 300, { voice: 'text', size: 9 })).toEqual(['one', 'two', 'three']);
	});
});

test('a name is refused by its first letter that the font lacks, and by nothing else', () => {
	expect(FACES.Text.set('Łukasz Śmigły, Γ ≤ 8.0 % O₂ → ÄÖÜß')).toMatchObject({ ok: true });
	expect(FACES.Text.set('Ann 漢')).toEqual({
		ok: false,
		error: { kind: 'no-glyph', codePoint: 'U+6F22', text: 'Ann 漢' },
	});
});
