import { rectangle, segment } from '../path';
import { lettering, stroke, type Box, type Shape } from '../shape';

/** The frame of a drawing sheet, with the zones by which a place on it is named: "C5". */
export function sheetShapes({ width, height }: Pick<Box, 'width' | 'height'>, margin: number): readonly Shape[] {
	const inner = { x: margin, y: margin, width: width - 2 * margin, height: height - 2 * margin };
	const columns = Array.from({ length: COLUMNS }, (_, i) => i + 1);
	const rows = Array.from(ROWS);
	const ticks = [
		...columns.slice(1).flatMap((_, i) => {
			const x = ((i + 1) * width) / COLUMNS;
			return [...segment(x, 0, x, margin), ...segment(x, height - margin, x, height)];
		}),
		...rows.slice(1).flatMap((_, i) => {
			const y = ((i + 1) * height) / rows.length;
			return [...segment(0, y, margin, y), ...segment(width - margin, y, width, y)];
		}),
	];
	const size = margin * 0.68;
	const named = (text: string, x: number, y: number) =>
		lettering(text, { x, y: y + size * 0.36 }, { size, tone: 'soft', anchor: 'middle' });
	return [
		stroke(rectangle({ x: 0, y: 0, width, height }), { pen: 'hair' }),
		stroke(rectangle(inner), { pen: 'line' }),
		stroke(ticks, { pen: 'hair' }),
		...columns.flatMap((column) => {
			const x = ((column - 0.5) * width) / COLUMNS;
			return [named(String(column), x, margin / 2), named(String(column), x, height - margin / 2)];
		}),
		...rows.flatMap((row, i) => {
			const y = ((i + 0.5) * height) / rows.length;
			return [named(row, margin / 2, y), named(row, width - margin / 2, y)];
		}),
	];
}

const COLUMNS = 8;
const ROWS = 'ABCDE';
