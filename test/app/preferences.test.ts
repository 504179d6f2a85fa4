import { expect, test } from 'vitest';
import { Preferences } from '../../src/lib/app';

function memoryOf(kept: Record<string, string>) {
	return {
		kept,
		getItem: (name: string) => kept[name] ?? null,
		setItem: (name: string, value: string) => void (kept[name] = value),
	};
}

test('what was chosen for this tablet is there again after a reload', () => {
	const memory = memoryOf({});
	const before = new Preferences(memory);
	before.look = 'night';
	before.sound = 'off';
	const after = new Preferences(memory);
	expect([after.look, after.sound, after.language]).toEqual(['night', 'off', 'en']);
	expect(memory.kept).toEqual({ look: 'night', sound: 'off' });
});

test('as long as nobody chose, the language is the first of the browser that the app speaks', () => {
	expect(new Preferences(memoryOf({}), ['fr-FR', 'de-AT', 'en-GB']).language).toBe('de');
	expect(new Preferences(memoryOf({}), ['fr-FR']).language).toBe('en');
	expect(new Preferences(memoryOf({ language: 'en' }), ['de']).language).toBe('en');
});

test('a language that the app does not speak is English', () => {
	expect(new Preferences(memoryOf({ language: 'xx' })).language).toBe('en');
	expect(new Preferences(memoryOf({ language: 'toString' })).language).toBe('en');
});
