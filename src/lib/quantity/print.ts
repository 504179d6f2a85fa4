import { shownUnit } from './units';

/**
 * A number and its unit as people read them: fixed decimals, groups of three from five digits on, no-break spaces,
 * a true minus sign. The value is already in `unit`; rounding happens here and nowhere before.
 */
export function print(value: number, unit: string, decimals: number, decimalMark: '.' | ',' = '.'): string {
	if (!Number.isFinite(value)) throw new TypeError(`${String(value)} cannot be shown`);
	const shown = shownUnit(unit);
	return `${printNumber(value, decimals, decimalMark)}${shown === '' ? '' : NO_BREAK_SPACE}${shown}`;
}

function printNumber(value: number, decimals: number, decimalMark: '.' | ','): string {
	const [whole = '', rest] = Math.abs(value).toFixed(decimals).split('.');
	const grouped = whole.length < 5 ? whole : whole.replaceAll(/\B(?=(?:\d{3})+$)/g, NO_BREAK_SPACE);
	const isNegative = value < 0 && /[1-9]/.test(whole + (rest ?? ''));
	return `${isNegative ? MINUS : ''}${grouped}${rest === undefined ? '' : decimalMark + rest}`;
}

const NO_BREAK_SPACE = '\u00a0';
const MINUS = '\u2212';
