import type { AdequacyInputs } from './adequacy-inputs';
import type { Circuit } from './circuit';
import { holdNeeded } from './hold-needed';
import type { Gap, HoldRule, HoldStartKind, PurgeReason, Stretch } from './notes';
import type { PlaceJudgement } from './place-judgement';
import { gapsIn, risesIn } from './trend';

/** What a hold is counted from: the last place to come below the line, or the last thing that stirred the gas. */
export type HoldStart = {
	readonly t: number;
	readonly by: HoldStartKind;
	readonly tag: string;
};

export type Hold = {
	readonly needed: number;
	readonly rule: HoldRule;
	readonly window: Stretch;
	/** Null while a place is above its line or a flow is not shown. */
	readonly start: HoldStart | null;
	readonly held: number;
	/** Gaps of fan, inert gas and outlet path inside the window, and earlier in the purge. */
	readonly gaps: { readonly [Which in 'fan' | 'inert' | 'outlet']: readonly Gap[] };
	readonly earlier: readonly Gap[];
};

type At = { readonly begins: number; readonly judgedAt: number };

export function findHold(
	given: AdequacyInputs,
	circuit: Circuit,
	{ judged, begins, judgedAt }: At & { readonly judged: readonly PlaceJudgement[] },
): Hold {
	const slow = Math.max(...judged.map(({ place }) => place.lag + place.T90));
	const rules = { least: given.leastHold.value, response: slow, cycle: given.cleaning.cycle };
	const untilTurns = holdNeeded({ ...rules, turn: null }).needed;
	const shown = leastFanFlow(circuit, { from: judgedAt - untilTurns, to: judgedAt });
	// Nobody reads a flow off a fan that was only seen running: then the least that the next gate asks for.
	const flow = shown ?? (given.fan.seen === undefined ? null : given.fan.least);
	const asked = holdNeeded({ ...rules, turn: flow === null ? null : circuit.size / flow });
	const window = { from: Math.max(judgedAt - asked.needed, begins), to: judgedAt };
	const gaps = (which: 'fan' | 'inert' | 'outlet', of: Stretch): readonly Gap[] =>
		gapsIn(circuit[which], of, { longestGap: given.longestGap.value, stopped: circuit[which].stopped });
	const purge = { from: begins, to: judgedAt };
	const all = { fan: gaps('fan', purge), inert: gaps('inert', purge), outlet: gaps('outlet', purge) };
	const start = holdStart(given, circuit, { judged, begins, judgedAt, gaps: all });
	return {
		...asked,
		window,
		start,
		held: start === null ? 0 : judgedAt - start.t,
		gaps: { fan: gaps('fan', window), inert: gaps('inert', window), outlet: gaps('outlet', window) },
		earlier: Object.values(all)
			.flat()
			.filter(({ to }) => to < window.from),
	};
}

/** (c): held long enough, with the fan at the flow of the next gate, cleaning running, every damper stroked once. */
export function holdReasons(given: AdequacyInputs, circuit: Circuit, hold: Hold, at: At): readonly PurgeReason[] {
	const c = { level: 'reason', criterion: 'c' } as const;
	const reasons: PurgeReason[] = [];
	if (hold.held < hold.needed) {
		const { needed, rule, held, start } = hold;
		const since = { since: start?.t ?? null, by: start?.by ?? null, tag: start?.tag ?? null };
		reasons.push({ ...c, kind: 'hold-too-short', needed, rule, held, ...since });
	}
	const { tag, least } = given.fan;
	const flow = leastFanFlow(circuit, hold.window);
	if (flow !== null && flow < least) reasons.push({ ...c, kind: 'fan-below-next-gate', tag, flow, least });
	const { runningSince } = given.cleaning;
	if (runningSince === null || runningSince > at.judgedAt) reasons.push({ ...c, kind: 'cleaning-not-running' });
	for (const damper of given.dampers) {
		const { strokedAt } = damper;
		const inPurge = strokedAt !== null && strokedAt >= at.begins && strokedAt <= at.judgedAt;
		if (!inPurge) reasons.push({ ...c, kind: 'damper-not-stroked', tag: damper.tag });
	}
	return reasons;
}

/** (e): fan, inert gas and outlet path shown without a gap through the hold window. */
export const flowReasons = ({ gaps }: Hold): readonly PurgeReason[] => [
	...gaps.fan.map((gap) => ({ level: 'reason', criterion: 'e', kind: 'fan-broken', ...gap }) as const),
	...gaps.inert.map((gap) => ({ level: 'reason', criterion: 'e', kind: 'inert-flow-broken', ...gap }) as const),
	...gaps.outlet.map((gap) => ({ level: 'reason', criterion: 'e', kind: 'outlet-broken', ...gap }) as const),
];

/** The latest of everything that a hold has to come after. */
function holdStart(
	given: AdequacyInputs,
	{ fan }: Circuit,
	{ judged, begins, judgedAt, gaps }: At & { judged: readonly PlaceJudgement[]; gaps: Hold['gaps'] },
): HoldStart | null {
	const below = judged.flatMap(({ place, adequateSince }): HoldStart[] =>
		adequateSince === null ? [] : [{ t: adequateSince, by: 'readings', tag: place.tag }],
	);
	if (below.length < judged.length) return null;
	const restored = [...gaps.inert, ...gaps.outlet].map(({ to, record }): HoldStart => ({
		t: to,
		by: 'flow restored',
		tag: record,
	}));
	const starts: readonly HoldStart[] = [
		{ t: begins, by: 'purge begun', tag: '' },
		...below,
		...restored,
		...gaps.fan.map(({ to, record }): HoldStart => ({ t: to, by: 'fan started', tag: record })),
		...risesIn(
			fan.points.filter(({ t, value }) => t >= begins && value > fan.stopped),
			given.flowRise.value,
		).map((t): HoldStart => ({ t, by: 'flow raised', tag: fan.record })),
		...(given.cleaning.runningSince === null
			? []
			: [{ t: given.cleaning.runningSince, by: 'cleaning started', tag: '' } as const]),
		...given.dampers.flatMap(({ strokedAt, tag }): HoldStart[] =>
			strokedAt === null ? [] : [{ t: strokedAt, by: 'damper moved', tag }],
		),
		...(given.disturbances ?? []).map(({ t, what, tag }): HoldStart => ({ t, by: what, tag })),
	];
	return starts.filter(({ t }) => t <= judgedAt).reduce((latest, each) => (each.t > latest.t ? each : latest));
}

/** The lowest flow that the fan's meter shows while it runs; null where it shows none. */
function leastFanFlow({ fan }: Circuit, { from, to }: Stretch): number | null {
	const running = fan.points.filter(({ t, value }) => t >= from && t <= to && value > fan.stopped);
	return running.length === 0 ? null : Math.min(...running.map(({ value }) => value));
}
