import { lettering, type Box, type Point, type Shape } from '../shape';
import type { Type } from './bubble';
import type { Equipment } from './equipment';
import type { Item, Place } from './item';

type Size = Pick<Box, 'width' | 'height'>;

/** The name of a piece of equipment: on one line, or its tag over the words; inside where it is empty, else around it. */
export function nameItem(equipment: Equipment, type: Type): Item {
	const { box: of, outline, content } = equipment;
	const [one, block] = [oneLine(equipment, type), blockOf(equipment, type)];
	const gap = type.size * 0.4;
	const centre: Point = { x: of.x + of.width / 2, y: of.y + of.height / 2 };
	const [right, bottom] = [of.x + of.width, of.y + of.height];
	const at = (x: number, y: number, size: Size, cost: number): Place => ({ box: { x, y, ...size }, cost });
	const isEmpty =
		HOLLOW.has(outline) && content === undefined && block.width < of.width * 0.92 && block.height < of.height * 0.6;
	const lifts = [0, 0.6, 1.4, 2.4, 3.6, 5];
	return {
		anchor: centre,
		own: of,
		places: [
			...(isEmpty ? [at(centre.x - block.width / 2, of.y + of.height * 0.4 - block.height / 2, block, -40)] : []),
			...[one, block].flatMap((size, i) =>
				lifts.flatMap((lift) => {
					const [above, below] = [of.y - gap - size.height - lift * type.size, bottom + gap + lift * type.size];
					return [
						centre.x - size.width / 2,
						of.x,
						right - size.width,
						right - size.width * 0.75,
						of.x - size.width * 0.25,
					].flatMap((x, k) => [
						at(x, above, size, i * 2 + lift * 6 + k * 2),
						at(x, below, size, i * 2 + lift * 6 + k * 2 + 1),
					]);
				}),
			),
			...[block, one].flatMap((size, i) =>
				[0.5, 0.3, 0.7, 0.1, 0.9].flatMap((part, k) => {
					const y = of.y + of.height * part - size.height / 2;
					return lifts
						.slice(0, 4)
						.flatMap((lift) => [
							at(right + gap + lift * type.size, y, size, 6 + i * 6 + k + lift * 6),
							at(of.x - gap - size.width - lift * type.size, y, size, 6 + i * 6 + k + lift * 6),
						]);
				}),
			),
		],
	};
}

export const nameShapes =
	({ id, title }: Equipment, type: Type) =>
	({ box }: Place): readonly Shape[] => {
		const { size, measure } = type;
		const first = box.y + size * 0.92;
		if (box.height < size * 2) {
			const x = box.x + measure(id, 'title', size) + size * 0.45;
			return [
				lettering(id, { x: box.x, y: first }, { size, voice: 'title' }),
				lettering(title, { x, y: first }, { size: size * SOFT, tone: 'soft' }),
			];
		}
		const x = box.x + box.width / 2;
		return [
			lettering(id, { x, y: first }, { size, voice: 'title', anchor: 'middle' }),
			...wrapped(title, type).map((text, i) =>
				lettering(text, { x, y: first + size * 1.12 * (i + 1) }, { size: size * SOFT, tone: 'soft', anchor: 'middle' }),
			),
		];
	};

const oneLine = ({ id, title }: Equipment, { size, measure }: Type): Size => ({
	width: measure(id, 'title', size) + size * 0.45 + measure(title, 'text', size * SOFT),
	height: size * 1.2,
});

function blockOf({ id, title }: Equipment, type: Type): Size {
	const { size, measure } = type;
	const lines = wrapped(title, type);
	return {
		width: Math.max(measure(id, 'title', size), ...lines.map((line) => measure(line, 'text', size * SOFT))),
		height: size * (1.2 + 1.12 * lines.length),
	};
}

/** Words on lines of about nine sizes of the lettering. */
function wrapped(title: string, { size, measure }: Type): readonly string[] {
	const lines: string[] = [];
	for (const word of title.split(' ')) {
		const last = lines.at(-1);
		if (last !== undefined && measure(`${last} ${word}`, 'text', size * SOFT) <= size * 9)
			lines[lines.length - 1] = `${last} ${word}`;
		else lines.push(word);
	}
	return lines;
}

const HOLLOW: ReadonlySet<string> = new Set(['bin', 'silo', 'vessel']);
const SOFT = 0.92;
