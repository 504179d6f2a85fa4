import type { Procedure } from '../../src/lib/procedure';

const shared = { lapsedBy: [], redo: [], waits: [], instruments: [], minutes: 5 } as const;
const source = { kind: 'demonstration', text: 'invented' } as const;

export const PURGE_INPUTS = {
	volumes: [{ id: 'loop', title: 'Circuit', volume: { value: 500, unit: 'm3' }, deadLeg: false }],
	outletRead: 'every volume',
	temperature: { value: 0, unit: 'degC' },
	pressure: { value: 1013.25, unit: 'hPa(a)' },
	inertFlow: { value: 1000, unit: 'm3(n)/h' },
	meter: { tag: 'FT-241', medium: 'inert gas' },
	outlet: 'stack damper HV-16',
	inertOxygen: { value: 0, unit: '%' },
	target: { value: 8, unit: '%' },
	mixing: 1,
	mixingFrom: 'measured fit',
};

/** Two gates, one step of most kinds: enough for everything that a judge of records asks. */
export const SMALL_PROCEDURE: Procedure = {
	format: 'gatehold-procedure/1',
	id: 'SMALL-1',
	revision: 2,
	title: 'A very small start-up',
	language: 'en',
	demonstration: true,
	gates: [
		{
			number: 1,
			title: 'Line-up',
			holdPoint: 'the purge',
			signatures: [{ roles: ['shift supervisor'], meaning: 'released' }],
		},
		{
			number: 2,
			title: 'Feed',
			holdPoint: 'the release of fuel feed',
			signatures: [{ roles: ['commissioning lead'], meaning: 'released' }],
		},
	],
	steps: [
		{
			...shared,
			id: 'L1',
			gate: 1,
			group: 'Valves',
			title: 'line-up of two valves',
			kind: 'line-up',
			validity: { kind: 'once' },
			rows: [
				{ id: 'HV-1', title: 'inert gas valve', required: 'open', choices: ['open', 'shut'] },
				{ id: 'HV-2', title: 'fresh air damper', required: 'shut', choices: ['open', 'shut'] },
			],
		},
		{
			...shared,
			id: 'K1',
			gate: 1,
			group: 'Purge',
			title: 'purge plan',
			kind: 'calculation',
			validity: { kind: 'once' },
			calculator: 'sweep-purge@1',
			bind: {
				...Object.fromEntries(
					Object.entries(PURGE_INPUTS).map(([name, value]) => [name, { from: 'procedure', value }] as const),
				),
				mixing: { from: 'typed', title: 'Mixing factor' },
			},
			proves: {
				output: 'timeByMixing',
				quantity: 'time',
				unit: 'min',
				limit: { atMost: { value: '60', unit: 'min' }, source },
			},
		},
		{
			...shared,
			id: 'R1',
			gate: 2,
			group: 'Oxygen',
			title: 'oxygen at the filter',
			kind: 'reading',
			roles: ['technician', 'instrument engineer'],
			validity: { kind: 'once' },
			fields: [
				{
					id: 'filter',
					title: 'filter outlet',
					point: 'AT-212',
					quantity: 'oxygen-dry',
					unit: '%',
					limit: { atMost: { value: '8.0', unit: '%' }, guard: { value: '0.3', unit: '%' }, source },
				},
			],
		},
		{
			...shared,
			id: 'C1',
			gate: 2,
			group: 'People',
			title: 'area cleared',
			kind: 'confirm',
			validity: { kind: 'once' },
			confirms: [{ id: 'counted', text: 'People are counted.' }],
		},
	],
	plantEvents: [{ id: 'fan-stop', title: 'Fan stopped' }],
	startTypes: [{ id: 'first', title: 'First start', without: [], needsReleasingRole: false, excludedBy: [] }],
};
