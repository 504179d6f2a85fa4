import type { Meter } from './circuit-input';
import type { Stretch } from './notes';
import type { Point } from './series-input';

export type Admitted = {
	readonly value: number;
	readonly U: number;
	/** Stretches between flow readings that are too long to count. */
	readonly gaps: readonly (Stretch & { readonly meter: string })[];
};

/**
 * Inert gas admitted to the circuit, by its own meters and nothing else.
 *
 *     flow meter:  V = Σ (Q_i + Q_(i+1))/2 (t_(i+1) − t_i) over steps no longer than a gap
 *     totaliser:   V = last − first reading inside the purge;   U² = Σ (U_rel V)²
 *
 * @param meters readings of each meter, flow [m³(n)/s] or counted volume [m³(n)], with U_rel [1]
 * @param window begin of the purge and time of the judgement [s]; longestGap [s]
 * @returns V and U [m³(n)]; time without readings admits nothing
 *
 * Source: trapezoidal rule; JCGM 100:2008, 5.1.2 for uncorrelated meters.
 * Checked against: flows integrated by hand (test/calc/purge/admitted-gas.test.ts).
 */
export function admittedGas(
	meters: readonly (Meter & { readonly points: readonly Point[] })[],
	window: Stretch & { readonly longestGap: number },
): Admitted {
	const each = meters.map((meter) => {
		const { value, gaps } = meter.reads === 'flow' ? integrated(meter.points, window) : counted(meter.points, window);
		return { value, U: meter.U * value, gaps: gaps.map((gap) => ({ ...gap, meter: meter.tag })) };
	});
	return {
		value: each.reduce((sum, { value }) => sum + value, 0),
		U: Math.hypot(...each.map(({ U }) => U)),
		gaps: each.flatMap(({ gaps }) => gaps),
	};
}

type OfOne = { readonly value: number; readonly gaps: readonly Stretch[] };

function integrated(points: readonly Point[], { from, to, longestGap }: Stretch & { longestGap: number }): OfOne {
	const gaps: Stretch[] = [];
	let value = 0;
	points.slice(1).forEach((b, i) => {
		const a = points[i] ?? b;
		const [begin, end] = [Math.max(a.t, from), Math.min(b.t, to)];
		if (end <= begin) return;
		if (b.t - a.t > longestGap) gaps.push({ from: begin, to: end });
		else {
			const at = (t: number): number => a.value + ((b.value - a.value) * (t - a.t)) / (b.t - a.t);
			value += ((at(begin) + at(end)) / 2) * (end - begin);
		}
	});
	return { value, gaps };
}

/** Gas between the begin of the purge and the first reading in it is not counted: it is not known. */
function counted(points: readonly Point[], { from, to }: Stretch): OfOne {
	const inside = points.filter(({ t }) => t >= from && t <= to);
	return { value: (inside.at(-1)?.value ?? 0) - (inside[0]?.value ?? 0), gaps: [] };
}

/** A totaliser as the flow that it shows between two readings, for the trend of the inert gas. */
export const flowOfTotaliser = (points: readonly Point[]): readonly Point[] =>
	points.slice(1).flatMap((b, i) => {
		const a = points[i] ?? b;
		if (b.t === a.t) return [];
		const value = (b.value - a.value) / (b.t - a.t);
		return [
			{ t: a.t, value },
			{ t: b.t, value },
		];
	});
