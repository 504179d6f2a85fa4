import type { CalcNote, Refusal } from '../calculator';
import { pressureOf } from '../gas/static-pressure';
import type { Numbers } from '../uncertainty';
import type { ClearanceGiven } from './clearance-inputs';
import type { States } from './clearance-model';
import { dewPoint } from './dew-point';

/** Refused: moisture beyond the range of the equations, and a present gas that is below its own dew point already. */
export function stateRefusals(given: ClearanceGiven, states: States, values: Numbers): readonly Refusal[] {
	const pressure = pressureOf(values);
	return Object.entries(states).flatMap(([state, moisture]): readonly Refusal[] => {
		if (moisture === undefined) return [];
		const waterVapour = moisture.at(values);
		const input = moisture.input.name;
		const dew = dewPoint(waterVapour, pressure);
		if (!dew.ok) return [{ ...dew.error, input }];
		const gas = given.gasTemperature?.value;
		if (state !== 'present' || gas === undefined || dew.value.kind === 'none') return [];
		if (dew.value.temperature <= gas) return [];
		return [{ kind: 'already-condensing', input, waterVapour, dewPoint: dew.value.temperature, gasTemperature: gas }];
	});
}

export function surfaceNotes({ surfaces, oldest, filter }: ClearanceGiven): readonly CalcNote[] {
	const old = surfaces.filter(({ age }) => age !== undefined && age > oldest.value).map(({ name }) => name);
	const ageless = surfaces.filter(({ age }) => age === undefined).map(({ name }) => name);
	return [
		...(old.length > 0
			? [{ kind: 'surface-reading-old', level: 'warning', surfaces: old, limit: oldest.value } as const]
			: []),
		...(ageless.length > 0
			? [{ kind: 'surface-reading-without-age', level: 'remark', surfaces: ageless } as const]
			: []),
		...(filter === 'cold' ? [{ kind: 'filter-cold', level: 'warning' } as const] : []),
	];
}

export function stateNotes(given: ClearanceGiven, states: States, now: Numbers): readonly CalcNote[] {
	const notes: CalcNote[] = [];
	const { waterVapour, predictedWaterVapour, dewPoint: present, predictedDewPoint: predicted } = now;
	if (states.present === undefined) notes.push({ kind: 'present-state-not-stated', level: 'warning' });
	if (waterVapour !== undefined && predictedWaterVapour !== undefined && predictedWaterVapour < waterVapour) {
		notes.push({ kind: 'predicted-drier-than-present', level: 'warning', waterVapour, predictedWaterVapour });
	}
	for (const [state, T] of Object.entries({ present, predicted })) {
		if (T !== undefined && T < FREEZING) notes.push({ kind: 'frost-point', level: 'remark', state, temperature: T });
	}
	const gas = given.gasTemperature?.value;
	if (gas !== undefined && predicted !== undefined && predicted > gas) {
		notes.push({ kind: 'gas-below-predicted-dew-point', level: 'warning', gasTemperature: gas, dewPoint: predicted });
	}
	return notes;
}

/** Triple point of water: below it the gas makes rime. */
const FREEZING = 273.16;
