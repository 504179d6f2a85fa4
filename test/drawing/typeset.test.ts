import { expect, test } from 'vitest';
import { CATALOGUE } from '../../src/lib/calc';
import { symbolNotation, typeset, type Typeset } from '../../src/lib/drawing';

const letter = (text: string): Typeset => ({ kind: 'letter', text });
const number = (text: string): Typeset => ({ kind: 'number', text });

test('a formula becomes a tree of fractions, roots and indices', () => {
	expect(typeset('q_m = frac{C}{sqrt{1 − β^4}}')).toEqual({
		kind: 'row',
		of: [
			{ kind: 'script', base: letter('q'), below: letter('m') },
			{ kind: 'gap' },
			{ kind: 'sign', text: '=' },
			{ kind: 'gap' },
			{
				kind: 'fraction',
				over: letter('C'),
				under: {
					kind: 'root',
					of: {
						kind: 'row',
						of: [
							number('1'),
							{ kind: 'gap' },
							{ kind: 'sign', text: '−' },
							{ kind: 'gap' },
							{ kind: 'script', base: letter('β'), above: number('4') },
						],
					},
				},
			},
		],
	});
});

test('a difference is one quantity, and a word is a name', () => {
	expect(typeset('Δp ln x')).toEqual({
		kind: 'row',
		of: [letter('Δp'), { kind: 'gap' }, { kind: 'name', text: 'ln' }, { kind: 'gap' }, letter('x')],
	});
});

test.each([
	['Q_L', 'Q_{L}'],
	['q_n,dry', 'q_{n, dry}'],
	['rho1', 'ρ_1'],
	['epsilon', 'ε'],
	['p1', 'p_1'],
	['C0', 'C_0'],
	['Ci', 'C_i'],
	['dp', 'Δp'],
	['SO3', 'SO_3'],
	['H2O', 'H_2 O'],
	['LOC', 'LOC'],
	['Re_D', 'Re_{D}'],
	['λ', 'λ'],
])('the symbol %s is printed as %s', (symbol, notation) => {
	expect(symbolNotation(symbol)).toBe(notation);
});

test.each(Object.entries(CATALOGUE))(
	'every formula and symbol of %s can be set: no brace is left over',
	(_, calculator) => {
		const symbols = [...calculator.inputs, ...calculator.outputs].flatMap(({ symbol }) => symbol ?? []);
		expect(calculator.page.formula.length).toBeGreaterThan(0);
		for (const notation of [...calculator.page.formula, ...symbols.map(symbolNotation)]) {
			expect(JSON.stringify(typeset(notation)), notation).not.toMatch(/"text":"(frac|sqrt|[{}_^])"/);
			expect(notation.split('{').length, notation).toBe(notation.split('}').length);
		}
	},
);
