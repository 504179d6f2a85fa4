import type { Standing } from '../../src/lib/record';

/** The part of an answer that the night's table and the hand-made cases state. */
export const statesOf = (standing: Standing): object => ({
	gates: standing.gates.map(({ state }) => state),
	lapsed: stepsIn(standing, 'lapsed'),
	failed: stepsIn(standing, 'failed'),
	waits: stepsIn(standing, 'waits'),
	reproof: standing.reproof.steps,
	minutes: standing.reproof.minutes,
});

export const stepsIn = (standing: Standing, wanted: Standing['steps'][number]['state']): readonly string[] =>
	standing.steps.filter(({ state }) => state === wanted).map(({ step }) => step);
