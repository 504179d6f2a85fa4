import { millis, type Millis, type RecordEvent, type Standing } from '../../record';

/** The machines that everybody asks for first, and by what the record tells of them. */
export type Machine = 'fan' | 'inert gas' | 'burner' | 'mill' | 'feed';

type Tells = {
	/** Steps whose proof says that it was seen on, or off. */
	readonly on: readonly string[];
	readonly off: readonly string[];
	/** A watch reading with an unbroken flow says that it was on all the time. */
	readonly watched?: true;
	/** Plant events that stopped it, and those whose end says that it is on again. */
	readonly stops: readonly string[];
	readonly backAtEnd: readonly string[];
};

/** Steps and plant events of the built-in procedure; of a procedure with other names nothing is told, and nothing guessed. */
export const MACHINES: { readonly [machine in Machine]: Tells } = {
	fan: { on: ['2.14', '4.5'], off: [], watched: true, stops: ['fan-stop'], backAtEnd: ['fan-stop'] },
	'inert gas': { on: ['2.18'], off: ['6.5'], watched: true, stops: ['inert-loss'], backAtEnd: ['inert-loss'] },
	burner: { on: ['4.2', '4.4'], off: [], stops: ['burner-trip'], backAtEnd: [] },
	mill: { on: ['6.2'], off: [], stops: ['mill-trip', 'trip-with-fuel'], backAtEnd: [] },
	feed: { on: ['6.2'], off: [], stops: ['feed-stop', 'trip-with-fuel'], backAtEnd: ['feed-stop'] },
};

export type MachineState = {
	readonly machine: Machine;
	readonly isOn: boolean;
	/** The first of the sayings that agree, without another between, and the newest. */
	readonly since: Millis;
	readonly last: Millis;
	readonly person: string;
};

type Saying = { readonly at: Millis; readonly isOn: boolean; readonly person: string };

/** What the record last said of every machine; one that is missing was never spoken of. */
export function plantStates(events: readonly RecordEvent[], standing: Standing): readonly MachineState[] {
	return (Object.keys(MACHINES) as Machine[]).flatMap((machine) => {
		const said = [...fromEntries(events, MACHINES[machine]), ...fromEvents(events, standing, MACHINES[machine])]
			.filter(({ at }) => at <= millis(standing.at))
			.sort((a, b) => a.at - b.at || Number(b.isOn) - Number(a.isOn));
		const last = said.at(-1);
		if (last === undefined) return [];
		const agreeing = said.slice(said.findLastIndex(({ isOn }) => isOn !== last.isOn) + 1);
		const since = agreeing[0]?.at ?? last.at;
		return [{ machine, isOn: last.isOn, since, last: last.at, person: last.person }];
	});
}

const fromEntries = (events: readonly RecordEvent[], { on, off, watched }: Tells): readonly Saying[] =>
	events.flatMap((event): readonly Saying[] => {
		if (event.kind !== 'entry') return [];
		const { step, outcome, flow } = event.body;
		const saying = { at: event.observedAt, person: event.person };
		if (watched === true && flow === 'unbroken') return [{ ...saying, isOn: true }];
		if (outcome !== 'pass') return [];
		return on.includes(step) ? [{ ...saying, isOn: true }] : off.includes(step) ? [{ ...saying, isOn: false }] : [];
	});

const fromEvents = (
	events: readonly RecordEvent[],
	standing: Standing,
	{ stops, backAtEnd }: Tells,
): readonly Saying[] =>
	standing.plantEvents
		.filter(({ what, withdrawn }) => stops.includes(what) && withdrawn !== true)
		.flatMap(({ event, what, begin, end }) => {
			const person = events.find(({ id }) => id === event)?.person ?? '';
			const stopped = { at: millis(begin), isOn: false, person };
			return end !== null && backAtEnd.includes(what) ? [stopped, { at: millis(end), isOn: true, person }] : [stopped];
		});
