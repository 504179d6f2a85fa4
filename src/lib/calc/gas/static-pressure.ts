import { fail, ok, type Result } from '../../base';
import { absolutePressure, type InSi } from '../../quantity';
import type { Refusal } from '../calculator';
import { measured, optional } from '../read-inputs';
import type { Numbers, Uncertain } from '../uncertainty';

/** The three inputs that tell an absolute pressure: itself, or a gauge pressure with the barometer of the hour. */
export const pressureInputs = (place: string) => ({
	pressure: optional(
		measured({
			symbol: 'p',
			label: 'Pressure, absolute',
			means: `absolute pressure ${place}`,
			quantity: 'pressure-absolute',
			min: 1e3,
			max: 1e7,
			from: 'reading',
		}),
	),
	pressureGauge: optional(
		measured({
			symbol: 'p_g',
			label: 'Pressure, gauge',
			means: `gauge pressure ${place}; needs the barometer`,
			quantity: 'pressure-gauge',
			from: 'reading',
		}),
	),
	barometer: optional(
		measured({
			symbol: 'p_b',
			label: 'Barometer',
			means: 'absolute pressure of the air outside, at this place and hour',
			quantity: 'pressure-absolute',
			min: 5e4,
			max: 1.1e5,
			from: 'reading',
		}),
	),
});

type PressureGiven = {
	readonly pressure: InSi<'pressure-absolute'> | undefined;
	readonly pressureGauge: InSi<'pressure-gauge'> | undefined;
	readonly barometer: InSi<'pressure-absolute'> | undefined;
};

/** The pressure as the inputs of a model that make it up; a gauge pressure alone is refused. */
export function staticPressure(given: PressureGiven): Result<readonly Uncertain[], readonly Refusal[]> {
	const { pressure, pressureGauge, barometer } = given;
	if ((pressure === undefined) === (pressureGauge === undefined)) {
		return fail([{ kind: 'one-of', inputs: ['pressure', 'pressureGauge'], given: pressure === undefined ? 0 : 2 }]);
	}
	if (pressure !== undefined) return ok([{ ...pressure, name: 'pressure', symbol: 'p', unit: 'Pa(a)' }]);
	if (pressureGauge === undefined || barometer === undefined) {
		return fail([{ kind: 'gauge-without-barometer', input: 'pressureGauge', needs: 'barometer' }]);
	}
	const absolute = absolutePressure(pressureGauge.value, barometer.value);
	if (!absolute.ok) return fail([{ input: 'pressureGauge', ...absolute.error }]);
	return ok([
		{ ...pressureGauge, name: 'pressureGauge', symbol: 'p_g', unit: 'Pa(g)' },
		{ ...barometer, name: 'barometer', symbol: 'p_b', unit: 'Pa(a)' },
	]);
}

/** Absolute pressure of a set of model values [Pa]. */
export const pressureOf = ({ pressure, pressureGauge = NaN, barometer = NaN }: Numbers): number =>
	pressure ?? pressureGauge + barometer;
