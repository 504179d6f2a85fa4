import { fromSi } from '../../quantity';
import type { Plot } from '../calculator';
import { expansibility, TAU_MIN } from './expansibility';
import { massFlow } from './mass-flow';
import type { WorkingPoint } from './working-point';

/** Flow over difference pressure at the present gas, up to the span, with the reading on it. */
export function venturiPlot(point: WorkingPoint, span: number | undefined): Plot {
	const { dp, p1, density } = point;
	const flowAt = (at: number) => {
		const epsilon = expansibility({ ...point, dp: at });
		const flow = massFlow({ ...point, C: point.coefficient.C, epsilon, dp: at, rho1: density }) / density;
		const shown = fromSi(flow, 'volume-flow', 'm3/h');
		return shown.ok ? shown.value : 0;
	};
	const end = Math.min(Math.max(span ?? 0, 1.3 * dp, 1), (1 - TAU_MIN) * p1);
	// Closer together near zero, where the root is steep.
	const x = Array.from({ length: POINTS }, (_, i) => end * (i / (POINTS - 1)) ** 2);
	return {
		id: 'flow',
		title: 'Flow over difference pressure',
		x: { label: 'Difference pressure', unit: 'Pa' },
		y: { label: 'Actual flow', unit: 'm3/h' },
		curves: [
			{ id: 'curve', label: 'flow of this gas', kind: 'line', x, y: x.map(flowAt) },
			{ id: 'now', label: 'this reading', kind: 'points', decides: true, x: [dp], y: [flowAt(dp)] },
		],
		marks: span === undefined ? [] : [{ kind: 'limit', label: '5 % of span', axis: 'x', at: 0.05 * span }],
	};
}

const POINTS = 41;
