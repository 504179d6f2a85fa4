import * as v from 'valibot';
import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';
import { all, shaped, typedMeasure } from '../read-inputs';
import type { Suction } from './notes';
import { readParts } from './read-parts';
import { meterSchema, OXYGEN_RANGE, refuseMeter } from './shared-inputs';

/** Who saw that something did not stop, from when to when: for what no recorder writes down. */
export type Seen = { readonly from: number; readonly to: number; readonly by: string };
const seen = v.optional(v.strictObject({ from: v.number(), to: v.number(), by: v.string() }));

export type Meter = {
	readonly tag: string;
	readonly medium: string;
	readonly reads: 'flow' | 'totaliser';
	/** Expanded uncertainty (k = 2), relative to the amount. */
	readonly U: number;
};
export type InertGas = {
	readonly oxygen: number;
	readonly least: number;
	readonly meters: readonly Meter[];
	readonly seen: Seen | undefined;
};

const meter = v.object({
	...meterSchema.entries,
	reads: v.picklist(['flow', 'totaliser']),
	U: v.optional(typedMeasure),
});

export const inertGas = shaped(
	v.strictObject({
		oxygen: typedMeasure,
		least: v.optional(typedMeasure),
		meters: v.pipe(v.array(meter), v.minLength(1)),
		seen,
	}),
	{
		quantity: 'inert gas and its meters',
		means: 'oxygen in the inert gas, least flow that counts as flowing, and its own meters',
		from: 'plant',
	},
	(typed, at): Result<InertGas, readonly Refusal[]> => {
		const read = readParts(at, {
			oxygen: { typed: typed.oxygen, quantity: 'oxygen-wet', ...OXYGEN_RANGE },
			least: { typed: typed.least, quantity: 'volume-flow-normal-wet', min: 0 },
		});
		const meters = all(
			typed.meters.map((row, i): Result<Meter, readonly Refusal[]> => {
				const wrong = refuseMeter(row, `${at}.meters[${i}]`);
				if (wrong !== undefined) return fail([wrong]);
				const part = { typed: row.U, quantity: 'fraction', min: 0, max: 1 } as const;
				const U = readParts(`${at}.meters[${i}]`, { U: part });
				return U.ok ? ok({ ...row, U: U.value.U ?? 0 }) : U;
			}),
		);
		if (read.ok && meters.ok)
			return ok({ oxygen: read.value.oxygen, least: read.value.least ?? 0, meters: meters.value, seen: typed.seen });
		return fail([read, meters].flatMap((each) => (each.ok ? [] : each.error)));
	},
);

export type Fan = { readonly tag: string; readonly least: number; readonly seen: Seen | undefined };

export const fan = shaped(
	v.strictObject({ tag: v.string(), least: typedMeasure, seen }),
	{ quantity: 'fan', means: 'the flow meter of the circuit, and the flow that the next gate asks for', from: 'plant' },
	(typed, at): Result<Fan, readonly Refusal[]> => {
		const read = readParts(at, { least: { typed: typed.least, quantity: 'volume-flow', min: 1e-6 } });
		return read.ok ? ok({ tag: typed.tag, least: read.value.least, seen: typed.seen }) : read;
	},
);

export type Outlet = { readonly name: string; readonly tag: string | undefined; readonly seen: Seen | undefined };

export const outlet = shaped(
	v.strictObject({ name: v.string(), tag: v.optional(v.string()), seen }),
	{ quantity: 'outlet', means: 'where the gas leaves, and the contact (1 open) or person that says so', from: 'plant' },
	(typed, at): Result<Outlet, readonly Refusal[]> =>
		typed.name.trim() === ''
			? fail([{ kind: 'no-outlet', input: `${at}.name` }])
			: ok({ name: typed.name, tag: typed.tag, seen: typed.seen }),
);

export type Cleaning = { readonly cycle: number; readonly runningSince: number | null };

export const cleaning = shaped(
	v.strictObject({ cycle: typedMeasure, runningSince: v.nullable(v.number()) }),
	{
		quantity: 'filter cleaning',
		means: 'one full cycle of the filter cleaning, and since when it runs',
		from: 'plant',
	},
	(typed, at): Result<Cleaning, readonly Refusal[]> => {
		const read = readParts(at, { cycle: { typed: typed.cycle, quantity: 'time', min: 0 } });
		return read.ok ? ok({ cycle: read.value.cycle, runningSince: typed.runningSince }) : read;
	},
);

export const dampers = shaped(v.array(v.strictObject({ tag: v.string(), strokedAt: v.nullable(v.number()) })), {
	...{ quantity: 'table of dampers', from: 'reading' },
	means: 'each damper that the next gates move, and when it was stroked once',
});

export const disturbances = shaped(
	v.array(
		v.strictObject({
			t: v.number(),
			what: v.picklist(['damper moved', 'fan started', 'flow raised']),
			tag: v.string(),
		}),
	),
	{
		quantity: 'table of events',
		means: 'what stirred the gas during the purge: it asks for a new hold',
		from: 'reading',
	},
);

export const suction = shaped(
	v.array(v.strictObject({ tag: v.string(), at: v.string(), pressure: typedMeasure })),
	{ quantity: 'pressure profile', means: 'pressures in the circuit: an in-leakage belongs to them', from: 'reading' },
	(rows, at): Result<readonly Suction[], readonly Refusal[]> =>
		all(
			rows.map((row, i) => {
				const part = { typed: row.pressure, quantity: 'pressure-gauge' } as const;
				const read = readParts(`${at}[${i}]`, { pressure: part });
				return read.ok ? ok({ ...row, pressure: read.value.pressure }) : read;
			}),
		),
);

export type ListedFlow = { readonly name: string; readonly medium: 'air' | 'inert gas'; readonly flow: number };

export const listedFlows = shaped(
	v.array(v.strictObject({ name: v.string(), medium: v.picklist(['air', 'inert gas']), flow: typedMeasure })),
	{
		quantity: 'table of flows',
		means: 'cleaning, seal, conveying and feeder gas: part of the floor, not of the leak',
		from: 'plant',
	},
	(rows, at): Result<readonly ListedFlow[], readonly Refusal[]> =>
		all(
			rows.map((row, i) => {
				const part = { typed: row.flow, quantity: 'volume-flow-normal-wet', min: 0 } as const;
				const read = readParts(`${at}[${i}]`, { flow: part });
				return read.ok ? ok({ ...row, flow: read.value.flow }) : read;
			}),
		),
);
