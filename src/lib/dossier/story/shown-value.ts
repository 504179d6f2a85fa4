import { CATALOGUE, type CalcValue, type OutputSpec } from '../../calc';
import { fromSi, isQuantityName, shownUnit, type QuantityName } from '../../quantity';
import { sayNumber } from '../../wording';

/** What an output of a calculator is: "AT-211.floor" is the floor of one place. */
export function outputOf(calc: string, name: string): OutputSpec | undefined {
	const outputs = (Object.hasOwn(CATALOGUE, calc) ? CATALOGUE[calc] : undefined)?.outputs ?? [];
	const last = name.slice(name.lastIndexOf('.') + 1);
	return outputs.find((output) => output.name === name) ?? outputs.find((output) => output.name === `{place}.${last}`);
}

/** A number of a result as people read it, with its expanded uncertainty. */
export function shownValue({ value, unit, U, because }: CalcValue, quantity: string): string {
	if (value === null) return because ?? '–';
	const plain = () => printed(sayNumber(value), U === undefined ? undefined : sayNumber(U), unit);
	const better = isQuantityName(quantity) ? BETTER[quantity] : undefined;
	if (better === undefined || !isQuantityName(quantity)) return plain();
	const shown = fromSi(value, quantity, better);
	// An uncertainty is a difference: it is not shifted as a temperature is.
	const spread =
		U === undefined ? undefined : fromSi(U, quantity === 'temperature' ? 'temperature-difference' : quantity, better);
	if (!shown.ok) return plain();
	return printed(sayNumber(shown.value), spread?.ok === true ? sayNumber(spread.value) : undefined, better);
}

const printed = (value: string, U: string | undefined, unit: string): string =>
	[U === undefined ? value : `${value}\u00a0±\u00a0${U}`, shownUnit(unit)].filter((part) => part !== '').join('\u00a0');

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
};
