import { fail, ok, type Result } from '../../base';
import type { QuantityName } from '../../quantity';
import type { Refusal } from '../calculator';
import type { AdequacyInputs } from './adequacy-inputs';
import { admittedGas, flowOfTotaliser, type Admitted } from './admitted-gas';
import { normalVolume } from './normal-volume';
import type { Stretch } from './notes';
import { readSeries, type Point } from './series-input';
import { valueAt, type Trend } from './trend';

/** The circuit as its volumes, meters and contacts show it. */
export type Circuit = {
	/** Every volume that is not shut off [m³], and the gas in it [m³(n)] with its U. */
	readonly size: number;
	readonly gas: number;
	readonly gasU: number;
	/** A tenth of the flow that the next gate asks for is a fan that stands: a flow meter at rest seldom reads zero. */
	readonly fan: Trend & { readonly stopped: number };
	readonly inert: Trend & { readonly stopped: number };
	readonly outlet: Trend & { readonly stopped: number };
	readonly admitted: (window: Stretch) => Admitted;
	/** Mean inert flow by its meters over the time that they show [m³(n)/s]; null where they show none. */
	readonly meanInert: (window: Stretch) => number | null;
};

/** Read up to the judgement: what came later was not known to it. */
export function readCircuit(given: AdequacyInputs, judgedAt: number): Result<Circuit, readonly Refusal[]> {
	const longestGap = given.longestGap.value;
	const readKnown = (tag: string, quantity: QuantityName): ReturnType<typeof readSeries> => {
		const points = readSeries(given.series, tag, quantity);
		return points.ok ? ok(points.value.filter(({ t }) => t <= judgedAt)) : points;
	};
	const meters = given.inertGas.meters.map((meter) => {
		const quantity = meter.reads === 'flow' ? 'volume-flow-normal-wet' : 'volume-normal';
		return { meter, points: readKnown(meter.tag, quantity) };
	});
	const fan = readKnown(given.fan.tag, 'volume-flow');
	const outlet = given.outlet.tag === undefined ? ok([]) : readKnown(given.outlet.tag, 'number');
	const refused = [...meters.map(({ points }) => points), fan, outlet].flatMap((read) => (read.ok ? [] : read.error));
	const read = meters.map(({ meter, points }) => ({ ...meter, points: points.ok ? points.value : [] }));
	refused.push(...read.flatMap((meter) => backwards(meter)));
	if (!fan.ok || !outlet.ok || refused.length > 0) return fail(refused);

	const shut = new Set(
		given.coverage.filter(({ answer }) => answer === 'shut off, inerted by itself').map(({ volume }) => volume),
	);
	const connected = given.volumes.filter(({ id }) => !shut.has(id)).map(({ volume }) => volume);
	const state = { temperature: given.temperature.value, pressure: given.pressure.value };
	const size = connected.reduce((sum, { value }) => sum + value, 0);
	const admitted = (window: Stretch): Admitted => admittedGas(read, { ...window, longestGap });
	return ok({
		size,
		gas: normalVolume(size, state),
		gasU: normalVolume(Math.hypot(...connected.map(({ U = 0 }) => U)), state),
		fan: { record: given.fan.tag, points: fan.value, seen: given.fan.seen, stopped: 0.1 * given.fan.least },
		inert: {
			record: read.map(({ tag }) => tag).join(', '),
			points: sumOf(
				read.map(({ points, reads }) => (reads === 'flow' ? points : flowOfTotaliser(points))),
				longestGap,
			),
			seen: given.inertGas.seen,
			stopped: given.inertGas.least,
		},
		outlet: { record: given.outlet.name, points: outlet.value, seen: given.outlet.seen, stopped: 0.5 },
		admitted,
		meanInert: ({ from, to }) => {
			const { value, gaps } = admitted({ from, to });
			const shown = to - from - gaps.reduce((sum, gap) => sum + gap.to - gap.from, 0);
			return shown > 0 && value > 0 ? value / shown : null;
		},
	});
}

/** Several meters as one flow: known only while all of them are. */
function sumOf(trends: readonly (readonly Point[])[], longestGap: number): readonly Point[] {
	const [only] = trends;
	if (trends.length === 1 && only !== undefined) return only;
	const times = [...new Set(trends.flatMap((points) => points.map(({ t }) => t)))].sort((a, b) => a - b);
	return times.flatMap((t) => {
		const flows = trends.map((points) => valueAt(points, t, longestGap));
		return flows.includes(undefined) ? [] : [{ t, value: flows.reduce<number>((sum, flow) => sum + (flow ?? 0), 0) }];
	});
}

const backwards = (meter: {
	readonly tag: string;
	readonly reads: string;
	readonly points: readonly Point[];
}): Refusal[] =>
	meter.points.flatMap(({ t, value }, i) => {
		const before = meter.points[i - 1];
		if (meter.reads !== 'totaliser' || before === undefined || value >= before.value) return [];
		return [{ kind: 'totaliser-ran-backwards', input: `series.${meter.tag}`, t, before: before.value, value }];
	});
