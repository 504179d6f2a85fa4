import { checkChains, type ChainFinding, type RecordEvent } from '../record';
import { nameOf, offences } from './about-event';
import { failed, type Check } from './pdf/check';

/** Chains of every log: nothing missing, twice, moved or cut off, as far as any event in it knows better. */
export function checkChain(events: readonly RecordEvent[]): readonly Check[] {
	const byId = new Map(events.map((event) => [event.id, event]));
	const logs = [...new Set(events.map(({ log }) => log))].map((log) => events.filter((event) => event.log === log));
	return RULES.flatMap(({ name, kinds, held }) =>
		offences(
			name,
			logs.flatMap((log) =>
				checkChains(log)
					.filter(({ kind }) => kinds.includes(kind))
					.map((finding) => broken(name, finding, byId)),
			),
			held,
		),
	);
}

const RULES: readonly {
	readonly name: string;
	readonly kinds: readonly ChainFinding['kind'][];
	readonly held: string;
}[] = [
	{
		name: 'chains are whole',
		kinds: ['events missing', 'seen but missing'],
		held: 'Every number is there, and every event that another event has seen or vouches for.',
	},
	{ name: 'chains are linked', kinds: ['link broken'], held: 'Each event names the one before it on its tablet.' },
	{ name: 'chains do not fork', kinds: ['chain forked'], held: 'No number stands for two events of one tablet.' },
	{
		name: 'heads are those that were promised',
		kinds: ['head differs'],
		held: 'What seals, chain heads, copies and gate acts say of other tablets is so.',
	},
	{
		name: 'clocks of the record run forward',
		kinds: ['clock not above what it saw'],
		held: 'Each event comes after all it had seen.',
	},
];

function broken(name: string, finding: ChainFinding, byId: ReadonlyMap<string, RecordEvent>): Check {
	const called = (id: string): string => {
		const event = byId.get(id);
		return event === undefined ? `event ${id.slice(0, 12)}` : nameOf(event);
	};
	const { kind } = finding;
	switch (kind) {
		case 'events missing': {
			const { device, from, to, knownBecause } = finding;
			const numbers = from === to ? `number ${from} is` : `numbers ${from} to ${to} are`;
			return failed(name, `${device}: ${numbers} missing; known because of ${called(knownBecause)}.`, {
				facts: { kind, device, number: from, to },
			});
		}
		case 'seen but missing': {
			const { device, event, missing } = finding;
			return failed(name, `${called(event)} had seen an event of ${device} that is not here.`, {
				facts: { kind, device, event, missing },
			});
		}
		case 'link broken': {
			const { device, number, event } = finding;
			return failed(name, `${called(event)} does not name ${device} number ${number - 1} as it stands here.`, {
				facts: { kind, device, number, event },
			});
		}
		case 'chain forked': {
			const { device, number, events } = finding;
			return failed(name, `${events.length} events stand as ${device} number ${number}.`, {
				facts: { kind, device, number, events: events.join(' ') },
			});
		}
		case 'head differs': {
			const { device, number, knownBecause } = finding;
			return failed(name, `${called(knownBecause)} knew ${device} number ${number} as another event.`, {
				facts: { kind, device, number, event: knownBecause },
			});
		}
		case 'clock not above what it saw': {
			const { event, clock, saw } = finding;
			return failed(name, `${called(event)} has clock ${clock} and had seen ${saw}.`, {
				facts: { kind, event, clock, saw },
			});
		}
	}
}
