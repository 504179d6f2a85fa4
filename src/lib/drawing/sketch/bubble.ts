import { MARK_TONES, markShapes, type Mark } from '../marks';
import { circle, segment } from '../path';
import { area, group, lettering, stroke, type Box, type Measure, type Point, type Shape } from '../shape';
import type { Item, Place } from './item';

/** What is known of a measuring point: the value as it was typed, and how it stands. */
export type SketchReading = {
	readonly value: string;
	readonly unit: string;
	readonly mark?: Mark;
	/** "stands 10:46", with the time it was read. */
	readonly word?: string;
};

export type Bubble = {
	readonly tag: string;
	readonly title: string;
	/** Where it is read. */
	readonly tap: Point;
	/** Where the plant description wants the bubble. */
	readonly centre: Point;
	readonly reading?: SketchReading;
};

/** Letters above the line of an ISA-5.1 bubble, number below: "AT-211" is AT over 211 (from memory, verify). */
export function bubbleParts(tag: string): readonly [string, string] {
	const [, letters, rest] = /^([A-Za-z]+)[-_ ]?(.*)$/.exec(tag) ?? [];
	return letters === undefined || rest === undefined || rest === '' ? [tag, ''] : [letters, rest];
}

/** The lettering of a sketch: its size, and how wide a text becomes. */
export type Type = { readonly size: number; readonly measure: Measure };

/** Where a bubble with its reading could stand: where the description wants it, or a little aside, the value to either side. */
export function bubbleItem({ tap, centre, reading }: Bubble, type: Type): Item {
	const radius = type.size * RADIUS;
	const text = readingWidth(reading, type);
	const places = SHIFTS.flatMap((shift): readonly Place[] => {
		const at = { x: centre.x + shift.x * type.size, y: centre.y + shift.y * type.size };
		const away = Math.hypot(tap.x - at.x, tap.y - at.y);
		if (away < radius * 1.1) return [];
		const along = { x: (at.x - tap.x) / away, y: (at.y - tap.y) / away };
		const leaderTo = { x: at.x - along.x * radius, y: at.y - along.y * radius };
		const box = { y: at.y - radius, width: radius * 2 + text, height: radius * 2 };
		const cost = shift.cost + away / type.size;
		// A value that would lie over its own leader is worse than one that points away from it.
		return [
			{ box: { ...box, x: at.x - radius }, leaderTo, cost: cost + (along.x < -0.3 ? 60 : 0) },
			{ box: { ...box, x: at.x - radius - text }, leaderTo, cost: cost + 3 + (along.x > 0.3 ? 60 : 0) },
		];
	});
	return { anchor: tap, places };
}

/** The bubble where it was put, its leader and its reading. */
export const bubbleShapes =
	({ tag, title, tap, reading }: Bubble, type: Type) =>
	({ box, leaderTo = tap }: Place): readonly Shape[] => {
		const { size } = type;
		const radius = size * RADIUS;
		const y = box.y + radius;
		// The leader ends on the bubble: that tells which end of the box the bubble is at.
		const ends = [box.x + radius, box.x + box.width - radius] as const;
		const isRight =
			Math.hypot(ends[0] - leaderTo.x, y - leaderTo.y) <= Math.hypot(ends[1] - leaderTo.x, y - leaderTo.y);
		const centre = { x: isRight ? ends[0] : ends[1], y };
		const [letters, number] = bubbleParts(tag);
		const narrow = Math.min(1, (radius * 1.75) / Math.max(1, type.measure(number, 'strong', size * 0.86)));
		return [
			group(`point ${tag}`, `${tag} ${title}: ${reading === undefined ? 'no reading' : said(reading)}`, [
				stroke(segment(tap.x, tap.y, leaderTo.x, leaderTo.y), { pen: 'line' }),
				area(circle(tap, size * 0.18), 'ink'),
				stroke(circle(centre, radius), { pen: 'line', fill: 'paper' }),
				stroke(segment(centre.x - radius, y, centre.x + radius, y), { pen: 'line' }),
				lettering(
					letters,
					{ x: centre.x, y: y - size * 0.28 },
					{ size: size * 0.86, voice: 'strong', anchor: 'middle' },
				),
				lettering(
					number,
					{ x: centre.x, y: y + size * 0.92 },
					{ size: size * 0.86 * narrow, voice: 'strong', anchor: 'middle' },
				),
				...(reading === undefined ? [] : readingShapes(reading, centre, isRight ? 'right' : 'left', type)),
			]),
		];
	};

const said = ({ value, unit, word }: SketchReading): string =>
	[value, unit, word].filter((part) => part !== undefined).join(' ');

function readingShapes(reading: SketchReading, centre: Point, side: 'right' | 'left', type: Type): readonly Shape[] {
	const { value, unit, mark, word } = reading;
	const { size, measure } = type;
	const away = size * (RADIUS + 0.45);
	const [valueWidth, unitWidth] = [
		measure(value, 'title', size * 1.25) + size * 0.3,
		measure(unit, 'text', size * 0.86),
	];
	const left = side === 'right' ? centre.x + away : centre.x - away - valueWidth - unitWidth;
	const top = word === undefined ? centre.y + size * 0.42 : centre.y - size * 0.12;
	const wordLeft = side === 'right' ? centre.x + away : centre.x - away - wordWidth(reading, type);
	const below = centre.y + size * 1.05;
	const box: Box = { x: wordLeft, y: below - size * 0.66, width: size * 0.7, height: size * 0.7 };
	return [
		lettering(value, { x: left, y: top }, { size: size * 1.25, voice: 'title' }),
		lettering(unit, { x: left + valueWidth, y: top }, { size: size * 0.86, tone: 'soft' }),
		...(word === undefined || mark === undefined
			? []
			: markShapes(mark, { x: box.x + box.width / 2, y: box.y + box.height / 2 }, box.width)),
		...(word === undefined
			? []
			: [
					lettering(
						word,
						{ x: wordLeft + (mark === undefined ? 0 : size * 1.05), y: below },
						{
							size: size * 0.86,
							tone: mark === undefined ? 'soft' : MARK_TONES[mark],
						},
					),
				]),
	];
}

const wordWidth = ({ mark, word }: SketchReading, { size, measure }: Type): number =>
	word === undefined ? 0 : measure(word, 'text', size * 0.86) + (mark === undefined ? 0 : size * 1.05);

function readingWidth(reading: SketchReading | undefined, type: Type): number {
	if (reading === undefined) return 0;
	const { size, measure } = type;
	const value = measure(reading.value, 'title', size * 1.25) + size * 0.3 + measure(reading.unit, 'text', size * 0.86);
	return size * 0.55 + Math.max(value, wordWidth(reading, type));
}

/** Radius of a bubble, in sizes of the lettering. */
const RADIUS = 1.55;

/** How far a bubble may give way, in sizes of the lettering: in rings, along the axes before aslant. */
const SHIFTS = [0, 1.2, 2.4, 3.6, 4.8, 6.2, 7.8, 9.6, 12].flatMap((ring) =>
	[0, -90, 180, 90, -45, 45, -135, 135, -22, 22, -158, 158, -67, 67, -113, 113].map((angle, turn) => ({
		x: ring * Math.cos((angle * Math.PI) / 180),
		y: ring * Math.sin((angle * Math.PI) / 180),
		cost: ring * 6 + (turn < 4 ? 0 : 2),
	})),
);
