import * as v from 'valibot';
import { fail, ok, unreachable, type Result } from '../../base';
import type { Refusal } from '../calculator';
import { all, shaped, typedMeasure } from '../read-inputs';
import type { Basis } from './place-input';
import { readParts } from './read-parts';
import { duplicates } from './shared-inputs';

/** A reading of the gas that leaves a volume, or of a volume that is shut off; by a portable or an analyser. */
export type GasReading = { readonly tag: string; readonly basis: Basis; readonly t: number; readonly oxygen: number };

/** How one enclosed volume was shown to be purged. A volume without a row is not covered. */
export type CoverageRow = { readonly volume: string } & (
	| { readonly answer: 'measured'; readonly place: string; readonly atOutlet: boolean }
	| { readonly answer: 'swept, outlet read'; readonly outlet: GasReading | undefined }
	| {
			readonly answer: 'shut off, inerted by itself';
			readonly inertedBy: string;
			readonly reading: GasReading | undefined;
	  }
	| { readonly answer: '' }
);

const gasReading = v.strictObject({
	tag: v.string(),
	basis: v.picklist(['wet', 'dry']),
	t: v.number(),
	oxygen: typedMeasure,
});

const rowSchema = v.variant('answer', [
	v.strictObject({
		volume: v.string(),
		answer: v.literal('measured'),
		place: v.string(),
		atOutlet: v.optional(v.boolean()),
	}),
	v.strictObject({
		volume: v.string(),
		answer: v.literal('swept, outlet read'),
		outlet: v.optional(gasReading),
	}),
	v.strictObject({
		volume: v.string(),
		answer: v.literal('shut off, inerted by itself'),
		inertedBy: v.string(),
		reading: v.optional(gasReading),
	}),
	v.strictObject({ volume: v.string(), answer: v.literal('') }),
]);

export const coverageField = shaped(
	v.array(rowSchema),
	{ quantity: 'coverage table', means: 'how every enclosed volume was shown to be purged', from: 'reading' },
	(rows, at): Result<readonly CoverageRow[], readonly Refusal[]> => {
		const twice = duplicates(
			rows.map(({ volume }) => volume),
			at,
		);
		return twice.length > 0 ? fail(twice) : all(rows.map((row, i) => readRow(row, `${at}[${i}]`)));
	},
);

function readRow(row: v.InferOutput<typeof rowSchema>, at: string): Result<CoverageRow, readonly Refusal[]> {
	switch (row.answer) {
		case '':
			return ok(row);
		case 'measured':
			return ok({ ...row, atOutlet: row.atOutlet ?? false });
		case 'swept, outlet read': {
			const outlet = readGas(row.outlet, `${at}.outlet`);
			return outlet.ok ? ok({ ...row, outlet: outlet.value }) : outlet;
		}
		case 'shut off, inerted by itself': {
			const reading = readGas(row.reading, `${at}.reading`);
			return reading.ok ? ok({ ...row, reading: reading.value }) : reading;
		}
		default:
			return unreachable(row);
	}
}

function readGas(
	typed: v.InferOutput<typeof gasReading> | undefined,
	at: string,
): Result<GasReading | undefined, readonly Refusal[]> {
	if (typed === undefined) return ok(undefined);
	const quantity = typed.basis === 'wet' ? 'oxygen-wet' : 'oxygen-dry';
	const read = readParts(at, { oxygen: { typed: typed.oxygen, quantity, min: 0, max: 0.25 } });
	return read.ok ? ok({ ...typed, oxygen: read.value.oxygen }) : read;
}
