import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkChains, headCode, parseEvents, printEventLine, type RecordEvent } from '../../src/lib/record';
import { SITE, Teller, tellNight } from '../support/night';

const night = tellNight().events;
const tablet = (device: string): readonly RecordEvent[] => night.filter((event) => event.device === device);
const kinds = (events: readonly RecordEvent[]): readonly string[] => checkChains(events).map(({ kind }) => kind);

describe('chains of a record', () => {
	test('[R6] the night as it was told has nothing to find', () => {
		expect(checkChains(night)).toEqual([]);
	});

	test('[R6] every event that is dropped is missed, wherever it stood but at the end of its chain', () => {
		const dropped = (pick: number): RecordEvent => night[pick % night.length]!;
		fc.assert(
			fc.property(fc.nat(), (pick) => {
				const gone = dropped(pick);
				const last = tablet(gone.device).length;
				fc.pre(gone.number < last);
				const findings = checkChains(night.filter((event) => event !== gone));
				expect(findings).toContainEqual(
					expect.objectContaining({ kind: 'events missing', device: gone.device, from: gone.number, to: gone.number }),
				);
			}),
			{ numRuns: 60 },
		);
	});

	test('[R7] a cut tail is found by what another tablet had seen of it', () => {
		const cut = night.filter((event) => !(event.device === 'T-1' && event.number >= tablet('T-1').length - 1));
		expect(kinds(cut)).toContain('seen but missing');
	});

	test('[R7] a cut tail of the only tablet is found by the head that its copy promised', () => {
		const teller = new Teller();
		const say = (text: string, entered: number): RecordEvent =>
			teller.say('note', { text }, { person: 'TechA', device: 'T-1', entered });
		say('one', 1);
		const two = say('two', 2);
		const promise = teller.say(
			'copy made',
			{ to: 'memory stick', way: 'USB', heads: { 'T-1': { number: 2, code: headCode(two) } } },
			{ person: 'TechA', device: 'T-9', entered: 3 },
		);
		const all = [...teller.events];
		expect(checkChains(all)).toEqual([]);
		expect(checkChains(all.filter((event) => event !== two))).toEqual([
			{ kind: 'events missing', device: 'T-1', from: 2, to: 2, knownBecause: promise.id },
		]);
	});

	test('[R7] a head that the record does not end in is named', () => {
		const teller = new Teller();
		const note = teller.say('note', { text: 'one' }, { person: 'TechA', device: 'T-1', entered: 1 });
		const promise = teller.say(
			'copy made',
			{ to: 'T-2', way: 'QR', heads: { 'T-1': { number: 1, code: 'ZZZZZZ' } } },
			{ person: 'TechA', device: 'T-2', entered: 2 },
		);
		expect(checkChains(teller.events)).toEqual([
			{
				kind: 'head differs',
				device: 'T-1',
				number: 1,
				promised: 'ZZZZZZ',
				found: headCode(note),
				knownBecause: promise.id,
			},
		]);
	});

	test('[R6] two events with one number on one tablet are a fork', () => {
		const teller = new Teller();
		const told = { person: 'TechA', device: 'T-1', entered: 1 };
		const one = teller.say('note', { text: 'one' }, told);
		const other = new Teller().say('note', { text: 'other' }, told);
		const [finding] = checkChains([one, other]);
		expect(finding).toMatchObject({ kind: 'chain forked', device: 'T-1', number: 1 });
	});

	test('[R6] a changed byte changes the id, so the next event no longer links to it', () => {
		fc.assert(
			fc.property(fc.nat(), fc.nat(), (pick, where) => {
				const chain = tablet('T-1');
				const event = chain[pick % (chain.length - 1)]!;
				const at = where % event.text.length;
				const changed = event.text.slice(0, at) + (event.text[at] === '7' ? '8' : '7') + event.text.slice(at + 1);
				const lines = night.map((one) => (one === event ? JSON.stringify({ text: changed }) : printEventLine(one)));
				const read = parseEvents(lines.join('\n'));
				// Either the line is no event any more, and its line number is said, or the chain no longer holds.
				if (!read.ok) expect(read.error.line).toBe(night.indexOf(event) + 1);
				else expect(checkChains(read.value)).not.toEqual([]);
			}),
			{ numRuns: 200 },
		);
	});

	test('the site log has chains of its own', () => {
		const teller = new Teller();
		teller.say(
			'instrument checked',
			{ instrument: 'AT-1', passes: true },
			{ person: 'Inst', device: 'T-1', entered: 1, log: SITE },
		);
		const note = teller.say('note', { text: 'one' }, { person: 'TechA', device: 'T-1', entered: 2 });
		expect(note.number).toBe(1);
		expect(checkChains(teller.site)).toEqual([]);
	});
});
