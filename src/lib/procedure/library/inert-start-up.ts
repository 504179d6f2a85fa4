import type { Plant } from '../../plant';
import { toSi } from '../../quantity';
import type { Gate, Permissive, Procedure } from '../schema';
import { GATE_0 } from './inert-start-up/gate-0';
import { GATE_1 } from './inert-start-up/gate-1';
import { GATE_2_ANALYSERS } from './inert-start-up/gate-2-analysers';
import { GATE_2_PURGE } from './inert-start-up/gate-2-purge';
import { GATE_3 } from './inert-start-up/gate-3';
import { GATE_4 } from './inert-start-up/gate-4';
import { GATE_5 } from './inert-start-up/gate-5';
import { GATE_6 } from './inert-start-up/gate-6';
import { GATE_7 } from './inert-start-up/gate-7';
import { PLANT_EVENTS } from './inert-start-up/plant-events';
import { startTypes } from './inert-start-up/start-types';
import { gate } from './inert-start-up/write';

const released = (...roles: readonly string[]): Gate['signatures'] => [{ roles, meaning: 'released' }];
const SUPERVISOR = released('shift supervisor');
const LEAD = released('commissioning lead');

const gates: readonly Gate[] = [
	{ number: 0, title: 'Authority and area', holdPoint: 'work on the line-up', signatures: SUPERVISOR },
	{ number: 1, title: 'Line-up', holdPoint: 'inert gas and gas flow into the circuit', signatures: SUPERVISOR },
	{
		number: 2,
		title: 'Purged and analysed',
		holdPoint: 'the first movement of the mill',
		signatures: SUPERVISOR,
		permissives: ['oxygen-read'],
	},
	{ number: 3, title: 'Mill ready', holdPoint: 'lighting the burner', signatures: SUPERVISOR },
	{ number: 4, title: 'Warm and dry', holdPoint: 'preparing the fuel feed', signatures: SUPERVISOR },
	{
		number: 5,
		title: 'Feed release',
		holdPoint: 'the release of fuel feed',
		signatures: LEAD,
		permissives: ['oxygen-fresh'],
	},
	{ number: 6, title: 'Feed on, self-inert running', holdPoint: 'hand-over to operation', signatures: LEAD },
	{
		number: 7,
		title: 'Hand-over',
		holdPoint: 'acceptance by operation',
		signatures: [
			{ roles: ['commissioning lead'], meaning: 'accepted' },
			{ roles: ['shift supervisor'], meaning: 'accepted' },
		],
	},
];

/** The four places as a permissive reads them: moist oxygen in per cent, at most so many minutes old. */
const places = (notOlderThanMinutes: number): Permissive['readings'] =>
	Object.fromEntries(
		[
			['o2_mill', 'AT-211'] as const,
			['o2_filter', 'AT-212'] as const,
			['o2_hopper', 'AT-213'] as const,
			['o2_silo', 'AT-214'] as const,
		].map(([name, point]) => [
			name,
			{ point, quantity: 'oxygen-wet', unit: '%', basis: 'wet' as const, notOlderThanMinutes },
		]),
	);

/** @param atMost per cent moist: the purge target of the unit less its guard */
const permissives = (atMost: string): readonly Permissive[] => [
	{
		id: 'oxygen-read',
		title: `Every place was read within 30 min, at most ${atMost} % moist, and the fan has not stopped`,
		condition: `[o2_mill, o2_filter, o2_hopper, o2_silo].all(o2, o2 <= ${atMost}) && fan_runs`,
		readings: places(30),
		facts: { fan_runs: { notGoingOn: 'fan-stop' } },
	},
	{
		id: 'oxygen-fresh',
		title: `Every place was read within 10 min, at most ${atMost} % moist, fan, inert gas and oxygen trip as proved`,
		condition: `[o2_mill, o2_filter, o2_hopper, o2_silo].all(o2, o2 <= ${atMost}) && fan_runs && inert_gas_there && trip_proved`,
		readings: places(10),
		facts: {
			fan_runs: { notGoingOn: 'fan-stop' },
			inert_gas_there: { notGoingOn: 'inert-loss' },
			trip_proved: { stepStands: '1.11' },
		},
	},
];

const steps = [
	...GATE_0,
	...GATE_1,
	...gate(2, [...GATE_2_ANALYSERS, ...GATE_2_PURGE]),
	...GATE_3,
	...GATE_4,
	...GATE_5,
	...GATE_6,
	...GATE_7,
];

/** The main procedure, written for the demonstration unit: a site copies it, puts in its own tags, and approves its own. */
export const INERT_START_UP: Procedure = {
	format: 'gatehold-procedure/1',
	id: 'inert-start-up',
	revision: 1,
	title: 'Inert start-up of a closed grinding-drying circuit',
	language: 'en',
	demonstration: true,
	toleranceMinutes: 2,
	lateMinutes: 10,
	gates,
	steps,
	permissives: permissives('7.7'),
	plantEvents: PLANT_EVENTS,
	startTypes: startTypes(steps),
};

/**
 * The same for a unit of the same build, by its own description: the conditions take the purge target of that unit, and
 * what is pinned is no demonstration. A person of the site approves it before it is used.
 */
export function inertStartUpFor(plant: Plant): Procedure {
	const { demonstration: _invented, ...procedure } = INERT_START_UP;
	const target = plant.limits.find(({ id }) => id === 'purge-oxygen');
	const [most, guard] = [target?.atMost, target?.guard ?? { value: '0', unit: '%' }].map((measure) =>
		measure === undefined ? undefined : toSi(measure, 'oxygen-wet'),
	);
	if (most?.ok !== true || guard?.ok !== true) return procedure;
	// Per cent, with the digits that a limit is written with; the difference of two decimals has more.
	const atMost = String(Number(((most.value.value - guard.value.value) * 100).toFixed(3)));
	return { ...procedure, permissives: permissives(atMost) };
}
