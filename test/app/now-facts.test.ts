import { beforeAll, describe, expect, test } from 'vitest';
import { nowFacts } from '../../src/lib/app';
import { MACHINES, plantStates } from '../../src/lib/app/now/plant-state';
import { inertLeft } from '../../src/lib/app/now/inert-left';
import { worstOxygen } from '../../src/lib/app/now/oxygen';
import { whatBlocks } from '../../src/lib/app/now/what-blocks';
import { LIBRARY } from '../../src/lib/procedure';
import { standing } from '../../src/lib/record';
import { momentsAt, speaker } from '../../src/lib/wording';
import { toldNight, type At } from '../support/told-night';

const say = speaker('en');
const moments = momentsAt(60, say);

let at: At;
beforeAll(async () => {
	at = await toldNight();
}, 120_000);

const stateOf = (moment: string) =>
	Object.fromEntries(
		plantStates(at(moment).events, at(moment).standing).map(({ machine, isOn, since }) => [
			machine,
			`${isOn ? 'on' : 'off'} ${moments.clock(at(moment).instant(since))}`,
		]),
	);

describe('the plant, as last recorded', () => {
	test('speaks only of machines that somebody spoke of', () => {
		expect(stateOf('2026-03-14T20:20:00+01:00')).toEqual({});
		expect(stateOf('2026-03-14T20:50:00+01:00')).toEqual({ fan: 'on 20:31', 'inert gas': 'on 20:40' });
	});

	test('a fan that stopped is on again from the end of the stop; a burner that tripped is not', () => {
		expect(stateOf('2026-03-15T02:30:00+01:00').burner).toBe('off 02:11');
		expect(stateOf('2026-03-15T02:30:00+01:00').fan).toBe('on 02:16');
	});

	test('mill and feed are on with the first feed, and inert gas is off once it was taken off the circuit', () => {
		expect(stateOf('2026-03-15T08:40:00+01:00')).toMatchObject({
			mill: 'on 07:17',
			feed: 'on 07:17',
			'inert gas': 'off 08:31',
		});
	});

	test('names steps and plant events that the built-in procedure has', () => {
		const procedure = LIBRARY['inert-start-up'];
		const known = [...(procedure?.steps ?? []), ...(procedure?.plantEvents ?? [])].map(({ id }) => id);
		const named = Object.values(MACHINES).flatMap(({ on, off, stops, backAtEnd }) => [
			...on,
			...off,
			...stops,
			...backAtEnd,
		]);
		expect(named.filter((id) => !known.includes(id))).toEqual([]);
	});
});

describe('the worst oxygen', () => {
	test('is the newest reading with the least room under the limit of the watch, its guard band counted', () => {
		expect(worstOxygen(at('2026-03-15T07:00:00+01:00'))).toMatchObject({
			point: 'AT-213',
			typed: '7,0',
			limit: { value: '8.0', guard: '0.3', margin: 0.7 },
			before: { typed: '7,0' },
		});
	});

	test('is never the air that was given at a probe', () => {
		expect(worstOxygen(at('2026-03-14T20:12:00+01:00'))).toBeUndefined();
	});
});

test('inert gas lasts until its reserve at the flow of the newest trend, counted from the reading of the stock', () => {
	const told = at('2026-03-15T07:00:00+01:00');
	const inert = plantStates(told.events, told.standing).find(({ machine }) => machine === 'inert gas');
	const left = inertLeft(told, inert);
	expect(left).toMatchObject({ stock: '2830', reserve: '600', isMeasured: true });
	// 2830 less 600 kept apart, less what 12 min took since 06:48.
	const flow = left?.flow ?? NaN;
	expect(left?.minutes).toBe(Math.floor(((2830 - 600 - (flow * 12) / 60) / flow) * 60));
	expect(inertLeft(told, undefined)?.minutes).toBeUndefined();
});

describe('what blocks', () => {
	test('is the first open step of the rung in work, with who worked on its group last', () => {
		expect(whatBlocks(at('2026-03-14T21:22:00+01:00'))).toMatchObject({ kind: 'step', step: { gate: 2 } });
	});

	test('is the hold point when everything under it stands, and the refusal when it was refused', () => {
		expect(whatBlocks(at('2026-03-14T21:42:00+01:00'))).toMatchObject({ kind: 'release', gate: 2 });
		expect(whatBlocks(at('2026-03-15T02:10:00+01:00'))).toMatchObject({ kind: 'refusal', gate: 5 });
	});

	test('is nothing once every gate is released', () => {
		expect(whatBlocks(at('2026-03-15T11:00:00+01:00'))).toBeUndefined();
	});
});

test('readings older than their watch are called stale while the watch is needed', () => {
	const fresh = at('2026-03-15T06:50:00+01:00');
	expect(nowFacts(fresh, say, moments).stale).toBeUndefined();
	const { standing: _, ...late } = fresh;
	const later = '2026-03-15T07:20:00+01:00';
	const old = { ...late, standing: standing(fresh.procedure, fresh.events, fresh.siteLog, later) };
	expect(nowFacts(old, say, moments).stale).toBe('The newest oxygen reading is 36\u00a0min old; its watch is 30 min.');
});
