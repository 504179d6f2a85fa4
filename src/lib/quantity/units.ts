import type { QuantityName } from './names';

/** si = (value + offset) * times / per. Both factors are kept so that 20.95 % is 0.2095 to the last bit. */
export type Unit = {
	/** As written in files: "mbar(g)", "m3(n)/h", "degC". */
	readonly symbol: string;
	readonly times: number;
	readonly per: number;
	readonly offset: number;
	/** Other spellings that mean the same and nothing else. */
	readonly aliases: readonly string[];
};

/** The unit that this text names for this quantity; undefined when the quantity is never given in it. */
export const unitFor = (quantity: QuantityName, text: string): Unit | undefined =>
	BY_SPELLING[quantity].get(spelling(text));

/** All units a quantity may be given in, the SI unit first. */
export const unitsFor = (quantity: QuantityName): readonly string[] => UNITS[quantity].map((unit) => unit.symbol);

/** Every quantity that may be given in this unit: says what "bar(g)" would have been right for. */
export const quantitiesIn = (text: string): readonly QuantityName[] =>
	(Object.keys(UNITS) as QuantityName[]).filter((quantity) => unitFor(quantity, text) !== undefined);

/** How people see it: "m³/h", "°C", "mmH₂O". */
export const shownUnit = (symbol: string): string =>
	symbol === '1'
		? ''
		: symbol
				.replace(/^(%)span$/, '$1 of span')
				.replace('deg', '°')
				.replace('m3', 'm³')
				.replace('m2', 'm²')
				.replace('H2O', 'H₂O')
				.replace(/^u/, 'µ')
				.replace('Pa s', 'Pa·s');

/** One spelling for "m³/h" and "m3 / h". Letters keep their case: mPa and MPa differ by a thousand million. */
const spelling = (text: string): string =>
	text
		.normalize('NFKC')
		.replaceAll(/[\s·*]/g, '')
		.replaceAll('°', 'deg')
		.replaceAll('\u03bc', 'u');

const unit = (
	symbol: string,
	factor: { times?: number; per?: number; offset?: number },
	...aliases: string[]
): Unit => ({
	symbol,
	times: factor.times ?? 1,
	per: factor.per ?? 1,
	offset: factor.offset ?? 0,
	aliases,
});

/** A pressure unit exists three times: absolute, gauge, and bare for a difference. They are never exchanged here. */
const pressures = (suffix: '' | '(a)' | '(g)'): readonly Unit[] =>
	PRESSURES.map((bare) => ({
		...bare,
		symbol: bare.symbol + suffix,
		aliases: [bare.symbol, ...bare.aliases].flatMap((name) => SUFFIXES[suffix].map((ending) => name + ending)),
	}));

const SUFFIXES = { '': [''], '(a)': ['(a)', 'a', '(abs)', 'abs'], '(g)': ['(g)', 'g'] } as const;

// Factors: NIST SP 811 (2008), Appendix B.8, where the unit is not itself a decimal multiple; see the test.
// "Conventional" columns of water and mercury: 1000 kg/m3 and 13 595.1 kg/m3 at 9.806 65 m/s2.
const PRESSURES: readonly Unit[] = [
	unit('Pa', {}),
	unit('hPa', { times: 100 }),
	unit('mbar', { times: 100 }),
	unit('kPa', { times: 1e3 }),
	unit('bar', { times: 1e5 }),
	unit('MPa', { times: 1e6 }),
	unit('mmH2O', { times: 9.806_65 }, 'mmWC', 'mmWS'),
	unit('inH2O', { times: 249.088_91 }, 'inWC', 'inWG'),
	unit('mmHg', { times: 133.322_387_415 }),
	unit('psi', { times: 6_894.757_293_168_361 }),
];

const FRACTION = [
	unit('1', {}),
	unit('%', { per: 100 }, 'vol%', '%vol', 'vol.-%', 'Vol.-%', 'Vol%', 'mol%'),
	unit('ppm', { per: 1e6 }, 'ppmv', 'vppm'),
];
const NORMAL_FLOW = [
	unit('m3(n)/s', {}, 'Nm3/s'),
	unit('m3(n)/min', { per: 60 }, 'Nm3/min'),
	unit('m3(n)/h', { per: 3600 }, 'Nm3/h'),
	unit('L(n)/min', { per: 60e3 }, 'NL/min', 'Nl/min'),
];
const NUMBER = [unit('1', {})];
const SPEEDS = [unit('m/s', {}), unit('mm/s', { per: 1e3 }), unit('m/min', { per: 60 })];

const UNITS: { readonly [Q in QuantityName]: readonly Unit[] } = {
	'pressure-absolute': pressures('(a)'),
	'pressure-gauge': pressures('(g)'),
	'pressure-difference': pressures(''),
	temperature: [unit('K', {}), unit('degC', { offset: 273.15 }), unit('degF', { offset: 459.67, times: 5, per: 9 })],
	'temperature-difference': [unit('K', {}), unit('degC', {}), unit('degF', { times: 5, per: 9 })],
	'oxygen-wet': FRACTION,
	'oxygen-dry': FRACTION,
	'carbon-monoxide-wet': FRACTION,
	'carbon-monoxide-dry': FRACTION,
	'water-vapour': FRACTION,
	'water-vapour-dry': FRACTION,
	'humidity-ratio': [unit('kg/kg', {}), unit('g/kg', { per: 1e3 })],
	fraction: FRACTION,
	number: NUMBER,
	'mass-concentration': [unit('kg/m3', {}), unit('g/m3', { per: 1e3 }), unit('mg/m3', { per: 1e6 })],
	'mass-concentration-normal': [
		unit('kg/m3(n)', {}),
		unit('g/m3(n)', { per: 1e3 }, 'g/Nm3'),
		unit('mg/m3(n)', { per: 1e6 }, 'mg/Nm3'),
	],
	volume: [unit('m3', {}), unit('L', { per: 1e3 }, 'l')],
	'volume-normal': [unit('m3(n)', {}, 'Nm3')],
	'volume-flow': [
		unit('m3/s', {}),
		unit('m3/min', { per: 60 }),
		unit('m3/h', { per: 3600 }),
		unit('L/s', { per: 1e3 }, 'l/s'),
		unit('L/min', { per: 60e3 }, 'l/min'),
		unit('L/h', { per: 3600e3 }, 'l/h'),
	],
	'volume-flow-normal-wet': NORMAL_FLOW,
	'volume-flow-normal-dry': NORMAL_FLOW,
	mass: [unit('kg', {}), unit('g', { per: 1e3 }), unit('t', { times: 1e3 })],
	'mass-flow': [unit('kg/s', {}), unit('kg/h', { per: 3600 }), unit('t/h', { times: 1e3, per: 3600 })],
	velocity: SPEEDS,
	length: [
		unit('m', {}),
		unit('mm', { per: 1e3 }),
		unit('cm', { per: 100 }),
		unit('um', { per: 1e6 }),
		unit('in', { times: 0.0254 }),
	],
	area: [unit('m2', {}), unit('cm2', { per: 1e4 }), unit('mm2', { per: 1e6 })],
	time: [
		unit('s', {}),
		unit('min', { times: 60 }),
		unit('h', { times: 3600 }),
		unit('d', { times: 86_400 }),
		unit('ms', { per: 1e3 }),
	],
	rate: [unit('1/s', {}), unit('1/min', { per: 60 }), unit('1/h', { per: 3600 })],
	current: [unit('A', {}), unit('mA', { per: 1e3 })],
	'percent-of-span': [unit('1', {}), unit('%span', { per: 100 }, '%ofspan')],
	density: [unit('kg/m3', {}), unit('g/cm3', { times: 1e3 }, 'kg/L', 'kg/l')],
	'molar-mass': [unit('kg/mol', {}), unit('g/mol', { per: 1e3 }, 'kg/kmol')],
	viscosity: [unit('Pa s', {}), unit('mPa s', { per: 1e3 }, 'cP'), unit('uPa s', { per: 1e6 })],
	'thermal-expansion': [unit('1/K', {})],
	'vibration-velocity': SPEEDS,
	count: NUMBER,
};

const BY_SPELLING = Object.fromEntries(
	Object.entries(UNITS).map(([quantity, units]) => [
		quantity,
		new Map(units.flatMap((each) => [each.symbol, ...each.aliases].map((name) => [spelling(name), each] as const))),
	]),
) as unknown as { readonly [Q in QuantityName]: ReadonlyMap<string, Unit> };
