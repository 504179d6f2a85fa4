import { MARK_TONES, markShapes, type Mark } from '../marks';
import { segment } from '../path';
import { lettering, stroke, type Box, type Point, type Shape } from '../shape';
import type { Type } from './bubble';
import type { Item, Place } from './item';

/** Where it was seen; `word` is said in place of the position, and may be nothing. */
export type SketchElement = { readonly position: string; readonly mark?: Mark; readonly word?: string };

/** Tag and position of a valve or damper, beside it. */
export type ElementName = { readonly tag: string; readonly at: Point; readonly seen?: SketchElement };

export function elementNameItem(name: ElementName, reach: number, type: Type): Item {
	const { at } = name;
	const { width, height } = sizeOf(name, type);
	const gap = reach + type.size * 0.2;
	const spots = [0, 1, 2.2, 3.6].flatMap((ring) => {
		const away = gap + ring * type.size;
		const beside = [0, -0.55, 0.55, -1, 1].flatMap((shift) => {
			const [y, cost] = [at.y - height / 2 + shift * height, ring * 9 + Math.abs(shift) * 7];
			return [
				[at.x + away, y, cost],
				[at.x - away - width, y, cost + 1],
			] as const;
		});
		const over = [0, -0.5, 0.5].flatMap((shift) => {
			const [x, cost] = [at.x - width / 2 + shift * width, ring * 9 + 2 + Math.abs(shift) * 6];
			return [
				[x, at.y - away - height, cost],
				[x, at.y + away, cost + 1],
			] as const;
		});
		return [...beside, ...over];
	});
	return {
		anchor: at,
		places: spots.map(([x, y, cost]) => {
			const box = { x, y, width, height };
			const end = leaderEnd(at, box, reach + type.size * NEAR);
			return { box, cost, ...(end === undefined ? {} : { leaderTo: end }) };
		}),
	};
}

export const elementNameShapes =
	({ tag, at, seen }: ElementName, { size }: Type) =>
	({ box, leaderTo }: Place): readonly Shape[] => {
		const small = size * SMALL;
		const tone = seen?.mark === undefined ? 'soft' : MARK_TONES[seen.mark];
		const below = box.y + small * 2.2;
		return [
			...(leaderTo === undefined
				? []
				: [stroke(segment(at.x, at.y, leaderTo.x, leaderTo.y), { pen: 'hair', tone: 'soft' })]),
			lettering(tag, { x: box.x, y: box.y + small * 0.95 }, { size: small, voice: 'strong' }),
			...(seen?.mark === undefined
				? []
				: markShapes(seen.mark, { x: box.x + small * 0.4, y: below - small * 0.34 }, small * 0.75)),
			...(seen === undefined || !hasWord(seen)
				? []
				: [lettering(wordOf(seen), { x: box.x + indentOf(seen, small), y: below }, { size: small, tone })]),
		];
	};

/** A name that had to give way is led back to its element: where its leader ends, if it needs one. */
function leaderEnd(at: Point, { x, y, width, height }: Box, near: number): Point | undefined {
	const end = { x: Math.min(x + width, Math.max(x, at.x)), y: Math.min(y + height, Math.max(y, at.y)) };
	return Math.hypot(end.x - at.x, end.y - at.y) < near ? undefined : end;
}

function sizeOf({ tag, seen }: ElementName, { size, measure }: Type) {
	const small = size * SMALL;
	const word = seen === undefined ? 0 : indentOf(seen, small) + measure(wordOf(seen), 'text', small);
	return { width: Math.max(measure(tag, 'strong', small), word), height: small * (hasWord(seen) ? 2.5 : 1.25) };
}

/** A position such as "automatic, open for purge" is named by its first words. */
const wordOf = ({ word, position }: SketchElement): string => word ?? position.split(',')[0] ?? position;

const hasWord = (seen: SketchElement | undefined): boolean =>
	seen !== undefined && (wordOf(seen) !== '' || seen.mark !== undefined);

const indentOf = ({ mark }: SketchElement, small: number): number => (mark === undefined ? 0 : small * 1.1);

const SMALL = 0.86;
/** So close to its element, in sizes of the lettering, a name needs no leader. */
const NEAR = 0.6;
