import type { BoundReading, BoundRow, BoundSeries, Lookup } from '../../src/lib/procedure';

/** 2026-03-14T20:33:00+01:00, the zero of the series. */
export const ZERO = Date.UTC(2026, 2, 14, 19, 33);
const END = 3600;

/** Oxygen that falls to a floor of 4.2 % after the lag of its place, sampled every 10 s for an hour. */
const decay = (lag: number, tau: number): BoundSeries['byTag'][string] => {
	const t = Array.from({ length: END / 10 + 1 }, (_, i) => i * 10);
	const oxygen = (time: number): number => (time < lag ? 20.9 : 4.2 + 16.7 * Math.exp(-(time - lag) / tau));
	// As an analyser prints it: two decimals, with a ripple that keeps two values in a row from being the same.
	return { unit: '%', t, values: t.map((time, i) => Math.round((oxygen(time) + (i % 2) * 0.02) * 100) / 100) };
};

const steady = (unit: string, value: number): BoundSeries['byTag'][string] => {
	const t = Array.from({ length: END / 10 + 1 }, (_, i) => i * 10);
	return { unit, t, values: t.map((_, i) => value + (i % 3)) };
};

const SERIES: BoundSeries = {
	zero: '2026-03-14T20:33:00+01:00',
	zeroAt: ZERO,
	byTag: {
		'AT-211': decay(5, 1000),
		'AT-212': decay(8, 1060),
		'AT-213': decay(45, 1350),
		'AT-214': decay(40, 1200),
		'FT-201': steady('m3/h', 15_200),
		'FT-241': steady('m3(n)/h', 888),
	},
};

const at = (seconds: number): number => ZERO + seconds * 1000;

const WALLS = {
	'TT-225': ['78', 'degC'],
	'TT-226': ['56', 'degC'],
	'TT-227': ['82,5', 'degC'],
	now: ['4', '%'],
	predicted: ['7', '%'],
	'PT-201': ['-31', 'mbar(g)'],
} as const;

const READINGS: { readonly [step: string]: { readonly [field: string]: readonly [typed: string, unit: string] } } = {
	'2.8': { 'PT-299': ['992.4', 'mbar(a)'] },
	'2.9': { content: ['3600', 'm3(n)'], 'gas-temperature': ['18', 'degC'] },
	'2.14': { 'PDT-201': ['4.9', 'mbar'], 'PT-201': ['-22', 'mbar(g)'], 'TT-201': ['19.5', 'degC'] },
	'2.20': { 'PT-202': ['-3.1', 'mbar(g)'] },
	'2.22': { 'AT-211': ['4.7', '%'], 'AT-212': ['4.8', '%'], 'AT-213': ['5.4', '%'], 'AT-214': ['5.0', '%'] },
	'4.8': WALLS,
	'5.3': WALLS,
};

const AIR_CHECKS = ['2.1', '2.2', '2.3', '2.4'];
const OBSERVED: { readonly [step: string]: number } = {
	...Object.fromEntries(AIR_CHECKS.map((step, i) => [step, -5000 + 900 * i])),
	'2.13': -600,
	'2.14': -180,
	'2.17': -60,
	'2.18': 0,
	'2.19': 240,
	'2.23': END + 60,
};

const outlet = (oxygen: string, seconds: number): BoundReading => ({
	typed: oxygen,
	unit: '%',
	basis: 'dry',
	tag: 'PG-1',
	at: at(seconds),
});

export const COVERAGE: readonly BoundRow[] = [
	...['mill', 'filter', 'hopper', 'silo'].map((row) => ({ row, found: 'measured' })),
	{ row: 'generator', found: 'swept, outlet read', reading: outlet('5.6', 3200) },
	{ row: 'fan', found: 'swept, outlet read', reading: outlet('5.1', 3260) },
	{ row: 'by-pass', found: 'swept, outlet read', reading: outlet('6.4', 3320) },
	{ row: 'chute', found: 'shut off, inerted by itself', reading: outlet('3.0', 3400) },
];

/** What a record would answer after a purge that went well; a test changes what it is about. */
export const purgeLookup = (changes: Partial<Lookup> = {}): Lookup => ({
	now: at(END + 120),
	reading: (step, field) => {
		if (AIR_CHECKS.includes(step) && field === 'air')
			return { typed: '20.9', unit: '%', at: at(OBSERVED[step] ?? Number.NaN) };
		const found = READINGS[step]?.[field];
		return found && { typed: found[0], unit: found[1], mode: 'measuring', at: at(END) };
	},
	series: () => SERIES,
	rows: () => COVERAGE,
	result: () => undefined,
	observed: (step) => (OBSERVED[step] === undefined ? undefined : at(OBSERVED[step])),
	person: () => 'TechA',
	standing: () => 'stands',
	typed: () => undefined,
	...changes,
});
