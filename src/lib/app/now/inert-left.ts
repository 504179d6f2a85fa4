import type { Plant } from '../../plant';
import type { Procedure } from '../../procedure';
import { toSi } from '../../quantity';
import { MINUTE, millis, type Millis, type RecordEvent, type Standing } from '../../record';
import type { Trends } from '../trend-files';
import { countedEntries } from './counted-entries';
import type { MachineState } from './plant-state';

export type InertLeft = {
	/** As it was read. */
	readonly stock: string;
	readonly unit: string;
	readonly readAt: Millis;
	readonly reserve: string;
	/** m3(n)/h, and whether it was measured or stands in the plant description. */
	readonly flow: number;
	readonly isMeasured: boolean;
	/** Whole minutes until the reserve is reached, when inert gas was last said to be on. */
	readonly minutes?: number;
};

type Told = {
	readonly procedure: Procedure;
	readonly plant: Plant;
	readonly events: readonly RecordEvent[];
	readonly standing: Standing;
	readonly trends: Trends;
};

/** The stock as it was last read, less what the present flow has taken since, down to the emergency reserve. */
export function inertLeft(told: Told, inert: MachineState | undefined): InertLeft | undefined {
	const { plant, standing } = told;
	const stock = newestStock(told);
	const reserve = plant.inertSources[0]?.stock.reserve;
	const flow = measuredFlow(told) ?? plannedFlow(plant);
	if (stock === undefined || reserve === undefined || flow === undefined) return undefined;
	const [content, kept] = [normal(stock.typed, stock.unit), normal(reserve.value, reserve.unit)];
	if (content === undefined || kept === undefined) return undefined;
	const said = {
		...{ stock: stock.typed, unit: stock.unit, readAt: stock.at },
		...{ reserve: String(reserve.value), flow: flow.perHour, isMeasured: flow.isMeasured },
	};
	if (inert?.isOn !== true || flow.perHour <= 0) return said;
	const used = (flow.perHour * Math.max(0, millis(standing.at) - Math.max(stock.at, inert.since))) / HOUR;
	return { ...said, minutes: Math.max(0, Math.floor(((content - kept - used) / flow.perHour) * 60)) };
}

const HOUR = 60 * MINUTE;

/** The field that the plan of the purge takes the stock from. */
function newestStock({ procedure, events, standing }: Told) {
	const binding = procedure.steps.flatMap((step) => (step.kind === 'calculation' ? (step.bind.stock ?? []) : []))[0];
	if (binding?.from !== 'field') return undefined;
	return countedEntries(events, standing)
		.filter(({ body }) => body.step === binding.step)
		.flatMap(({ body, observedAt: at }) =>
			(body.values ?? []).flatMap(({ field, typed, unit }) => (field === binding.field ? [{ typed, unit, at }] : [])),
		)
		.sort((a, b) => a.at - b.at)
		.at(-1);
}

/** The end of the newest trend of the meter. */
function measuredFlow({ plant, events, trends, standing }: Told) {
	const meter = plant.inertSources[0]?.meter;
	const ends = events.flatMap((event) => {
		if (event.kind !== 'series attached' || millis(event.body.to) > millis(standing.at)) return [];
		const point = event.body.points.find((each) => each.point === meter);
		const trend = trends.get(event.body.attachment.hash);
		const last = trend?.columns.find(({ name }) => name === (point?.column ?? point?.point))?.values.at(-1);
		const perHour = point === undefined || last === undefined ? undefined : hourly(last, point.unit);
		return perHour === undefined ? [] : [{ at: millis(event.body.to), perHour, isMeasured: true }];
	});
	return ends.sort((a, b) => a.at - b.at).at(-1);
}

function plannedFlow({ purge }: Plant) {
	const planned = purge?.inertGasFlow;
	const perHour = planned === undefined ? undefined : hourly(planned.value, planned.unit);
	return perHour === undefined ? undefined : { perHour, isMeasured: false };
}

function normal(value: string | number, unit: string): number | undefined {
	const read = toSi({ value, unit }, 'volume-normal');
	return read.ok ? read.value.value : undefined;
}

function hourly(value: string | number, unit: string): number | undefined {
	const read = toSi({ value, unit }, 'volume-flow-normal-wet');
	return read.ok ? read.value.value * 3600 : undefined;
}
