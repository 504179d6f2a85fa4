import { group, type Shape } from '../shape';
import { contactShapes, type ContactSize } from './contact';
import { caption, COIL, coilAndTail, FIRST, gateName, penThrough, wires, type DrawnRung, type Rails } from './line';
import type { Rung } from './rungs';

type Place = { readonly y: number; readonly rails: Rails; readonly caption: string; readonly height: number };

/** A rung with its contacts unnamed: where the line ends is seen at a glance, in a ladder of any number of groups. */
export function overviewRung(rung: Rung, { y, rails, caption: text, height }: Place): DrawnRung {
	const line = y + height - 15;
	const coil = { x: rails.right - COIL, y: line };
	const first = rails.left + FIRST;
	const pitch = Math.min(WIDEST, (coil.x - 40 - first) / Math.max(1, rung.contacts.length - 1));
	const size: ContactSize = pitch < 34 ? 'tiny' : 'small';
	const shapes: readonly Shape[] = [
		...gateName(rung, { x: rails.left + 16, y: line - NAME }, 15.5),
		caption(text, rung.coil, { x: rails.right - 14, y: line - NAME }, 14.5),
		...wires(rung, { line, from: rails.left, first, pitch, size, to: coil.x - RADIUS }),
		...rung.contacts.map((contact, i) => {
			const through = penThrough(contact.state, i < rung.passes);
			const drawn = contactShapes(contact, { x: first + i * pitch, y: line }, size, through);
			return group(`contact ${rung.gate} ${contact.id}`, `${contact.label}: ${contact.word}`, drawn);
		}),
		...coilAndTail(rung, coil, RADIUS, rails.right),
	];
	return { shapes, height, enters: line };
}

/** Baseline of the names over the line: clear of bars, clocks and bubbles. */
const NAME = 24;
const RADIUS = 13;
const WIDEST = 40;
