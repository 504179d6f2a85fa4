import { fail, ok, type Result } from '../base';
import { si, type PascalAbsolute, type PascalGauge, type Si } from './brands';
import type { QuantityName } from './names';
import { parseNumber, type NumberError, type NumberStyle } from './parse-number';
import { quantitiesIn, unitFor, unitsFor } from './units';

/** A value as somebody typed it or an instrument showed it. `U` is its expanded uncertainty (k = 2) in the same unit. */
export type Measure = {
	readonly value: string | number;
	readonly unit: string;
	readonly U?: string | number | undefined;
};

/** The same value in the SI unit of its quantity. */
export type InSi<Q extends QuantityName> = { readonly value: Si<Q>; readonly U?: number };

export type QuantityError =
	| (NumberError & { readonly part: 'value' | 'U' })
	| { readonly kind: 'negative-uncertainty'; readonly U: number }
	| {
			readonly kind: 'unknown-unit';
			readonly unit: string;
			readonly quantity: QuantityName;
			readonly known: readonly string[];
	  }
	/** The unit exists, but for something else: bar(g) where an absolute pressure is asked for. */
	| {
			readonly kind: 'wrong-quantity';
			readonly unit: string;
			readonly quantity: QuantityName;
			readonly isFor: readonly QuantityName[];
	  }
	| { readonly kind: 'below-absolute-zero'; readonly value: number; readonly unit: string }
	| { readonly kind: 'below-vacuum'; readonly value: number; readonly unit: string };

/** From the typed value to the SI value of one quantity. Nothing is guessed: not the unit, not the basis, not the barometer. */
export function toSi<Q extends QuantityName>(
	measure: Measure,
	quantity: Q,
	style?: NumberStyle,
): Result<InSi<Q>, QuantityError> {
	const unit = unitFor(quantity, measure.unit);
	if (unit === undefined) return fail(unitError(measure.unit, quantity));
	const typed = numberOf(measure.value, 'value', style);
	if (!typed.ok) return typed;
	const value = ((typed.value + unit.offset) * unit.times) / unit.per;
	if (!Number.isFinite(value)) return fail({ kind: 'number-too-large', text: String(measure.value), part: 'value' });
	if (quantity === 'temperature' && !(value > 0)) {
		return fail({ kind: 'below-absolute-zero', value: typed.value, unit: unit.symbol });
	}
	if (quantity === 'pressure-absolute' && !(value >= 0)) {
		return fail({ kind: 'below-vacuum', value: typed.value, unit: unit.symbol });
	}
	if (measure.U === undefined) return ok({ value: si(quantity, value) });

	const typedU = numberOf(measure.U, 'U', style);
	if (!typedU.ok) return typedU;
	if (!(typedU.value >= 0)) return fail({ kind: 'negative-uncertainty', U: typedU.value });
	return ok({ value: si(quantity, value), U: (typedU.value * unit.times) / unit.per });
}

/** @returns the number to show in `unit`; the quantity says whether 20 degC is a temperature or a difference of two */
export function fromSi(value: number, quantity: QuantityName, unitText: string): Result<number, QuantityError> {
	const unit = unitFor(quantity, unitText);
	if (unit === undefined) return fail(unitError(unitText, quantity));
	const shown = (value * unit.per) / unit.times - unit.offset;
	if (!Number.isFinite(shown)) return fail({ kind: 'number-too-large', text: String(value), part: 'value' });
	return ok(shown);
}

/** The only way from a gauge pressure to an absolute one: with the barometer of the place and the hour. */
export function absolutePressure(gauge: PascalGauge, barometer: PascalAbsolute): Result<PascalAbsolute, QuantityError> {
	const value = gauge + barometer;
	return value > 0 ? ok(si('pressure-absolute', value)) : fail({ kind: 'below-vacuum', value, unit: 'Pa(a)' });
}

function numberOf(
	typed: string | number,
	part: 'value' | 'U',
	style: NumberStyle | undefined,
): Result<number, QuantityError> {
	if (typeof typed === 'number') {
		if (Number.isFinite(typed)) return ok(typed);
		return fail({ kind: 'not-a-number', text: String(typed), at: 0, expected: 'a finite number', part });
	}
	const read = parseNumber(typed, style);
	return read.ok ? read : fail({ ...read.error, part });
}

function unitError(unit: string, quantity: QuantityName): QuantityError {
	const isFor = quantitiesIn(unit);
	return isFor.length > 0
		? { kind: 'wrong-quantity', unit, quantity, isFor }
		: { kind: 'unknown-unit', unit, quantity, known: unitsFor(quantity) };
}
