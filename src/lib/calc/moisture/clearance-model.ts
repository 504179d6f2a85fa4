import { pressureOf } from '../gas/static-pressure';
import type { Numbers } from '../uncertainty';
import type { Surface } from './clearance-inputs';
import { dewPoint } from './dew-point';
import type { Moisture } from './stated-moisture';

/** The gas as it is, and as it will be with feed on; each undefined where nobody stated it. */
export type States = { readonly present: Moisture | undefined; readonly predicted: Moisture | undefined };

/** The surface with the lowest bound of its temperature: a poorly known wall counts as a cold one. */
export const coldestOf = (surfaces: readonly Surface[]): Surface =>
	surfaces.reduce((coldest, each) => (lowerBound(each) < lowerBound(coldest) ? each : coldest));

const lowerBound = ({ temperature: { value, U = 0 } }: Surface): number => value - U;

/** Moistures, dew points and clearances as one function of what was read; a dry gas has no dew point and no entry. */
export const clearanceModel =
	(states: States) =>
	(values: Numbers): Numbers => {
		const pressure = pressureOf(values);
		const coldestTemperature = values.surface ?? NaN;
		const of = (moisture: Moisture | undefined) => {
			const x = moisture?.at(values);
			const dew = x === undefined ? undefined : dewPoint(x, pressure);
			const T = dew?.ok === true && dew.value.kind !== 'none' ? dew.value.temperature : undefined;
			return { x, T, clearance: T === undefined ? undefined : coldestTemperature - T };
		};
		const [present, predicted] = [of(states.present), of(states.predicted)];
		const clearances = [present.clearance, predicted.clearance].filter((each) => each !== undefined);
		const all = {
			coldestTemperature,
			waterVapour: present.x,
			predictedWaterVapour: predicted.x,
			dewPoint: present.T,
			predictedDewPoint: predicted.T,
			clearance: present.clearance,
			predictedClearance: predicted.clearance,
			leastClearance: clearances.length === 0 ? undefined : Math.min(...clearances),
		};
		return Object.fromEntries(
			Object.entries(all).flatMap(([name, value]) => (value === undefined ? [] : [[name, value]])),
		);
	};
