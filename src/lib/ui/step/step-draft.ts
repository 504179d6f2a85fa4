import type { Step, StepKind } from '../../procedure';
import type { Typed, TypedRow, TypedValue } from '../../record';

export type StepOf<K extends StepKind> = Extract<Step, { readonly kind: K }>;

/**
 * What a person has typed or touched on a step so far, in the shape from which the record room makes an entry. Who holds
 * it keeps it with every change: nothing half-typed is lost.
 */
export type StepDraft = Pick<Typed, 'confirmed' | 'choice' | 'flow' | 'note'> & {
	readonly values?: { readonly [field: string]: TypedValue };
	readonly rows?: { readonly [row: string]: TypedRow };
	/** What the analysers say of themselves. */
	readonly mode?: (typeof ANALYSER_MODES)[number];
	/** When a timed hold began. */
	readonly begun?: string;
	/** Typed inputs of a calculation. */
	readonly inputs?: { readonly [input: string]: string };
};

export const ANALYSER_MODES = ['measuring', 'hold', 'back-purge', 'calibration', 'fault'] as const;
export const FLOWS = ['unbroken', 'broken', 'not looked at'] as const;

export const withValue = (draft: StepDraft, field: string, typed: string): StepDraft => ({
	...draft,
	values: { ...draft.values, [field]: { ...draft.values?.[field], typed } },
});

export const withRow = (draft: StepDraft, row: string, found: TypedRow): StepDraft => ({
	...draft,
	rows: { ...draft.rows, [row]: found },
});

/** What every body of a step sheet gets: the step, what is typed so far, and whom to tell. */
export type BodyProps<K extends StepKind> = {
	readonly step: StepOf<K>;
	readonly draft: StepDraft;
	readonly ondraft: (draft: StepDraft) => void;
	/** Save is one press; who holds the record judges, writes and moves on. */
	readonly onsave: () => void;
	/** While it is being written. */
	readonly busy?: boolean;
};
