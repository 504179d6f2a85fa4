import { readFileSync, writeFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { parseEvents, printEventLine, standing } from '../../src/lib/record';
import { clock, minutesOf, NIGHT, NIGHT_PROCEDURE, tellNight } from '../support/night';
import { statesOf } from '../support/states';

// The night is shipped as a stranger gets it: a procedure, event lines, site lines, and the expected states beside them.
// `WRITE=1 npx vitest run test/record/night-files.test.ts` writes the files again from the vector and the cast.
const file = (name: string): URL => new URL(`../../static/demo/night/${name}`, import.meta.url);
const night = tellNight();
const EXPECTED = NIGHT.expected.map((row) => ({
	...row,
	instant: clock(minutesOf(row.at)),
	knownTo: minutesOf(row.at) >= 780 ? 'T-2' : 'T-1',
}));

const FILES: { readonly [name: string]: string } = {
	'events.ndjson': night.events.map((event) => `${printEventLine(event)}\n`).join(''),
	'site.ndjson': night.site.map((event) => `${printEventLine(event)}\n`).join(''),
	'expected.json': `${JSON.stringify(EXPECTED, null, '\t')}\n`,
};

if (process.env.WRITE === '1') for (const [name, text] of Object.entries(FILES)) writeFileSync(file(name), text);

describe('the night as files', () => {
	test.each(Object.keys(FILES))('%s is what the vector and the cast tell', (name) => {
		expect(readFileSync(file(name), 'utf8')).toBe(FILES[name]);
	});

	test('read back from the files alone, every row has its states', () => {
		const events = parseEvents(readFileSync(file('events.ndjson'), 'utf8'));
		const site = parseEvents(readFileSync(file('site.ndjson'), 'utf8'));
		if (!events.ok || !site.ok) throw new Error('the files cannot be read');
		for (const { instant, knownTo, gates, lapsed, failed, waits, reproof, minutes } of EXPECTED)
			expect(statesOf(standing(NIGHT_PROCEDURE, events.value, site.value, instant, knownTo))).toEqual({
				gates,
				lapsed,
				failed,
				waits,
				reproof,
				minutes,
			});
	});
});
