import type { CalculatorPage } from '../calculator';

export const SWEEP_PAGE: CalculatorPage = {
	area: 'purge',
	findBy: 'nitrogen N2 inerting purge time oxygen O2 volume changes stock how much gas how long leak floor',
	first: [
		...[
			'volumes',
			'temperature',
			'pressure',
			'inertFlow',
			'inertOxygen',
			'target',
			'guard',
			'mixing',
			'leak',
			'suction',
		],
		...['meter', 'outlet'],
	],
	results: ['time', 'inertGas', 'floor', 'volumeChanges', 'leastInertFlow', 'stockNeeded'],
	formula: [
		'C(t) = C_ss + (C_0 − C_ss) e^{−λ t}',
		'λ = frac{K (Q_I + Q_L)}{V}',
		'C_ss = frac{x_air Q_L + C_i Q_I}{Q_L + Q_I}',
		't = frac{1}{λ} ln frac{C_0 − C_ss}{C_t − C_ss}',
	],
	explains: [
		'Inert gas that enters pushes mixed gas out: oxygen falls along a curve that never quite reaches its floor. The floor is made by the air that leaks in; no time helps against it, only more inert gas or less suction.',
		'The mixing factor is the part of the inert gas that takes part. A circuit with its fan on comes near 1 where it is swept; dead legs, hoppers and a by-pass do not. It is applied once.',
		'All flows are in the normal state: a hot circuit holds less gas than its volume says, and the meter of the inert gas says nothing about what circulates.',
		'This is a plan. Whether a purge was enough is judged by readings at every place, not by this formula.',
	],
	cautions: ['inert', 'entry'],
	example: {
		volumes: [
			{ id: 'MILL', title: 'Mill and riser', volume: { value: 60, unit: 'm3', U: 3 }, deadLeg: false },
			{ id: 'FILT', title: 'Filter and hopper', volume: { value: 380, unit: 'm3', U: 15 }, deadLeg: false },
			{ id: 'BYP', title: 'By-pass duct', volume: { value: 60, unit: 'm3', U: 6 }, deadLeg: true },
		],
		temperature: { value: 25, unit: 'degC', U: 2 },
		pressure: { value: 990, unit: 'hPa(a)', U: 3 },
		inertFlow: { value: 1500, unit: 'm3(n)/h', U: 45 },
		meter: { tag: 'FT-301', medium: 'inert gas' },
		outlet: 'Vent after the fan',
		inertOxygen: { value: 0.1, unit: '%', U: 0.05 },
		target: { value: 8, unit: '%' },
		guard: { value: 0.3, unit: '%' },
		mixing: { value: 0.7, unit: '1', U: 0.1 },
		suction: { value: 800, unit: 'Pa' },
		leak: { flow: { value: 300, unit: 'm3(n)/h', U: 60 }, suction: { value: 800, unit: 'Pa' } },
	},
};
