import * as v from 'valibot';
import { canonicalJson, fromUtf8, ok, sha256Hex, type Json } from '../base';
import { CATALOGUE } from '../calc';
import type { Plant } from '../plant';
import { bindInputs, type Procedure, type Step } from '../procedure';
import {
	allOf,
	Knowledge,
	lookupIn,
	parseTrend,
	standing,
	type EventOf,
	type RecordEvent,
	trendKey,
	type Trend,
	type TrendReading,
} from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import type { Replayed } from './check-gates';
import { knownSite } from './known-site';
import { failed, undecided, type Check } from './pdf/check';

type Bytes = Uint8Array<ArrayBuffer>;
type Calculation = Extract<Step, { readonly kind: 'calculation' }>;
type Inputs = { readonly [input: string]: Json };

const NAME = 'calculations took what the record held';

/** Nobody types what is known: every bound input of a calculation is the reading, series or datum that the procedure names. */
export function checkBindings(
	replayed: Replayed,
	plant: Plant | undefined,
	files: readonly { readonly bytes: Bytes }[],
): readonly Check[] {
	const { procedure, startUp, site } = replayed;
	const steps = new Map(procedure.steps.map((step) => [step.id, step]));
	const calculated = allOf(startUp, 'entry').flatMap((event) => {
		const step = steps.get(event.body.step);
		const { calculation } = event.body;
		if (step?.kind !== 'calculation' || calculation === undefined) return [];
		// Inputs that are no table are named where they are calculated again.
		return isTable(calculation.inputs) ? [{ event, step, inputs: calculation.inputs }] : [];
	});
	if (plant === undefined)
		return calculated.length === 0 ? [] : [undecided(NAME, 'The record holds no plant description that can be read.')];
	const trends = trendsIn(startUp, files, plant.utcOffsetMinutes);
	const knowledge = new Knowledge([...startUp, ...site]);
	const bad = calculated.flatMap(({ event, step, inputs }) => {
		const past = knowledge.past(event);
		const known = startUp.filter(({ id }) => past.has(id));
		const moments = [...new Set([event.observed ?? event.entered, event.entered])];
		const bound = knownSite(site, event, known).flatMap((then) =>
			moments.map((at) => bindAt(at, { procedure, plant, trends, step, inputs, known, site: then })),
		);
		return compare(event, inputs, bound);
	});
	return offences(NAME, bad, `${calculated.length} calculations, each input where the procedure binds it.`);
}

type At = {
	readonly procedure: Procedure;
	readonly plant: Plant;
	readonly trends: ReadonlyMap<string, Trend>;
	readonly step: Calculation;
	readonly inputs: Inputs;
	readonly known: readonly RecordEvent[];
	readonly site: readonly RecordEvent[];
};

function bindAt(
	at: string,
	{ procedure, plant, trends, step, inputs, known, site }: At,
): ReturnType<typeof bindInputs> {
	const stood = standing(procedure, known, site, at);
	// What was typed into the calculation itself stands nowhere else: it is what it says.
	const lookup = lookupIn({ events: known, standing: stood, trends, typed: byPath(inputs, '') });
	const bound = bindInputs(step, { procedure, plant, lookup });
	return bound.ok ? ok(asTaken(step.calculator, bound.value)) : bound;
}

/** A calculator keeps of its inputs what its schema names: a volume of the plant also has a place on the sketch. */
function asTaken(
	calculator: string,
	bound: { readonly [input: string]: unknown },
): { readonly [input: string]: unknown } {
	const schema = Object.hasOwn(CATALOGUE, calculator) ? CATALOGUE[calculator]?.schema : undefined;
	const taken = schema === undefined ? undefined : v.safeParse(schema, bound);
	return taken?.success === true ? (taken.output as { readonly [input: string]: unknown }) : bound;
}

/** A calculation may have been made for when a thing was seen or for when it was entered: one of them must agree. */
function compare(
	event: EventOf<'entry'>,
	inputs: Inputs,
	bound: readonly ReturnType<typeof bindInputs>[],
): readonly Check[] {
	const facts = aboutEvent(event);
	const differences = bound.flatMap((each) => (each.ok ? [differing(inputs, each.value)] : []));
	const [first] = differences;
	if (first === undefined) {
		const missing = bound.flatMap((each) => (each.ok ? [] : each.error.map(({ input }) => input)));
		const because = `${nameOf(event)}: the record as it is here does not say ${[...new Set(missing)].join(', ')}.`;
		return [undecided(NAME, because, { facts })];
	}
	if (differences.some((names) => names.length === 0)) return [];
	return [failed(NAME, `${nameOf(event)} took another ${first.join(', ')} than the record held.`, { facts })];
}

function differing(stored: Inputs, bound: { readonly [input: string]: unknown }): readonly string[] {
	const names = new Set([...Object.keys(stored), ...Object.keys(bound)]);
	const text = (value: unknown): string =>
		value === undefined ? '' : canonicalJson(JSON.parse(JSON.stringify(value)) as Json);
	return [...names].filter((name) => text(stored[name]) !== text(bound[name]));
}

const isTable = (value: unknown): value is Inputs =>
	typeof value === 'object' && value !== null && !Array.isArray(value);

/** Every value inside the inputs by its path, "places[2].age". */
function byPath(value: Json, path: string): { readonly [path: string]: Json } {
	if (typeof value !== 'object' || value === null) return { [path]: value };
	const inner = Array.isArray(value)
		? value.map((item: Json, i) => byPath(item, `${path}[${i}]`))
		: Object.entries(value).map(([name, item]) => byPath(item, path === '' ? name : `${path}.${name}`));
	return Object.assign({ [path]: value }, ...inner) as { readonly [path: string]: Json };
}

/** Every attached series, read as its event says. */
function trendsIn(
	startUp: readonly RecordEvent[],
	files: readonly { readonly bytes: Bytes }[],
	utcOffsetMinutes: number,
): ReadonlyMap<string, Trend> {
	const byHash = new Map(files.map(({ bytes }) => [sha256Hex(bytes), bytes] as const));
	const trends = allOf(startUp, 'series attached').flatMap(({ body }) => {
		const bytes = byHash.get(body.attachment.hash);
		const trend = bytes === undefined ? undefined : trendOf(bytes, utcOffsetMinutes, body.reading);
		return trend === undefined ? [] : [[trendKey(body), trend] as const];
	});
	return new Map(trends);
}

function trendOf(bytes: Bytes, utcOffsetMinutes: number, reading: TrendReading | undefined): Trend | undefined {
	try {
		const trend = parseTrend(fromUtf8(bytes), utcOffsetMinutes, reading);
		return trend.ok ? trend.value : undefined;
	} catch {
		// Not every file is text.
		return undefined;
	}
}
