import { describe, expect, test } from 'vitest';
import { sha256Hex } from '../../src/lib/base';
import { parseEvents, printEventLine } from '../../src/lib/record';
import { Teller, tellNight } from '../support/night';

const note = new Teller().say('note', { text: 'gloves on' }, { person: 'TechA', device: 'T-1', entered: 0 });

describe('event lines', () => {
	test('[R2] the id is the hash of the canonical text', () => {
		// printf '%s' '{"body":{"text":"gloves on"},"clock":1,"device":"T-1","entered":"2026-03-14T16:00:00+01:00","kind":"note","log":"FM-1/night","number":1,"person":"TechA","previous":null,"seen":{},"v":1}' | sha256sum
		expect(note.text).toBe(
			'{"body":{"text":"gloves on"},"clock":1,"device":"T-1","entered":"2026-03-14T16:00:00+01:00","kind":"note","log":"FM-1/night","number":1,"person":"TechA","previous":null,"seen":{},"v":1}',
		);
		expect(note.id).toBe('65f10cc3fd0800647f4821d4340fab0b781975cb1122038bf3bd95712b13d261');
	});

	test('[R1] every event comes back from its line as it was, bytes and all', () => {
		const { events } = tellNight();
		const read = parseEvents(events.map(printEventLine).join('\n'));
		expect(read).toEqual({ ok: true, value: events });
	});

	test('[R1] a bare envelope, one under "envelope", and an array of them are read alike', () => {
		const bare = note.text;
		for (const file of [bare, `{"envelope":${bare}}`, `[${bare}]`, `\n${bare}\n\n`])
			expect(parseEvents(file)).toEqual({ ok: true, value: [note] });
	});

	const changed = (change: (envelope: Record<string, unknown>) => void): string => {
		const envelope = JSON.parse(note.text) as Record<string, unknown>;
		change(envelope);
		return JSON.stringify(envelope);
	};

	test.each([
		['a text that is not JSON', '{"v":1', { kind: 'not-json', line: 1 }],
		['an unknown version', changed((e) => (e.v = 9)), { kind: 'unknown-version', line: 1, version: 9 }],
		[
			'an unknown kind',
			changed((e) => (e.kind = 'gate blessed')),
			{ kind: 'unknown-kind', line: 1, found: 'gate blessed' },
		],
		[
			'a field that no schema has',
			changed((e) => (e.colour = 'red')),
			{ kind: 'not-an-event', line: 1, path: 'colour' },
		],
		[
			'a body without what it needs',
			changed((e) => (e.body = {})),
			{ kind: 'not-an-event', line: 1, path: 'body.text' },
		],
		[
			'a day that does not exist',
			changed((e) => (e.entered = '2026-13-40T00:00:00Z')),
			{ kind: 'not-an-event', line: 1, path: 'entered' },
		],
		[
			'a signed text that is not canonical',
			JSON.stringify({ text: `${note.text} ` }),
			{ kind: 'not-canonical', line: 1 },
		],
		[
			'a name that reaches the prototype',
			'{"v":1,"__proto__":{"admin":true},"kind":"note"}',
			{ kind: 'not-json', line: 1, because: 'forbidden-name' },
		],
		['a list', `${note.text}\n[1]`, { kind: 'not-an-event', line: 2 }],
	])('%s is refused with its line', (_, file, error) => {
		expect(parseEvents(file)).toMatchObject({ ok: false, error });
	});

	test('the hash function is the one of the shell', () => {
		expect(sha256Hex(note.text)).toBe(note.id);
	});
});
