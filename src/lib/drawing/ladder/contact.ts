import { circle, polyline, segment } from '../path';
import { stroke, type Pen, type Point, type Shape } from '../shape';
import type { Contact } from './rungs';

/** Half the gap between the bars and half their height: for the rung in work, the overview, and a crowded overview. */
export const CONTACT_SIZES = {
	large: { gap: 12, height: 18, clock: 9 },
	small: { gap: 7, height: 11, clock: 6 },
	tiny: { gap: 4, height: 9, clock: 4 },
} as const;

export type ContactSize = keyof typeof CONTACT_SIZES;

/**
 * A contact of IEC 61131-3 (from memory, verify). Closed: bold bars and the line through. Open: thin bars round an empty gap. Lapsed: a clock in the gap.
 * Blocking: bold bars and a slash. Not applicable: thin bars under a dashed bridge. `through` is the pen of the line that
 * passes it, or nothing where none does. A proof whose age was spent under a released gate keeps its line, its clock above.
 */
export function contactShapes(
	contact: Contact,
	at: Point,
	size: ContactSize,
	through: Pen | undefined,
): readonly Shape[] {
	const { gap, height, clock } = CONTACT_SIZES[size];
	const permissive = contact.of === 'permissive' ? stalk(at, height, size) : [];
	switch (contact.state) {
		case 'stands':
			return [...passing(at, gap, through), bars(at, gap, height, 'bold'), ...permissive];
		case 'not yet':
			return [...passing(at, gap, through), bars(at, gap, height, 'line'), ...permissive];
		case 'lapsed': {
			const centre = through === undefined ? at : { x: at.x, y: at.y - height - clock * 0.7 };
			return [
				...passing(at, gap, through),
				bars(at, gap, height, 'bold'),
				...clockShapes(centre, clock),
				...permissive,
			];
		}
		case 'blocks':
			return [
				...passing(at, gap, through),
				bars(at, gap, height, 'bold', 'bad'),
				slash(at, gap, height),
				...permissive,
			];
		case 'not applicable':
			return [bars(at, gap, height, 'line', 'soft'), bridge(at, gap, height, through)];
	}
}

/** Where the line on either side of a contact ends: at its bars, or at the feet of the bridge outside them. */
export const reach = (contact: Contact, size: ContactSize): number =>
	CONTACT_SIZES[size].gap + (contact.state === 'not applicable' ? BRIDGE_FEET[size] : 0);

export function clockShapes({ x, y }: Point, radius: number): readonly Shape[] {
	const hands = polyline([
		{ x, y: y - radius * 0.62 },
		{ x, y },
		{ x: x + radius * 0.48, y: y + radius * 0.28 },
	]);
	return [
		stroke(circle({ x, y }, radius), { pen: 'line', fill: 'warn-fill' }),
		stroke(hands, { pen: radius > 5 ? 'line' : 'hair' }),
	];
}

const passing = ({ x, y }: Point, gap: number, pen: Pen | undefined): readonly Shape[] =>
	pen === undefined ? [] : [stroke(segment(x - gap, y, x + gap, y), { pen })];

const bars = ({ x, y }: Point, gap: number, height: number, pen: Pen, tone: 'ink' | 'soft' | 'bad' = 'ink'): Shape =>
	stroke([...segment(x - gap, y - height, x - gap, y + height), ...segment(x + gap, y - height, x + gap, y + height)], {
		pen,
		tone,
	});

const slash = ({ x, y }: Point, gap: number, height: number): Shape => {
	const [dx, dy] = [gap + (gap > 5 ? 7 : 4), height * 0.86];
	return stroke(segment(x - dx, y + dy, x + dx, y - dy), { pen: 'bold', tone: 'bad' });
};

function bridge({ x, y }: Point, gap: number, height: number, through: Pen | undefined): Shape {
	const [foot, top] = [gap + BRIDGE_FEET[gap > 10 ? 'large' : gap > 5 ? 'small' : 'tiny'], y - height - 5];
	const points = [
		{ x: x - foot, y },
		{ x: x - foot, y: top },
		{ x: x + foot, y: top },
		{ x: x + foot, y },
	];
	return stroke(polyline(points), { pen: through === 'power' ? 'bold' : 'line', dash: 'bridge' });
}

/** A permissive's bubble: on a stalk where there is room for one, else close on its bars. */
function stalk({ x, y }: Point, height: number, size: ContactSize): readonly Shape[] {
	const { radius, length } = STALKS[size];
	const foot = y - height - 1;
	return [
		...(length === 0 ? [] : [stroke(segment(x, foot, x, foot - length), { pen: 'line' })]),
		stroke(circle({ x, y: foot - length - radius }, radius), { pen: 'line', fill: 'paper' }),
	];
}

const STALKS = {
	large: { radius: 8, length: 6 },
	small: { radius: 3.6, length: 0 },
	tiny: { radius: 2.6, length: 0 },
} as const;
const BRIDGE_FEET = { large: 8, small: 6, tiny: 3 } as const;
