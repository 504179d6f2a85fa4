import type { QuantityName } from '../quantity';

/** What a guard, a resolution or an uncertainty of this quantity is: 5 K of a temperature is a difference, not 5 K warm. */
export function differenceOf(quantity: QuantityName): QuantityName {
	if (quantity === 'temperature') return 'temperature-difference';
	return quantity.startsWith('pressure-') ? 'pressure-difference' : quantity;
}
