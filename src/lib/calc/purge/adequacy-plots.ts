import type { Plot, PlotCurve } from '../calculator';
import type { JudgedPlace, PurgeJudgement } from './judge-purge';

const CURVE_POINTS = 60;

/** Oxygen at every place with its fitted curve, and below it the inert gas that went in. */
export const adequacyPlots = (judgement: PurgeJudgement): readonly Plot[] => [
	oxygenPlot(judgement),
	inertPlot(judgement),
];

function oxygenPlot({ places, slowest, given, hold, judgedAt }: PurgeJudgement): Plot {
	const { limit, guard } = given;
	return {
		id: 'oxygen',
		title: 'Oxygen at every place',
		x: { label: 'time', unit: 's' },
		y: { label: limit.basis === 'wet' ? 'oxygen, moist' : 'oxygen, dry', unit: '1' },
		curves: places.flatMap((place) => curvesOf(place, { judgedAt, decides: place === slowest })),
		marks: [
			{ kind: 'limit', label: 'limit', axis: 'y', at: limit.oxygen },
			{ kind: 'guard', label: 'limit less guard', axis: 'y', at: limit.oxygen - guard.value },
			{ kind: 'window', label: 'hold window', axis: 'x', at: hold.window.from, to: hold.window.to },
			...(hold.start === null
				? []
				: [{ kind: 'event', label: 'adequate since', axis: 'x', at: hold.start.t } as const]),
		],
	};
}

function curvesOf(
	{ place, valid, fitted }: JudgedPlace,
	at: { readonly judgedAt: number; readonly decides: boolean },
): readonly PlotCurve[] {
	const label = place.title;
	const decides = at.decides ? ({ decides: true } as const) : {};
	const points: PlotCurve = {
		...{ id: place.tag, label, kind: 'points', ...decides },
		...{ x: valid.map(({ t }) => t), y: valid.map(({ C }) => C) },
	};
	if (!fitted.ok) return [points];
	const { fit, from, curve, curveError } = fitted.value;
	const x = Array.from({ length: CURVE_POINTS + 1 }, (_, i) => from + ((at.judgedAt - from) * i) / CURVE_POINTS);
	const y = x.map(curve);
	const band = (width: number): PlotCurve => ({
		...{ id: `${place.tag} band`, label, kind: 'band', x },
		...{
			y: y.map((C, i) => C + width * curveError(x[i] ?? 0)),
			y2: y.map((C, i) => C - width * curveError(x[i] ?? 0)),
		},
	});
	return [
		...[fit.t === null ? [] : band(fit.t)].flat().filter(({ y }) => y.every(Number.isFinite)),
		points,
		{ id: `${place.tag} fit`, label, kind: 'line', ...decides, x, y },
		{ id: `${place.tag} floor`, label, kind: 'line', x: [from, at.judgedAt], y: [fit.Cf, fit.Cf] },
	];
}

function inertPlot({ circuit, begins, hold }: PurgeJudgement): Plot {
	const { points } = circuit.inert;
	return {
		id: 'inert-flow',
		title: 'Inert gas admitted',
		x: { label: 'time', unit: 's' },
		y: { label: 'inert gas', unit: 'm3(n)/s' },
		curves: [
			{
				...{ id: circuit.inert.record, label: circuit.inert.record, kind: 'steps' },
				...{ x: points.map(({ t }) => t), y: points.map(({ value }) => value) },
			},
		],
		marks: [
			{ kind: 'event', label: 'purge begun', axis: 'x', at: begins },
			{ kind: 'window', label: 'hold window', axis: 'x', at: hold.window.from, to: hold.window.to },
		],
	};
}
