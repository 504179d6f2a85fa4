import type { HoldRule } from './notes';

/**
 * Hold that a purge needs after its last disturbance: long enough for every analyser to answer, for the filter to clean
 * every row once, and for the circuit gas to come round three times.
 *
 *     t_hold = max( least, 3 (lag + T90), one filter cleaning cycle, 3 V/Q )
 *
 * @param rules least hold [s] ≥ 300, response: longest lag + T90 of all places [s], cycle [s], turn V/Q: volume of the
 *        circuit over its gas flow [s], null where the flow is not known
 * @returns t_hold [s] and the rule that asks for it
 *
 * Source: site rule (common practice); 3 (lag + T90) leaves 0.1 % of a step unseen with a first-order analyser.
 * Checked against: the longest of four by hand (test/calc/purge/hold-needed.test.ts).
 */
export function holdNeeded(rules: {
	readonly least: number;
	readonly response: number;
	readonly cycle: number;
	readonly turn: number | null;
}): { readonly needed: number; readonly rule: HoldRule } {
	const asked: readonly { needed: number; rule: HoldRule }[] = [
		{ needed: rules.least, rule: 'least hold' },
		{ needed: 3 * rules.response, rule: 'response of the analysers' },
		{ needed: rules.cycle, rule: 'filter cleaning cycle' },
		{ needed: 3 * (rules.turn ?? 0), rule: 'turns of the circuit gas' },
	];
	return asked.reduce((longest, each) => (each.needed > longest.needed ? each : longest));
}
