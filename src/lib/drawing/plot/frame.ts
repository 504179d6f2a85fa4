import type { Plot, PlotAxis, PlotCurve } from '../../calc';
import type { Box } from '../shape';
import { logarithmicTicks, tickLabel, ticks, timeStep } from '../ticks';

/** Where the numbers of one axis lie on the sheet. */
export type Scale = {
	readonly from: number;
	readonly to: number;
	/** Undefined for what the axis cannot show: not a number, or nothing of it on a logarithm. */
	readonly at: (value: number) => number | undefined;
	readonly ticks: readonly { readonly at: number; readonly label: string }[];
};

export type Frame = { readonly box: Box; readonly x: Scale; readonly y: Scale };

export type AxisLook = {
	readonly logarithmic?: boolean;
	/** Prints an axis of time as clock time: the instant of its zero in milliseconds, and the offset of the plant. */
	readonly clock?: { readonly zero: number; readonly utcOffsetMinutes: number };
};

/** The axes of a plot, wide enough for every finite number of its curves and marks; no two labels of an axis meet. */
export function frameOf(
	plot: Plot,
	box: Box,
	look: { readonly x?: AxisLook; readonly y?: AxisLook },
	lettering: number,
): Frame {
	const room = (length: number, letters: number): number => Math.max(2, Math.floor(length / (lettering * letters)));
	const xs = [...plot.curves.flatMap(({ x }) => x), ...marksOn(plot, 'x')];
	const ys = [...groundOf(plot), ...plot.curves.flatMap(heights), ...marksOn(plot, 'y')];
	return {
		box,
		x: scaleOf(xs, plot.x, look.x ?? {}, {
			start: box.x,
			length: box.width,
			count: Math.min(7, room(box.width, 4)),
			margin: 0,
		}),
		y: scaleOf(ys, plot.y, look.y ?? {}, {
			start: box.y + box.height,
			length: -box.height,
			count: Math.min(8, room(box.height, 1.9)),
			margin: 0.04,
		}),
	};
}

/** A flow that is drawn in steps is seen against no flow, with room above it for the names of events. */
function groundOf(plot: Plot): readonly number[] {
	if (!plot.curves.every(({ kind }) => kind === 'steps')) return [];
	const highest = Math.max(0, ...plot.curves.flatMap(({ y }) => y.filter((value) => Number.isFinite(value))));
	return [0, highest * 1.4];
}

const heights = ({ y, y2 }: PlotCurve): readonly number[] => [...y, ...(y2 ?? [])];

const marksOn = ({ marks }: Plot, axis: 'x' | 'y'): readonly number[] =>
	marks.filter((mark) => mark.axis === axis).flatMap(({ at, to }) => (to === undefined ? [at] : [at, to]));

type Room = { readonly start: number; readonly length: number; readonly count: number; readonly margin: number };

function scaleOf(values: readonly number[], axis: PlotAxis, look: AxisLook, room: Room): Scale {
	const logarithmic = look.logarithmic ?? axis.logarithmic === true;
	const seen = values.filter(
		(value) => Number.isFinite(value) && Math.abs(value) < HUGE && (!logarithmic || value > TINY),
	);
	const [low, high] = rangeOf(seen, logarithmic);
	const of = logarithmic ? Math.log10 : (value: number) => value;
	const margin = (of(high) - of(low)) * room.margin;
	const [from, to] = [of(low) - margin, of(high) + margin];
	const position = (value: number) => room.start + ((of(value) - from) / (to - from)) * room.length;
	const edges = logarithmic ? ([10 ** from, 10 ** to] as const) : ([from, to] as const);
	return {
		from: edges[0],
		to: edges[1],
		at: (value) => {
			if (!Number.isFinite(value) || (logarithmic && value <= 0)) return undefined;
			const at = position(value);
			return Number.isFinite(at) ? at : undefined;
		},
		ticks: ticksOf(edges, axis.unit, { ...look, logarithmic }, room.count).map((tick) => ({
			label: tick.label,
			at: position(tick.value),
		})),
	};
}

/** A range always has a length: a single value stands in the middle of its own. */
function rangeOf(seen: readonly number[], logarithmic: boolean): readonly [number, number] {
	let [low, high] = [Infinity, -Infinity];
	for (const value of seen) {
		low = Math.min(low, value);
		high = Math.max(high, value);
	}
	if (!(low <= high)) return logarithmic ? [1, 10] : [0, 1];
	if (logarithmic) return high / low > 1.001 ? [low, high] : [low / 2, high * 2];
	const enough = Math.max(Math.abs(low), Math.abs(high)) * 1e-9;
	return high - low > enough ? [low, high] : [low - (Math.abs(low) || 1) / 2, high + (Math.abs(high) || 1) / 2];
}

function ticksOf([from, to]: readonly [number, number], unit: string, look: AxisLook, count: number) {
	const seconds = SECONDS[unit];
	if (look.clock !== undefined && seconds !== undefined) return clockTicks(from, to, { ...look.clock, seconds }, count);
	if (look.logarithmic === true)
		return logarithmicTicks(from, to).map((value) => ({ value, label: String(Number(value.toPrecision(6))) }));
	const { at, decimals } = ticks(from, to, count);
	return at.map((value) => ({ value, label: tickLabel(value, decimals) }));
}

type Clock = NonNullable<AxisLook['clock']> & { readonly seconds: number };

function clockTicks(from: number, to: number, { zero, utcOffsetMinutes, seconds }: Clock, count: number) {
	const step = timeStep((to - from) * seconds, count);
	const midnight = zero / 1000 + utcOffsetMinutes * 60;
	const first = Math.ceil((from * seconds + midnight) / step);
	const last = Math.min(first + 100, Math.floor((to * seconds + midnight) / step));
	return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => (first + i) * step).map((wall) => ({
		value: (wall - midnight) / seconds,
		label: wallClock(wall),
	}));
}

/** Hours and minutes of seconds that count from midnight of some day. */
export function wallClock(seconds: number): string {
	const minutes = Math.floor((((seconds % 86_400) + 86_400) % 86_400) / 60);
	return `${String(Math.floor(minutes / 60)).padStart(2, '0')}:${String(minutes % 60).padStart(2, '0')}`;
}

const SECONDS: { readonly [unit: string]: number } = { s: 1, min: 60, h: 3600 };
const HUGE = 1e250;
const TINY = 1e-250;
