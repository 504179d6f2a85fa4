import { allowedOxygen } from '../calc';
import type { Plant } from '../plant';
import { toSi } from '../quantity';
import type { ProcedureFinding } from './finding';

/**
 * [P32] No oxygen limit of a measuring point lies above what the fuel's tested limiting oxygen concentration allows while
 * oxygen is monitored and interlocked. It is said when the procedure is saved, not when the first reading is compared.
 */
export function checkOxygenLimits(plant: Plant): readonly ProcedureFinding[] {
	const tested = plant.fuel.limitingOxygen;
	if (tested === undefined) return [];
	const quantity = `oxygen-${tested.basis}` as const;
	const LOC = toSi(tested.value, quantity);
	if (!LOC.ok) return [];
	const allowed = allowedOxygen(LOC.value.value, 'monitored');
	return plant.limits.flatMap((limit, i): readonly ProcedureFinding[] => {
		if (limit.quantity !== quantity || limit.appliesTo === undefined || limit.atMost === undefined) return [];
		const most = toSi(limit.atMost, quantity);
		// Typed per cents become fractions; the last bits of that are no reason to refuse 10 % against 12 % less 2 %.
		if (!most.ok || most.value.value <= allowed + 1e-9) return [];
		return [
			{
				kind: 'oxygen-limit-above-allowed',
				path: `plant.limits[${i}].atMost`,
				limit: limit.id,
				allowed: `${Number((100 * allowed).toPrecision(6))} %`,
				limitingOxygen: `${tested.value.value} ${tested.value.unit}`,
			},
		];
	});
}
