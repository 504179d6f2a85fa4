import { readableCode } from '../base';
import { allOf, isOf, type RecordEvent } from './event';
import { inOrder } from './knowledge';

/** What is wrong with the chains of a log: always a place, so that a person can go and look. */
export type ChainFinding =
	| {
			readonly kind: 'link broken';
			readonly device: string;
			readonly number: number;
			readonly event: string;
			readonly expected: string | null;
			readonly found: string | null;
	  }
	| {
			readonly kind: 'events missing';
			readonly device: string;
			readonly from: number;
			readonly to: number;
			readonly knownBecause: string;
	  }
	| {
			readonly kind: 'chain forked';
			readonly device: string;
			readonly number: number;
			readonly events: readonly string[];
	  }
	| { readonly kind: 'seen but missing'; readonly event: string; readonly device: string; readonly missing: string }
	| {
			readonly kind: 'head differs';
			readonly device: string;
			readonly number: number;
			readonly promised: string;
			readonly found: string;
			readonly knownBecause: string;
	  }
	| {
			readonly kind: 'clock not above what it saw';
			readonly event: string;
			readonly clock: number;
			readonly saw: number;
	  };

/** A promise, inside some event, that a chain had got so far: a cut tail breaks it. */
type Promise = {
	readonly device: string;
	readonly number: number;
	readonly id?: string;
	readonly code?: string;
	readonly because: string;
};

/**
 * Checks the chains of one log: no number missing, none twice, every link to the event before it, every event that another
 * tablet had seen present, and every head that an event promised reached. One chain per device (rule R6 of SPEC.md).
 */
export function checkChains(events: readonly RecordEvent[]): readonly ChainFinding[] {
	const byId = new Map(events.map((event) => [event.id, event]));
	const chains = new Map<string, RecordEvent[]>();
	for (const event of [...events].sort((a, b) => a.number - b.number || inOrder(a, b)))
		chains.set(event.device, [...(chains.get(event.device) ?? []), event]);
	return [
		...[...chains].flatMap(([device, chain]) => checkChain(device, chain)),
		...events.flatMap((event) => checkSeen(event, byId)),
		...promises(events).flatMap((promise) => checkPromise(promise, chains.get(promise.device) ?? [])),
	];
}

function checkChain(device: string, chain: readonly RecordEvent[]): readonly ChainFinding[] {
	const findings: ChainFinding[] = [];
	let before: RecordEvent | undefined;
	for (const event of chain) {
		if (event.number === before?.number) {
			const events = chain.filter(({ number }) => number === event.number).map(({ id }) => id);
			findings.push({ kind: 'chain forked', device, number: event.number, events });
			continue;
		}
		const expectedNumber = (before?.number ?? 0) + 1;
		if (event.number !== expectedNumber)
			findings.push({
				kind: 'events missing',
				device,
				from: expectedNumber,
				to: event.number - 1,
				knownBecause: event.id,
			});
		else if (event.previous !== (before?.id ?? null))
			findings.push({
				kind: 'link broken',
				device,
				number: event.number,
				event: event.id,
				expected: before?.id ?? null,
				found: event.previous,
			});
		before = event;
	}
	return findings;
}

function checkSeen(event: RecordEvent, byId: ReadonlyMap<string, RecordEvent>): readonly ChainFinding[] {
	const findings: ChainFinding[] = [];
	const parents = [...Object.values(event.seen), ...(event.previous === null ? [] : [event.previous])];
	for (const [device, missing] of Object.entries(event.seen))
		if (!byId.has(missing)) findings.push({ kind: 'seen but missing', event: event.id, device, missing });
	const saw = Math.max(0, ...parents.map((id) => byId.get(id)?.clock ?? 0));
	if (event.clock <= saw)
		findings.push({ kind: 'clock not above what it saw', event: event.id, clock: event.clock, saw });
	return findings;
}

function promises(events: readonly RecordEvent[]): readonly Promise[] {
	const heads = (
		because: string,
		list: { readonly [device: string]: { readonly number: number; readonly id?: string; readonly code?: string } },
	): readonly Promise[] => Object.entries(list).map(([device, head]) => ({ device, because, ...head }));
	return [
		...allOf(events, 'chain head').map(({ id: because, device, body }) => ({
			device,
			because,
			number: body.number,
			id: body.head,
		})),
		...allOf(events, 'sealed').flatMap((event) => heads(event.id, event.body.heads)),
		...allOf(events, 'copy made').flatMap((event) => heads(event.id, event.body.heads)),
		...allOf(events, 'copy received').flatMap((event) => heads(event.id, event.body.heads ?? {})),
		...events.flatMap((event) =>
			isOf(event, 'gate released') || isOf(event, 'gate refused') || isOf(event, 'sealed')
				? (event.body.statement?.others ?? []).map(({ device, number, head }) => ({
						device,
						because: event.id,
						number,
						...(head === null ? {} : { code: head }),
					}))
				: [],
		),
	];
}

function checkPromise(promise: Promise, chain: readonly RecordEvent[]): readonly ChainFinding[] {
	const { device, number, because } = promise;
	if (number === 0) return [];
	const last = chain.at(-1)?.number ?? 0;
	if (last < number) return [{ kind: 'events missing', device, from: last + 1, to: number, knownBecause: because }];
	const found = chain.find((event) => event.number === number);
	const promised = promise.id ?? promise.code;
	if (found === undefined || promised === undefined) return [];
	const has = promise.id === undefined ? headCode(found) : found.id;
	return has === promised
		? []
		: [{ kind: 'head differs', device, number, promised, found: has, knownBecause: because }];
}

/** Six characters that name the state of a tablet's log, to be said by radio. */
export const headCode = (head: RecordEvent): string => readableCode(head.id, 6);

/** The last event of every chain of a log, by device. */
export function headsOf(events: readonly RecordEvent[]): ReadonlyMap<string, RecordEvent> {
	const heads = new Map<string, RecordEvent>();
	for (const event of events) if (event.number > (heads.get(event.device)?.number ?? 0)) heads.set(event.device, event);
	return heads;
}
