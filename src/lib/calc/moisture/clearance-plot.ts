import { fromSi } from '../../quantity';
import type { Plot, PlotCurve } from '../calculator';
import type { Numbers } from '../uncertainty';
import type { Surface } from './clearance-inputs';
import { dewPoint } from './dew-point';

type Drawn = {
	readonly now: Numbers;
	readonly pressure: number;
	readonly surfaces: readonly Surface[];
	readonly margin: number;
	readonly guard: number;
};

/** Dew point over moisture at this pressure, both states on it, and every surface as a line above or below. */
export function clearancePlot({ now, pressure, surfaces, margin, guard }: Drawn): Plot {
	const states = [
		{ id: 'present', label: 'gas at present', x: now.waterVapour, T: now.dewPoint },
		{ id: 'predicted', label: 'gas with feed on', x: now.predictedWaterVapour, T: now.predictedDewPoint },
	];
	const end = Math.min(1, Math.max(0.3, ...states.map(({ x = 0 }) => 1.3 * x)));
	const curve = Array.from({ length: POINTS }, (_, i) => (end * (i + 1)) / POINTS).flatMap((x) => {
		const dew = dewPoint(x, pressure);
		return dew.ok && dew.value.kind !== 'none' ? [{ x: 100 * x, y: celsius(dew.value.temperature) }] : [];
	});
	const points = states.flatMap(({ id, label, x, T }): PlotCurve[] =>
		x === undefined || T === undefined
			? []
			: [
					{
						id,
						label,
						kind: 'points',
						x: [100 * x],
						y: [celsius(T)],
						...(id === 'predicted' ? { decides: true } : {}),
					},
				],
	);
	const coldest = now.coldestTemperature ?? NaN;
	return {
		id: 'clearance',
		title: 'Dew point over moisture, and the surfaces',
		x: { label: 'Water vapour', unit: '%' },
		y: { label: 'Temperature', unit: 'degC' },
		curves: [
			{ id: 'dew-point', label: 'dew point', kind: 'line', x: curve.map(({ x }) => x), y: curve.map(({ y }) => y) },
			...points,
		],
		marks: [
			...surfaces.map(({ name, temperature }) => ({
				kind: 'event' as const,
				label: name,
				axis: 'y' as const,
				at: celsius(temperature.value),
			})),
			{ kind: 'limit', label: 'coldest surface less margin', axis: 'y', at: celsius(coldest - margin) },
			{ kind: 'guard', label: 'and less the uncertainty', axis: 'y', at: celsius(coldest - margin - guard) },
		],
	};
}

function celsius(kelvin: number): number {
	const shown = fromSi(kelvin, 'temperature', 'degC');
	return shown.ok ? shown.value : 0;
}

const POINTS = 60;
