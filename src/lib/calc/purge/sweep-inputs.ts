import * as v from 'valibot';
import { fail, ok, type Result } from '../../base';
import type { InSi } from '../../quantity';
import type { Refusal } from '../calculator';
import { OXYGEN_IN_AIR } from '../constants';
import { choice, measured, optional, readMeasure, shaped, typedMeasure, withDefault, type Given } from '../read-inputs';
import { METER_PARTS, meterSchema, output, OXYGEN_RANGE, volumesField } from './shared-inputs';

export type Leak = { readonly flow: InSi<'volume-flow-normal-wet'>; readonly suction: number | undefined };

const leak = shaped(
	v.strictObject({ flow: typedMeasure, suction: v.optional(typedMeasure) }),
	{
		quantity: 'in-leakage',
		symbol: 'Q_L',
		label: 'In-leakage',
		means: 'air that leaks in, and the suction at which it was found',
		parts: [
			{
				...{ name: 'flow', label: 'Air that leaks in', means: 'normal flow of the air that leaks in' },
				...{ quantity: 'volume-flow-normal-wet', unit: 'm3(n)/s', min: 0 },
			},
			{
				...{ name: 'suction', label: 'Found at a suction of', means: 'suction at which it was found' },
				...{ quantity: 'pressure-difference', unit: 'Pa', min: 0, optional: true },
			},
		],
		from: 'reading',
	},
	(typed, at): Result<Leak, readonly Refusal[]> => {
		const flow = readMeasure(typed.flow, { quantity: 'volume-flow-normal-wet', min: 0 }, `${at}.flow`);
		if (typed.suction === undefined) return flow.ok ? ok({ flow: flow.value, suction: undefined }) : flow;
		const suction = readMeasure(typed.suction, { quantity: 'pressure-difference', min: 0 }, `${at}.suction`);
		if (flow.ok && suction.ok) return ok({ flow: flow.value, suction: suction.value.value });
		return fail([flow, suction].flatMap((read) => (read.ok ? [] : read.error)));
	},
);

/** Inputs of the planning twin. All flows and amounts are in the normal state; a hot circuit is converted, never its meter. */
export const sweepFields = {
	volumes: volumesField('every volume that is connected while the purge runs, dead legs too'),
	outletRead: withDefault(
		choice(['not every volume', 'every volume'], {
			label: 'Outlets read',
			means: 'of which volumes the outlet is read: with all of them one volume change is the least, else three',
			from: 'plant',
		}),
		'not every volume',
	),
	temperature: measured({
		...{ quantity: 'temperature', symbol: 'T', from: 'reading' },
		label: 'Temperature in the circuit',
		means: 'temperature of the gas in the circuit',
	}),
	pressure: measured({
		...{ quantity: 'pressure-absolute', symbol: 'p', from: 'reading' },
		label: 'Pressure in the circuit',
		means: 'pressure of the gas in the circuit',
	}),
	inertFlow: measured({
		...{ quantity: 'volume-flow-normal-wet', symbol: 'Q_I', from: 'reading' },
		label: 'Inert gas flow',
		means: 'inert gas that enters, by its own meter; never the flow that circulates',
	}),
	meter: shaped(meterSchema, {
		...{ quantity: 'tag and medium', from: 'plant' },
		label: 'Its meter',
		means: 'the meter that reads this flow; its medium has to be "inert gas"',
		parts: METER_PARTS,
	}),
	outlet: shaped(v.string(), { quantity: 'text', label: 'Outlet', means: 'where the gas leaves', from: 'plant' }),
	gas: withDefault(
		choice(['nitrogen', 'carbon dioxide', 'other'], { label: 'Inert gas', means: 'the inert gas', from: 'plant' }),
		'nitrogen',
	),
	inertOxygen: measured({
		...{ quantity: 'oxygen-wet', symbol: 'Ci', from: 'plant', ...OXYGEN_RANGE },
		label: 'Oxygen in the inert gas',
		means: 'oxygen in the inert gas; an inert gas generator is no pure nitrogen',
	}),
	startOxygen: withDefault(
		measured({
			...{ quantity: 'oxygen-wet', symbol: 'C0', from: 'reading', ...OXYGEN_RANGE },
			label: 'Oxygen at the start',
			means: 'oxygen in the circuit at the start',
		}),
		OXYGEN_IN_AIR,
	),
	target: measured({
		...{ quantity: 'oxygen-wet', symbol: 'Ct', from: 'procedure', ...OXYGEN_RANGE },
		label: 'Oxygen limit',
		means: 'limit that every place has to be below',
	}),
	guard: withDefault(
		measured({
			...{ quantity: 'fraction', from: 'procedure', ...OXYGEN_RANGE },
			label: 'Guard',
			typedIn: '%',
			means: 'kept between the readings and the limit',
		}),
		0,
	),
	mixing: measured({
		...{ quantity: 'fraction', symbol: 'K', from: 'site', min: 0, max: 1 },
		label: 'Mixing factor',
		means: 'mixing factor, applied once: the part of the inert gas that takes part in the exchange',
	}),
	mixingFrom: withDefault(
		choice(['assumed', 'measured fit'], {
			label: 'Mixing factor from',
			means: 'where the mixing factor comes from',
			from: 'site',
		}),
		'assumed',
	),
	leak: optional(leak),
	suction: optional(
		measured({
			...{ quantity: 'pressure-difference', from: 'reading', min: 0 },
			label: 'Suction in this purge',
			means: 'suction in the circuit during this purge, below the atmosphere',
		}),
	),
	minimumVolumeChanges: optional(
		measured({
			quantity: 'number',
			label: 'Least volume changes',
			means: 'least volume changes, whatever the formula says',
			from: 'site',
			min: 0,
		}),
	),
	stock: optional(
		measured({
			...{ quantity: 'volume-normal', from: 'reading', min: 0 },
			label: 'Usable stock',
			means: 'usable inert gas in stock, on the low side',
		}),
	),
	reserve: withDefault(
		measured({
			quantity: 'volume-normal',
			label: 'Emergency reserve',
			means: 'emergency reserve, counted apart',
			from: 'site',
			min: 0,
		}),
		0,
	),
	limitingOxygen: optional(
		measured({
			...{ quantity: 'oxygen-wet', symbol: 'LOC', from: 'plant', ...OXYGEN_RANGE },
			label: 'Limiting oxygen',
			means: 'limiting oxygen concentration of this fuel with this inert gas, by test',
		}),
	),
	oxygenTrip: withDefault(
		choice(['not proved', 'proved'], {
			...{ from: 'procedure' },
			label: 'Oxygen trip',
			means: 'whether oxygen is monitored continuously with a proved trip',
		}),
		'not proved',
	),
	unburntGas: optional(
		measured({
			...{ quantity: 'fraction', from: 'reading', min: 0, max: 1 },
			label: 'Unburnt gas',
			typedIn: '%',
			means: 'CO, H2 and CH4 together that can be in the circuit',
		}),
	),
};

export type SweepInputs = Given<typeof sweepFields>;

export const sweepOutputs = [
	output('normalVolume', 'volume-normal', 'gas in all connected volumes', 'V'),
	output('rate', 'rate', 'exchange rate', 'λ'),
	output('floor', 'oxygen-wet', 'oxygen that the sweep settles at', 'C_ss'),
	output('leastInertFlow', 'volume-flow-normal-wet', 'inert flow below which the floor lies above the line'),
	output('timeByMixing', 'time', 'time to the line by the mixing formula alone'),
	output('changesByMixing', 'number', 'volume changes by the mixing formula alone', 'N'),
	output('gasByMixing', 'volume-normal', 'inert gas by the mixing formula alone'),
	output('volumeChanges', 'number', 'volume changes needed: by the formula or the least, whichever is more'),
	output('time', 'time', 'time needed'),
	output('inertGas', 'volume-normal', 'inert gas needed'),
	output('stockNeeded', 'volume-normal', 'inert gas for this purge and one repeat'),
	output('stockLeft', 'volume-normal', 'stock less the reserve, this purge and one repeat'),
] as const;
