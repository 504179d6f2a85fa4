import * as v from 'valibot';
import { fail, ok, type Json, type Result } from '../base';
import { QUANTITIES, toSi, type InSi, type Measure, type QuantityName } from '../quantity';
import type { InputSpec, Refusal } from './calculator';

/**
 * One input of a calculator, said once: how it is described to people (`spec`), which shape it has in JSON (`schema`),
 * and how it is read (`read`). Descriptions, published schema and reading cannot drift apart.
 */
export type Field<T> = {
	readonly spec: Omit<InputSpec, 'name'>;
	readonly schema: v.GenericSchema;
	/** `at` names the place in a refusal: "dp", "places[2].volume". */
	readonly read: (typed: unknown, at: string) => Result<T, readonly Refusal[]>;
};
export type Fields = { readonly [name: string]: Field<unknown> };
/** What stands behind each name after reading. */
export type Given<F extends Fields> = { readonly [Name in keyof F]: F[Name] extends Field<infer T> ? T : never };

type About = Pick<InputSpec, 'means' | 'from' | 'label' | 'parts' | 'repeats' | 'symbol' | 'typedIn'>;
type AboutMeasured<Q> = About & { readonly quantity: Q; readonly min?: number; readonly max?: number };

/** A measured value as typed, or a bare number in the SI unit of its quantity. */
export type Typed = Measure | number;
export const typedMeasure = v.union([
	v.number(),
	v.strictObject({
		value: v.union([v.number(), v.string()]),
		unit: v.string(),
		U: v.optional(v.union([v.number(), v.string()])),
	}),
]);

/** One measured value with unit, range [SI] and, when stated, its expanded uncertainty. */
export const measured = <Q extends QuantityName>(about: AboutMeasured<Q>): Field<InSi<Q>> => ({
	spec: { ...about, unit: QUANTITIES[about.quantity] },
	schema: typedMeasure,
	read: (typed, at) => readMeasure(typed as Typed, about, at),
});

/** Several values of one quantity, in the order they were taken. */
export const measuredList = <Q extends QuantityName>(
	about: AboutMeasured<Q>,
	length: { readonly min: number; readonly max: number },
): Field<readonly InSi<Q>[]> => ({
	spec: { ...about, quantity: `list of ${about.quantity}`, unit: QUANTITIES[about.quantity] },
	schema: v.pipe(v.array(typedMeasure), v.minLength(length.min), v.maxLength(length.max)),
	read: (typed, at) => all((typed as readonly Typed[]).map((each, i) => readMeasure(each, about, `${at}[${i}]`))),
});

export const choice = <const C extends readonly [string, ...string[]]>(choices: C, about: About): Field<C[number]> => ({
	spec: { ...about, quantity: 'choice', choices },
	schema: v.picklist(choices),
	read: (typed) => ok(typed as C[number]),
});

/** An input of its own shape: a table of surfaces, a composition, a series. `quantity` says its shape in words. */
export const shaped = <S extends v.GenericSchema, T = v.InferOutput<S>>(
	schema: S,
	about: About & { readonly quantity: string },
	read: (typed: v.InferOutput<S>, at: string) => Result<T, readonly Refusal[]> = (typed) => ok(typed as T),
): Field<T> => ({ spec: about, schema, read: (typed, at) => read(typed, at) });

export const optional = <T>(field: Field<T>): Field<T | undefined> => ({
	spec: { ...field.spec, optional: true },
	schema: v.optional(field.schema),
	read: (typed, at) => (typed === undefined ? ok(undefined) : field.read(typed, at)),
});

/** An input that stands at a stated value when it is left out; a number is in the SI unit. */
export const withDefault = <T>(field: Field<T>, value: number | string): Field<T> => ({
	spec: { ...field.spec, optional: true, default: value },
	schema: v.optional(field.schema),
	read: (typed, at) => field.read(typed ?? value, at),
});

export const inputSpecs = (fields: Fields): readonly InputSpec[] =>
	Object.entries(fields).map(([name, { spec }]) => ({ name, ...spec }));

export const inputSchema = (fields: Fields): v.GenericSchema =>
	v.strictObject(Object.fromEntries(Object.entries(fields).map(([name, { schema }]) => [name, schema])));

/** Reads whatever came from outside: every value in SI units, or every refusal, each naming its input. */
export function readInputs<F extends Fields>(
	fields: F,
	raw: unknown,
): Result<{ readonly given: Given<F>; readonly typed: Json }, readonly Refusal[]> {
	const parsed = v.safeParse(inputSchema(fields), raw);
	if (!parsed.success) return fail(parsed.issues.flatMap(refusalsOfIssue));
	const typed = parsed.output as { readonly [name: string]: unknown };
	const read = all(
		Object.entries(fields).map(([name, field]) => {
			const value = field.read(typed[name], name);
			return value.ok ? ok([name, value.value] as const) : value;
		}),
	);
	if (!read.ok) return read;
	return ok({ given: Object.fromEntries(read.value) as Given<F>, typed: typed as Json });
}

/** One typed value of a table or series inside an input, with its range in SI units. */
export function readMeasure<Q extends QuantityName>(
	typed: Typed,
	about: { readonly quantity: Q; readonly min?: number; readonly max?: number },
	at: string,
): Result<InSi<Q>, readonly Refusal[]> {
	const unit = QUANTITIES[about.quantity];
	const read = toSi(typeof typed === 'number' ? { value: typed, unit } : typed, about.quantity);
	if (!read.ok) return fail([{ input: at, ...read.error }]);
	const { min = -Infinity, max = Infinity } = about;
	const { value } = read.value;
	if (value >= min && value <= max) return read;
	return fail([
		{
			kind: 'out-of-range',
			input: at,
			value,
			unit,
			...(about.min === undefined ? {} : { min }),
			...(about.max === undefined ? {} : { max }),
		},
	]);
}

/** All values, or all refusals: a person corrects a sheet once, not field by field. */
export function all<T>(results: readonly Result<T, readonly Refusal[]>[]): Result<readonly T[], readonly Refusal[]> {
	const refusals = results.flatMap((result) => (result.ok ? [] : result.error));
	return refusals.length > 0 ? fail(refusals) : ok(results.flatMap((result) => (result.ok ? [result.value] : [])));
}

function refusalsOfIssue(issue: v.BaseIssue<unknown>): readonly Refusal[] {
	// A measure is a number or an object; when an object was given, only its own issues say something.
	const inner = issue.type === 'union' ? (issue.issues ?? []).filter((each) => each.path !== undefined) : [];
	if (inner.length > 0)
		return inner.flatMap((each) => refusalsOfIssue({ ...each, path: joined(issue.path, each.path) }));
	const input = v.getDotPath(issue) ?? '';
	if (issue.type === 'strict_object' && issue.expected === 'never') return [{ kind: 'unknown-input', input }];
	if (issue.type === 'strict_object' && issue.received === 'undefined') return [{ kind: 'missing-input', input }];
	return [{ kind: 'bad-input', input, expected: issue.expected ?? issue.message, found: issue.received }];
}

type Path = v.BaseIssue<unknown>['path'];
const joined = (outer: Path, inner: Path): Path => [...(outer ?? []), ...(inner ?? [])] as unknown as Path;
