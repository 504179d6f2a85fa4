import { shownUnit } from '../../quantity';
import { MINUTE, millis } from '../../record';
import { sayNumber, sayWord, shownText, withMark, type Moments, type Say } from '../../wording';
import { ageOf, nameOf, type OpenRecord } from '../record-words';
import { besides } from './besides';
import { inertLeft } from './inert-left';
import { nextToLapse } from './next-to-lapse';
import { oxygenReadings, worstOxygen } from './oxygen';
import { MACHINES, plantStates, type Machine, type MachineState } from './plant-state';
import { whatBlocks, type Blocking } from './what-blocks';

/** The first page of a running start-up, in words: what was last recorded, how old it is, and "not recorded" for the rest. */
export function nowFacts(told: OpenRecord, say: Say, moments: Moments) {
	const states = plantStates(told.events, told.standing);
	const oxygen = saidOxygen(told, say, moments);
	const inert = saidInert(told, states, say, moments);
	const blocks = blockingOf(told, say, moments);
	const stale = saidStale(told, say);
	return {
		plant: (Object.keys(MACHINES) as Machine[]).map((machine) => saidMachine(machine, states, told, say, moments)),
		...(oxygen === undefined ? {} : { oxygen }),
		...(inert === undefined ? {} : { inert }),
		...(blocks === undefined ? {} : { blocks }),
		nextToLapse: nextToLapse(told, say, moments).slice(0, 3),
		besides: besides(told, say, moments),
		...(stale === undefined ? {} : { stale }),
	};
}

/** The one thing at which the line of a start-up ends, in words. */
export function blockingOf(told: OpenRecord, say: Say, moments: Moments) {
	const blocks = whatBlocks(told);
	return blocks === undefined ? undefined : saidBlocking(blocks, told, say, moments);
}

function saidMachine(
	machine: Machine,
	states: readonly MachineState[],
	told: OpenRecord,
	say: Say,
	moments: Moments,
): { readonly name: string; readonly word: string; readonly said: string } {
	const name = say(`now.${machine}`);
	const state = states.find((each) => each.machine === machine);
	if (state === undefined) return { name, word: say('now.not recorded'), said: '' };
	const facts = {
		at: moments.clock(told.instant(state.since)),
		person: nameOf(told, state.person),
		age: ageOf(millis(told.standing.at) - state.last, say),
	};
	return { name, word: say(state.isOn ? 'now.on' : 'now.off'), said: say('now.since', facts) };
}

function saidOxygen(told: OpenRecord, say: Say, moments: Moments) {
	const worst = worstOxygen(told);
	if (worst === undefined) return undefined;
	const point = told.plant.points.find(({ tag }) => tag === worst.point);
	const basis = point?.basis === undefined ? undefined : say(`basis.${point.basis}`);
	const unit = worst.unit === '%' ? say('now.by volume') : shownUnit(worst.unit);
	const { before, limit } = worst;
	const trend =
		before === undefined
			? say('now.no reading before')
			: say(worst.number > before.number ? 'now.rising' : worst.number < before.number ? 'now.falling' : 'now.steady', {
					before: before.typed,
					at: moments.clock(told.instant(before.at)),
				});
	return {
		typed: worst.typed,
		unit: basis === undefined ? unit : `${unit}, ${basis}`,
		place: `${worst.point} ${point?.title ?? ''}`.trim(),
		said: `${ageOf(millis(told.standing.at) - worst.at, say)}. ${trend}`,
		against:
			limit === undefined
				? say('now.no limit')
				: say('now.against', {
						limit: withMark(limit.value, say),
						guard: withMark(limit.guard, say),
						margin: sayNumber(limit.margin, say),
					}),
	};
}

function saidInert(told: OpenRecord, states: readonly MachineState[], say: Say, moments: Moments) {
	const left = inertLeft(
		told,
		states.find(({ machine }) => machine === 'inert gas'),
	);
	if (left === undefined) return undefined;
	const unit = shownUnit(left.unit);
	const stock = say('now.stock', {
		...{ stock: left.stock, unit, reserve: left.reserve },
		at: moments.clock(told.instant(left.readAt)),
	});
	const flow = say(left.isMeasured ? 'now.flow measured' : 'now.flow planned', {
		flow: sayNumber(Math.round(left.flow), say),
	});
	return {
		...(left.minutes === undefined ? {} : { minutes: String(left.minutes) }),
		reserve: `${stock} ${left.minutes === undefined ? say('now.not in use') : flow}`,
	};
}

/** The one thing that blocks as a title, who is on it, and where to go on. */
export function saidBlocking(blocks: Blocking, told: OpenRecord, say: Say, moments: Moments) {
	const worked = (by: { readonly person: string; readonly at: string } | undefined, key: 'now.worked' | 'now.owned') =>
		by === undefined
			? say('now.nobody on it')
			: say(key, { person: nameOf(told, by.person), at: moments.clock(by.at) });
	switch (blocks.kind) {
		case 'step': {
			const { step, state, last } = blocks;
			return {
				state,
				title: `${step.id} ${shownText(step.title, say)}`,
				said: worked(last, 'now.worked'),
				step: step.id,
			};
		}
		case 'deviation':
			return {
				state: 'blocks' as const,
				title: `${blocks.deviation} ${blocks.title}`,
				said: worked(blocks.raised, 'now.owned'),
			};
		case 'condition':
			return {
				state: 'not yet' as const,
				title: shownText(blocks.title, say),
				said: sayWord(blocks.value, say),
				gate: blocks.gate,
			};
		case 'release': {
			const roles = [...new Set(blocks.roles)].map((role) => role).join(', ');
			return {
				state: 'next' as const,
				title: say('now.waits for release', { gate: blocks.gate }),
				said: say('now.released by', { roles }),
				gate: blocks.gate,
			};
		}
		case 'refusal':
			return {
				state: 'failed' as const,
				title: say('ui.refused', { gate: blocks.gate }),
				said: `${blocks.reason} ${worked(blocks.by, 'now.owned')}`.trim(),
				gate: blocks.gate,
			};
		case 'gate':
			return { state: 'not yet' as const, title: say('app.gate', { gate: blocks.gate }), said: '', gate: blocks.gate };
	}
}

/** While the watch is needed, readings older than it say nothing about now. */
function saidStale(told: OpenRecord, say: Say): string | undefined {
	const newest = oxygenReadings(told).at(-1);
	const watch = told.procedure.steps.find(({ validity }) => {
		if (validity.kind !== 'watch') return false;
		return told.standing.gates.find(({ gate }) => gate === validity.until)?.state !== 'released';
	});
	if (newest === undefined || watch?.validity.kind !== 'watch') return undefined;
	const age = millis(told.standing.at) - newest.at;
	const every = watch.validity.everyMinutes;
	return age <= every * MINUTE ? undefined : say('now.stale', { age: ageOf(age, say), minutes: every });
}
