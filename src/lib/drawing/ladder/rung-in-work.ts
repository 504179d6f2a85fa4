import { circle, segment } from '../path';
import { group, lettering, stroke, type Measure, type Point, type Shape, type Tone } from '../shape';
import { contactShapes } from './contact';
import { caption, COIL, coilAndTail, FIRST, gateName, penThrough, wires, type DrawnRung, type Rails } from './line';
import type { Contact, ContactState, Rung } from './rungs';

type Place = { readonly y: number; readonly rails: Rails; readonly caption: string; readonly measure: Measure };

/** The rung that work is on, opened to the name and word of every contact; rows of eleven at most, joined by lettered connectors. */
export function rungInWork(rung: Rung, place: Place): DrawnRung {
	const { y, rails } = place;
	const rows = inRows(rung);
	const head = [
		...gateName(rung, { x: rails.left + 16, y: y + 32 }, 20),
		caption(place.caption, rung.coil, { x: rails.right - 14, y: y + 32 }, 15.5),
	];
	const shapes = rows.flatMap((row) => rowShapes(rung, row, y + FIRST_LINE + row.index * ROW_HEIGHT, place));
	const height = FIRST_LINE + (rows.length - 1) * ROW_HEIGHT + BELOW;
	return { shapes: [...head, ...shapes], height, enters: y + FIRST_LINE };
}

/** A piece of a long rung, with how far the line comes in it. */
type Row = Pick<Rung, 'contacts' | 'passes' | 'reached'> & {
	readonly index: number;
	readonly isLast: boolean;
	readonly leads: boolean;
};

function inRows({ contacts, passes, reached }: Rung): readonly Row[] {
	const count = Math.max(1, Math.ceil(contacts.length / ROW));
	const length = Math.ceil(contacts.length / count);
	return Array.from({ length: count }, (_, index) => {
		const before = index * length;
		const own = contacts.slice(before, before + length);
		return {
			index,
			contacts: own,
			passes: Math.min(own.length, Math.max(0, passes - before)),
			reached: reached && passes >= before,
			isLast: index === count - 1,
			leads: reached && passes >= before + own.length,
		};
	});
}

function rowShapes(rung: Rung, row: Row, line: number, { rails, measure }: Place): readonly Shape[] {
	const coil = { x: rails.right - COIL, y: line };
	const start = { x: rails.left + 20, y: line };
	const isFirst = row.index === 0;
	const first = rails.left + FIRST + (isFirst ? 0 : 12);
	const pitch = Math.min(56, (coil.x - 56 - first) / (ROW - 1));
	return [
		...wires(row, {
			line,
			from: isFirst ? rails.left : start.x + CONNECTOR,
			first,
			pitch,
			size: 'large',
			to: coil.x - (row.isLast ? RADIUS : CONNECTOR),
		}),
		...row.contacts.map((contact, i) => {
			const at = { x: first + i * pitch, y: line };
			return group(`contact ${rung.gate} ${contact.id}`, `${contact.label}: ${contact.word}`, [
				...contactShapes(contact, at, 'large', penThrough(contact.state, i < row.passes)),
				...nameOf(contact, at, { above: i % 2 === 1, width: 2 * pitch - 6, measure }),
			]);
		}),
		...(isFirst ? [] : connector(row.index - 1, start, row.reached)),
		...(row.isLast
			? [
					...coilAndTail(rung, coil, RADIUS, rails.right),
					lettering('Hold point', { x: coil.x, y: line - 38 }, { size: 14.5, voice: 'strong', anchor: 'middle' }),
				]
			: connector(row.index, coil, row.leads)),
	];
}

function connector(index: number, at: Point, powered: boolean): readonly Shape[] {
	const letter = String.fromCharCode('a'.charCodeAt(0) + index);
	return [
		stroke(circle(at, CONNECTOR), { pen: powered ? 'bold' : 'line', fill: 'paper' }),
		lettering(letter, { x: at.x, y: at.y + 5 }, { size: 15, voice: 'strong', anchor: 'middle' }),
	];
}

type Naming = { readonly above: boolean; readonly width: number; readonly measure: Measure };

/** Names alternate above and below the rung, so that each has the width of two contacts. */
function nameOf(contact: Contact, { x, y }: Point, { above, width, measure }: Naming): readonly Shape[] {
	const { label, word, state, of } = contact;
	// A bubble or a bridge already stands where the leader would.
	const crowned = above && (of === 'permissive' || state === 'not applicable');
	const [leader, name, below] = above
		? [segment(x, y - 24, x, y - 36), y - 60, y - 42]
		: [segment(x, y + 24, x, y + 36), y + 53, y + 71];
	return [
		...(crowned ? [] : [stroke(leader, { pen: 'hair', tone: 'rule' })]),
		lettering(shortened(label, width, measure), { x, y: name }, { size: NAME, voice: 'strong', anchor: 'middle' }),
		lettering(word, { x, y: below }, { size: 14, anchor: 'middle', tone: WORD_TONES[state] }),
	];
}

/** A name that is too long ends in an ellipsis; the whole name stands in the label of its group. */
function shortened(label: string, width: number, measure: Measure): string {
	if (measure(label, 'strong', NAME) <= width) return label;
	let text = label;
	while (text.length > 1 && measure(`${text}…`, 'strong', NAME) > width) text = text.slice(0, -1).trimEnd();
	return `${text}…`;
}

const WORD_TONES: { readonly [state in ContactState]: Tone } = {
	stands: 'ok',
	'not yet': 'soft',
	lapsed: 'warn',
	blocks: 'bad',
	'not applicable': 'soft',
};

const NAME = 14.5;
const ROW = 11;
const ROW_HEIGHT = 158;
const FIRST_LINE = 134;
const BELOW = 98;
const CONNECTOR = 12;
const RADIUS = 19;
