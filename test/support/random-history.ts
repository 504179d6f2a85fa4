import fc from 'fast-check';
import type { Procedure } from '../../src/lib/procedure';
import type { EventKind, BodyOf } from '../../src/lib/record';
import { clock, PEOPLE, SITE, Teller } from './night';

/**
 * Random start-ups on a procedure: proofs and failures in and out of order, plant events, findings, deviations, gate acts
 * by anybody, two tablets that now and then copy to each other. Nothing here knows the rules; that is the point.
 */
type Move =
	| {
			readonly do: 'enter';
			readonly step: number;
			readonly outcome: 'pass' | 'fail' | 'try' | 'cannot do';
			readonly ago: number;
	  }
	| { readonly do: 'work on'; readonly gate: number }
	/** Everything from one gate to another proved and released, as on a night that goes well. */
	| { readonly do: 'climb'; readonly from: number; readonly to: number; readonly pace: number }
	| { readonly do: 'happen'; readonly what: number; readonly ago: number; readonly lasts: number }
	| { readonly do: 'release'; readonly gate: number; readonly person: number }
	| { readonly do: 'refuse'; readonly gate: number }
	| { readonly do: 'answer'; readonly gate: number }
	| { readonly do: 'deviate'; readonly gate: number }
	| { readonly do: 'dispose' }
	| { readonly do: 'find'; readonly instrument: number; readonly ago: number }
	| { readonly do: 'copy' };

type Told = { readonly move: Move; readonly after: number; readonly tablet: 'T-1' | 'T-2' };

const MOVES: fc.Arbitrary<Move> = fc.oneof(
	{
		weight: 4,
		arbitrary: fc.record({
			do: fc.constant('climb' as const),
			from: fc.nat(6),
			to: fc.nat(8),
			pace: fc.constantFrom(0, 1, 3, 25),
		}),
	},
	{
		weight: 8,
		arbitrary: fc.record({
			do: fc.constant('enter' as const),
			step: fc.nat(999),
			outcome: fc.constantFrom(
				'pass' as const,
				'pass' as const,
				'pass' as const,
				'fail' as const,
				'try' as const,
				'cannot do' as const,
			),
			ago: fc.constantFrom(0, 0, 0, 5, 20),
		}),
	},
	{ weight: 8, arbitrary: fc.record({ do: fc.constant('work on' as const), gate: fc.nat(7) }) },
	{
		weight: 3,
		arbitrary: fc.record({ do: fc.constant('happen' as const), what: fc.nat(99), ago: fc.nat(30), lasts: fc.nat(20) }),
	},
	{ weight: 8, arbitrary: fc.record({ do: fc.constant('release' as const), gate: fc.nat(7), person: fc.nat(3) }) },
	{ weight: 1, arbitrary: fc.record({ do: fc.constant('refuse' as const), gate: fc.nat(7) }) },
	{ weight: 1, arbitrary: fc.record({ do: fc.constant('answer' as const), gate: fc.nat(7) }) },
	{ weight: 1, arbitrary: fc.record({ do: fc.constant('deviate' as const), gate: fc.nat(7) }) },
	{ weight: 1, arbitrary: fc.constant({ do: 'dispose' as const }) },
	{ weight: 1, arbitrary: fc.record({ do: fc.constant('find' as const), instrument: fc.nat(3), ago: fc.nat(10) }) },
	{ weight: 1, arbitrary: fc.constant({ do: 'copy' as const }) },
);

/** Most histories begin with some gates released: what happens then is what the rules are about. */
export const HISTORIES: fc.Arbitrary<readonly Told[]> = fc
	.tuple(
		fc.nat(8),
		fc.constantFrom(0, 1, 3, 25),
		fc.array(
			fc.record({
				move: MOVES,
				after: fc.constantFrom(0, 1, 2, 5, 12, 40, 200),
				tablet: fc.constantFrom('T-1' as const, 'T-1' as const, 'T-2' as const),
			}),
			{ minLength: 1, maxLength: 30 },
		),
	)
	.map(([to, pace, told]) => [{ move: { do: 'climb', from: 0, to, pace }, after: 0, tablet: 'T-1' }, ...told]);

const RELEASERS = ['SupA', 'SupB', 'Lead', 'TechA'] as const;

export type History = { readonly teller: Teller; readonly end: number };

export function tellHistory(procedure: Procedure, told: readonly Told[]): History {
	const teller = new Teller();
	let now = 0;
	const at = (device: string, person: string, observed?: number): Parameters<Teller['say']>[2] => ({
		device,
		person,
		entered: now,
		...(observed === undefined ? {} : { observed }),
	});
	const say = <K extends EventKind>(kind: K, body: BodyOf<K>, when: Parameters<Teller['say']>[2]): void =>
		void teller.say(kind, body, when);
	say(
		'start-up opened',
		{ procedure: { id: procedure.id, revision: procedure.revision }, people: PEOPLE },
		at('T-1', 'Lead'),
	);
	teller.copy('T-1', 'T-2');
	const open: string[] = [];
	const instruments = [...new Set(procedure.steps.flatMap(({ instruments: used }) => used))];
	for (const [i, { move, after, tablet }] of told.entries()) {
		now += after;
		switch (move.do) {
			case 'enter': {
				const step = procedure.steps[move.step % procedure.steps.length];
				if (step !== undefined)
					say('entry', { step: step.id, outcome: move.outcome }, at(tablet, 'TechA', Math.max(0, now - move.ago)));
				break;
			}
			case 'work on':
				for (const step of procedure.steps)
					if (step.gate === move.gate) say('entry', { step: step.id, outcome: 'pass' }, at(tablet, 'TechB'));
				break;
			case 'climb':
				for (let gate = move.from; gate < move.to; gate++) {
					now += move.pace;
					for (const step of procedure.steps)
						if (step.gate === gate || (gate < 6 && step.kind === 'watch'))
							say('entry', { step: step.id, outcome: 'pass' }, at(tablet, 'TechB'));
					for (const person of gate < 5 ? ['SupA'] : gate < 7 ? ['Lead'] : ['Lead', 'SupA'])
						say('gate released', { gate }, at(tablet, person));
				}
				break;
			case 'happen': {
				const kind = procedure.plantEvents[move.what % procedure.plantEvents.length];
				const begin = Math.max(0, now - move.ago - move.lasts);
				if (kind !== undefined)
					say(
						'plant event begun',
						{ what: kind.id, begin: clock(begin), end: clock(Math.min(now, begin + move.lasts)) },
						at(tablet, 'TechB'),
					);
				break;
			}
			case 'release':
				say('gate released', { gate: move.gate }, at(tablet, RELEASERS[move.person] ?? 'SupA'));
				break;
			case 'refuse':
				say('gate refused', { gate: move.gate, reason: 'looked at again' }, at(tablet, 'SupB'));
				break;
			case 'answer':
				say('refusal answered', { gate: move.gate, words: 'looked at' }, at(tablet, 'SupA'));
				break;
			case 'deviate':
				open.push(`D-${String(i)}`);
				say(
					'deviation raised',
					{ deviation: `D-${String(i)}`, title: 'not as required', blocks: move.gate },
					at(tablet, 'TechA'),
				);
				break;
			case 'dispose': {
				const deviation = open.pop();
				if (deviation !== undefined)
					say('deviation dispositioned', { deviation, disposition: 'repaired' }, at(tablet, 'SupA'));
				break;
			}
			case 'find':
				say(
					'instrument finding',
					{ instrument: instruments[move.instrument % Math.max(1, instruments.length)] ?? 'none' },
					{ ...at(tablet, 'TechB', Math.max(0, now - move.ago)), log: SITE },
				);
				break;
			case 'copy':
				teller.copy('T-1', 'T-2');
				teller.copy('T-2', 'T-1');
				break;
		}
	}
	return { teller, end: now };
}
