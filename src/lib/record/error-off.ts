import { fromSi, parseNumber, quantitiesIn, toSi } from '../quantity';

/** As found by a check: reading minus true value, so that a negative error reads low. */
export type AsFoundError = { readonly error: string; readonly unit: string };

/** A value as typed with the error of its instrument taken off: 7.6 by one that reads 0.6 low was 8.2. */
export function withErrorOff(
	typed: string,
	unit: string,
	{ error, unit: errorUnit }: AsFoundError,
): string | undefined {
	const [value, off] = [parseNumber(typed), parseNumber(error)];
	if (!value.ok || !off.ok) return undefined;
	const same = unit === errorUnit ? off.value : inUnit(error, errorUnit, unit);
	if (same === undefined) return undefined;
	const decimals = Math.max(decimalsOf(typed), decimalsOf(error));
	return (value.value - same).toFixed(decimals).replace('-', '−');
}

/** An error in another unit of the same quantity. */
function inUnit(value: string, from: string, to: string): number | undefined {
	for (const quantity of quantitiesIn(from)) {
		const si = toSi({ value, unit: from }, quantity);
		const shown = si.ok ? fromSi(si.value.value, quantity, to) : si;
		if (shown.ok) return shown.value;
	}
	return undefined;
}

const decimalsOf = (typed: string): number => /[.,](\d+)/.exec(typed)?.[1]?.length ?? 0;
