import * as v from 'valibot';
import { fail, ok } from '../../base';
import { QUANTITIES, type InSi, type QuantityName } from '../../quantity';
import type { InputPart, OutputSpec, Refusal } from '../calculator';
import { all, readMeasure, shaped, typedMeasure, type Field } from '../read-inputs';

export type Volume = {
	readonly id: string;
	readonly title: string;
	readonly volume: InSi<'volume'>;
	/** Not swept by the circuit gas: by-pass, hopper corner, reject box, chute, casing. */
	readonly deadLeg: boolean;
};

/** Rows may carry more of the plant description (outline, sketch); only these four are used and kept. */
const volumeSchema = v.object({ id: v.string(), title: v.string(), volume: typedMeasure, deadLeg: v.boolean() });

const VOLUME_PARTS: readonly InputPart[] = [
	{ name: 'id', label: 'Tag', means: 'its tag', quantity: 'text' },
	{ name: 'title', label: 'Volume', means: 'what it is called', quantity: 'text' },
	{ name: 'volume', label: 'Size', means: 'its size', quantity: 'volume', unit: 'm3', min: 0 },
	{ name: 'deadLeg', label: 'Dead leg', means: 'whether the circuit gas does not sweep it', quantity: 'yes or no' },
];

export const volumesField = (means: string): Field<readonly Volume[]> =>
	shaped(
		v.pipe(v.array(volumeSchema), v.minLength(1)),
		{
			...{ quantity: 'table of volumes', symbol: 'V_i', label: 'Volumes', means, from: 'plant' },
			...{ repeats: true, parts: VOLUME_PARTS },
		},
		(rows, at) => {
			const read = all(
				rows.map((row, i) => {
					const volume = readMeasure(row.volume, { quantity: 'volume' }, `${at}[${i}].volume`);
					if (!volume.ok) return volume;
					if (volume.value.value > 0) return ok({ ...row, volume: volume.value });
					return fail([{ kind: 'not-positive', input: `${at}[${i}].volume`, value: volume.value.value }]);
				}),
			);
			const twice = duplicates(
				rows.map(({ id }) => id),
				at,
			);
			return twice.length > 0 ? fail(twice) : read;
		},
	);

export const METER_PARTS: readonly InputPart[] = [
	{ name: 'tag', label: 'Tag of the meter', means: 'its tag', quantity: 'text' },
	{
		...{ name: 'medium', label: 'What it meters', means: 'its medium', quantity: 'text' },
		choices: ['inert gas', 'circuit gas', 'air'],
	},
];

export const meterSchema = v.object({ tag: v.string(), medium: v.string() });

/** What circulates is many times what enters; taken for it, a purge of 39 minutes looks like half a minute. */
export const refuseMeter = (meter: v.InferOutput<typeof meterSchema>, at: string): Refusal | undefined =>
	meter.medium === 'inert gas'
		? undefined
		: { kind: 'not-an-inert-gas-meter', input: at, tag: meter.tag, medium: meter.medium };

export const duplicates = (names: readonly string[], at: string): readonly Refusal[] =>
	names.flatMap((name, i) => (names.indexOf(name) < i ? [{ kind: 'named-twice', input: `${at}[${i}]`, name }] : []));

export const output = <const Name extends string>(
	name: Name,
	quantity: QuantityName,
	means: string,
	symbol?: string,
): OutputSpec & { readonly name: Name } => ({
	...{ name, means, quantity, unit: QUANTITIES[quantity] },
	...(symbol === undefined ? {} : { symbol }),
});

/** Oxygen outside 0 to 25 % is a mistake of unit or basis, or a fault: refused as an input, void as a sample. */
export const OXYGEN_RANGE = { min: 0, max: 0.25 } as const;
