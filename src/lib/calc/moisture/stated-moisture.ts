import { fail, ok, type Result } from '../../base';
import type { InSi } from '../../quantity';
import type { Refusal } from '../calculator';
import type { Numbers, Uncertain } from '../uncertainty';
import { wetFromDryBasis, wetFromHumidityRatio } from './moisture-basis';

/** A moisture in one of the three ways it is known; the basis is part of the name, so that it cannot be mistaken. */
export type StatedMoisture = {
	readonly wet: InSi<'water-vapour'> | undefined;
	readonly dry: InSi<'water-vapour-dry'> | undefined;
	readonly byMass: InSi<'humidity-ratio'> | undefined;
};
export type MoistureNames = { readonly [Way in keyof StatedMoisture]: string };

/** How a moisture enters a model: its input, and the mole fraction in the wet gas that follows from a set of values. */
export type Moisture = { readonly input: Uncertain; readonly at: (values: Numbers) => number };

/** Undefined when nobody stated it; refused when it is stated twice, or by mass without the molar mass of the dry gas. */
export function statedMoisture(
	stated: StatedMoisture,
	names: MoistureNames,
	hasDryMolarMass: boolean,
): Result<Moisture | undefined, readonly Refusal[]> {
	const { wet, dry, byMass } = stated;
	const given = [wet, dry, byMass].filter((each) => each !== undefined).length;
	if (given > 1) return fail([{ kind: 'one-of', inputs: Object.values(names), given }]);
	if (wet !== undefined) {
		return ok({ input: { ...wet, name: names.wet, symbol: 'x_w', unit: '1' }, at: (v) => v[names.wet] ?? NaN });
	}
	if (dry !== undefined) {
		const at = (v: Numbers) => wetFromDryBasis(v[names.dry] ?? NaN);
		return ok({ input: { ...dry, name: names.dry, symbol: 'w', unit: '1' }, at });
	}
	if (byMass === undefined) return ok(undefined);
	if (!hasDryMolarMass) return fail([{ kind: 'missing-input', input: 'dryMolarMass', neededBy: names.byMass }]);
	const at = (v: Numbers) => wetFromHumidityRatio(v[names.byMass] ?? NaN, v.dryMolarMass ?? NaN);
	return ok({ input: { ...byMass, name: names.byMass, symbol: 'Y', unit: 'kg/kg' }, at });
}
