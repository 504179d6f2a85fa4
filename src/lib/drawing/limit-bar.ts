import { hatching, polygon, rectangle, segment } from './path';
import { roughly } from './roughly';
import { area, lettering, stroke, type Drawing, type Measure, type Shape } from './shape';
import { tickLabel, ticks } from './ticks';

export type LimitBar = {
	/** The value in the unit of the scale, as a number; absent while nothing is read. */
	readonly value?: number;
	/** The value as it was typed. */
	readonly typed?: string;
	readonly atMost?: number;
	readonly atLeast?: number;
	/** Kept between the value and its limit. */
	readonly guard?: number;
	readonly width: number;
	readonly measure?: Measure;
};

/**
 * A value against its limit: the part that stands as a thick line, the guard band hatched before the limit, what lies beyond
 * hatched in red. The pointer is the hand's: it is what somebody typed.
 */
export function limitBar({ value, typed, atMost, atLeast, guard = 0, width, measure = roughly }: LimitBar): Drawing {
	const scale = rangeOf([value, atMost, atLeast].filter(isNumber), guard);
	const at = (each: number) => MARGIN + ((each - scale.from) / (scale.to - scale.from)) * (width - 2 * MARGIN);
	const [low, high] = [
		atLeast === undefined ? undefined : atLeast + guard,
		atMost === undefined ? undefined : atMost - guard,
	];
	const shapes: Shape[] = [];
	const stands = { from: at(Math.max(scale.from, low ?? scale.from)), to: at(Math.min(scale.to, high ?? scale.to)) };
	if (stands.to > stands.from)
		shapes.push(stroke(segment(stands.from, LINE, stands.to, LINE), { pen: 'power', tone: 'ok-fill' }));
	for (const limit of [
		...(atMost === undefined ? [] : [{ at: atMost, guarded: atMost - guard, beyond: scale.to }]),
		...(atLeast === undefined ? [] : [{ at: atLeast, guarded: atLeast + guard, beyond: scale.from }]),
	]) {
		shapes.push(...hatched(at(limit.guarded), at(limit.at), 'warn'), ...hatched(at(limit.at), at(limit.beyond), 'bad'));
		shapes.push(stroke(segment(at(limit.at), LINE - 19, at(limit.at), LINE + 19), { pen: 'bold', tone: 'bad' }));
		const text = `limit ${tickLabel(limit.at, decimalsOf(limit.at))}`;
		shapes.push(
			lettering(
				text,
				{ x: inside(at(limit.at), measure(text, 'strong', 14), width), y: LINE + 36 },
				{ size: 14, voice: 'strong', tone: 'bad', anchor: 'middle' },
			),
		);
	}
	shapes.push(stroke(segment(at(scale.from), LINE, at(scale.to), LINE), { pen: 'hair' }));
	const { at: steps, decimals } = ticks(scale.from, scale.to, 5);
	for (const step of steps) {
		shapes.push(stroke(segment(at(step), LINE - 6, at(step), LINE + 6), { pen: 'line' }));
		const near = [atMost, atLeast].filter(isNumber).some((limit) => Math.abs(at(limit) - at(step)) < 52);
		if (!near)
			shapes.push(
				lettering(
					tickLabel(step, decimals),
					{ x: at(step), y: LINE + 36 },
					{ size: 13.5, tone: 'soft', anchor: 'middle' },
				),
			);
	}
	if (value !== undefined && Number.isFinite(value))
		shapes.push(...pointer(at(value), typed ?? String(value), measure, width));
	return { width, height: LINE + 44, shapes };
}

/** The limits in the middle, and the value never at the edge. */
function rangeOf(values: readonly number[], guard: number): { readonly from: number; readonly to: number } {
	if (values.length === 0) return { from: 0, to: 1 };
	const [low, high] = [Math.min(...values), Math.max(...values)];
	const around = Math.max(high - low, guard * 4, Math.abs(high) * 0.1, 1e-9);
	return { from: low - around * 0.6, to: high + around * 0.6 };
}

function hatched(a: number, b: number, tone: 'warn' | 'bad'): readonly Shape[] {
	const box = { x: Math.min(a, b), y: LINE - 12, width: Math.abs(b - a), height: 24 };
	if (box.width < 0.5) return [];
	const ground = tone === 'warn' ? [area(rectangle(box), 'warn-wash')] : [];
	return [...ground, stroke(hatching(box, tone === 'warn' ? 9 : 6), { pen: 'hair', tone })];
}

function pointer(x: number, typed: string, measure: Measure, width: number): readonly Shape[] {
	const head = polygon([
		{ x: x - 9, y: LINE - 22 },
		{ x: x + 9, y: LINE - 22 },
		{ x, y: LINE - 7 },
	]);
	return [
		area(head, 'hand'),
		lettering(
			typed,
			{ x: inside(x, measure(typed, 'title', 17), width), y: LINE - 28 },
			{ size: 17, voice: 'title', tone: 'hand', anchor: 'middle' },
		),
	];
}

const inside = (x: number, text: number, width: number): number => Math.min(width - text / 2, Math.max(text / 2, x));

const decimalsOf = (value: number): number => Math.min(6, /\.(\d+)$/.exec(String(value))?.[1]?.length ?? 0);

const isNumber = (value: number | undefined): value is number => value !== undefined && Number.isFinite(value);

const MARGIN = 12;
const LINE = 52;
