import type { Plot, PlotAxis } from '../../calc';
import { fromSi, shownUnit, type QuantityName } from '../../quantity';

/**
 * A calculator's picture in the units that people of the plant read: percent, cubic metres an hour, minutes
 * where the axis of time is not printed as clock time.
 */
export function shownPlot(plot: Plot, { isClock }: { readonly isClock: boolean }): Plot {
	const [x, y] = [isClock ? asIs(plot.x) : scaleOf(plot.x), scaleOf(plot.y)];
	return {
		...plot,
		x: x.axis,
		y: y.axis,
		curves: plot.curves.map((curve) => ({
			...curve,
			x: curve.x.map(x.shown),
			y: curve.y.map(y.shown),
			...(curve.y2 === undefined ? {} : { y2: curve.y2.map(y.shown) }),
		})),
		marks: plot.marks.map((mark) => {
			const { shown } = mark.axis === 'x' ? x : y;
			return { ...mark, at: shown(mark.at), ...(mark.to === undefined ? {} : { to: shown(mark.to) }) };
		}),
	};
}

type Shown = { readonly axis: PlotAxis; readonly shown: (value: number) => number };

const asIs = (axis: PlotAxis): Shown => ({ axis: { ...axis, unit: shownUnit(axis.unit) }, shown: (value) => value });

function scaleOf(axis: PlotAxis): Shown {
	const better = BETTER[axis.unit];
	if (better === undefined) return asIs(axis);
	return {
		axis: { ...axis, unit: shownUnit(better.unit) },
		shown: (value) => {
			const shown = fromSi(value, better.quantity, better.unit);
			return shown.ok ? shown.value : Number.NaN;
		},
	};
}

const BETTER: { readonly [si: string]: { readonly quantity: QuantityName; readonly unit: string } } = {
	'1': { quantity: 'fraction', unit: '%' },
	s: { quantity: 'time', unit: 'min' },
	'm3(n)/s': { quantity: 'volume-flow-normal-wet', unit: 'm3(n)/h' },
};
