import type { InputPart } from '../../calc';
import { fromSi, isQuantityName } from '../../quantity';
import { sayNumber, type Say } from '../../wording';

export type FieldKind = 'choice' | 'yes or no' | 'number' | 'list' | 'text' | 'data';

/** How an input is typed; what is no number, choice or text is pasted as data. */
export function fieldKind({ quantity, choices }: InputPart): FieldKind {
	if (choices !== undefined) return 'choice';
	if (quantity === 'yes or no' || quantity === 'text') return quantity;
	if (isQuantityName(quantity)) return 'number';
	return isQuantityName(quantity.replace(/^list of /, '')) ? 'list' : 'data';
}

/** The range that is accepted, in the unit that is being typed in; what goes without saying is not said. */
export function rangeOf({ quantity, min, max }: InputPart, unit: string, say: Say): string {
	const shown = (si: number | undefined): string | undefined => {
		if (si === undefined || !isQuantityName(quantity)) return undefined;
		const value = fromSi(si, quantity, unit);
		return value.ok && Math.abs(value.value) < BEYOND_WORDS ? sayNumber(value.value, say) : undefined;
	};
	if (min === 0 && max === 1) return '';
	const [from, to] = [min === 0 || !isTiny(min) ? shown(min) : undefined, shown(max)];
	if (from !== undefined && to !== undefined) return say('ui.calc.range', { from, to });
	if (from !== undefined) return min === 0 ? '' : say('ui.calc.range from', { from });
	return to === undefined ? '' : say('ui.calc.range to', { to });
}

/** A lower end that only keeps zero out goes without saying. */
const isTiny = (min: number | undefined): boolean => min !== undefined && min > 0 && min <= 1e-3;

const BEYOND_WORDS = 1e6;
