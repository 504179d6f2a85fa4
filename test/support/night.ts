import { readFileSync } from 'node:fs';
import { ProcedureSchema, type Procedure } from '../../src/lib/procedure';
import { nextEnvelope, unsignedEvent, type BodyOf, type EventKind, type RecordEvent } from '../../src/lib/record';
import * as v from 'valibot';

/**
 * The start-up night as a record: the vector's events (minutes after 16:00) told by the people and tablets of the cast.
 * The vector gives facts and expected states; who did it, on which tablet, is the cast's timetable.
 */
export type NightVector = {
	readonly events: readonly VectorEvent[];
	readonly expected: readonly ExpectedRow[];
};

type VectorEvent = {
	readonly n: number;
	readonly known: number;
	readonly kind: string;
	readonly obs: number;
	readonly step?: string;
	readonly pass?: boolean;
	readonly by?: string;
	readonly dev?: string;
	readonly gate?: number;
	readonly id?: string;
	readonly what?: string;
	readonly begin?: number;
	readonly end?: number;
	readonly instr?: string;
	readonly good?: number;
};

export type ExpectedRow = {
	readonly no: number | string;
	readonly at: string;
	readonly text: string;
	readonly gates: readonly string[];
	readonly lapsed: readonly string[];
	readonly failed: readonly string[];
	readonly waits: readonly string[];
	readonly reproof: readonly string[];
	readonly minutes: number;
};

const read = (file: string): unknown => JSON.parse(readFileSync(new URL(file, import.meta.url), 'utf8'));

export const NIGHT = read('../vectors/record/start-up-night.json') as NightVector;

export const NIGHT_PROCEDURE: Procedure = v.parse(ProcedureSchema, read('../../static/demo/night/procedure.json'));

export const START_UP = 'FM-1/night';
export const SITE = 'site';

const MIDNIGHT_BEFORE = Date.UTC(2026, 2, 14, 0, 0);

/** Minutes after 16:00 plant time (UTC+01:00) of the night's first day. */
export const clock = (minutes: number): string => {
	const local = new Date(MIDNIGHT_BEFORE + (16 * 60 + minutes) * 60_000).toISOString().slice(0, 19);
	return `${local}+01:00`;
};

/** A row's wall-clock time, in minutes after 16:00. */
export const minutesOf = (at: string): number => {
	const [hours = 0, minutes = 0] = at.split(':').map(Number);
	return ((hours - 16 + 24) % 24) * 60 + minutes;
};

export const PEOPLE = [
	{ person: 'TechA', roles: ['technician'] },
	{ person: 'TechB', roles: ['technician'] },
	{ person: 'SupA', roles: ['shift supervisor'] },
	{ person: 'SupB', roles: ['shift supervisor'] },
	{ person: 'Lead', roles: ['commissioning lead'] },
	{ person: 'QA', roles: ['QA'] },
];

/** From 22:00 to 06:02 the night shift has the plant. */
const onShift = (minutes: number, late: string, night: string): string =>
	minutes >= 360 && minutes < 842 ? night : late;
const technician = (minutes: number): string => onShift(minutes, 'TechA', 'TechB');
const supervisor = (minutes: number): string => onShift(minutes, 'SupA', 'SupB');
/** T-1 falls at 05:00. */
const tabletAt = (minutes: number): string => (minutes >= 780 ? 'T-2' : 'T-1');

/** Tells events to tablets and keeps what each of them holds. */
export class Teller {
	readonly events: RecordEvent[] = [];
	readonly site: RecordEvent[] = [];
	readonly #held = new Map<string, RecordEvent[]>();

	say<K extends EventKind>(
		kind: K,
		body: BodyOf<K>,
		told: { person: string; device: string; entered: number; observed?: number; log?: string },
	): RecordEvent {
		const log = told.log ?? START_UP;
		const held = this.#heldBy(told.device);
		const entered = clock(told.entered);
		const observed =
			told.observed === undefined || told.observed === told.entered ? {} : { observed: clock(told.observed) };
		const { person, device } = told;
		const event = unsignedEvent(nextEnvelope({ log, kind, body, person, device, entered, ...observed }, held));
		held.push(event);
		(log === SITE ? this.site : this.events).push(event);
		return event;
	}

	/** Everything that one tablet holds reaches another. */
	copy(from: string, to: string): void {
		const held = this.#heldBy(to);
		for (const event of this.#heldBy(from)) if (!held.includes(event)) held.push(event);
	}

	#heldBy(device: string): RecordEvent[] {
		const held = this.#held.get(device) ?? [];
		this.#held.set(device, held);
		return held;
	}
}

export type Night = { readonly events: readonly RecordEvent[]; readonly site: readonly RecordEvent[] };

/** @param until minutes after 16:00; events known later are left out, for the variants that branch off */
export function tellNight(
	until = Infinity,
	leaveOut: (event: VectorEvent) => boolean = () => false,
): Night & { teller: Teller } {
	const teller = new Teller();
	const ids = new Map<string, string>();
	const ordered = [...NIGHT.events].filter((event) => !leaveOut(event)).sort((a, b) => a.known - b.known || a.n - b.n);
	const before = (minutes: number): void => extras(teller, minutes, until, ids);
	for (const event of ordered) {
		// What T-1 recorded after 04:50 reached T-2 only at 06:30, but was entered in its own time.
		if (event.dev === 'T-1' || event.n === 84) continue;
		if (event.known > until) break;
		before(event.known);
		tell(teller, event, ids);
		if (event.n === 82 && event.known <= until) {
			tellLostTablet(teller, until);
		}
	}
	before(until);
	return { events: teller.events, site: teller.site, teller };
}

/** 04:50: T-1 is copied to T-2. 04:58 and 05:03: two events on T-1 alone, which then falls. */
function tellLostTablet(teller: Teller, until: number): void {
	teller.say(
		'copy made',
		{ to: 'T-2', way: 'QR', heads: {}, compared: true },
		{ person: 'TechB', device: 'T-1', entered: 770 },
	);
	teller.copy('T-1', 'T-2');
	teller.say('copy received', { from: 'T-1' }, { person: 'TechB', device: 'T-2', entered: 770 });
	if (until < 783) return;
	for (const event of NIGHT.events) if (event.dev === 'T-1') tell(teller, { ...event, known: event.obs }, new Map());
	tell(
		teller,
		{ n: 84, known: 783, kind: 'plant', what: 'burner-trip', begin: 779, end: 783, obs: 779, dev: 'T-1' },
		new Map(),
	);
}

const said = new WeakMap<Teller, Set<string>>();

/** What the table tells and the vector does not: refused acts, and the merge at 06:30. */
function extras(teller: Teller, minutes: number, until: number, ids: Map<string, string>): void {
	const done = said.get(teller) ?? new Set();
	said.set(teller, done);
	const once = (name: string, at: number, act: () => void): void => {
		if (at > minutes || at > until || done.has(name)) return;
		done.add(name);
		act();
	};
	once('18:45', 165, () =>
		teller.say(
			'refused act',
			{ act: 'release', gate: 1, because: 'TechA performed steps under the gate' },
			{ person: 'TechA', device: 'T-1', entered: 165 },
		),
	);
	once('01:22', 562, () =>
		teller.say(
			'refused act',
			{ act: 'release', gate: 4, because: 'SupB performed E4', wayOut: 'TechB repeats E4, or another releaser' },
			{ person: 'SupB', device: 'T-1', entered: 562 },
		),
	);
	once('02:40', 640, () => {
		const event = ids.get('61');
		teller.say(
			'refused act',
			{
				act: 'withdrawal',
				...(event === undefined ? {} : { event }),
				because: 'withdrawing an event needs a releasing role that did not enter it, and evidence',
			},
			{ person: 'TechB', device: 'T-1', entered: 640 },
		);
	});
	once('06:30', 870, () => {
		teller.copy('T-1', 'T-2');
		teller.say('copy received', { from: 'T-1' }, { person: 'TechA', device: 'T-2', entered: 870 });
	});
}

/** First sample of the hold window of the two adequate purges: 21:24 and 03:44. */
const HOLD: { readonly [n: number]: number } = { 27: 324, 73: 704 };

function tell(teller: Teller, event: VectorEvent, ids: Map<string, string>): void {
	const device = event.dev === '' || event.dev === undefined ? tabletAt(event.known) : event.dev;
	const at = { device, entered: event.known, observed: event.obs };
	const who = (person: string): string => (event.by === '' || event.by === undefined ? person : event.by);
	const step = event.step ?? '';
	const gate = event.gate ?? 0;
	switch (event.kind) {
		case 'opened-startup':
			teller.say(
				'start-up opened',
				{ procedure: { id: 'GD-1', revision: 3 }, startType: 'after-overhaul', people: PEOPLE },
				{ ...at, person: 'Lead' },
			);
			return;
		case 'entry': {
			const from = HOLD[event.n];
			const body = {
				step,
				outcome: event.pass === true ? ('pass' as const) : ('fail' as const),
				...(from === undefined ? {} : { from: clock(from) }),
			};
			teller.say('entry', body, { ...at, person: who(step === 'A2' ? 'Lead' : technician(event.known)) });
			return;
		}
		case 'attempt':
			teller.say('entry', { step, outcome: 'try' }, { ...at, person: technician(event.known) });
			return;
		case 'release': {
			const first = gate >= 5 ? 'Lead' : supervisor(event.known);
			teller.say('gate released', { gate }, { ...at, person: first });
			if (gate === 7) teller.say('gate released', { gate }, { ...at, person: 'SupA' });
			return;
		}
		case 'refuse':
			teller.say(
				'gate refused',
				{ gate, reason: 'hopper 7.6 against 7.7; have AT-213 looked at', names: ['AT-213', 'F1'] },
				{ ...at, person: 'SupB' },
			);
			return;
		case 'answered':
			teller.say(
				'refusal answered',
				{ gate, words: 'AT-213 adjusted and checked, F1 read again' },
				{ ...at, person: 'SupA' },
			);
			return;
		case 'deviation':
			teller.say(
				'deviation raised',
				{ deviation: event.id ?? '', title: 'HV-14 required shut, seen open', blocks: gate },
				{ ...at, person: technician(event.known) },
			);
			return;
		case 'disposed':
			teller.say(
				'deviation dispositioned',
				{ deviation: event.id ?? '', disposition: 'repaired' },
				{ ...at, person: supervisor(event.known) },
			);
			return;
		case 'plant': {
			const what = event.what ?? '';
			const begin = clock(event.begin ?? 0);
			const end = event.end === undefined ? {} : { end: clock(event.end) };
			const { observed: _, ...when } = at;
			if (what.startsWith('burner-purge'))
				teller.say('fact', { what, begin, ...end }, { ...when, person: technician(event.known) });
			else
				ids.set(
					String(event.n),
					teller.say('plant event begun', { what, begin, ...end }, { ...when, person: technician(event.known) }).id,
				);
			return;
		}
		case 'finding':
			teller.say(
				'instrument finding',
				{
					instrument: event.instr ?? '',
					asFound: { error: '-0.6', unit: '%', tolerance: '0.2' },
					lastGood: clock(event.good ?? 0),
				},
				{ ...at, person: technician(event.known), log: SITE },
			);
			return;
		case 'handover': {
			const night = event.known < 600;
			teller.say(
				'shift hand-over',
				{
					from: night ? ['TechA', 'SupA'] : ['TechB', 'SupB'],
					to: night ? ['TechB', 'SupB'] : ['TechA', 'SupA', 'Lead', 'QA'],
					temporaryStatesConfirmed: true,
				},
				{ ...at, person: technician(event.known) },
			);
			return;
		}
		case 'sealed':
			teller.say('sealed', { heads: {} }, { ...at, person: 'QA' });
			return;
		case 'addendum':
			teller.say('addendum', { text: 'a photo that T-1 held' }, { ...at, person: 'QA' });
			return;
		default:
			throw new Error(`the vector says ${event.kind}`);
	}
}
