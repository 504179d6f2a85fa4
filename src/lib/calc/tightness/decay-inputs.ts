import { ok, type Result } from '../../base';
import { QUANTITIES } from '../../quantity';
import type { OutputSpec, Refusal } from '../calculator';
import { staticPressure } from '../gas/static-pressure';
import { choice, measured, optional, withDefault, type Given } from '../read-inputs';
import type { Uncertain } from '../uncertainty';

const pressures = (when: 'at the start' | 'at the end', index: 1 | 2) => ({
	absolute: optional(
		measured({
			...{ quantity: 'pressure-absolute', from: 'reading', min: 1e3, max: 1e7 },
			symbol: `p_${index}`,
			label: `Pressure ${when}, absolute`,
			means: `absolute pressure ${when} of the test`,
		}),
	),
	gauge: optional(
		measured({
			...{ quantity: 'pressure-gauge', from: 'reading' },
			symbol: `p_g${index}`,
			label: `Pressure ${when}, gauge`,
			means: `gauge pressure ${when} of the test; needs the barometer of that moment`,
		}),
	),
	barometer: optional(
		measured({
			...{ quantity: 'pressure-absolute', from: 'reading', min: 5e4, max: 1.1e5 },
			symbol: `p_b${index}`,
			label: `Barometer ${when}`,
			means: `absolute pressure of the air outside ${when} of the test`,
		}),
	),
});
const start = pressures('at the start', 1);
const end = pressures('at the end', 2);
const temperature = (when: string, index: 1 | 2) =>
	measured({
		...{ quantity: 'temperature', from: 'reading', min: 200, max: 600 },
		symbol: `T_${index}`,
		label: `Gas temperature ${when}`,
		means: `mean temperature of the enclosed gas ${when} of the test`,
	});

/** Everything `pressure-decay@1` can be told. Each pressure is absolute, or gauge with the barometer of its moment. */
export const DECAY_INPUTS = {
	pressureStart: start.absolute,
	gaugeStart: start.gauge,
	barometerStart: start.barometer,
	pressureEnd: end.absolute,
	gaugeEnd: end.gauge,
	barometerEnd: end.barometer,
	temperatureStart: temperature('at the start', 1),
	temperatureEnd: temperature('at the end', 2),
	volume: measured({
		...{ quantity: 'volume', from: 'plant', min: 1e-4 },
		symbol: 'V',
		label: 'Enclosed volume',
		means: 'all volume that is shut off and under test',
	}),
	duration: measured({
		...{ quantity: 'time', from: 'reading', min: 1 },
		symbol: 't',
		label: 'Duration',
		means: 'time between the two readings',
	}),
	walls: withDefault(
		choice(['rigid', 'flexible'], {
			label: 'Walls',
			means: 'whether compensators, bags or sheet walls change the volume with the pressure',
			from: 'plant',
		}),
		'rigid',
	),
	allowedLeak: optional(
		measured({
			...{ quantity: 'volume-flow-normal-wet', from: 'site', min: 0 },
			symbol: 'q_max',
			label: 'Allowed leak',
			means: 'largest leak at this test pressure that the site or the supplier allows',
		}),
	),
};

export type DecayGiven = Given<typeof DECAY_INPUTS>;

const output = (name: string, symbol: string, means: string, quantity: keyof typeof QUANTITIES): OutputSpec => ({
	...{ name, symbol, means, quantity },
	unit: QUANTITIES[quantity],
});
export const DECAY_OUTPUTS: readonly OutputSpec[] = [
	output('leak', 'q_L', 'leak as a normal flow', 'volume-flow-normal-wet'),
	output('correctedDrop', 'dp_c', 'pressure drop with the temperature taken out', 'pressure-difference'),
	output('rawDrop', 'dp', 'pressure drop as read', 'pressure-difference'),
	output('lost', 'f', 'part of the gas that was lost', 'fraction'),
	output('hourlyRate', 'T_f', 'leak rate of the volume', 'rate'),
	output('startPressure', 'p_1', 'absolute pressure at the start', 'pressure-absolute'),
];

/** The pressure of one moment as inputs of the model, under names of that moment. */
export function pressureAt(given: DecayGiven, when: 'Start' | 'End'): Result<readonly Uncertain[], readonly Refusal[]> {
	const names = { pressure: `pressure${when}`, pressureGauge: `gauge${when}`, barometer: `barometer${when}` } as const;
	const named = (name: string): string => (Object.hasOwn(names, name) ? names[name as keyof typeof names] : name);
	const read = staticPressure({
		pressure: given[names.pressure],
		pressureGauge: given[names.pressureGauge],
		barometer: given[names.barometer],
	});
	if (read.ok) return ok(read.value.map((input) => ({ ...input, name: named(input.name) })));
	return {
		ok: false,
		error: read.error.map((refusal) => ({
			...refusal,
			...(refusal.input === undefined ? {} : { input: named(refusal.input) }),
			...(Array.isArray(refusal.inputs) ? { inputs: (refusal.inputs as readonly string[]).map(named) } : {}),
		})),
	};
}
