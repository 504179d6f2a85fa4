/** On which sheet a chapter begins, for those that point to it: known once the sheets have been laid out. */
export class Anchors {
	readonly #sheets = new Map<string, number>();
	readonly #before: ReadonlyMap<string, number>;

	/** @param before where the chapters began when the sheets were laid out last */
	constructor(before: ReadonlyMap<string, number> = new Map()) {
		this.#before = before;
	}

	mark(chapter: string, sheet: number): void {
		this.#sheets.set(chapter, sheet);
	}

	sheetOf(chapter: string): string {
		const sheet = this.#before.get(chapter);
		return sheet === undefined ? '–' : String(sheet);
	}

	get marked(): ReadonlyMap<string, number> {
		return this.#sheets;
	}

	/** Whether everything still begins where it was pointed to. */
	get settled(): boolean {
		return [...this.#sheets].every(([chapter, sheet]) => this.#before.get(chapter) === sheet);
	}
}
