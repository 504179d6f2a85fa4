import {
	inputsFrom,
	runCalculator,
	usualUnit,
	type Calculator,
	type InputSpec,
	type Plot,
	type TypedInputs,
} from '../calc';
import { fromSi, isQuantityName, parseNumber, shownUnit } from '../quantity';

/** One input is varied from here to there, in the unit it is typed in, and one output watched. */
export type Sweep = { readonly input: string; readonly from: string; readonly to: string; readonly output: string };

/** A curve, or why there is none: the range is not two numbers, or the calculator refused all of it. */
export type SweptCurve =
	| { readonly plot: Plot; readonly refused: number; readonly all: number }
	| { readonly because: 'no range' | 'all refused' };

const POINTS = 61;

/** How an output follows one input while everything else stays as it is typed; what is refused is a gap in the curve. */
export function sweepCurve(calculator: Calculator, typed: TypedInputs, sweep: Sweep): SweptCurve {
	const input = calculator.inputs.find(({ name }) => name === sweep.input);
	const output = calculator.outputs.find(({ name }) => name === sweep.output);
	const [from, to] = [parseNumber(sweep.from), parseNumber(sweep.to)];
	if (input === undefined || output === undefined || !from.ok || !to.ok || from.value === to.value)
		return { because: 'no range' };
	const unit = typed[input.name]?.unit ?? usualUnit(input);
	const shownIn = usualUnit(output);
	const x = Array.from({ length: POINTS }, (_, i) => from.value + ((to.value - from.value) * i) / (POINTS - 1));
	const y = x.map((value) => {
		const field = { ...typed[input.name], text: String(value), unit };
		const result = runCalculator(
			`${calculator.id}@${calculator.version}`,
			inputsFrom(calculator, { ...typed, [input.name]: field }),
		);
		const found = result.ok ? result.value.values[output.name]?.value : undefined;
		if (typeof found !== 'number' || !isQuantityName(output.quantity)) return found ?? Number.NaN;
		const shown = fromSi(found, output.quantity, shownIn);
		return shown.ok ? shown.value : Number.NaN;
	});
	const refused = y.filter((value) => !Number.isFinite(value)).length;
	if (refused === POINTS) return { because: 'all refused' };
	const known = x.map((value, i) => ({ x: value, y: y[i] ?? Number.NaN }));
	return {
		refused,
		all: POINTS,
		plot: {
			id: 'sweep',
			title: calculator.title,
			x: { label: input.label ?? input.means, unit: shownUnit(unit) },
			y: { label: output.means, unit: shownUnit(shownIn) },
			curves: [
				{
					...{ id: output.name, label: '', kind: 'line', decides: true },
					x: known.map((point) => point.x),
					y: known.map((point) => point.y),
				},
			],
			marks: markOf(typed, input),
		},
	};
}

/** Where the input stands now. */
function markOf(typed: TypedInputs, { name }: InputSpec): Plot['marks'] {
	const now = parseNumber(typed[name]?.text ?? '');
	return now.ok ? [{ kind: 'event', label: typed[name]?.text ?? '', axis: 'x', at: now.value }] : [];
}

/** Inputs that a curve can be drawn over: numbers with a value, which spans the range offered first. */
export function sweepable(
	calculator: Calculator,
	typed: TypedInputs,
): readonly { readonly input: InputSpec; readonly from: string; readonly to: string }[] {
	const { inputs, page } = calculator;
	const order = ({ name }: InputSpec): number => (page.first.includes(name) ? page.first.indexOf(name) : inputs.length);
	const inOrder = [...inputs].sort((a, b) => order(a) - order(b));
	return inOrder.flatMap((input) => {
		const now = parseNumber(typed[input.name]?.text ?? '');
		if (!isQuantityName(input.quantity) || !now.ok) return [];
		const around = now.value === 0 ? 1 : Math.abs(now.value) / 2;
		const ends = [now.value - around, now.value + around].map((end) => String(Number(end.toPrecision(3))));
		return [{ input, from: ends[0] ?? '', to: ends[1] ?? '' }];
	});
}
