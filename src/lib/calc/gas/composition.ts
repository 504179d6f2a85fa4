import * as v from 'valibot';
import { fail, ok, type Result } from '../../base';
import type { InSi } from '../../quantity';
import type { CalcNote, InputPart, Refusal } from '../calculator';
import { MOLAR_MASS, type Gas } from '../constants';
import { all, readMeasure, typedMeasure } from '../read-inputs';

export const GASES = Object.keys(MOLAR_MASS) as readonly Gas[];

/** Mole fractions of a gas that add up to one. */
export type Composition = { readonly [G in Gas]?: number };
/** The same with what is known of the uncertainty of each. */
export type ReadComposition = { readonly [G in Gas]?: InSi<'fraction'> };

/** As it comes from outside: any of the gases, each as a fraction or as a measure in %, ppm or 1. */
export const compositionSchema = v.strictObject(
	Object.fromEntries(GASES.map((gas) => [gas, v.optional(typedMeasure)])) as {
		[G in Gas]: v.OptionalSchema<typeof typedMeasure, undefined>;
	},
);

const GAS_NAMES: { readonly [G in Gas]: string } = {
	N2: 'Nitrogen',
	O2: 'Oxygen',
	CO2: 'Carbon dioxide',
	CO: 'Carbon monoxide',
	H2O: 'Water',
	Ar: 'Argon',
};

export const COMPOSITION_PARTS: readonly InputPart[] = GASES.map((gas) => ({
	...{
		name: gas,
		symbol: gas,
		label: GAS_NAMES[gas],
		means: `mole fraction of ${gas}`,
		quantity: 'fraction',
		unit: '1',
		typedIn: '%',
	},
	...{ min: 0, max: 1, optional: true },
}));

/**
 * Reads a composition and refuses what cannot be one: a negative fraction, percent typed as fractions, a sum that is
 * not 1 within 0.005. A smaller gap is closed in proportion, by `normalised`, which says so.
 */
export function readComposition(
	typed: v.InferOutput<typeof compositionSchema>,
	at: string,
): Result<ReadComposition, readonly Refusal[]> {
	const present = GASES.flatMap((gas) => (typed[gas] === undefined ? [] : [{ gas, typed: typed[gas] }]));
	const read = all(
		present.map((each) => {
			const fraction = readMeasure(each.typed, { quantity: 'fraction' }, `${at}.${each.gas}`);
			return fraction.ok ? ok([each.gas, fraction.value] as const) : fraction;
		}),
	);
	if (!read.ok) return read;
	const composition = Object.fromEntries(read.value) as ReadComposition;
	const sum = sumOf(fractionsOf(composition));
	if (Math.abs(sum - 100) <= 100 * SUM_TOLERANCE) return fail([{ kind: 'percent-for-fraction', input: at, sum }]);
	const outside = read.value.filter(([, x]) => !(x.value >= 0 && x.value <= 1));
	if (outside.length > 0) {
		return fail(
			outside.map(([gas, x]) => ({
				kind: 'out-of-range',
				input: `${at}.${gas}`,
				value: x.value,
				min: 0,
				max: 1,
				unit: '1',
			})),
		);
	}
	if (!(Math.abs(sum - 1) <= SUM_TOLERANCE)) {
		return fail([{ kind: 'fractions-do-not-add-up', input: at, sum, tolerance: SUM_TOLERANCE }]);
	}
	return ok(composition);
}

/** The composition with a sum of exactly one, and the note that must stand beside the result when it was scaled. */
export function normalised(composition: Composition): { readonly x: Composition; readonly notes: readonly CalcNote[] } {
	const sum = sumOf(composition);
	const x = Object.fromEntries(Object.entries(composition).map(([gas, fraction]) => [gas, fraction / sum]));
	const wasScaled = Math.abs(sum - 1) > 1e-9;
	return { x, notes: wasScaled ? [{ kind: 'composition-normalised', level: 'warning', sum }] : [] };
}

/** From dry mole fractions and the moisture of the gas (mole of water per mole of wet gas) to wet mole fractions. */
export function moistened(dry: Composition, waterVapour: number): Composition {
	const wet = Object.entries(dry).map(([gas, fraction]) => [gas, fraction * (1 - waterVapour)] as const);
	return { ...Object.fromEntries(wet), H2O: waterVapour };
}

export const fractionsOf = (read: ReadComposition): Composition =>
	Object.fromEntries(Object.entries(read).map(([gas, x]) => [gas, x.value]));

/** Sum of x_i times a property of each gas. */
export const mixed = (x: Composition, property: (gas: Gas) => number): number =>
	GASES.reduce((sum, gas) => (x[gas] === undefined || x[gas] === 0 ? sum : sum + x[gas] * property(gas)), 0);

const sumOf = (x: Composition): number => mixed(x, () => 1);

const SUM_TOLERANCE = 0.005;
