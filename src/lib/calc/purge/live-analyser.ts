import type { DecaySample } from './decay-fit';
import type { PurgeNote, PurgeReason } from './notes';
import type { Place } from './place-input';

/** Dry air as an analyser reads it: 20.9 ± 0.5 % (common practice; 20.95 and 20.946 occur as well). */
const AIR = { oxygen: 0.209, tolerance: 0.005 };
/** More CO, H2 and CH4 than this burns off noticeable oxygen in a hot zirconia cell (common practice). */
const UNBURNT_AT_ZIRCONIA = 0.002;
/** From here on the limiting oxygen is that of the gas, about 5 %, and no longer that of the dust. */
const UNBURNT_HYBRID = 0.01;

/**
 * (f) and (g): whether the readings of an analyser may count at all. Its check stands, it measures, it has read air (or
 * a system check at the probe stands), it has moved since, and nothing burns in it.
 */
export function analyserReasons(
	place: Place,
	samples: { readonly asRead: readonly DecaySample[]; readonly begins: number; readonly guard: number },
): readonly PurgeReason[] {
	const f = { level: 'reason', criterion: 'f', place: place.tag } as const;
	const reasons: PurgeReason[] = [];
	if (place.check !== 'stands') reasons.push({ ...f, kind: 'check-does-not-stand', state: place.check });
	if (place.mode !== 'measuring') reasons.push({ ...f, kind: 'not-measuring', mode: place.mode });
	if (place.systemCheck !== 'stands' && !hasReadAir(place, samples)) {
		reasons.push({ ...f, kind: 'air-not-read', read: place.airBefore?.oxygen ?? null });
	}
	if (samples.asRead.length === 0) reasons.push({ ...f, kind: 'no-valid-samples' });
	else reasons.push(...stillness(place, samples));
	return [...reasons, ...unburntReasons(place)];
}

export const analyserWarnings = ({ tag, unburntGas }: Place): readonly PurgeNote[] =>
	unburntGas !== undefined && unburntGas > UNBURNT_HYBRID
		? [{ level: 'warning', kind: 'unburnt-gas-limit-applies', place: tag, fraction: unburntGas }]
		: [];

/** Seen on a check before the purge, or on the samples themselves while only air had reached the cell. */
function hasReadAir(
	{ airBefore, lag }: Place,
	{ asRead, begins }: { readonly asRead: readonly DecaySample[]; readonly begins: number },
): boolean {
	const isAir = (oxygen: number): boolean => Math.abs(oxygen - AIR.oxygen) <= AIR.tolerance + 1e-12;
	if (airBefore !== undefined && airBefore.t <= begins && isAir(airBefore.oxygen)) return true;
	return asRead.some(({ t, C }) => t <= begins + lag && isAir(C));
}

/** An analyser that has not moved by more than its own guard may be stuck. */
function stillness(
	place: Place,
	{
		asRead,
		begins,
		guard,
	}: { readonly asRead: readonly DecaySample[]; readonly begins: number; readonly guard: number },
): readonly PurgeReason[] {
	const air = place.airBefore !== undefined && place.airBefore.t <= begins ? [place.airBefore.oxygen] : [];
	const read = [...air, ...asRead.map(({ C }) => C)];
	const moved = Math.max(...read) - Math.min(...read);
	const least = Math.max(guard, 2 * (place.resolution ?? 0));
	if (moved > least) return [];
	return [{ level: 'reason', criterion: 'f', kind: 'has-not-moved', place: place.tag, moved, least }];
}

function unburntReasons({ tag, principle, unburntGas }: Place): readonly PurgeReason[] {
	if (!/zircon/i.test(principle)) return [];
	const g = { level: 'reason', criterion: 'g', place: tag } as const;
	if (unburntGas === undefined) return [{ ...g, kind: 'unburnt-gas-not-known' }];
	if (unburntGas <= UNBURNT_AT_ZIRCONIA) return [];
	return [{ ...g, kind: 'unburnt-gas', fraction: unburntGas, most: UNBURNT_AT_ZIRCONIA }];
}
