import { fromBase64, fromUtf8, parseJson, toBase64 } from '../base';
import { inOrder, parseEventLine, START_UP_BODIES, type EventError, type RecordEvent } from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import { failed, passed, type Check } from './pdf/check';

type Bytes = Uint8Array<ArrayBuffer>;

/** A record as it was stored, read line by line: what could be read, and what is wrong with the lines. */
export type StoredRecord = {
	readonly checks: readonly Check[];
	/** Every event that could be read, each once. */
	readonly events: readonly RecordEvent[];
	/** Those of the start-up's log. */
	readonly startUp: readonly RecordEvent[];
	readonly site: readonly RecordEvent[];
	readonly lines: number;
};

type Line = { readonly file: string; readonly number: number; readonly bytes: Bytes };

/** Reads any bytes, and always answers. A line that cannot be read does not hide the others. */
export function readStoredRecord(files: readonly { readonly name: string; readonly bytes: Bytes }[]): StoredRecord {
	const lines = files.flatMap(({ name, bytes }) => linesOf(name, bytes));
	const read = lines.map((line) => ({ line, event: readLine(line) }));
	const unreadable = read.flatMap(({ line, event }) => (event.ok ? [] : [unreadableLine(line, event.error)]));
	const kept = read.flatMap(({ line, event }) => (event.ok ? [{ line, event: event.value }] : []));
	const events = [...new Map(kept.map(({ event }) => [event.id, event])).values()];
	const logs = new Set(events.filter(({ kind }) => Object.hasOwn(START_UP_BODIES, kind)).map(({ log }) => log));
	return {
		checks: [
			...offences('lines can be read', unreadable, `${lines.length} lines, each an event in its canonical form.`),
			...checkKeptBytes(kept),
			...checkOnce(kept),
			...checkOrder(kept),
			checkOneStartUp(logs, events),
		],
		events,
		startUp: events.filter(({ log }) => logs.has(log)),
		site: events.filter(({ log }) => !logs.has(log)),
		lines: lines.length,
	};
}

function linesOf(file: string, bytes: Bytes): readonly Line[] {
	const lines: Line[] = [];
	let from = 0;
	for (let number = 1; from < bytes.length; number++) {
		const newline = bytes.indexOf(NEWLINE, from);
		const to = newline === -1 ? bytes.length : newline;
		if (to > from) lines.push({ file, number, bytes: bytes.slice(from, to) });
		from = to + 1;
	}
	return lines;
}

const NEWLINE = 0x0a;

function readLine(line: Line): ReturnType<typeof parseEventLine> {
	try {
		return parseEventLine(fromUtf8(line.bytes), line.number);
	} catch (error) {
		if (!(error instanceof TypeError)) throw error;
		return { ok: false, error: { kind: 'not-json', line: line.number, at: 0, because: 'not UTF-8' } };
	}
}

/** Names the line, and the tablet and number that it seems to have been: a damaged line cannot vouch for its name. */
function unreadableLine({ file, number, bytes }: Line, error: EventError): Check {
	const text = new TextDecoder('latin1').decode(bytes);
	// The last of each: names of the envelope stand after its body, which may hold the same names.
	const device = [...text.matchAll(/\\?"device\\?":\\?"([^"\\]{1,128})/g)].at(-1)?.[1];
	const count = [...text.matchAll(/\\?"number\\?":(\d{1,9})/g)].at(-1)?.[1];
	const seems =
		device === undefined || count === undefined ? '' : `, which seems to have been ${device} number ${count}`;
	return failed('lines can be read', `Line ${number} of ${file}${seems}: ${why(error)}.`, {
		facts: { file, line: number, error: error.kind, ...(device === undefined ? {} : { device }) },
		sub: 'FORMAT_FAILURE',
	});
}

function why(error: EventError): string {
	switch (error.kind) {
		case 'not-json':
			return `it is no JSON at character ${error.at} (${error.because})`;
		case 'not-an-event':
			return `at "${error.path}" it should hold ${error.expected}, and holds ${error.found}`;
		case 'unknown-version':
			return `version ${JSON.stringify(error.version)} is not known here`;
		case 'unknown-kind':
			return `the kind "${error.found}" is not known here`;
		case 'not-canonical':
			return 'its text is not in the canonical form that is hashed and signed';
	}
}

type Kept = readonly { readonly line: Line; readonly event: RecordEvent }[];

/** What was signed is kept as text, and a signature has one spelling: else a byte could change that nothing covers. */
function checkKeptBytes(kept: Kept): readonly Check[] {
	const name = 'lines hold the bytes that were signed';
	const bad = kept.flatMap(({ line, event }) => {
		const { signature } = event;
		const bytes = signature === undefined ? undefined : fromBase64(signature);
		const because = !holdsText(line)
			? 'holds values, not the text that was hashed and signed'
			: bytes !== undefined && toBase64(bytes) !== signature
				? 'spells its signature in another way than base64 is written'
				: undefined;
		return because === undefined
			? []
			: [failed(name, `${nameOf(event)} ${because}.`, { facts: aboutEvent(event), sub: 'FORMAT_FAILURE' })];
	});
	return offences(name, bad, 'Ids are hashed from them; nothing was written again to check it.');
}

/** The other forms of a line are for histories that nobody signed. */
function holdsText({ bytes }: Line): boolean {
	const json = parseJson(fromUtf8(bytes));
	return json.ok && typeof json.value === 'object' && json.value !== null && 'text' in json.value;
}

function checkOnce(kept: Kept): readonly Check[] {
	const name = 'every event stands once';
	const first = new Map<string, Line>();
	const bad = kept.flatMap(({ line, event }) => {
		const before = first.get(event.id);
		if (before === undefined) {
			first.set(event.id, line);
			return [];
		}
		const places = `lines ${before.number} and ${line.number} of ${line.file}`;
		return [failed(name, `${nameOf(event)} stands twice: ${places}.`, { facts: aboutEvent(event) })];
	});
	return offences(name, bad, 'No line is repeated.');
}

/** A file is written in the order of the record, so that a line that was moved is seen. */
function checkOrder(kept: Kept): readonly Check[] {
	const name = 'lines stand in the order of the record';
	const before = new Map<string, RecordEvent>();
	const bad = kept.flatMap(({ line, event }) => {
		const key = JSON.stringify([line.file, event.log]);
		const last = before.get(key);
		before.set(key, event);
		return last === undefined || inOrder(last, event) <= 0
			? []
			: [
					failed(name, `${nameOf(event)} stands after ${nameOf(last)}, and comes before it.`, {
						facts: aboutEvent(event),
					}),
				];
	});
	return offences(name, bad, 'By logical clock, then by id.');
}

function checkOneStartUp(logs: ReadonlySet<string>, events: readonly RecordEvent[]): Check {
	const name = 'it is the record of one start-up';
	const [only] = logs;
	const opened = events.filter(({ kind }) => kind === 'start-up opened');
	if (only === undefined) return failed(name, 'It holds no event of a start-up.', { sub: 'SIGNED_DATA_NOT_FOUND' });
	if (logs.size > 1) return failed(name, `It holds ${logs.size}: ${[...logs].join(', ')}.`);
	if (opened.length !== 1) return failed(name, `It was opened ${opened.length} times.`);
	return passed(name, `Start-up ${only}.`, { facts: { startUp: only } });
}
