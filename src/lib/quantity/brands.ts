import type { QuantityName } from './names';

declare const quantity: unique symbol;

/** A finite number in the SI unit of its quantity: a wet oxygen fraction does not fit where a dry one is asked for. */
export type Si<Q extends QuantityName> = number & { readonly [quantity]: Q };

export type PascalAbsolute = Si<'pressure-absolute'>;
export type PascalGauge = Si<'pressure-gauge'>;
export type PascalDifference = Si<'pressure-difference'>;
export type Kelvin = Si<'temperature'>;
export type KelvinDifference = Si<'temperature-difference'>;

/**
 * Names the meaning of a number that is already in SI units. What comes from outside goes through `toSi` instead;
 * here a number that is not finite is a mistake of the program.
 */
export function si<Q extends QuantityName>(name: Q, value: number): Si<Q> {
	if (!Number.isFinite(value)) throw new TypeError(`${name}: ${String(value)} is not a finite number`);
	return value as Si<Q>;
}

export const pascalAbsolute = (value: number): PascalAbsolute => si('pressure-absolute', value);
export const pascalGauge = (value: number): PascalGauge => si('pressure-gauge', value);
export const pascalDifference = (value: number): PascalDifference => si('pressure-difference', value);
export const kelvin = (value: number): Kelvin => si('temperature', value);
export const kelvinDifference = (value: number): KelvinDifference => si('temperature-difference', value);
