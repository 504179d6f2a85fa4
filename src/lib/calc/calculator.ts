import type { Json, Result } from '../base';
import type * as v from 'valibot';

/**
 * What every calculator offers, so that steps, the calculators screen, the command line and verify treat all alike.
 * `run` is total: it takes whatever came from outside and answers with a result or with every refusal it found.
 */
export type Calculator = {
	/** The file's name, and the word in a procedure. */
	readonly id: string;
	/** A released version never changes its numbers; a correction is a new version beside the old one. */
	readonly version: number;
	readonly title: string;
	/** The question in the words of a technician: "What flows through this Venturi?" */
	readonly answers: string;
	readonly sources: readonly string[];
	readonly inputs: readonly InputSpec[];
	readonly outputs: readonly OutputSpec[];
	/** Shape of the inputs, from which the published JSON Schema is made. */
	readonly schema: v.GenericSchema;
	readonly run: (inputs: unknown) => Result<CalcResult, readonly Refusal[]>;
	readonly page: CalculatorPage;
};

/** What a calculator's page shows beside its inputs and numbers: a new calculator brings its page along. */
export type CalculatorPage = {
	readonly area: 'purge' | 'flow' | 'tightness' | 'instruments' | 'moisture' | 'stock';
	/** Other words that people look for it by. */
	readonly findBy: string;
	/** Inputs shown at once; the others are folded away until they are wanted. */
	readonly first: readonly string[];
	/** Outputs shown at once, the one that is asked for first; the others are folded away. */
	readonly results: readonly string[];
	/** What was calculated, in the notation of the drawing room's `typeset`. */
	readonly formula: readonly string[];
	/** One screen of explanation: what it assumes, where it ends, what is often done wrong. */
	readonly explains: readonly string[];
	/** What can hurt where it is used: inert gas suffocates; a number is no permission to enter. */
	readonly cautions: readonly ('inert' | 'entry')[];
	/** Invented inputs that give a result. */
	readonly example?: { readonly [input: string]: Json };
};

/** Where an input comes from when a step binds it and nobody types it. */
export type InputSource = 'reading' | 'series' | 'plant' | 'instrument' | 'site' | 'procedure' | 'typed';

export type InputSpec = {
	readonly name: string;
	/** The source's own letter, when it has one. */
	readonly symbol?: string;
	/** In two or three words, beside the field; `means` is the whole sentence. */
	readonly label?: string;
	readonly means: string;
	/** A name of the quantity room ("pressure-absolute"), or the shape of what is not one number. */
	readonly quantity: string;
	/** SI unit that a bare number is read in; absent for what is not one number. */
	readonly unit?: string;
	/** Unit that a field offers first, where it is not the usual one of the quantity. */
	readonly typedIn?: string;
	readonly min?: number;
	readonly max?: number;
	readonly choices?: readonly string[];
	readonly optional?: true;
	/** What stands when the input is left out, said in words and used by the calculation. */
	readonly default?: number | string | boolean;
	/** What an input of several values is made of; with `repeats` it is a table of such rows. */
	readonly parts?: readonly InputPart[];
	readonly repeats?: true;
	readonly from: InputSource;
};

export type InputPart = Omit<InputSpec, 'from' | 'parts' | 'repeats'>;

export type OutputSpec = {
	readonly name: string;
	readonly symbol?: string;
	readonly means: string;
	readonly quantity: string;
	readonly unit: string;
};

/** A number of a result, in the SI unit of its output; `U` is the expanded uncertainty at k = 2 in the same unit. */
export type CalcValue = {
	readonly value: number | null;
	readonly unit: string;
	readonly U?: number;
	/** Why there is no number ("unreachable"), when value is null. */
	readonly because?: string;
};

/** A stored result names its calculator, its constants and its inputs, so that anyone can do it again. */
export type CalcResult = {
	/** "venturi-flow@1" */
	readonly calc: string;
	/** "constants@1" */
	readonly constants: string;
	readonly inputs: Json;
	readonly values: { readonly [name: string]: CalcValue };
	readonly verdict?: Verdict;
	/** Whether the result may prove a step: outside a standard's scope it is shown, and proves nothing. */
	readonly scope: 'in scope' | 'outside scope';
	readonly notes: readonly CalcNote[];
	readonly budget?: readonly BudgetRow[];
	readonly plots?: readonly Plot[];
};

/** adequate: proves the step. not yet: a try, kept and counted. cannot be shown: blocks until its reasons are gone. */
export type Verdict = {
	readonly word: 'adequate' | 'not yet' | 'cannot be shown';
	readonly reasons: readonly CalcNote[];
};

/** Said as data; the wording room makes the sentence. `kind` is the name of what is meant, the rest its facts. */
export type CalcNote = {
	readonly kind: string;
	readonly level: 'outside scope' | 'warning' | 'reason' | 'remark';
	readonly [fact: string]: Json;
};

/** Why no result exists. Never a clamped or invented number. */
export type Refusal = {
	readonly kind: string;
	readonly input?: string;
	readonly [fact: string]: Json | undefined;
};

/** One line of an uncertainty budget: what the input contributes to the expanded uncertainty of `output` (k = 2). */
export type BudgetRow = {
	readonly output: string;
	readonly input: string;
	readonly symbol?: string;
	/** Expanded uncertainty of the input, relative (percent of value) or absolute in `unit`. */
	readonly U: number;
	readonly unit: string;
	readonly sensitivity: number;
	/** Part of the output's variance, 0 to 1. */
	readonly share: number;
};

/** A picture as data: the drawing room turns it into paths, for screen and paper alike. */
export type Plot = {
	readonly id: string;
	readonly title: string;
	readonly x: PlotAxis;
	readonly y: PlotAxis;
	readonly curves: readonly PlotCurve[];
	/** Horizontal or vertical lines: a limit, the acceptance line after the guard band, a hold window. */
	readonly marks: readonly PlotMark[];
};

export type PlotAxis = { readonly label: string; readonly unit: string; readonly logarithmic?: true };

export type PlotCurve = {
	readonly id: string;
	readonly label: string;
	readonly kind: 'points' | 'line' | 'band' | 'steps';
	/** The curve that decides is drawn heavy. */
	readonly decides?: true;
	readonly x: readonly number[];
	readonly y: readonly number[];
	/** Lower edge of a band; y is its upper edge. */
	readonly y2?: readonly number[];
};

export type PlotMark = {
	readonly kind: 'limit' | 'guard' | 'window' | 'event';
	readonly label: string;
	readonly axis: 'x' | 'y';
	readonly at: number;
	readonly to?: number;
};
