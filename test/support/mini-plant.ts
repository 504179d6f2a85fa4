import type { Plant } from '../../src/lib/plant';

/** The smallest plant that the cases' permissive can read: one volume, one moist oxygen point. Invented. */
export const MINI_PLANT: Plant = {
	format: 'gatehold-plant/1',
	unit: 'MINI',
	title: 'one vessel',
	site: 'nowhere',
	revision: 1,
	demonstration: true,
	utcOffsetMinutes: 60,
	volumes: [
		{
			id: 'V-1',
			title: 'vessel',
			volume: { value: '10', unit: 'm3' },
			outline: 'vessel',
			deadLeg: false,
			sketch: { x: 1, y: 1 },
		},
	],
	ducts: [],
	elements: [],
	points: [
		{
			tag: 'AT-1',
			title: 'oxygen',
			quantity: 'oxygen-wet',
			unit: '%',
			basis: 'wet',
			at: 'V-1',
			medium: 'process gas',
			range: { from: 0, to: 25 },
			sketch: { x: 2, y: 2 },
		},
	],
	venturis: [],
	inertSources: [],
	instruments: [],
	fuel: { title: 'none' },
	limits: [],
};
