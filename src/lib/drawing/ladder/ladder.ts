import type { Procedure } from '../../procedure';
import type { Standing } from '../../record';
import { segment } from '../path';
import { roughly } from '../roughly';
import { stroke, type Drawing, type Measure, type Shape } from '../shape';
import { overviewRung } from './overview-rung';
import { rungInWork } from './rung-in-work';
import { rungsOf } from './rungs';

export type LadderLook = {
	readonly width: number;
	/** The gate whose rung is opened to the names of its contacts. */
	readonly inWork?: number;
	/** What stands above each coil: "Released 06:31, shift supervisor". By default the word of the gate's state. */
	readonly captions?: ReadonlyMap<number, string>;
	/** Height of a rung in the overview. */
	readonly rungHeight?: number;
	readonly measure?: Measure;
};

/** A start-up as a ladder diagram: rails, one rung per gate, one contact per group of steps, the hold point as coil. */
export function ladder(
	procedure: Procedure,
	standing: Standing,
	{ width, inWork, captions, rungHeight = 60, measure = roughly }: LadderLook,
): Drawing {
	const rails = { left: RAIL, right: width - RAIL };
	const shapes: Shape[] = [];
	let y = 0;
	let powerEnds = 0;
	for (const rung of rungsOf(procedure, standing)) {
		const caption = captions?.get(rung.gate) ?? capitalised(rung.coil);
		const drawn =
			rung.gate === inWork
				? rungInWork(rung, { y, rails, caption, measure })
				: overviewRung(rung, { y, rails, caption, height: rungHeight });
		shapes.push(...drawn.shapes);
		if (rung.reached) powerEnds = drawn.enters;
		y += drawn.height;
	}
	const height = y + 8;
	const rail = (x: number) => stroke(segment(x, 0, x, height), { pen: 'line' });
	const power = stroke(segment(rails.left, 0, rails.left, powerEnds), { pen: 'power' });
	return { width, height, shapes: [rail(rails.left), rail(rails.right), power, ...shapes] };
}

const capitalised = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);

const RAIL = 26;
