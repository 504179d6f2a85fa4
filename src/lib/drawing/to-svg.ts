import type { Dash, Drawing, PathShape, Pen, Segment, Shape, TextShape, Tone } from './shape';

/** The drawing as an SVG document in the colours of the printed sheet: for previews and pictures. Screens draw the shapes themselves. */
export function toSvg({ width, height, shapes }: Drawing, title: string): string {
	const box = `${number(width)} ${number(height)}`;
	return [
		`<svg xmlns="http://www.w3.org/2000/svg" width="${number(width)}" height="${number(height)}" viewBox="0 0 ${box}" role="img">`,
		`<title>${escaped(title)}</title>`,
		...shapes.map(svgOf),
		'</svg>\n',
	].join('\n');
}

function svgOf(shape: Shape): string {
	switch (shape.kind) {
		case 'path':
			return pathElement(shape);
		case 'text':
			return textElement(shape);
		case 'group':
			return `<g aria-label="${escaped(shape.label)}">${shape.shapes.map(svgOf).join('')}</g>`;
	}
}

function pathElement({ path, pen, tone = 'ink', dash, fill }: PathShape): string {
	const line =
		pen === undefined
			? ''
			: ` stroke="${COLOURS[tone]}" stroke-width="${PENS[pen]}"${dash === undefined ? '' : ` stroke-dasharray="${DASHES[dash].join(' ')}"`}${pen === 'dot' ? ' stroke-linecap="round"' : ''}`;
	return `<path d="${path.map(segmentText).join('')}" fill="${fill === undefined ? 'none' : COLOURS[fill]}"${line}/>`;
}

function textElement({ text, x, y, size, voice, tone, anchor }: TextShape): string {
	const at = `x="${number(x)}" y="${number(y)}" font-size="${number(size)}" text-anchor="${anchor}"`;
	return `<text ${at} ${VOICES[voice]} fill="${COLOURS[tone]}">${escaped(text)}</text>`;
}

const segmentText = ([letter, ...numbers]: Segment): string => letter + numbers.map(number).join(' ');

/** Hundredths are finer than any pen. A number that is none must never reach a drawing. */
function number(value: number): string {
	if (!Number.isFinite(value)) throw new TypeError(`${String(value)} cannot be drawn`);
	return String(Math.round(value * 100) / 100);
}

const escaped = (text: string): string =>
	text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');

/** Colours of the printed sheet. */
export const COLOURS: { readonly [tone in Tone]: string } = {
	ink: '#12202a',
	soft: '#45525b',
	rule: '#aeb3ae',
	faint: '#d9d9cf',
	paper: '#ffffff',
	hand: '#4a2785',
	ok: '#17613a',
	'ok-fill': '#1f7a49',
	warn: '#734600',
	'warn-fill': '#f4b90a',
	'warn-wash': '#fbeab9',
	bad: '#a3121b',
	must: '#0a4c8f',
	band: '#dfe3e4',
};

/** Widths of the pens in the units of the screen. */
const PENS: { readonly [pen in Pen]: number } = { hair: 1, line: 1.6, bold: 3.2, power: 7, dot: 2.6 };

export const DASHES: { readonly [dash in Dash]: readonly number[] } = {
	dashed: [8, 4],
	dotted: [2, 3],
	chain: [16, 4, 3, 4],
	bridge: [4.5, 3],
};

const VOICES = {
	text: 'font-family="Sofia Sans" font-weight="500"',
	strong: 'font-family="Sofia Sans" font-weight="700"',
	title: 'font-family="Sofia Sans" font-weight="800"',
	signed: 'font-family="Literata" font-weight="500"',
	code: 'font-family="Sofia Sans" font-weight="700" letter-spacing="0.06em"',
} as const;
