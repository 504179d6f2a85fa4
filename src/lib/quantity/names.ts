/**
 * The quantities of the trade, one name per physical meaning, not per dimension, each with the SI unit used inside.
 * Wet and dry, actual and normal, absolute, gauge and difference are different quantities: they never mix unseen.
 * "Normal" is 0 degC and 101 325 Pa (ISO 13443 and others call other states "standard"): see normal-state.ts.
 */
export const QUANTITIES = {
	'pressure-absolute': 'Pa(a)',
	'pressure-gauge': 'Pa(g)',
	'pressure-difference': 'Pa',
	temperature: 'K',
	'temperature-difference': 'K',
	'oxygen-wet': '1',
	'oxygen-dry': '1',
	'carbon-monoxide-wet': '1',
	'carbon-monoxide-dry': '1',
	/** Mole of water per mole of wet gas. */
	'water-vapour': '1',
	/** Mole of water per mole of dry gas. */
	'water-vapour-dry': '1',
	/** Mass of water per mass of dry gas. */
	'humidity-ratio': 'kg/kg',
	fraction: '1',
	/** A number without unit that is no fraction of anything: Reynolds number, isentropic exponent, compressibility. */
	number: '1',
	'mass-concentration': 'kg/m3',
	'mass-concentration-normal': 'kg/m3(n)',
	volume: 'm3',
	'volume-normal': 'm3(n)',
	'volume-flow': 'm3/s',
	'volume-flow-normal-wet': 'm3(n)/s',
	'volume-flow-normal-dry': 'm3(n)/s',
	mass: 'kg',
	'mass-flow': 'kg/s',
	velocity: 'm/s',
	length: 'm',
	area: 'm2',
	time: 's',
	rate: '1/s',
	current: 'A',
	'percent-of-span': '1',
	density: 'kg/m3',
	'molar-mass': 'kg/mol',
	viscosity: 'Pa s',
	'thermal-expansion': '1/K',
	'vibration-velocity': 'm/s',
	count: '1',
} as const;

export type QuantityName = keyof typeof QUANTITIES;

export const isQuantityName = (name: string): name is QuantityName => Object.hasOwn(QUANTITIES, name);
