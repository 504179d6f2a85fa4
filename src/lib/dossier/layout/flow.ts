import { lettering, placed, segment, stroke, type Box, type Drawing, type Shape, type Tone } from '../../drawing';
import { AREA, type FieldBox, type PictureBox, type Sheet } from './sheet';
import { wrap, type Setting } from './wrap';

export type Style = Setting & { readonly lead: number; readonly tone: Tone };

/** The type of the dossier, in points. */
export const STYLES = {
	caption: { voice: 'text', size: 8.6, lead: 11.5, tone: 'soft' },
	title: { voice: 'title', size: 22.5, lead: 25, tone: 'ink' },
	heading: { voice: 'title', size: 12.4, lead: 15.5, tone: 'ink' },
	subheading: { voice: 'strong', size: 9.8, lead: 13, tone: 'ink' },
	lead: { voice: 'text', size: 10.8, lead: 15.2, tone: 'ink' },
	body: { voice: 'text', size: 9.4, lead: 12.8, tone: 'ink' },
	note: { voice: 'text', size: 8.6, lead: 12, tone: 'soft' },
	signed: { voice: 'signed', size: 10.4, lead: 15.6, tone: 'ink' },
} as const satisfies { readonly [name: string]: Style };

type Draft = { title: string; shapes: Shape[]; fields: FieldBox[]; pictures: PictureBox[] };

/** Writes down a column, sheet after sheet. What does not fit goes on at the top of the next sheet of the same title. */
export class Flow {
	readonly #sheets: Draft[] = [];
	#y = AREA.y;

	get sheets(): readonly Sheet[] {
		return this.#sheets;
	}

	get y(): number {
		return this.#y;
	}

	/** Height left on this sheet. */
	get room(): number {
		return AREA.y + AREA.height - this.#y;
	}

	/** A new sheet; `title` goes into its title block. */
	newSheet(title: string): void {
		this.#sheets.push({ title, shapes: [], fields: [], pictures: [] });
		this.#y = AREA.y;
	}

	/** Goes on to the next sheet when less than this is left. */
	keep(height: number): void {
		if (height > this.room) this.newSheet(this.#sheet.title);
	}

	/** Adds shapes that already stand in the coordinates of the sheet. */
	draw(...shapes: readonly Shape[]): void {
		this.#sheet.shapes.push(...shapes);
	}

	addField(field: FieldBox): void {
		this.#sheet.fields.push(field);
	}

	addPicture(picture: PictureBox): void {
		this.#sheet.pictures.push(picture);
	}

	space(height: number): void {
		this.#y += height;
	}

	/** Small line over a large title, at the head of a sheet. */
	head(caption: string, title: string, width = AREA.width): void {
		this.write(caption, STYLES.caption, { width });
		this.write(title, STYLES.title, { width });
		this.space(5);
	}

	/** A heading never stands alone at the foot of a sheet: `with` is the height of what must follow it there. */
	heading(text: string, { with: following = 40, style = STYLES.heading }: { with?: number; style?: Style } = {}): void {
		const before = this.#y === AREA.y ? 0 : style.size * 1.1;
		this.keep(before + style.lead + following);
		if (this.#y !== AREA.y) this.space(before);
		this.write(text, style);
		this.space(2.5);
	}

	/** A paragraph, line by line over the foot of the sheet if need be. */
	write(text: string, style: Style, { x = AREA.x, width = AREA.width }: { x?: number; width?: number } = {}): void {
		for (const line of wrap(text, width, style)) {
			this.keep(style.lead);
			const y = this.#y + style.lead / 2 + style.size * 0.34;
			this.draw(lettering(line, { x, y }, { size: style.size, voice: style.voice, tone: style.tone }));
			this.space(style.lead);
		}
	}

	/** A picture, fitted to the width of the column. */
	figure(drawing: Drawing, width = AREA.width): void {
		const scale = width / drawing.width;
		this.keep(drawing.height * scale);
		const x = AREA.x + (AREA.width - width) / 2;
		this.draw(...placed(drawing.shapes, { x, y: this.#y }, scale));
		this.space(drawing.height * scale);
	}

	rule(pen: 'hair' | 'line' = 'hair', tone: Tone = 'rule'): void {
		this.draw(stroke(segment(AREA.x, this.#y, AREA.x + AREA.width, this.#y), { pen, tone }));
	}

	/** A box of the column that is drawn by hand; the cursor goes below it. */
	block(height: number, drawIn: (box: Box) => readonly Shape[]): void {
		this.keep(height);
		this.draw(...drawIn({ x: AREA.x, y: this.#y, width: AREA.width, height }));
		this.space(height);
	}

	get #sheet(): Draft {
		const sheet = this.#sheets.at(-1);
		if (sheet === undefined) throw new Error('nothing is written before the first sheet');
		return sheet;
	}
}
