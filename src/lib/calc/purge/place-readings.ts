import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';
import type { AdequacyInputs } from './adequacy-inputs';
import { comparable } from './comparable';
import type { GasReading } from './coverage-input';
import type { PlaceReadings } from './place-judgement';
import type { Basis } from './place-input';
import { readSeries } from './series-input';
import { voidSamples } from './void-samples';

/** The valid readings of every place on the basis of the limit, with the guard that each analyser needs. */
export function readPlaces(given: AdequacyInputs): Result<readonly PlaceReadings[], readonly Refusal[]> {
	const { limit } = given;
	const refusals: Refusal[] = [...basisRefusals(given)];
	const places = given.places.map((place, i): PlaceReadings => {
		const points = readSeries(given.series, place.tag, place.basis === 'wet' ? 'oxygen-wet' : 'oxygen-dry');
		const guard = Math.max(given.guard.value, place.U ?? 0, place.resolution ?? 0);
		const accept = limit.oxygen - guard;
		if (!points.ok) refusals.push(...points.error);
		if (!(accept > 0))
			refusals.push({ kind: 'guard-leaves-nothing', input: `places[${i}]`, limit: limit.oxygen, guard });
		// What was read after the judgement was not known to it.
		const known = (points.ok ? points.value : []).filter(({ t }) => t <= (given.judgedAt?.value ?? Infinity));
		const { valid, excluded } = voidSamples(known, {
			flagged: Object.hasOwn(given.series, place.tag) ? given.series[place.tag]?.flagged : undefined,
			range: place.range,
			identicalMost: given.identicalMost.value,
		});
		const compared = valid.map(({ t, C }) => ({ t, C: onLimitBasis(C, place.basis, given) }));
		return { place, valid: compared, asRead: valid, excluded, guard, accept };
	});
	return refusals.length > 0 ? fail(refusals) : ok(places);
}

/** A reading on the basis of the limit; what cannot be brought there was refused before. */
export const onLimitBasis = (C: number, read: Basis, { limit, moisture }: AdequacyInputs): number =>
	comparable(C, { read, limit: limit.basis, waterVapour: moisture ?? { low: 0 } }) ?? Number.NaN;

function basisRefusals({ limit, moisture, places, coverage }: AdequacyInputs): readonly Refusal[] {
	if (limit.basis === 'wet' || moisture?.high !== undefined) return [];
	const readings = coverage.flatMap((row, i): { read: GasReading; input: string }[] => {
		if (row.answer === 'swept, outlet read' && row.outlet)
			return [{ read: row.outlet, input: `coverage[${i}].outlet` }];
		if (row.answer !== 'shut off, inerted by itself' || row.reading === undefined) return [];
		return [{ read: row.reading, input: `coverage[${i}].reading` }];
	});
	const read = [...places.map((place, i) => ({ read: place, input: `places[${i}].basis` })), ...readings];
	return read.flatMap(({ read: { tag, basis }, input }) =>
		basis === 'wet' ? [{ kind: 'basis-needs-moisture', input, tag, basis, limitBasis: limit.basis }] : [],
	);
}
