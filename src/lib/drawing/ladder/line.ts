import { segment } from '../path';
import { group, lettering, stroke, type Pen, type Point, type Shape, type Tone } from '../shape';
import { coilShapes } from './coil';
import { reach, type ContactSize } from './contact';
import type { CoilState, ContactState, Rung } from './rungs';

export type Rails = { readonly left: number; readonly right: number };

/** A rung as drawn; `enters` is the height at which its line leaves the left rail. */
export type DrawnRung = { readonly shapes: readonly Shape[]; readonly height: number; readonly enters: number };

type Wire = {
	readonly line: number;
	readonly from: number;
	readonly first: number;
	readonly pitch: number;
	readonly size: ContactSize;
	readonly to: number;
};

/** The pieces of line between the contacts: thick as far as the line has power, thin beyond. */
export function wires(
	{ contacts, passes, reached }: Pick<Rung, 'contacts' | 'passes' | 'reached'>,
	{ line, from, first, pitch, size, to }: Wire,
): readonly Shape[] {
	const ends = contacts.map((contact, i) => ({
		left: first + i * pitch - reach(contact, size),
		right: first + i * pitch + reach(contact, size),
	}));
	return Array.from({ length: contacts.length + 1 }, (_, i) => {
		const [start, end] = [ends[i - 1]?.right ?? from, ends[i]?.left ?? to];
		return stroke(segment(start, line, end, line), { pen: reached && i <= passes ? 'power' : 'line' });
	});
}

/** The pen of the line through a contact: a closed one beyond the power is closed but thin, an open one has none. */
export const penThrough = (state: ContactState, powered: boolean): Pen | undefined =>
	powered ? 'power' : state === 'stands' ? 'line' : undefined;

export const coilAndTail = (rung: Rung, at: Point, radius: number, rail: number): readonly Shape[] => [
	stroke(segment(at.x + radius, at.y, rail, at.y), { pen: rung.coil === 'released' ? 'power' : 'line' }),
	group(`coil ${rung.gate}`, `Hold point of gate ${rung.gate}: ${rung.coil}`, coilShapes(rung.coil, at, radius)),
];

/** Number and name of a gate over the start of its rung. */
export const gateName = ({ gate, title }: Rung, { x, y }: Point, size: number): readonly Shape[] => [
	lettering(String(gate), { x, y }, { size, voice: 'title' }),
	lettering(title, { x: x + size * (gate > 9 ? 1.6 : 1.1), y }, { size, voice: 'strong' }),
];

export const caption = (text: string, state: CoilState, at: Point, size: number): Shape =>
	lettering(text, at, { size, voice: 'strong', tone: COIL_TONES[state], anchor: 'end' });

const COIL_TONES: { readonly [state in CoilState]: Tone } = {
	'not ready': 'soft',
	ready: 'must',
	released: 'ok',
	lapsed: 'warn',
	held: 'soft',
	refused: 'bad',
};

/** From the left rail to the centre of the first contact, and from the centre of the coil to the right rail. */
export const FIRST = 44;
export const COIL = 46;
