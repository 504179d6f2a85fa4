import { utf8 } from '../../src/lib/base';
import { printEventLine } from '../../src/lib/record';
import { playStartUp } from '../../src/lib/demo';

/**
 * A short start-up of another invented site, with its own people and its own root: what somebody hands in who belongs
 * elsewhere. Its keys are made anew every time, so the lines differ from run to run.
 */
export async function foreignRecord(): Promise<string> {
	const { tablets } = await playStartUp({ read: (name) => utf8(JSON.stringify(FILES[name])) });
	const lines = [...tablets.siteLog('LT-7'), ...tablets.startUp('LT-7')].map(printEventLine);
	return `${lines.join('\n')}\n`;
}

const shared = { validity: { kind: 'once' }, lapsedBy: [], redo: [], waits: [], instruments: [] };
const invented = { kind: 'demonstration', text: 'invented' };

const PROCEDURE = {
	format: 'gatehold-procedure/1',
	id: 'LD-START',
	revision: 4,
	title: 'Warm restart of the lignite dust mill',
	language: 'en',
	demonstration: true,
	gates: [
		{
			number: 0,
			title: 'Line-up and purge',
			holdPoint: 'the first movement of the mill',
			signatures: [{ roles: ['shift supervisor'], meaning: 'released' }],
		},
		{
			number: 1,
			title: 'Feed',
			holdPoint: 'the release of fuel feed',
			signatures: [{ roles: ['commissioning lead'], meaning: 'released' }],
		},
	],
	steps: [
		{
			...shared,
			id: 'V1',
			gate: 0,
			kind: 'line-up',
			group: 'Valves',
			title: 'Two valves of the circuit',
			minutes: 10,
			rows: [
				{ id: 'XV-71', title: 'Inert gas valve', required: 'open', choices: ['shut', 'open'] },
				{ id: 'XV-72', title: 'Fresh-air damper', required: 'shut', choices: ['shut', 'open'] },
			],
		},
		{
			...shared,
			id: 'O1',
			gate: 0,
			kind: 'reading',
			group: 'Oxygen',
			title: 'Oxygen in the dust bin',
			minutes: 5,
			fields: [
				{
					id: 'bin',
					title: 'Oxygen, dust bin',
					point: 'AT-71',
					quantity: 'oxygen-wet',
					unit: '%',
					limit: { atMost: { value: '9', unit: '%' }, guard: { value: '0.5', unit: '%' }, source: invented },
				},
			],
		},
		{
			...shared,
			id: 'P1',
			gate: 1,
			kind: 'confirm',
			group: 'People',
			title: 'Area cleared',
			minutes: 5,
			confirms: [{ id: 'clear', text: 'Nobody is in the area.' }],
		},
	],
	plantEvents: [{ id: 'fan-stop', title: 'Fan stopped' }],
	startTypes: [{ id: 'warm', title: 'Warm restart', without: [], needsReleasingRole: false, excludedBy: [] }],
};

const PLANT = {
	format: 'gatehold-plant/1',
	unit: 'LD-7',
	title: 'Lignite dust mill 7',
	site: 'Demonstration sugar works',
	revision: 2,
	demonstration: true,
	utcOffsetMinutes: 60,
	volumes: [
		{
			id: 'DB-71',
			title: 'Dust bin',
			volume: { value: '21', unit: 'm3' },
			outline: 'bin',
			deadLeg: false,
			sketch: { x: 40, y: 20, width: 10, height: 14 },
		},
	],
	ducts: [],
	elements: [],
	points: [
		{
			tag: 'AT-71',
			title: 'Oxygen in the dust bin',
			quantity: 'oxygen-wet',
			unit: '%',
			basis: 'wet',
			at: 'DB-71',
			medium: 'process gas',
			range: { from: 0, to: 25 },
		},
	],
	venturis: [],
	inertSources: [],
	instruments: [],
	fuel: { title: 'Lignite (invented)' },
	limits: [],
};

const PEOPLE = {
	people: [
		{ person: 'tech-7', name: 'Fen Achterholm', roles: ['technician'] },
		{ person: 'sup-7', name: 'Wibke Sundermarn', roles: ['shift supervisor'] },
		{ person: 'lead-7', name: 'Arne Lutterveen', roles: ['commissioning lead'] },
		{ person: 'office-7', name: 'Jonna Kirschgart', roles: ['site administrator', 'process engineer'] },
	],
};

const day = (time: string): string => `2026-02-20T${time}:00`;

const START_UP = {
	format: 'gatehold-play/1',
	demonstration: true,
	startUp: 'LD-7/2026-02-20',
	procedure: 'procedure.json',
	plant: 'plant.json',
	people: 'people.json',
	tablets: ['LT-7'],
	acts: [
		{
			at: day('06:30'),
			by: 'lead-7',
			do: 'open',
			startType: 'warm',
			title: 'Warm restart of LD-7',
			present: ['tech-7', 'sup-7', 'lead-7'],
			inertGas: 'nitrogen',
			controlSystem: 'invented',
			setPoints: 'invented',
		},
		{ at: day('06:31'), by: 'tech-7', do: 'start shift' },
		{ at: day('06:48'), by: 'tech-7', do: 'enter', step: 'V1', rows: { 'XV-71': 'open', 'XV-72': 'shut' } },
		{ at: day('07:05'), by: 'tech-7', do: 'enter', step: 'O1', values: { bin: '8,2' } },
		{ at: day('07:10'), by: 'sup-7', do: 'release', gate: 0 },
		{ at: day('07:20'), by: 'tech-7', do: 'enter', step: 'P1' },
		{ at: day('07:24'), by: 'lead-7', do: 'release', gate: 1 },
		{ at: day('07:40'), by: 'lead-7', do: 'seal' },
	],
};

const FILES: { readonly [name: string]: object } = {
	'start-up.json': START_UP,
	'procedure.json': PROCEDURE,
	'plant.json': PLANT,
	'people.json': PEOPLE,
};
