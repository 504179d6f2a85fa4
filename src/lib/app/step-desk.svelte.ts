import { fail, ok, type Json, type Result } from '../base';
import type { Attachment, DraftKey } from '../store';
import type { Step } from '../procedure';
import {
	guessedColumns,
	lastTimeAt,
	parseTrend,
	tableOf,
	type SeriesColumn,
	type Trend,
	type TrendReading,
	type TrendTable,
	type Typed,
	type TypedRow,
	type TypedValue,
} from '../record';
import { attachSeries, calculate, enter, textOf, type TrendFile } from './entries';
import type { OpenStartUp, Seen } from './open-start-up.svelte';
import { redrawnPhoto } from './photo';
import type { Problem } from './problem';

/** What a person has typed or touched on a step so far. It is kept with every change: nothing half typed is lost. */
export type TypedSoFar = {
	readonly values?: { readonly [field: string]: TypedValue };
	readonly rows?: { readonly [row: string]: TypedRow };
	readonly confirmed?: readonly string[];
	readonly choice?: string;
	readonly flow?: 'unbroken' | 'broken' | 'not looked at';
	readonly begun?: string;
	/** "02:14": seen before it is typed, as the clock of the plant showed. */
	readonly seen?: string;
	readonly inputs?: { readonly [input: string]: string };
	readonly party?: string;
	readonly note?: string;
	/** Photos already kept, by their hash. */
	readonly photos?: readonly Attachment[];
	readonly mode?: NonNullable<TypedValue['analyserMode']>;
	/** A trend that is being read in: its file, and what was corrected of what was found in it. */
	readonly series?: {
		readonly file: Attachment;
		readonly reading?: TrendReading;
		readonly columns?: readonly SeriesColumn[];
	};
};

/** One step as it lies open before a person: what is typed so far, and its saving. */
export class StepDesk {
	readonly startUp: OpenStartUp;
	readonly step: Step;
	/** Where what is half typed lies: with the person who had the tablet when the step was opened. */
	readonly #key: DraftKey;
	#draft = $state.raw<TypedSoFar>({});
	#file = $state.raw<TrendFile>();
	#problem = $state.raw<Problem>();
	#busy = $state.raw(false);
	#saving: Promise<unknown> = Promise.resolve();

	private constructor(startUp: OpenStartUp, step: Step, key: DraftKey, draft: TypedSoFar, file: TrendFile | undefined) {
		this.startUp = startUp;
		this.step = step;
		this.#key = key;
		this.#draft = draft;
		this.#file = file;
	}

	static async open(startUp: OpenStartUp, id: string): Promise<Result<StepDesk, Problem>> {
		const step = startUp.stepOf(id);
		if (!step.ok) return step;
		const key = { startUp: startUp.id, step: id, person: startUp.tablet.person?.person ?? '' };
		const { store } = startUp.tablet;
		const kept = await store.drafts.read(key);
		if (!kept.ok) return kept;
		const draft = (kept.value?.typed ?? {}) as TypedSoFar;
		const file = draft.series === undefined ? undefined : await store.attachments.read(draft.series.file.hash);
		if (file?.ok === false) return file;
		const trend = file?.value;
		const bytes = trend === undefined ? undefined : new Uint8Array(await trend.blob.arrayBuffer());
		return ok(new StepDesk(startUp, step.value, key, draft, bytes && { name: draft.series?.file.name ?? '', bytes }));
	}

	get draft(): TypedSoFar {
		return this.#draft;
	}

	/** The trend that was chosen or pasted, before it is attached. */
	get file(): TrendFile | undefined {
		return this.#file;
	}

	readonly #text: string | undefined = $derived(this.#file === undefined ? undefined : textOf(this.#file.bytes));

	/** The cells as they stand in the file. */
	readonly table: TrendTable | undefined = $derived(
		this.#text === undefined ? undefined : tableOf(this.#text, this.#draft.series?.reading?.separator),
	);

	readonly trend: Result<Trend, Problem> | undefined = $derived.by(() => {
		if (this.#file === undefined) return undefined;
		if (this.#text === undefined) return fail({ kind: 'not-utf8', name: this.#file.name });
		return parseTrend(this.#text, this.startUp.plant.utcOffsetMinutes, this.#draft.series?.reading);
	});

	/** Which column is which measuring point: as it was said, else as it was found. */
	readonly columns: readonly SeriesColumn[] = $derived.by(() => {
		const said = this.#draft.series?.columns;
		if (said !== undefined || this.trend?.ok !== true) return said ?? [];
		return guessedColumns(this.trend.value, this.startUp.plant);
	});

	get problem(): Problem | undefined {
		return this.#problem;
	}

	get busy(): boolean {
		return this.#busy;
	}

	type(draft: TypedSoFar): void {
		this.#draft = draft;
		this.#problem = undefined;
		const { store, clock } = this.startUp.tablet;
		const saved = this.startUp.instant(clock.now());
		const row = { ...this.#key, typed: draft as unknown as Json, saved };
		this.#saving = this.#saving
			.then(() => store.drafts.save(row))
			.then((kept) => {
				if (!kept.ok) this.#problem = kept.error;
			});
	}

	/** The file is kept before anything is read from it: a reload finds it again. */
	async choose(file: TrendFile): Promise<void> {
		const as = { name: file.name, mediaType: 'text/csv' };
		const kept = await this.startUp.tablet.store.attachments.save(file.bytes, as);
		this.#file = kept.ok ? file : undefined;
		if (kept.ok) this.type({ ...this.#draft, series: { file: { ...kept.value, name: file.name } } });
		else this.#problem = kept.error;
	}

	/** A correction of what was found in the file. Other headings than before: the columns are looked for anew. */
	readAs(change: TrendReading): void {
		const { series } = this.#draft;
		if (series === undefined) return;
		const { columns: _found, ...rest } = series;
		const reading = Object.fromEntries(
			Object.entries({ ...series.reading, ...change }).filter(([, value]) => (value as unknown) !== undefined),
		);
		this.type({ ...this.#draft, series: { ...rest, reading } });
	}

	useColumns(columns: readonly SeriesColumn[]): void {
		const { series } = this.#draft;
		if (series !== undefined) this.type({ ...this.#draft, series: { ...series, columns } });
	}

	/** A photo is kept before the entry that names it. */
	async addPhoto(photo: Blob, name: string): Promise<void> {
		if (this.#busy) return;
		this.#busy = true;
		const drawn = await redrawnPhoto(photo, name);
		const kept = drawn.ok
			? await this.startUp.tablet.store.attachments.save(drawn.value.bytes, {
					name: drawn.value.name,
					mediaType: 'image/jpeg',
				})
			: drawn;
		this.#busy = false;
		if (!kept.ok) this.#problem = kept.error;
		else if (this.#draft.photos?.some(({ hash }) => hash === kept.value.hash) !== true)
			this.type({ ...this.#draft, photos: [...(this.#draft.photos ?? []), kept.value] });
	}

	/** A photo that is not meant: the entry will not name it. */
	leavePhotoOut(hash: string): void {
		const photos = (this.#draft.photos ?? []).filter((photo) => photo.hash !== hash);
		this.type({ ...this.#draft, photos });
	}

	/** @returns whether it was saved; else `problem` says why, and what was typed stays */
	async save(): Promise<boolean> {
		return this.#keep(() => {
			const { startUp, step } = this;
			const { note, inputs, photos } = this.#draft;
			const seen = this.#seen();
			const said = {
				...(note === undefined || note.trim() === '' ? {} : { note }),
				...(photos === undefined || photos.length === 0 ? {} : { attachments: photos }),
			};
			if (step.kind === 'calculation')
				return calculate(startUp, step.id, { ...said, ...(inputs === undefined ? {} : { typed: inputs }) }, seen);
			if (step.kind === 'series' && this.#file !== undefined)
				return attachSeries(startUp, step.id, this.#file, {
					...(note === undefined ? {} : { note }),
					reading: this.#draft.series?.reading,
					columns: this.columns,
				});
			return enter(startUp, step.id, { ...typedOf(this.#draft), ...said }, seen);
		});
	}

	/** When it was seen, where that was before it is typed: the record keeps both times. */
	#seen(): Seen {
		const { startUp } = this;
		const at = lastTimeAt(this.#draft.seen ?? '', startUp.tablet.clock.now(), startUp.plant.utcOffsetMinutes);
		return at === undefined ? {} : { observed: startUp.instant(at) };
	}

	/** What no limit decides: it cannot be done now, or it does not apply here. */
	async giveReason(outcome: 'cannot do' | 'not applicable', reason: string): Promise<boolean> {
		return this.#keep(() => enter(this.startUp, this.step.id, { outcome, reason }));
	}

	async #keep(write: () => Promise<Result<'saved', Problem>>): Promise<boolean> {
		if (this.#busy) return false;
		this.#busy = true;
		await this.#saving;
		const written = await write();
		if (written.ok) {
			await this.startUp.tablet.store.drafts.drop(this.#key);
			this.#draft = {};
			this.#file = undefined;
		}
		this.#problem = written.ok ? undefined : written.error;
		this.#busy = false;
		return written.ok;
	}
}

/** Adds to what is typed on a step that is not open: it is found there when the step is opened. */
export async function keepInDraft(
	startUp: OpenStartUp,
	step: string,
	change: (draft: TypedSoFar) => TypedSoFar,
): Promise<Result<'saved', Problem>> {
	const { store, clock } = startUp.tablet;
	const key = { startUp: startUp.id, step, person: startUp.tablet.person?.person ?? '' };
	const kept = await store.drafts.read(key);
	if (!kept.ok) return kept;
	const typed = change((kept.value?.typed ?? {}) as TypedSoFar) as unknown as Json;
	return store.drafts.save({ ...key, typed, saved: startUp.instant(clock.now()) });
}

function typedOf({ values, rows, confirmed, choice, flow, begun, mode }: TypedSoFar): Typed {
	const read = (value: TypedValue): TypedValue => (mode === undefined ? value : { ...value, analyserMode: mode });
	return {
		...(values === undefined
			? {}
			: { values: Object.fromEntries(Object.entries(values).map(([field, value]) => [field, read(value)])) }),
		...(rows === undefined ? {} : { rows }),
		...(confirmed === undefined ? {} : { confirmed }),
		...(choice === undefined ? {} : { choice }),
		...(flow === undefined ? {} : { flow }),
		...(begun === undefined ? {} : { from: begun }),
	};
}

/** Where work goes on after a step: the next one of the rung in work that does not stand, its own gate first. */
export function nextStep({ procedure, standing }: OpenStartUp, after: string): string | undefined {
	const at = procedure.steps.findIndex(({ id }) => id === after);
	const stateOf = (id: string) => standing.steps.find(({ step }) => step === id)?.state;
	const isOpen = ({ id, gate }: Step): boolean =>
		gate === procedure.steps[at]?.gate && id !== after && ['not yet', 'lapsed', 'failed'].includes(stateOf(id) ?? '');
	return (procedure.steps.slice(at + 1).find(isOpen) ?? procedure.steps.find(isOpen))?.id;
}
