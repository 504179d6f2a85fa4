import { lettering, rectangle, segment, stroke, type Shape } from '../../drawing';
import { measure } from '../fonts/faces';
import { FRAME, PAPER, TITLE_BLOCK_HEIGHT } from './sheet';

export type TitleBlock = {
	readonly owner: Field;
	readonly title: Field;
	readonly startUp: Field;
	readonly procedure: Field;
	readonly sealed: Field;
	readonly digest: Field;
	readonly sheet: Field;
};

export type Field = { readonly label: string; readonly value: string };

/** Frame with centring marks (ISO 5457) and title block (ISO 7200; both from memory, verify), round every sheet. */
export function frameShapes(block: TitleBlock): readonly Shape[] {
	const { x, y, width, height } = FRAME;
	const [right, bottom] = [x + width, y + height];
	const top = bottom - TITLE_BLOCK_HEIGHT;
	const middle = top + TITLE_BLOCK_HEIGHT / 2;
	const columns = COLUMNS.map((part) => x + part * width);
	const [, second = x, third = x, fourth = x, fifth = x] = columns;
	const centre = { x: x + width / 2, y: PAPER.height / 2 };
	return [
		stroke(rectangle(FRAME), { pen: 'bold' }),
		stroke(
			[
				...segment(centre.x, y - 8.5, centre.x, y + 6),
				...segment(centre.x, bottom - 6, centre.x, bottom + 8.5),
				...segment(x - 8.5, centre.y, x + 6, centre.y),
				...segment(right - 6, centre.y, right + 8.5, centre.y),
			],
			{ pen: 'bold' },
		),
		stroke(segment(x, top, right, top), { pen: 'bold' }),
		stroke(
			[
				...segment(x, middle, right, middle),
				...segment(third, top, third, middle),
				...[second, third, fourth, fifth].flatMap((at) => segment(at, middle, at, bottom)),
			],
			{ pen: 'line' },
		),
		...cell(block.owner, x, third, top),
		...cell(block.title, third, right, top, 13),
		...cell(block.startUp, x, second, middle),
		...cell(block.procedure, second, third, middle),
		...cell(block.sealed, third, fourth, middle),
		...cell(block.digest, fourth, fifth, middle, 9.4, 'code'),
		...cell(block.sheet, fifth, right, middle),
	];
}

/** A value that is too long for its cell is set smaller: it is never cut. */
function cell(
	{ label, value }: Field,
	left: number,
	right: number,
	top: number,
	size = 10,
	voice: 'strong' | 'code' = 'strong',
): readonly Shape[] {
	const room = right - left - 12;
	const set = Math.min(size, (size * room) / Math.max(1, measure(value, voice, size)));
	return [
		lettering(label, { x: left + 6, y: top + 11 }, { size: 7.8, tone: 'soft' }),
		lettering(value, { x: left + 6, y: top + 25 }, { size: set, voice }),
	];
}

/** Where the columns of the lower row begin, in parts of the width. */
const COLUMNS = [0, 0.155, 0.33, 0.585, 0.885] as const;
