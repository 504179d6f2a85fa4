import type { Measure, Plant } from '$lib/plant';
import { shownUnit } from '$lib/quantity';

export type Item = { readonly path: string; readonly tag: string; readonly title: string; readonly fact: string };
export type GroupName =
	'site' | 'fuel' | 'volumes' | 'ducts' | 'points' | 'venturis' | 'inertSources' | 'instruments' | 'limits';

/** The items of a description as people look for them, each with the one value that tells it. */
export function groupsOf(plant: Plant): readonly { readonly name: GroupName; readonly items: readonly Item[] }[] {
	const { fuel, altitude, purge, volumes, ducts, points, venturis, inertSources, instruments, limits } = plant;
	return [
		{ name: 'fuel', items: [{ path: 'fuel', tag: '', title: fuel.title, fact: said(fuel.limitingOxygen?.value) }] },
		{
			name: 'site',
			items: [
				...(altitude === undefined ? [] : [{ path: 'altitude', tag: '', title: plant.site, fact: said(altitude) }]),
				...(purge === undefined
					? []
					: [{ path: 'purge', tag: '', title: purge.outlet, fact: said(purge.circuitGasFlow) }]),
			],
		},
		{
			name: 'volumes',
			items: volumes.map(({ id, title, volume }) => ({ path: `volumes/${id}`, tag: id, title, fact: said(volume) })),
		},
		{
			name: 'points',
			items: points.map(({ tag, title, range, unit, basis }) => ({
				path: `points/${tag}`,
				tag,
				title,
				fact: `${range.from} … ${range.to} ${shownUnit(unit)}${basis === undefined ? '' : ` ${basis}`}`,
			})),
		},
		{
			name: 'limits',
			items: limits.map(({ id, title, atMost, atLeast }) => ({
				path: `limits/${id}`,
				tag: '',
				title,
				fact: [atLeast === undefined ? '' : `≥ ${said(atLeast)}`, atMost === undefined ? '' : `≤ ${said(atMost)}`]
					.filter((text) => text !== '')
					.join(', '),
			})),
		},
		{
			name: 'instruments',
			items: instruments.map(({ id, title, serial, due }) => ({
				path: `instruments/${id}`,
				tag: id,
				title,
				fact: `${serial}, ${due}`,
			})),
		},
		{
			name: 'venturis',
			items: venturis.map(({ tag, title, throatDiameter }) => ({
				path: `venturis/${tag}`,
				tag,
				title,
				fact: said(throatDiameter),
			})),
		},
		{
			name: 'inertSources',
			items: inertSources.map(({ tag, title, stock }) => ({
				path: `inertSources/${tag}`,
				tag,
				title,
				fact: said(stock.content),
			})),
		},
		{
			name: 'ducts',
			items: ducts.map(({ id, title, diameter }) => ({ path: `ducts/${id}`, tag: id, title, fact: said(diameter) })),
		},
	];
}

const said = (measure: Measure | undefined): string =>
	measure === undefined ? '' : `${measure.value} ${shownUnit(measure.unit)}`;
