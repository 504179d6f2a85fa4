import type { Binding } from '../../binding';
import { PLACES } from './write';

/** The series of the purge: its zero is the zero of every time in the calculation. */
const SERIES = '2.21';

const observed = (step: string, otherwise?: null): Binding => ({
	from: 'observed',
	step,
	zero: SERIES,
	...(otherwise === undefined ? {} : { otherwise }),
});
const plant = (path: string): Binding => ({ from: 'plant', path });
const limit = (id: string, side: 'atMost' | 'atLeast' | 'guard'): Binding => ({ from: 'limit', limit: id, side });
const field = (step: string, name: string): Binding => ({ from: 'field', step, field: name });
const group = (of: { readonly [name: string]: Binding }): Binding => ({ from: 'group', of });
const list = (of: readonly Binding[]): Binding => ({ from: 'list', of });

/** One analyser at its place: what it is from the plant description, how it does from the proofs of this start-up. */
const place = ({ tag, check }: (typeof PLACES)[number]): Binding => {
	const of = (name: string): Binding => plant(`points/${tag}/${name}`);
	const bound = (end: 'from' | 'to'): Binding => group({ value: of(`range/${end}`), unit: of('unit') });
	return group({
		tag: of('tag'),
		title: of('title'),
		volume: of('at'),
		basis: of('basis'),
		principle: of('principle'),
		range: group({ from: bound('from'), to: bound('to') }),
		resolution: of('resolution'),
		lag: of('lag'),
		T90: of('t90'),
		U: of('uncertainty'),
		check: { from: 'standing', step: check },
		airBefore: { from: 'group', optional: true, of: { t: observed(check), oxygen: field(check, 'air') } },
		mode: { from: 'mode', step: '2.22', field: tag },
	});
};

/** Everything that decides whether a purge was adequate. */
export const ADEQUACY: { readonly [input: string]: Binding } = {
	zero: { from: 'zero', step: SERIES },
	begins: observed('2.18'),
	limit: group({
		oxygen: limit('purge-oxygen', 'atMost'),
		basis: plant('limits/purge-oxygen/basis'),
		source: plant('limits/purge-oxygen/source'),
	}),
	guard: limit('purge-oxygen', 'guard'),
	places: list(PLACES.map(place)),
	series: { from: 'series', step: SERIES },
	volumes: plant('volumes'),
	coverage: { from: 'coverage', step: '2.24', zero: SERIES },
	temperature: field('2.14', 'TT-201'),
	// The circuit is under suction: nowhere in it is the pressure higher than outside.
	pressure: field('2.8', 'PT-299'),
	inertGas: group({
		oxygen: plant('inertSources/NS-21/oxygen'),
		meters: list([
			group({
				tag: plant('points/FT-241/tag'),
				medium: plant('points/FT-241/medium'),
				reads: { from: 'procedure', value: 'flow' },
			}),
		]),
	}),
	fan: group({ tag: plant('points/FT-201/tag'), least: limit('gas-flow-purge', 'atLeast') }),
	outlet: group({
		name: plant('purge/outlet'),
		seen: group({ from: observed('2.13'), to: observed('2.23'), by: { from: 'person', step: '2.23' } }),
	}),
	cleaning: group({ cycle: plant('purge/filterCleaningCycle'), runningSince: observed('2.17', null) }),
	dampers: list(
		['HV-16', 'HV-17', 'HV-18'].map((tag) =>
			group({ tag: plant(`elements/${tag}/tag`), strokedAt: observed('2.19', null) }),
		),
	),
	minimumVolumeChanges: plant('purge/minimumVolumeChanges'),
	suction: list([
		group({ tag: plant('points/PT-202/tag'), at: plant('points/PT-202/at'), pressure: field('2.20', 'PT-202') }),
	]),
};

/** The Venturi of the circuit while it runs on inert gas, cold and without dust. */
export const VENTURI: { readonly [input: string]: Binding } = {
	type: plant('venturis/FT-201/variant'),
	pipeDiameter: plant('venturis/FT-201/pipeDiameter'),
	throatDiameter: plant('venturis/FT-201/throatDiameter'),
	thermalExpansion: plant('venturis/FT-201/expansion'),
	dp: field('2.14', 'PDT-201'),
	dpSpan: plant('venturis/FT-201/span'),
	pressureGauge: field('2.14', 'PT-201'),
	barometer: field('2.8', 'PT-299'),
	temperature: field('2.14', 'TT-201'),
	composition: {
		from: 'procedure',
		value: {
			N2: { value: 84, unit: '%', U: 6 },
			O2: { value: 15, unit: '%', U: 6 },
			H2O: { value: 1, unit: '%', U: 1 },
		},
		why: 'between air and nitrogen, wherever in the purge it is read: U spans both',
	},
	dpCalibration: { from: 'calibration', instrument: 'PDT-201' },
	dust: { from: 'procedure', value: 'none', why: 'no fuel has been fed' },
	throatCondition: { from: 'procedure', value: 'as drawn', why: 'measured against the drawing at erection' },
	uncertaintyLimit: limit('flow-uncertainty', 'atMost'),
};
