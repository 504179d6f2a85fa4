import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { merge, standing, type RecordEvent, type Standing } from '../../src/lib/record';
import { clock, NIGHT_PROCEDURE } from '../support/night';
import { HISTORIES, tellHistory, type History } from '../support/random-history';
import { statesOf } from '../support/states';

// Laws of the record, over random start-ups that know nothing of the rules.
const RUNS = { numRuns: Number(process.env.RUNS ?? 60) };

const ask = (history: History, minutes: number, more: readonly RecordEvent[] = []): Standing =>
	standing(NIGHT_PROCEDURE, [...history.teller.events, ...more], history.teller.site, clock(minutes));

const highestBegun = (found: Standing): number => {
	const released = found.gates.filter(({ acts }) => acts.length > 0).map(({ gate }) => gate);
	return Math.max(0, ...released.map((gate) => gate + 1));
};

const lapsedOrFailed = (found: Standing): readonly string[] =>
	found.steps
		.filter(({ state, gate }) => (state === 'lapsed' || state === 'failed') && gate <= highestBegun(found))
		.map(({ step }) => step);

/** The history with these steps proved, one after the other, at one instant. */
function withProofs(told: Parameters<typeof tellHistory>[1], steps: readonly string[], minutes: number): Standing {
	const history = tellHistory(NIGHT_PROCEDURE, told);
	history.teller.copy('T-1', 'T-2');
	history.teller.copy('T-2', 'T-1');
	for (const step of steps)
		history.teller.say('entry', { step, outcome: 'pass' }, { person: 'TechB', device: 'T-1', entered: minutes });
	return ask(history, minutes);
}

describe('laws of what stands', () => {
	test('[ST1] arrival order, repetition and merging change nothing', () => {
		fc.assert(
			fc.property(HISTORIES, fc.infiniteStream(fc.nat()), (told, chance) => {
				const history = tellHistory(NIGHT_PROCEDURE, told);
				const { events, site } = history.teller;
				const shuffled = [...events, ...events.slice(0, 3)].sort(() => (Number(chance.next().value) % 2) - 0.5);
				const halves = merge(shuffled.slice(0, 7), shuffled.slice(4));
				const at = clock(history.end + 1);
				const expected = ask(history, history.end + 1);
				expect(statesOf(standing(NIGHT_PROCEDURE, shuffled, site, at))).toEqual(statesOf(expected));
				expect(statesOf(standing(NIGHT_PROCEDURE, halves, site, at))).toEqual(statesOf(expected));
			}),
			RUNS,
		);
	});

	test('[ST10] the re-proof list is sufficient: proving exactly it leaves nothing lapsed', () => {
		fc.assert(
			fc.property(HISTORIES, (told) => {
				const history = tellHistory(NIGHT_PROCEDURE, told);
				const later = history.end + 3;
				const list = ask(history, later).reproof.inWorkingOrder.map(({ step }) => step);
				expect(lapsedOrFailed(withProofs(told, list, later))).toEqual([]);
			}),
			RUNS,
		);
	});

	test('[ST10] the re-proof list is minimal: leaving one out leaves something lapsed', () => {
		fc.assert(
			fc.property(HISTORIES, fc.nat(), (told, pick) => {
				const history = tellHistory(NIGHT_PROCEDURE, told);
				const later = history.end + 3;
				const list = ask(history, later).reproof.inWorkingOrder.map(({ step }) => step);
				fc.pre(list.length > 0);
				const left = list.filter((_, i) => i !== pick % list.length);
				expect(lapsedOrFailed(withProofs(told, left, later))).not.toEqual([]);
			}),
			RUNS,
		);
	});

	test('[ST2] a plant event that no step names changes nothing, whenever it happened', () => {
		fc.assert(
			fc.property(HISTORIES, fc.array(fc.nat(400), { maxLength: 12 }), (told, times) => {
				const history = tellHistory(NIGHT_PROCEDURE, told);
				const expected = statesOf(ask(history, history.end + 1));
				// Told on a tablet of its own, entered at the end: nobody's act can have known of it.
				for (const minute of times.filter((time) => time <= history.end))
					history.teller.say(
						'plant event begun',
						{ what: 'burner-purge', begin: clock(minute), end: clock(minute) },
						{ person: 'TechB', device: 'T-9', entered: history.end },
					);
				expect(statesOf(ask(history, history.end + 1))).toEqual(expected);
			}),
			RUNS,
		);
	});

	test('[ST8] a gate is never shown released over one that is not', () => {
		fc.assert(
			fc.property(HISTORIES, (told) => {
				const history = tellHistory(NIGHT_PROCEDURE, told);
				const states = ask(history, history.end + 1).gates.map(({ state }) => state);
				const firstDown = states.findIndex((state) => state !== 'released');
				expect(firstDown === -1 ? [] : states.slice(firstDown).filter((state) => state === 'released')).toEqual([]);
			}),
			RUNS,
		);
	});

	test('[ST8] a released gate has no step under it that failed, lapsed for good or was never proved', () => {
		fc.assert(
			fc.property(HISTORIES, (told) => {
				const history = tellHistory(NIGHT_PROCEDURE, told);
				const found = ask(history, history.end + 1);
				const released = new Set(found.gates.filter(({ state }) => state === 'released').map(({ gate }) => gate));
				const wrong = found.steps.filter(
					({ gate, state, why }) =>
						released.has(gate) &&
						state !== 'stands' &&
						state !== 'not applicable' &&
						why[0]?.kind !== 'age counts again',
				);
				expect(wrong).toEqual([]);
			}),
			RUNS,
		);
	});

	test('[ST9] a counted release was never given by somebody who performed a step under it', () => {
		fc.assert(
			fc.property(HISTORIES, (told) => {
				const history = tellHistory(NIGHT_PROCEDURE, told);
				const found = ask(history, history.end + 1);
				expect(found.acts.filter(({ counted, person }) => counted && person.startsWith('Tech'))).toEqual([]);
			}),
			RUNS,
		);
	});
});
