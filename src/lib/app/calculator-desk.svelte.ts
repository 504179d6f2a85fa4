import type { Result } from '../base';
import {
	inputsFrom,
	runCalculator,
	typedFrom,
	type CalcResult,
	type Calculator,
	type Refusal,
	type TypedInputs,
} from '../calc';
import { keptCases, keepCases, type Cases, type Shelf } from './calculator-shelf';
import { sweepCurve, type Sweep, type SweptCurve } from './sweep-curve';

type Case = 'A' | 'B';
type Answer = Result<CalcResult, readonly Refusal[]>;

/** A calculator as it lies open: what is typed, kept on this tablet with every change, and what it gives. */
export class CalculatorDesk {
	readonly calculator: Calculator;
	readonly name: string;
	readonly #shelf: Shelf;
	#cases = $state.raw<Cases>({ A: {} });
	#open = $state.raw<Case>('A');
	#sweep = $state.raw<Sweep>();
	#isKept = $state.raw(true);

	readonly answerA: Answer | undefined = $derived.by(() => this.#answer(this.#cases.A));
	readonly answerB: Answer | undefined = $derived.by(() => this.#answer(this.#cases.B));
	readonly curve: SweptCurve | undefined = $derived.by(() =>
		this.#sweep === undefined ? undefined : sweepCurve(this.calculator, this.typed, this.#sweep),
	);

	constructor(calculator: Calculator, shelf: Shelf, linked?: TypedInputs) {
		this.calculator = calculator;
		this.name = `${calculator.id}@${calculator.version}`;
		this.#shelf = shelf;
		const kept = keptCases(shelf, this.name);
		if (kept !== undefined) this.#cases = kept;
		if (linked !== undefined) this.#replace(linked);
	}

	/** The case that is open. */
	get open(): Case {
		return this.#open;
	}

	get typed(): TypedInputs {
		return this.#cases[this.#open] ?? {};
	}

	get answer(): Answer | undefined {
		return this.#open === 'A' ? this.answerA : this.answerB;
	}

	get isComparing(): boolean {
		return this.#cases.B !== undefined;
	}

	/** What stood here before an example, a link or a clearing took its place. */
	get before(): TypedInputs | undefined {
		return this.#cases.before;
	}

	get sweep(): Sweep | undefined {
		return this.#sweep;
	}

	/** False when this tablet refused to keep what is typed: it is then lost when the page is left. */
	get isKept(): boolean {
		return this.#isKept;
	}

	/** Inputs that are typed differently in the two cases. */
	get changed(): readonly string[] {
		const { A, B = {} } = this.#cases;
		const differs = (at: string): boolean => JSON.stringify(A[at]) !== JSON.stringify(B[at]);
		return [...Object.keys(A), ...Object.keys(B).filter((at) => A[at] === undefined)].filter(differs);
	}

	type(typed: TypedInputs): void {
		this.#keep({ ...this.#cases, [this.#open]: typed });
	}

	showExample(): void {
		const { example } = this.calculator.page;
		if (example !== undefined) this.#replace(typedFrom(this.calculator, example));
	}

	clear(): void {
		this.#replace({});
	}

	takeBack(): void {
		const { before } = this.#cases;
		if (before !== undefined) this.#replace(before);
	}

	/** A second case begins as the first, so that one input is changed and the difference seen. */
	compare(): void {
		this.#keep({ ...this.#cases, B: this.#cases.B ?? this.#cases.A });
		this.#open = 'B';
	}

	choose(open: Case): void {
		if (open === 'A' || this.isComparing) this.#open = open;
	}

	endComparison(): void {
		const { B: _ended, ...cases } = this.#cases;
		this.#open = 'A';
		this.#keep(cases);
	}

	draw(sweep: Sweep | undefined): void {
		this.#sweep = sweep;
	}

	#replace(typed: TypedInputs): void {
		const stood = this.typed;
		const before = Object.keys(stood).length > 0 && JSON.stringify(stood) !== JSON.stringify(typed) ? stood : undefined;
		this.#keep({ ...this.#cases, [this.#open]: typed, ...(before === undefined ? {} : { before }) });
	}

	#keep(cases: Cases): void {
		this.#cases = cases;
		this.#isKept = keepCases(this.#shelf, this.name, cases);
	}

	#answer(typed: TypedInputs | undefined): Answer | undefined {
		const inputs = inputsFrom(this.calculator, typed ?? {});
		return Object.keys(inputs).length === 0 ? undefined : runCalculator(this.name, inputs);
	}
}
