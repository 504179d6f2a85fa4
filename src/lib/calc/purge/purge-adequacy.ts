import { fail, ok, type Result } from '../../base';
import type { CalcResult, Refusal, Verdict } from '../calculator';
import { defineCalculator } from '../define-calculator';
import { adequacyFields, type AdequacyInputs } from './adequacy-inputs';
import { adequacyOutputs } from './adequacy-outputs';
import { adequacyPlots } from './adequacy-plots';
import { adequacyValues } from './adequacy-values';
import { readCircuit } from './circuit';
import { judgePurge } from './judge-purge';
import type { PurgeReason } from './notes';
import type { PlaceReadings } from './place-judgement';
import { readPlaces } from './place-readings';
import { ADEQUACY_PAGE } from './adequacy-page';

/**
 * Adequacy of a purge: whether the readings show that every enclosed volume was brought below the limit and stays there.
 * The fit of a place never makes a purge adequate: it forecasts, gives the floor, and refuses.
 *
 *     adequate: (a) every volume covered; (b) all valid readings of the hold ≤ limit − guard, no rise; (c) held ≥ hold
 *     needed; (d) admitted − U ≥ N_min V; (e) fan, inert gas, outlet without a gap; (f) live analysers; (g) no unburnt
 *     gas at zirconia.  Cannot be shown: a, e, f, g, or floor ≥ limit.  Not yet: b, c, d
 *
 * @param inputs series of oxygen at each place, inert gas, fan and outlet [own unit, s]; limit and guard [1] ≤ 0.25;
 *        coverage of every volume [m³]; T [K], p [Pa absolute]; site rules with their defaults
 * @returns the verdict with every reason; for each place last reading, margin, floor [1], rate [1/s], forecast [s]; admitted
 *          gas [m³(n)], in-leakage [m³(n)/s] with its suction
 *
 * Source: CEN/TR 15281 and NFPA 69 (purge, margin, mixing; from memory, verify); JCGM 106:2012, clause 8 (guard band; from
 * memory, verify); the conditions (a) to (g) are the rule of this procedure (common practice).
 * Checked against: simulated circuits, each condition broken by itself (test/calc/purge/purge-adequacy.test.ts).
 */
export const purgeAdequacy = defineCalculator({
	id: 'purge-adequacy',
	version: 1,
	title: 'Purge adequacy',
	answers:
		'Do these readings show that every enclosed volume is purged, and if not yet: what is missing, and how long?',
	sources: [
		'CEN/TR 15281 and NFPA 69 (from memory, verify)',
		'JCGM 106:2012, clause 8, guarded acceptance (from memory, verify)',
		'Conditions (a) to (g): common practice',
	],
	outputs: adequacyOutputs,
	fields: adequacyFields,
	page: ADEQUACY_PAGE,
	compute,
});

type Computed = Result<Omit<CalcResult, 'calc' | 'constants' | 'inputs'>, readonly Refusal[]>;

function compute(given: AdequacyInputs): Computed {
	const begins = given.begins.value;
	const places = readPlaces(given);
	const judgedAt = given.judgedAt?.value ?? (places.ok ? lastValid(places.value, begins) : begins);
	const circuit = readCircuit(given, judgedAt);
	if (!places.ok || !circuit.ok) return fail([places, circuit].flatMap((read) => (read.ok ? [] : read.error)));
	if (judgedAt < begins) return fail([{ kind: 'judged-before-it-began', input: 'judgedAt', begins, judgedAt }]);
	const judgement = judgePurge(given, { places: places.value, circuit: circuit.value, judgedAt });
	return ok({
		values: adequacyValues(judgement),
		verdict: { word: verdictWord(judgement.reasons), reasons: judgement.reasons },
		scope: 'in scope',
		notes: judgement.notes,
		plots: adequacyPlots(judgement),
	});
}

/** What waiting, holding or more gas can mend is not yet; what they cannot mend cannot be shown. */
export function verdictWord(reasons: readonly Pick<PurgeReason, 'criterion'>[]): Verdict['word'] {
	if (reasons.length === 0) return 'adequate';
	return reasons.every(({ criterion }) => ['b', 'c', 'd'].includes(criterion)) ? 'not yet' : 'cannot be shown';
}

/** Void samples do not move the judgement, and so not its time either. */
const lastValid = (places: readonly PlaceReadings[], begins: number): number =>
	Math.max(begins, ...places.map(({ valid }) => valid.at(-1)?.t ?? begins));
