/** A formula as a tree, ready for MathML on a screen. */
export type Typeset =
	| { readonly kind: 'row'; readonly of: readonly Typeset[] }
	/** A quantity, slanted: q, Δp. */
	| { readonly kind: 'letter'; readonly text: string }
	/** Upright: ln, Re, a subscript that is a word. */
	| { readonly kind: 'name'; readonly text: string }
	| { readonly kind: 'number'; readonly text: string }
	| { readonly kind: 'sign'; readonly text: string }
	| { readonly kind: 'gap' }
	| { readonly kind: 'fraction'; readonly over: Typeset; readonly under: Typeset }
	| { readonly kind: 'root'; readonly of: Typeset }
	| { readonly kind: 'script'; readonly base: Typeset; readonly below?: Typeset; readonly above?: Typeset };

/**
 * Reads the notation in which calculators write their formulas: `q_m = frac{C ε}{sqrt{1 − β^4}} d^2`. One letter is a
 * quantity, several are a name, `_` and `^` take what follows or a group in braces, a space is a product.
 */
export function typeset(notation: string): Typeset {
	const tokens = [...notation.matchAll(TOKEN)].map(([token]) => token);
	let at = 0;
	const next = (): string | undefined => tokens[at];

	function row(end?: string): Typeset {
		const of: Typeset[] = [];
		while (next() !== undefined && next() !== end) of.push(scripted());
		at += 1;
		return of.length === 1 && of[0] !== undefined ? of[0] : { kind: 'row', of };
	}

	function scripted(): Typeset {
		const base = single();
		let below: Typeset | undefined;
		let above: Typeset | undefined;
		while (next() === '_' || next() === '^') {
			const mark = tokens[at++];
			if (mark === '_') below = single();
			else above = single();
		}
		if (below === undefined && above === undefined) return base;
		return {
			kind: 'script',
			base,
			...(below === undefined ? {} : { below }),
			...(above === undefined ? {} : { above }),
		};
	}

	function single(): Typeset {
		const token = tokens[at++] ?? '';
		if (token === '{') return row('}');
		if (token === 'sqrt') return { kind: 'root', of: single() };
		if (token === 'frac') {
			const over = single();
			return { kind: 'fraction', over, under: single() };
		}
		if (token.trim() === '') return { kind: 'gap' };
		if (/^\d/.test(token)) return { kind: 'number', text: token };
		if (!/^[\p{L}]/u.test(token)) return { kind: 'sign', text: token };
		return { kind: token.replace(/^Δ/, '').length === 1 ? 'letter' : 'name', text: token };
	}

	return row();
}

/** Letters hang together, digits hang together, spaces are one gap; all else stands alone. */
const TOKEN = /\p{L}+|\d+(?:\.\d+)?|\s+|./gu;

/**
 * A calculator's symbol in this notation. Symbols are written in files as words, "epsilon", "rho1", "q_n,dry", and stay so
 * in stored results; here they become ε, ρ with the index 1, q with the index n,dry.
 */
export function symbolNotation(symbol: string): string {
	const greek = symbol.replace(GREEK_WORD, (word) => GREEK[word] ?? word).replace(/^dp(?=_|$)/, 'Δp');
	const known = INDEXED[greek];
	if (known !== undefined) return known;
	const [, base = greek, digits] = /^(\D+?)_?(\d+)$/.exec(greek) ?? [];
	if (digits !== undefined && !base.includes('_')) return `${base}_${digits}`;
	const [first = '', ...rest] = greek.split('_');
	return rest.length === 0 ? first : `${first}_{${rest.join('_').replaceAll(',', ', ')}}`;
}

const GREEK: { readonly [word: string]: string } = {
	alpha: 'α',
	beta: 'β',
	delta: 'δ',
	epsilon: 'ε',
	kappa: 'κ',
	lambda: 'λ',
	mu: 'μ',
	phi: 'φ',
	rho: 'ρ',
	sigma: 'σ',
	tau: 'τ',
};
const GREEK_WORD = new RegExp(`^(?:${Object.keys(GREEK).join('|')})(?![a-z])`);

const INDEXED: { readonly [symbol: string]: string } = {
	H2O: 'H_2 O',
	C0: 'C_0',
	Ci: 'C_i',
	Ct: 'C_t',
	dw: 'Δω',
	dw_min: 'Δω_min',
	dw_max: 'Δω_max',
};
