import type { Plant } from '../../plant';
import { fieldsOf, type Field, type Procedure } from '../../procedure';
import { isQuantityName, parseNumber, toSi } from '../../quantity';
import { millis, type Millis, type RecordEvent, type Standing } from '../../record';
import type { Trends } from '../trend-files';
import { countedEntries } from './counted-entries';

export type OxygenReading = {
	readonly point: string;
	readonly typed: string;
	readonly unit: string;
	readonly number: number;
	readonly at: Millis;
};

export type WorstOxygen = OxygenReading & {
	/** The limit that the watch keeps at this place, as it is written, and its guard band. */
	readonly limit?: { readonly value: string; readonly guard: string; readonly margin: number };
	/** The reading of this place before. */
	readonly before?: OxygenReading;
};

type Told = {
	readonly procedure: Procedure;
	readonly plant: Plant;
	readonly events: readonly RecordEvent[];
	readonly standing: Standing;
	readonly trends: Trends;
};

/** Of the newest readings at all places in the circuit the one with the least room under its limit. */
export function worstOxygen(told: Told): WorstOxygen | undefined {
	const readings = oxygenReadings(told);
	const places = [...new Set(readings.map(({ point }) => point))].flatMap((point): WorstOxygen[] => {
		const own = readings.filter((each) => each.point === point);
		const last = own.at(-1);
		if (last === undefined) return [];
		const before = own.findLast(({ at }) => at < last.at);
		const limit = limitAt(last, told);
		return [{ ...last, ...(before === undefined ? {} : { before }), ...(limit === undefined ? {} : { limit }) }];
	});
	const roomOf = ({ limit, number }: WorstOxygen): number => limit?.margin ?? -number;
	return places.sort((a, b) => roomOf(a) - roomOf(b))[0];
}

/** Every oxygen value that was read in the circuit, oldest first; a reading of air at a probe is none. */
export function oxygenReadings(told: Told): readonly OxygenReading[] {
	return [...fromEntries(told), ...fromTrends(told)]
		.filter(({ at, number }) => at <= millis(told.standing.at) && Number.isFinite(number))
		.sort((a, b) => a.at - b.at);
}

function fromEntries({ procedure, plant, events, standing }: Told): readonly OxygenReading[] {
	return countedEntries(events, standing).flatMap(({ body, observedAt }) => {
		const step = procedure.steps.find(({ id }) => id === body.step);
		const fields = step === undefined ? [] : fieldsOf(step);
		return (body.values ?? []).flatMap(({ field, point, typed, unit, observed }) => {
			const asked = fields.find(({ id }) => id === field);
			if (point === undefined || !isOxygen(point, plant) || asked === undefined || isAir(asked, plant)) return [];
			const number = parseNumber(typed);
			const at = observed === undefined ? observedAt : millis(observed);
			return number.ok ? [{ point, typed, unit, number: number.value, at }] : [];
		});
	});
}

function fromTrends({ plant, events, trends }: Told): readonly OxygenReading[] {
	return events.flatMap((event) => {
		if (event.kind !== 'series attached') return [];
		const trend = trends.get(event.body.attachment.hash);
		return event.body.points
			.filter(({ point }) => isOxygen(point, plant))
			.flatMap(({ point, column, unit }) => {
				const values = trend?.columns.find(({ name }) => name === (column ?? point))?.values ?? [];
				// The end of a trend and its quarter before say where it is and where it went; the rest is for the plot.
				return [values.length - 1, Math.floor(values.length * 0.75)].flatMap((i) => {
					const [number, at] = [values[i], trend?.times[i]];
					if (number === undefined || at === undefined) return [];
					return [{ point, typed: number.toFixed(1), unit, number, at }];
				});
			});
	});
}

const isOxygen = (tag: string, plant: Plant): boolean =>
	plant.points.find((point) => point.tag === tag)?.quantity.startsWith('oxygen') === true;

const limitOf = ({ limit }: Field, plant: Plant) =>
	limit !== undefined && 'limit' in limit ? plant.limits.find(({ id }) => id === limit.limit) : limit;

/** A value that has to be high is a check of the analyser, not the circuit. */
const isAir = (field: Field, plant: Plant): boolean => limitOf(field, plant)?.atLeast !== undefined;

/** The watch says what every place has to keep. */
function limitAt({ point, typed, unit }: OxygenReading, { procedure, plant }: Told): WorstOxygen['limit'] {
	const field = procedure.steps
		.filter(({ kind }) => kind === 'watch')
		.flatMap(fieldsOf)
		.find((each) => each.point === point);
	const limit = field === undefined ? undefined : limitOf(field, plant);
	if (field === undefined || limit?.atMost === undefined || !isQuantityName(field.quantity)) return undefined;
	const [read, most] = [toSi({ value: typed, unit }, field.quantity), toSi(limit.atMost, field.quantity)];
	const guard = parseNumber(String(limit.guard?.value ?? 0));
	const written = parseNumber(String(limit.atMost.value));
	if (!read.ok || !most.ok || !guard.ok || !written.ok || most.value.value === 0) return undefined;
	const scale = written.value / most.value.value;
	const margin = (most.value.value - read.value.value) * scale - guard.value;
	return {
		value: String(limit.atMost.value),
		guard: String(limit.guard?.value ?? 0),
		margin: Number(margin.toFixed(6)),
	};
}
