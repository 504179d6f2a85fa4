/**
 * Line weights of the sheet, thin to thick. `power` is kept for the one line that says how far a start has come; `dot` is
 * round at its ends, so that a line of no length is a point that was read.
 */
export type Pen = 'hair' | 'line' | 'bold' | 'power' | 'dot';

/**
 * What a colour means, never a colour: ink is the plant, hand is what a person typed or signed, the rest are the meanings
 * of IEC 60073 (from memory, verify): ok normal, warn abnormal, bad danger, must mandatory action. A `-fill` carries ink on it.
 */
export type Tone =
	| 'ink'
	| 'soft'
	| 'rule'
	| 'faint'
	| 'paper'
	| 'hand'
	| 'ok'
	| 'ok-fill'
	| 'warn'
	| 'warn-fill'
	| 'warn-wash'
	| 'bad'
	| 'must'
	| 'band';

export type Dash = 'dashed' | 'dotted' | 'chain' | 'bridge';

/** Voices of the sheet: the plant speaks in text, strong and title; `signed` is a sentence that a person signs; `code` is compared by eye. */
export type Voice = 'text' | 'strong' | 'title' | 'signed' | 'code';

export type Anchor = 'start' | 'middle' | 'end';

export type Point = { readonly x: number; readonly y: number };
export type Box = { readonly x: number; readonly y: number; readonly width: number; readonly height: number };

export type Segment =
	| readonly ['M' | 'L', number, number]
	| readonly ['C', number, number, number, number, number, number]
	| readonly ['Z'];

export type PathShape = {
	readonly kind: 'path';
	readonly path: readonly Segment[];
	readonly pen?: Pen;
	readonly tone?: Tone;
	readonly dash?: Dash;
	readonly fill?: Tone;
};

export type TextShape = {
	readonly kind: 'text';
	readonly x: number;
	/** The baseline. */
	readonly y: number;
	readonly text: string;
	readonly size: number;
	readonly voice: Voice;
	readonly tone: Tone;
	readonly anchor: Anchor;
};

/** What belongs together: a contact that can be touched, a bubble that is read aloud. */
export type GroupShape = {
	readonly kind: 'group';
	readonly id: string;
	readonly label: string;
	readonly shapes: readonly Shape[];
};

/** All that a drawing is made of. A screen and a page draw the same shapes; y grows downwards. */
export type Shape = PathShape | TextShape | GroupShape;

export type Drawing = { readonly width: number; readonly height: number; readonly shapes: readonly Shape[] };

/** Width of a text in units of the drawing. Who prints knows the real font; without one, `roughly` is good enough to keep labels apart. */
export type Measure = (text: string, voice: Voice, size: number) => number;

type Stroke = { readonly pen: Pen; readonly tone?: Tone; readonly dash?: Dash; readonly fill?: Tone };

export const stroke = (path: readonly Segment[], { pen, tone = 'ink', dash, fill }: Stroke): PathShape => ({
	kind: 'path',
	path,
	pen,
	tone,
	...(dash === undefined ? {} : { dash }),
	...(fill === undefined ? {} : { fill }),
});

export const area = (path: readonly Segment[], fill: Tone): PathShape => ({ kind: 'path', path, fill });

type Lettering = { readonly size: number; readonly voice?: Voice; readonly tone?: Tone; readonly anchor?: Anchor };

export const lettering = (
	text: string,
	at: Point,
	{ size, voice = 'text', tone = 'ink', anchor = 'start' }: Lettering,
): TextShape => ({ kind: 'text', text, x: at.x, y: at.y, size, voice, tone, anchor });

export const group = (id: string, label: string, shapes: readonly Shape[]): GroupShape => ({
	kind: 'group',
	id,
	label,
	shapes,
});
