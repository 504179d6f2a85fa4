import { fail, ok, type Result } from '../../base';
import type { CalcNote, Refusal } from '../calculator';
import type { Numbers } from '../uncertainty';
import { acidDewPoint, acidDewPointOkkes } from './acid-dew-point';
import type { ClearanceGiven } from './clearance-inputs';

export type AcidDewPoints = { readonly acidDewPoint?: number; readonly acidDewPointOkkes?: number };

/** Acid dew points by both correlations, of the gas with feed on where it is stated; none where nobody stated SO3. */
export function acidDewPoints(
	sulphurTrioxide: number | undefined,
	now: Numbers,
	pressure: number,
): Result<AcidDewPoints, Refusal> {
	if (sulphurTrioxide === undefined || sulphurTrioxide === 0) return ok({});
	const water = (now.predictedWaterVapour ?? now.waterVapour ?? 0) * pressure;
	const first = acidDewPoint(water, sulphurTrioxide * pressure);
	if (!first.ok) return fail(first.error);
	const second = acidDewPointOkkes(water, sulphurTrioxide * pressure);
	return ok({ acidDewPoint: first.value, ...(second.ok ? { acidDewPointOkkes: second.value } : {}) });
}

/** The acid dew point is said, never proved with: how much SO2 becomes SO3 is the unknown that dominates it. */
export function acidNotes(given: ClearanceGiven, acid: AcidDewPoints, coldest: number): readonly CalcNote[] {
	const temperatures = [acid.acidDewPoint, acid.acidDewPointOkkes].filter((each) => each !== undefined);
	if (temperatures.length === 0) return [];
	const temperature = Math.max(...temperatures);
	const from = given.sulphurTrioxideFrom;
	return [
		{ kind: 'acid-dew-point', level: 'remark', temperature, from },
		...(temperature > coldest
			? [{ kind: 'acid-dew-point-above-wall', level: 'warning', temperature, wall: coldest } as const]
			: []),
		...(from === 'estimated' ? [{ kind: 'sulphur-trioxide-estimated', level: 'warning' } as const] : []),
	];
}
