import { runCalculator, type CalcResult, type Refusal } from '../../../src/lib/calc';

/**
 * An invented circuit, purged: zones in a loop with a fan, one of them badly mixed, air leaking in, inert gas entering.
 * The oxygen is integrated in steps of a second and read through a transport lag, a first-order answer and noise. It
 * shares nothing with the code under test.
 */
export type Scene = {
	/** Minutes from the begin of the purge to the last reading. */
	readonly minutes: number;
	/** m³(n)/h */
	readonly inert: number;
	readonly leak: number;
	/** Gas that reaches the badly mixed hopper [m³(n)/h]; the other zones share all that circulates. */
	readonly hopperExchange: number;
	readonly noise: number;
	readonly seed: number;
};
export const SCENE: Scene = { minutes: 75, inert: 888, leak: 100, hopperExchange: 1500, noise: 0.03, seed: 20260311 };

export const ANALYSERS = [
	{ tag: 'AT-211', title: 'Mill inlet', volume: 'mill', zone: 0, lag: 12, T90: 20 },
	{ tag: 'AT-212', title: 'Filter outlet', volume: 'filter', zone: 1, lag: 15, T90: 20 },
	{ tag: 'AT-213', title: 'Filter hopper', volume: 'hopper', zone: 3, lag: 30, T90: 25 },
	{ tag: 'AT-214', title: 'After the fan', volume: 'duct', zone: 2, lag: 10, T90: 20 },
] as const;

const VOLUMES = [
	{ id: 'mill', title: 'Mill', volume: 60, deadLeg: false },
	{ id: 'filter', title: 'Bag filter', volume: 330, deadLeg: false },
	{ id: 'duct', title: 'Fan and ducts', volume: 150, deadLeg: false },
	{ id: 'hopper', title: 'Filter hopper', volume: 40, deadLeg: true },
	{ id: 'bypass', title: 'By-pass duct', volume: 12, deadLeg: true },
	{ id: 'chute', title: 'Raw-fuel chute', volume: 4, deadLeg: true },
];

/** Deterministic noise (mulberry32, normal by Box and Muller). */
function noiseFrom(seed: number): () => number {
	let state = seed | 0;
	const next = (): number => {
		state = (state + 0x6d2b79f5) | 0;
		let x = Math.imul(state ^ (state >>> 15), 1 | state);
		x = (x + Math.imul(x ^ (x >>> 7), 61 | x)) ^ x;
		return ((x ^ (x >>> 14)) >>> 0) / 2 ** 32;
	};
	return () => Math.sqrt(-2 * Math.log(next() + 1e-12)) * Math.cos(2 * Math.PI * next());
}

/** Seconds before the begin in which the analysers read air. */
const BEFORE = 120;

export function simulate(scene: Scene): { t: number[]; zones: number[][] } {
	const perSecond = (flow: number): number => flow / 3600;
	const around = perSecond(45_000);
	const [inert, leak, side] = [perSecond(scene.inert), perSecond(scene.leak), perSecond(scene.hopperExchange)];
	// Flows are in the normal state, and so are the zones: 1010 mbar, 20 °C. The by-pass hangs on the filter.
	const V = [60, 342, 150, 40].map((size) => size * (1010 / 1013.25) * (273.15 / 293.15));
	const C = [20.95, 20.95, 20.95, 20.95] as [number, number, number, number];
	const t: number[] = [];
	const zones: number[][] = [[], [], [], []];
	for (let s = -BEFORE; s <= scene.minutes * 60; s++) {
		t.push(s);
		C.forEach((value, i) => zones[i]!.push(value));
		if (s < 0) continue;
		const [mill, filter, fan, hopper] = C;
		C[0] += (around * (fan - mill) + leak * (20.95 - mill)) / V[0]!;
		C[1] += ((around + leak) * (mill - filter) + side * (hopper - filter)) / V[1]!;
		C[2] += ((around + leak) * (filter - fan) + inert * (0 - fan)) / V[2]!;
		C[3] += (side * (filter - hopper)) / V[3]!;
	}
	return { t, zones };
}

/** Readings of one analyser every `step` seconds, percent, two decimals. */
function readings(
	{ t, zones }: ReturnType<typeof simulate>,
	{ zone, lag, T90 }: (typeof ANALYSERS)[number],
	{ step, noise, seed }: { step: number; noise: number; seed: number },
): { t: number[]; values: number[] } {
	const random = noiseFrom(seed + zone);
	const tau = T90 / Math.log(10);
	let [shown, like] = [20.95, 0];
	const out = { t: [] as number[], values: [] as number[] };
	t.forEach((at, i) => {
		shown += ((zones[zone]![Math.max(0, i - lag)] ?? 20.95) - shown) / tau;
		if (at % step !== 0) return;
		like = 0.5 * like + random() * noise;
		out.t.push(at);
		out.values.push(Math.round(100 * (shown + like)) / 100);
	});
	return out;
}

export type Inputs = ReturnType<typeof purgeInputs>;

const steady = (from: number, to: number, value: number, step = 30): { t: number[]; values: number[] } => {
	const t = Array.from({ length: Math.floor((to - from) / step) + 1 }, (_, i) => from + i * step);
	return { t, values: t.map(() => value) };
};

/** Inputs of the calculator for a scene, all conditions met; a test changes what it is about. */
export function purgeInputs(change: Partial<Scene> = {}, step = 10) {
	const scene = { ...SCENE, ...change };
	const end = scene.minutes * 60;
	const simulated = simulate(scene);
	return {
		zero: '2026-03-11T20:40:00+01:00',
		begins: 0,
		limit: {
			oxygen: { value: 8, unit: '%' },
			basis: 'wet',
			source: { kind: 'report', text: 'Fuel test report FT-26-014' },
		},
		guard: { value: 0.3, unit: '%' },
		places: ANALYSERS.map(({ tag, title, volume, lag, T90 }) => ({
			...{ tag, title, volume, basis: 'dry', principle: 'paramagnetic', lag, T90 },
			...{ range: { from: { value: 0, unit: '%' }, to: { value: 25, unit: '%' } }, U: { value: 0.24, unit: '%' } },
			...{ resolution: { value: 0.01, unit: '%' }, check: 'stands', mode: 'measuring' },
			airBefore: { t: -600, oxygen: { value: 20.9, unit: '%' } },
		})) as Record<string, unknown>[],
		series: {
			...Object.fromEntries(
				ANALYSERS.map((each) => [each.tag, { unit: '%', ...readings(simulated, each, { ...scene, step }) }]),
			),
			'FT-241': { unit: 'm3(n)/h', ...steady(0, end, scene.inert) },
			'FT-201': { unit: 'm3/h', ...steady(-BEFORE, end, 45_000) },
			'ZS-216': { unit: '1', ...steady(-BEFORE, end, 1) },
		} as Record<string, { unit: string; t: number[]; values: number[]; flagged?: unknown[] }>,
		volumes: VOLUMES.map(({ volume, ...each }) => ({ ...each, volume: { value: volume, unit: 'm3' } })),
		coverage: [
			...ANALYSERS.map(({ tag, volume }) => ({ volume, answer: 'measured', place: tag, atOutlet: true })),
			{
				...{ volume: 'bypass', answer: 'swept, outlet read' },
				outlet: { tag: 'portable', basis: 'dry', t: end - 60, oxygen: { value: 6.4, unit: '%' } },
			},
			{ volume: 'chute', answer: 'shut off, inerted by itself', inertedBy: 'nitrogen held at the slide gate' },
		] as Record<string, unknown>[],
		temperature: { value: 20, unit: 'degC' },
		pressure: { value: 1010, unit: 'mbar(a)' },
		inertGas: {
			oxygen: { value: 0, unit: '%' },
			meters: [{ tag: 'FT-241', medium: 'inert gas', reads: 'flow', U: { value: 2, unit: '%' } }],
		} as Record<string, unknown>,
		fan: { tag: 'FT-201', least: { value: 42_000, unit: 'm3/h' } } as Record<string, unknown>,
		outlet: { name: 'stack damper HV-16', tag: 'ZS-216' } as Record<string, unknown>,
		cleaning: { cycle: { value: 6, unit: 'min' }, runningSince: 60 as number | null },
		dampers: [{ tag: 'HV-12', strokedAt: 300 as number | null }],
		suction: [{ tag: 'PT-221', at: 'mill inlet', pressure: { value: -3, unit: 'mbar(g)' } }] as Record<
			string,
			unknown
		>[],
		minimumVolumeChanges: undefined as number | undefined,
	};
}

/** The base scene with something changed in place; a deep copy, so that tests do not meet. */
export const changed = (change: (inputs: Inputs) => unknown, scene: Partial<Scene> = {}): Inputs => {
	const inputs = purgeInputs(scene);
	change(inputs);
	return inputs;
};

export const place = (inputs: Inputs, tag: string): Record<string, unknown> =>
	inputs.places.find((each) => each.tag === tag)!;

/** As a record would carry it: what is undefined is not there. */
export const run = (inputs: unknown): CalcResult => {
	const result = runCalculator('purge-adequacy@1', JSON.parse(JSON.stringify(inputs)));
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
};

export const refusals = (inputs: unknown): readonly Refusal[] => {
	const result = runCalculator('purge-adequacy@1', JSON.parse(JSON.stringify(inputs)));
	return result.ok ? [] : result.error;
};

export const word = (result: CalcResult): string => result.verdict!.word;
export const reasons = (result: CalcResult): readonly string[] =>
	result.verdict!.reasons.map(({ criterion, kind }) => `${criterion as string} ${kind}`);
export const kinds = (result: CalcResult): readonly string[] => result.notes.map(({ kind }) => kind);
export const value = (result: CalcResult, name: string): number | null => result.values[name]!.value;
