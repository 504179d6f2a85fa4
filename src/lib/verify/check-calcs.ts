import { CATALOGUE, runCalculator, type CalcResult } from '../calc';
import { allOf, type EventOf, type RecordEvent } from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import { failed, undecided, type Check } from './pdf/check';

const NAME = 'calculations come out again as they are stored';

/** Every stored result is calculated again from its own inputs, by the calculator and version that it names. */
export function checkCalcs(events: readonly RecordEvent[]): readonly Check[] {
	const stored = allOf(events, 'entry').flatMap((event) => {
		const { calculation } = event.body;
		return calculation === undefined ? [] : [{ event, calculation }];
	});
	const bad = stored.flatMap(({ event, calculation }) => recalculate(event, calculation));
	return offences(NAME, bad, `${stored.length} calculated again, to ten digits.`);
}

function recalculate(event: EventOf<'entry'>, stored: { readonly [name: string]: unknown }): readonly Check[] {
	const { calc, inputs } = stored;
	const facts = { ...aboutEvent(event), calc: String(calc) };
	if (typeof calc !== 'string' || !Object.hasOwn(CATALOGUE, calc)) {
		const because = `${nameOf(event)}: calculator ${JSON.stringify(calc)} is not known here.`;
		return [undecided(NAME, because, { facts })];
	}
	const again = runCalculator(calc, inputs);
	if (!again.ok) {
		const refusal = again.error
			.map(({ kind, input }) => (input === undefined ? kind : `${kind} at ${input}`))
			.join(', ');
		return [failed(NAME, `${nameOf(event)}: ${calc} refuses the stored inputs: ${refusal}.`, { facts })];
	}
	const place = differencesOf(stored, again.value)[0];
	if (place === undefined) return [];
	const because = `${nameOf(event)}: ${calc} gives another ${place.at}: ${place.again}, stored is ${place.stored}.`;
	return [failed(NAME, because, { facts: { ...facts, at: place.at, stored: place.stored, again: place.again } })];
}

type Difference = { readonly at: string; readonly stored: string; readonly again: string };

/** Whatever a stored result holds must come out again; what it leaves out (a plot) nobody relied on. */
function differencesOf(stored: { readonly [name: string]: unknown }, again: CalcResult): readonly Difference[] {
	const needed = ['constants', 'values', 'scope', ...(again.verdict === undefined ? [] : ['verdict'])];
	const names = [...new Set([...needed, ...Object.keys(stored)])].filter(
		(name) => name !== 'calc' && name !== 'inputs',
	);
	return names.flatMap((name) => compare(name, own(stored, name), own(again, name)));
}

function compare(at: string, stored: unknown, again: unknown): readonly Difference[] {
	if (typeof stored === 'number' && typeof again === 'number')
		return agree(stored, again) ? [] : [difference(at, stored, again)];
	if (isTable(stored) && isTable(again) && Array.isArray(stored) === Array.isArray(again))
		return [...new Set([...Object.keys(stored), ...Object.keys(again)])].flatMap((name) =>
			compare(`${at}.${name}`, own(stored, name), own(again, name)),
		);
	return stored === again ? [] : [difference(at, stored, again)];
}

/** A stored table may name anything, also what every list can do. */
const own = (table: object, name: string): unknown =>
	Object.hasOwn(table, name) ? (table as { readonly [name: string]: unknown })[name] : undefined;

const isTable = (value: unknown): value is { readonly [name: string]: unknown } =>
	typeof value === 'object' && value !== null;

/** Two engines may round the last bits of a logarithm differently; nothing that a person reads differs by that. */
const agree = (a: number, b: number): boolean => Math.abs(a - b) <= 1e-10 * Math.max(Math.abs(a), Math.abs(b));

const difference = (at: string, stored: unknown, again: unknown): Difference => ({
	at,
	stored: shown(stored),
	again: shown(again),
});

const shown = (value: unknown): string => (value === undefined ? 'nothing' : JSON.stringify(value).slice(0, 60));
