import { expect, test } from 'vitest';
import { asHash, CalculatorDesk, fromHash, sayPlan, sweepable, type Shelf } from '../../src/lib/app';
import { CATALOGUE, typedFrom, type TypedInputs } from '../../src/lib/calc';
import { speaker } from '../../src/lib/wording';

const venturi = CATALOGUE['venturi-flow@1']!;
const example = typedFrom(venturi, venturi.page.example!);

class Drawer implements Shelf {
	readonly kept = new Map<string, string>();
	getItem(key: string): string | null {
		return this.kept.get(key) ?? null;
	}
	setItem(key: string, value: string): void {
		this.kept.set(key, value);
	}
}

test('what is typed into a calculator is there again when it is opened the next time, bad input too', () => {
	const shelf = new Drawer();
	const typed = { dp: { text: '4,6,2', unit: 'Pa' } };
	new CalculatorDesk(venturi, shelf).type(typed);
	const again = new CalculatorDesk(venturi, shelf);
	expect(again.typed).toEqual(typed);
	expect(again.answer?.ok).toBe(false);
	expect(new CalculatorDesk(CATALOGUE['sweep-purge@1']!, shelf).typed).toEqual({});
});

test('a tablet that cannot keep what is typed says so, and goes on calculating', () => {
	const full: Shelf = {
		getItem: () => 'no JSON at all',
		setItem: () => {
			throw new Error('full');
		},
	};
	const desk = new CalculatorDesk(venturi, full);
	desk.type(example);
	expect(desk.isKept).toBe(false);
	expect(desk.answer?.ok).toBe(true);
});

test('a link holds the inputs, and opening it loses nothing that stood here before', () => {
	const shelf = new Drawer();
	const mine: TypedInputs = { dp: { text: '300', unit: 'Pa' } };
	new CalculatorDesk(venturi, shelf).type(mine);
	const linked = fromHash(asHash(example));
	expect(linked).toEqual(example);
	const desk = new CalculatorDesk(venturi, shelf, linked);
	expect(desk.typed).toEqual(example);
	desk.takeBack();
	expect(desk.typed).toEqual(mine);
	expect(desk.before).toEqual(example);
});

test.each(['', '#', '#1.', '#1.%%%', '#1.bm8gSlNPTg', '#2.e30', `#1.${btoa('[1]')}`])(
	'the end of an address "%s" that holds no inputs is no input',
	(hash) => expect(fromHash(hash)).toBeUndefined(),
);

test('a unit with a sign that is no letter goes through a link unharmed', () => {
	const typed = { 'volumes[0].title': { text: 'Mühle 2 – Steigrohr' }, t: { text: '24,2', unit: 'degC', U: '0,5' } };
	expect(fromHash(asHash(typed))).toEqual(typed);
});

test('two cases begin alike; what is typed in the second leaves the first as it was', () => {
	const desk = new CalculatorDesk(venturi, new Drawer());
	desk.showExample();
	desk.compare();
	desk.type({ ...desk.typed, dp: { text: '1848', unit: 'Pa', U: '7' } });
	expect(desk.changed).toEqual(['dp']);
	const [a, b] = [desk.answerA, desk.answerB].map((answer) =>
		answer?.ok === true ? answer.value.values.massFlow?.value : undefined,
	);
	// Four times the difference pressure, twice the flow but for the expansion of the gas.
	expect(b! / a!).toBeGreaterThan(1.97);
	expect(b! / a!).toBeLessThan(2);
	desk.endComparison();
	expect(desk.typed).toEqual(example);
	expect(desk.isComparing).toBe(false);
});

test('a curve over one input passes through the result as typed, and has gaps where the calculator refuses', () => {
	const desk = new CalculatorDesk(venturi, new Drawer());
	desk.showExample();
	expect(sweepable(venturi, desk.typed).map(({ input }) => input.name)).toContain('dp');
	desk.draw({ input: 'dp', from: '-462', to: '924', output: 'volumeFlow' });
	const curve = desk.curve;
	if (curve === undefined || !('plot' in curve)) throw new Error('no curve');
	expect(curve.refused).toBe(20);
	const [line] = curve.plot.curves;
	const at = line!.x.findIndex((x) => Math.abs(x - 462) < 1e-9);
	const result = desk.answer;
	const flow = result?.ok === true ? result.value.values.volumeFlow?.value : undefined;
	expect(line!.y[at]).toBeCloseTo(flow! * 3600, 6);
});

test.each([
	['5', '5', 'no range'],
	['x', '9', 'no range'],
	['-9', '-1', 'all refused'],
])('a range from %s to %s draws nothing and says why', (from, to, because) => {
	const desk = new CalculatorDesk(venturi, new Drawer());
	desk.showExample();
	desk.draw({ input: 'dp', from, to, output: 'volumeFlow' });
	expect(desk.curve).toEqual({ because });
});

test('a plan is told in one sentence with its calculator, its results and what was typed', () => {
	const desk = new CalculatorDesk(venturi, new Drawer());
	desk.showExample();
	const answer = desk.answer;
	if (answer?.ok !== true) throw new Error('no result');
	const said = sayPlan({ calculator: venturi, result: answer.value, typed: desk.typed }, speaker('en'));
	expect(said).toContain('planned with venturi-flow@1');
	expect(said).toContain('Difference pressure 462 ± 7.4 Pa');
	expect(said).toMatch(/m³\/h/);
});
