import { CATALOGUE, type CalcValue, type OutputSpec } from '../../calc';
import { fromSi, isQuantityName, print, shownUnit, type QuantityName } from '../../quantity';
import { sayNumber, withMark, type Say } from '../../wording';

/** What an output of a calculator is: "AT-211.floor" is the floor of one place. */
export function outputOf(calc: string, name: string): OutputSpec | undefined {
	const outputs = (Object.hasOwn(CATALOGUE, calc) ? CATALOGUE[calc] : undefined)?.outputs ?? [];
	const last = name.slice(name.lastIndexOf('.') + 1);
	return outputs.find((output) => output.name === name) ?? outputs.find((output) => output.name === `{place}.${last}`);
}

/** Names of results in the order in which their calculator says them; canonical JSON has put them into that of the alphabet. */
export function inOrderOf(calc: string, names: readonly string[]): readonly string[] {
	const outputs = (Object.hasOwn(CATALOGUE, calc) ? CATALOGUE[calc] : undefined)?.outputs.map(({ name }) => name) ?? [];
	const place = (name: string): number => {
		const at = outputs.findIndex((output) => output === name || output.endsWith(`.${name}`));
		return at === -1 ? outputs.length : at;
	};
	return [...names].sort((a, b) => place(a) - place(b));
}

/** A number of a result in the unit that a step asks for. */
export function shownIn(value: CalcValue, quantity: string, unit: string, say: Say): string {
	const shown = value.value === null || !isQuantityName(quantity) ? undefined : fromSi(value.value, quantity, unit);
	return shown?.ok === true ? printed(shown.value, undefined, unit, say) : shownValue(value, quantity, say);
}

/** A number of a result as people read it, with its expanded uncertainty. */
export function shownValue({ value, unit, U: given, because }: CalcValue, quantity: string, say: Say): string {
	if (value === null) return because ?? '–';
	// What is left of an uncertainty that is none after rounding in the last bit.
	const U = given === undefined || given < Math.abs(value) * 1e-9 ? undefined : given;
	const plain = () => printed(value, U, unit, say);
	const better = isQuantityName(quantity) ? BETTER[quantity] : undefined;
	if (better === undefined || !isQuantityName(quantity)) return plain();
	const shown = fromSi(value, quantity, better);
	// An uncertainty is a difference: it is not shifted as a temperature is.
	const spread =
		U === undefined ? undefined : fromSi(U, quantity === 'temperature' ? 'temperature-difference' : quantity, better);
	if (!shown.ok) return plain();
	return printed(shown.value, spread?.ok === true ? spread.value : undefined, better, say);
}

/** An uncertainty has two digits that mean something, and its value none beyond them (JCGM 100, 7.2.6; from memory, verify). */
function printed(value: number, U: number | undefined, unit: string, say: Say): string {
	const said = U === undefined || !(U > 0) ? sayNumber(value, say) : withSpread(value, U, say);
	return [said, shownUnit(unit)].filter((part) => part !== '').join('\u00a0');
}

function withSpread(value: number, U: number, say: Say): string {
	const decimals = Math.min(12, Math.max(0, 1 - Math.floor(Math.log10(U))));
	if (Math.abs(value) < 1e-3 || U < 1e-6)
		return `${sayNumber(value, say)}\u00a0±\u00a0${sayNumber(Number(U.toPrecision(2)), say)}`;
	return `${withMark(print(value, '1', decimals), say)}\u00a0±\u00a0${withMark(print(U, '1', decimals), say)}`;
}

const BETTER: { readonly [quantity in QuantityName]?: string } = {
	temperature: 'degC',
	fraction: '%',
	'oxygen-wet': '%',
	'oxygen-dry': '%',
	'water-vapour': '%',
	'water-vapour-dry': '%',
	'volume-flow': 'm3/h',
	'volume-flow-normal-wet': 'm3(n)/h',
	'volume-flow-normal-dry': 'm3(n)/h',
	time: 'min',
	rate: '1/h',
};

/** A symbol as it stands in the source: Greek letters by their sign. */
export const shownSymbol = (symbol: string): string =>
	symbol.replace(/^(epsilon|beta|tau|rho|mu|kappa|lambda|alpha|delta|phi)(?![a-z])/, (name) => GREEK[name] ?? name);

const GREEK: { readonly [name: string]: string } = {
	alpha: 'α',
	beta: 'β',
	delta: 'δ',
	epsilon: 'ε',
	kappa: 'κ',
	lambda: 'λ',
	mu: 'μ',
	phi: 'φ',
	rho: 'ρ',
	tau: 'τ',
};
