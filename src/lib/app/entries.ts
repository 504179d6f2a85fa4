import { fail, fromUtf8, type Result } from '../base';
import {
	calculatedBody,
	enteredBody,
	millis,
	parseTrend,
	seriesBody,
	type BodyOf,
	type RecordEvent,
	type Typed,
} from '../record';
import { nextDeviation } from './new-id';
import type { OpenStartUp, Seen } from './open-start-up.svelte';
import type { Problem } from './problem';

type Saved = Promise<Result<'saved', Problem>>;

/** What a person typed, chose or confirmed on a step becomes an entry; limits decide its outcome, nobody chooses it. */
export async function enter(startUp: OpenStartUp, step: string, typed: Typed, seen?: Seen): Saved {
	const found = startUp.stepOf(step);
	if (!found.ok) return found;
	const newest = newestEntry(startUp, step);
	const body = enteredBody(found.value, typed, { plant: startUp.plant, known: startUp.events });
	if (!body.ok) return body;
	const corrects = typed.supersedes === undefined && newest !== undefined && sameMoment(newest, startUp, seen);
	return startUp.hold('entry', { ...body.value, ...(corrects ? { supersedes: newest.id } : {}) }, seen);
}

/** Runs the calculation of a step on what stands at that moment; short of adequate it is a try, and kept. */
export async function calculate(
	startUp: OpenStartUp,
	step: string,
	said: Parameters<typeof calculatedBody>[1] = {},
	seen: Seen = {},
): Saved {
	const found = startUp.stepOf(step);
	if (!found.ok) return found;
	const { procedure, plant, events, trends, tablet } = startUp;
	const standing = startUp.standingAt(seen.observed ?? startUp.instant(tablet.clock.now()));
	const body = calculatedBody(found.value, said, { procedure, plant, events, standing, trends });
	return body.ok ? startUp.hold('entry', body.value, seen) : body;
}

export type TrendFile = { readonly name: string; readonly bytes: Uint8Array<ArrayBuffer> };

/**
 * A trend file becomes a series of the measuring points that its columns name, and the entry of the series step that rests on
 * it. Observed is its last sample: what the plant showed, not when somebody copied it.
 */
export async function attachSeries(
	startUp: OpenStartUp,
	step: string,
	file: TrendFile,
	said: Parameters<typeof seriesBody>[3] = {},
): Saved {
	const found = startUp.stepOf(step);
	if (!found.ok) return found;
	const signer = startUp.entrySigner();
	if (!signer.ok) return signer;
	const { plant, tablet } = startUp;
	const text = textOf(file.bytes);
	const trend =
		text === undefined
			? fail({ kind: 'not-utf8', name: file.name } as const)
			: parseTrend(text, plant.utcOffsetMinutes, said.reading);
	if (!trend.ok) return trend;
	const kept = await tablet.store.attachments.save(file.bytes, { name: file.name, mediaType: 'text/csv' });
	if (!kept.ok) return kept;
	const series = seriesBody(trend.value, kept.value, plant, said);
	if (!series.ok) return series;
	const attached = await startUp.write('series attached', series.value, signer.value);
	if (!attached.ok) return attached;
	const { from, to } = series.value;
	const typed: Typed = { series: [attached.value.id], from, ...(said.note === undefined ? {} : { note: said.note }) };
	const now = startUp.instant(tablet.clock.now());
	return enter(startUp, step, typed, millis(to) < millis(now) ? { observed: to } : {});
}

/** Something happened to the plant: at least when it began. Nobody is asked for more before it is kept. */
export const recordPlantEvent = (startUp: OpenStartUp, body: BodyOf<'plant event begun'>): Saved =>
	startUp.hold('plant event begun', body);

export const endPlantEvent = (startUp: OpenStartUp, event: string, end: string): Saved =>
	startUp.hold('plant event ended', { event, end });

export function raiseDeviation(startUp: OpenStartUp, said: Omit<BodyOf<'deviation raised'>, 'deviation'>): Saved {
	const known = startUp.standing.deviations.map(({ deviation }) => deviation);
	const deviation = nextDeviation(known, startUp.tablet.device);
	return startUp.hold('deviation raised', { deviation, ...said });
}

export const note = (startUp: OpenStartUp, body: BodyOf<'note'>): Saved => startUp.hold('note', body);

const newestEntry = (startUp: OpenStartUp, step: string): RecordEvent | undefined => {
	const id = startUp.standing.steps.find((one) => one.step === step)?.entry;
	return startUp.events.find((event) => event.id === id);
};

/** Two entries of one step observed at the same moment: the later one corrects the earlier. */
const sameMoment = (newest: RecordEvent, startUp: OpenStartUp, seen?: Seen): boolean =>
	newest.observedAt === millis(seen?.observed ?? startUp.instant(startUp.tablet.clock.now()));

/** Nothing, where the bytes are no UTF-8 text. */
export function textOf(bytes: Uint8Array): string | undefined {
	try {
		return fromUtf8(bytes);
	} catch {
		return undefined;
	}
}
