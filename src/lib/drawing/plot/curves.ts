import type { PlotCurve } from '../../calc';
import { clipped, polygon } from '../path';
import { area, stroke, type Box, type Dash, type Point, type Segment, type Shape } from '../shape';
import type { Frame } from './frame';

/** One curve inside the frame. What is not a number breaks the line; what lies outside is cut off at the edge. */
export function curveShapes(curve: PlotCurve, frame: Frame, dash: Dash | undefined): readonly Shape[] {
	switch (curve.kind) {
		case 'points':
			return [stroke(dots(curve, frame), { pen: 'dot', tone: curve.decides === true ? 'ink' : 'soft' })];
		case 'band':
			return runs(bandPoints(curve, frame)).map((run) => area(bandOutline(run, frame.box), 'band'));
		case 'line':
		case 'steps': {
			const path = runs(pointsOf(curve, frame)).flatMap((run) =>
				insideBox(curve.kind === 'steps' ? stepped(run) : run, frame.box),
			);
			const pen = curve.decides === true ? 'bold' : 'line';
			return [stroke(path, { pen, ...(dash === undefined || curve.decides === true ? {} : { dash }) })];
		}
	}
}

/** Last point of a curve that lies inside the frame: where its label belongs. */
export function endOf(curve: PlotCurve, frame: Frame): Point | undefined {
	return pointsOf(curve, frame).findLast((point) => point !== undefined && isInside(point, frame.box));
}

type Gap = undefined;

const pointsOf = ({ x, y }: PlotCurve, frame: Frame): readonly (Point | Gap)[] =>
	x.map((value, i) => pointAt(value, y[i], frame));

function pointAt(x: number | undefined, y: number | undefined, frame: Frame): Point | Gap {
	if (x === undefined || y === undefined) return undefined;
	const [atX, atY] = [frame.x.at(x), frame.y.at(y)];
	return atX === undefined || atY === undefined ? undefined : { x: atX, y: atY };
}

/** Unbroken stretches of a curve. */
function runs<T>(points: readonly (T | Gap)[]): readonly (readonly T[])[] {
	const found: T[][] = [[]];
	for (const point of points) {
		if (point === undefined) found.push([]);
		else found.at(-1)?.push(point);
	}
	return found.filter((run) => run.length > 0);
}

/** Points that would land on the same half unit of the sheet are drawn once. */
function dots(curve: PlotCurve, frame: Frame): readonly Segment[] {
	const seen = new Set<string>();
	return pointsOf(curve, frame).flatMap((point): readonly Segment[] => {
		if (point === undefined || !isInside(point, frame.box)) return [];
		const at = { x: Math.round(point.x * 2) / 2, y: Math.round(point.y * 2) / 2 };
		const key = `${at.x} ${at.y}`;
		if (seen.has(key)) return [];
		seen.add(key);
		return [
			['M', at.x, at.y],
			['L', at.x, at.y],
		];
	});
}

const isInside = ({ x, y }: Point, box: Box): boolean =>
	x >= box.x - 0.01 && x <= box.x + box.width + 0.01 && y >= box.y - 0.01 && y <= box.y + box.height + 0.01;

function insideBox(run: readonly Point[], box: Box): readonly Segment[] {
	const path: Segment[] = [];
	let pen: Point | undefined;
	for (const [i, end] of run.entries()) {
		const start = run[i - 1];
		const piece = start === undefined ? undefined : clipped(start, end, box);
		if (piece === undefined) continue;
		if (pen?.x !== piece[0].x || pen.y !== piece[0].y) path.push(['M', piece[0].x, piece[0].y]);
		path.push(['L', piece[1].x, piece[1].y]);
		pen = piece[1];
	}
	return path;
}

const stepped = (run: readonly Point[]): readonly Point[] =>
	run.flatMap((point, i) => {
		const before = run[i - 1];
		return before === undefined ? [point] : [{ x: point.x, y: before.y }, point];
	});

type Slice = { readonly x: number; readonly top: number; readonly bottom: number };

const bandPoints = ({ x, y, y2 }: PlotCurve, frame: Frame): readonly (Slice | Gap)[] =>
	x.map((value, i) => {
		const [upper, lower] = [pointAt(value, y[i], frame), pointAt(value, y2?.[i], frame)];
		return upper === undefined || lower === undefined ? undefined : { x: upper.x, top: upper.y, bottom: lower.y };
	});

/** A band is squeezed into the frame: its edges never leave the sheet. */
function bandOutline(run: readonly Slice[], box: Box): readonly Segment[] {
	const into = (value: number, from: number, length: number) => Math.min(from + length, Math.max(from, value));
	const edge = (side: 'top' | 'bottom') =>
		run.map((slice) => ({ x: into(slice.x, box.x, box.width), y: into(slice[side], box.y, box.height) }));
	return polygon([...edge('top'), ...edge('bottom').reverse()]);
}
