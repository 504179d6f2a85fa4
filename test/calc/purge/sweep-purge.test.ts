import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { runCalculator, type CalcResult, type Refusal } from '../../../src/lib/calc';

const base = {
	volumes: [{ id: 'loop', title: 'Circuit', volume: { value: 500, unit: 'm3' }, deadLeg: false }],
	outletRead: 'every volume',
	temperature: { value: 0, unit: 'degC' },
	pressure: { value: 1013.25, unit: 'hPa(a)' },
	inertFlow: { value: 1000, unit: 'm3(n)/h' },
	meter: { tag: 'FT-241', medium: 'inert gas' },
	outlet: 'stack damper HV-16',
	inertOxygen: { value: 0, unit: '%' },
	target: { value: 8, unit: '%' },
	mixing: 1,
	mixingFrom: 'measured fit',
};
type Inputs = Record<string, unknown>;

const run = (change: Inputs = {}): CalcResult => {
	const result = runCalculator('sweep-purge@1', { ...base, ...change });
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
};
const refusals = (change: Inputs): readonly Refusal[] => {
	const result = runCalculator('sweep-purge@1', { ...base, ...change });
	return result.ok ? [] : result.error;
};
const value = (result: CalcResult, name: string): number => result.values[name]!.value!;
const kinds = (result: CalcResult): readonly string[] => result.notes.map(({ kind }) => kind);

// Source: closed form evaluated with numpy (engineering-checks.json); minutes as printed in the engineering check values A5.
test.each([
	{ Q: 1000, Ci: 0, Ct: 8, K: 1, V: 500, volumes: '0.962697', minutes: '28.8809' },
	{ Q: 1000, Ci: 0, Ct: 8, K: 0.5, V: 500, volumes: '1.925394', minutes: '57.7618' },
	{ Q: 1000, Ci: 0, Ct: 5, K: 0.25, V: 500, volumes: '5.730803', minutes: '171.9241' },
	{ Q: 1000, Ci: 2, Ct: 8, K: 1, V: 500, volumes: '1.150044', minutes: '34.5013' },
	{ Q: 1500, Ci: 3, Ct: 8, K: 0.7, V: 800, volumes: '1.825932', minutes: '58.4298' },
])('$V m³ at $Q m³(n)/h to $Ct %, K $K: $volumes volumes, $minutes min', ({ Q, Ci, Ct, K, V, volumes, minutes }) => {
	const result = run({
		volumes: [{ ...base.volumes[0], volume: { value: V, unit: 'm3' } }],
		inertFlow: { value: Q, unit: 'm3(n)/h' },
		inertOxygen: { value: Ci, unit: '%' },
		target: { value: Ct, unit: '%' },
		mixing: K,
	});
	expect(value(result, 'changesByMixing').toFixed(6)).toBe(volumes);
	expect((value(result, 'timeByMixing') / 60).toFixed(4)).toBe(minutes);
});

test('floor and time with an in-leakage are those of the one-zone balance', () => {
	const result = run({ inertFlow: { value: 1500, unit: 'Nm3/h' }, leak: { flow: { value: 300, unit: 'm3(n)/h' } } });
	// Source: engineering-checks.json, A4: floor 3.491667 %, 8 % after 0.376080 h.
	expect((value(result, 'floor') * 100).toFixed(6)).toBe('3.491667');
	expect((value(result, 'timeByMixing') / 3600).toFixed(6)).toBe('0.376080');
});

describe('traps', () => {
	test('trap 1: a hot circuit holds less gas than its size; the meter is not divided into hot cubic metres', () => {
		const result = run({
			volumes: [{ ...base.volumes[0], volume: { value: 600, unit: 'm3' } }],
			temperature: { value: 80, unit: 'degC' },
		});
		// Source: engineering check value A5 "hot loop": 464.080 m³(n), 446.769 m³(n) to 8 % and not 577.6.
		expect(value(result, 'normalVolume').toFixed(3)).toBe('464.080');
		expect(value(result, 'gasByMixing').toFixed(3)).toBe('446.769');
	});

	test('trap 2: to 8 % the formula is content with less than one volume, the plan is not', () => {
		const result = run();
		expect(value(result, 'changesByMixing')).toBeLessThan(1);
		expect(value(result, 'volumeChanges')).toBe(1);
		expect(kinds(result)).toContain('least-volume-changes-decide');
		expect(value(run({ outletRead: 'not every volume' }), 'volumeChanges')).toBeCloseTo(3, 12);
		expect(value(run({ minimumVolumeChanges: 5 }), 'volumeChanges')).toBeCloseTo(5, 12);
	});

	test.each([
		['at the inert gas', { inertOxygen: { value: 8, unit: '%' } }, null],
		['below the inert gas', { inertOxygen: { value: 9, unit: '%' } }, null],
		['below the floor', { leak: { flow: { value: 1000, unit: 'm3(n)/h' } } }, (1000 / 3600) * (12.95 / 8)],
	])('trap 3: a target %s is said to be unreachable, never NaN and never zero', (_, change, flow) => {
		const result = run(change);
		const unreachable = { value: null, unit: 's', because: 'unreachable' };
		expect(result.values).toMatchObject({ time: unreachable, timeByMixing: unreachable });
		expect(result.values.inertGas).toEqual({ value: null, unit: 'm3(n)', because: 'unreachable' });
		const leastInertFlow = flow === null ? null : (expect.closeTo(flow, 9) as number);
		expect(result.notes).toContainEqual(expect.objectContaining({ kind: 'unreachable', leastInertFlow }));
		expect(JSON.stringify(result.values)).not.toMatch(/NaN|Infinity/);
	});

	test('trap 4: an inert gas with 3 % of oxygen is not taken for pure nitrogen, and not saying so is refused', () => {
		const [pure, made] = [run(), run({ inertOxygen: { value: 3, unit: '%' } })];
		expect(value(made, 'timeByMixing')).toBeGreaterThan(1.3 * value(pure, 'timeByMixing'));
		expect(refusals({ inertOxygen: undefined })).toEqual([expect.objectContaining({ input: 'inertOxygen' })]);
	});

	test('trap 5: mixing is given once; a safety factor beside it is an unknown input, and K above 1 is refused', () => {
		expect(refusals({ safetyFactor: 2 })).toEqual([{ kind: 'unknown-input', input: 'safetyFactor' }]);
		expect(refusals({ mixing: 1.04 })).toEqual([expect.objectContaining({ kind: 'out-of-range', input: 'mixing' })]);
		expect(kinds(run({ mixing: 0.95, mixingFrom: 'assumed' }))).toContain('mixing-assumed-good');
		expect(kinds(run({ mixing: 0.95 }))).not.toContain('mixing-assumed-good');
	});

	test('trap 7: a gauge pressure is not taken for an absolute one', () => {
		expect(refusals({ pressure: { value: -3, unit: 'mbar(g)' } })).toEqual([
			expect.objectContaining({ kind: 'wrong-quantity', input: 'pressure' }),
		]);
	});

	test('trap 11: carbon dioxide carries its warning', () => {
		expect(kinds(run({ gas: 'carbon dioxide' }))).toContain('carbon-dioxide-discharge');
	});

	test('trap 12: a target above what the fuel test allows is said', () => {
		const limitingOxygen = { value: 12, unit: '%' };
		expect(kinds(run({ limitingOxygen }))).toContain('above-allowed-oxygen');
		expect(kinds(run({ limitingOxygen, oxygenTrip: 'proved' }))).not.toContain('above-allowed-oxygen');
		expect(kinds(run({ limitingOxygen, oxygenTrip: 'proved', target: { value: 10, unit: '%' } }))).toEqual(
			expect.not.arrayContaining(['above-allowed-oxygen']) as string[],
		);
	});

	test('trap 13: the flow that circulates is refused as inert gas, and so is a purge that has no outlet', () => {
		const circulating = {
			inertFlow: { value: 65_000, unit: 'm3(n)/h' },
			meter: { tag: 'FT-201', medium: 'process gas' },
		};
		expect(refusals(circulating)).toEqual([
			{ kind: 'not-an-inert-gas-meter', input: 'meter', tag: 'FT-201', medium: 'process gas' },
		]);
		expect(refusals({ outlet: ' ' })).toEqual([{ kind: 'no-outlet', input: 'outlet' }]);
		expect(refusals({ outlet: undefined })).toHaveLength(1);
		// Source: engineering section A.8: 600 m³ at 888 m³/h needs 39 min to 8 %.
		const right = run({
			volumes: [{ ...base.volumes[0], volume: { value: 600, unit: 'm3' } }],
			inertFlow: { value: 888, unit: 'm3(n)/h' },
		});
		expect((value(right, 'timeByMixing') / 60).toFixed(0)).toBe('39');
	});
});

describe('what is refused', () => {
	test.each([
		['a volume of nothing', { volumes: [{ ...base.volumes[0], volume: 0 }] }, 'not-positive', 'volumes[0].volume'],
		['a negative volume', { volumes: [{ ...base.volumes[0], volume: -5 }] }, 'not-positive', 'volumes[0].volume'],
		['no volume', { volumes: [] }, 'bad-input', 'volumes'],
		['the same volume twice', { volumes: [base.volumes[0], base.volumes[0]] }, 'named-twice', 'volumes[1]'],
		['no flow', { inertFlow: 0 }, 'not-positive', 'inertFlow'],
		['a flow that goes backwards', { inertFlow: -1 }, 'not-positive', 'inertFlow'],
		['no mixing at all', { mixing: 0 }, 'not-positive', 'mixing'],
		['a vacuum', { pressure: { value: 0, unit: 'Pa(a)' } }, 'not-positive', 'pressure'],
		['a target above the start', { startOxygen: { value: 7, unit: '%' } }, 'target-not-below-start', 'target'],
		['8 for 8 %', { target: 8 }, 'out-of-range', 'target'],
		['oxygen of 26 %', { startOxygen: { value: 26, unit: '%' } }, 'out-of-range', 'startOxygen'],
		['a guard as large as the target', { guard: { value: 8, unit: '%' } }, 'guard-leaves-nothing', 'guard'],
		['a negative leak', { leak: { flow: { value: -1, unit: 'm3(n)/h' } } }, 'out-of-range', 'leak.flow'],
		['a flow of another state', { inertFlow: { value: 1000, unit: 'm3/h' } }, 'wrong-quantity', 'inertFlow'],
	])('%s', (_, change, kind, input) => {
		expect(refusals(change)).toEqual([expect.objectContaining({ kind, input })]);
	});

	test('everything that is wrong is said at once', () => {
		expect(refusals({ inertFlow: 0, outlet: '', mixing: 0 }).map(({ kind }) => kind)).toEqual([
			'not-positive',
			'not-positive',
			'no-outlet',
		]);
	});
});

describe('leak and suction', () => {
	const leak = { flow: { value: 100, unit: 'm3(n)/h' }, suction: { value: 3, unit: 'mbar' } };

	test('a leak found at 3 mbar is taken 4.5 times as large at 60 mbar, and the result says so', () => {
		const result = run({ leak, suction: { value: 60, unit: 'mbar' } });
		const note = result.notes.find(({ kind }) => kind === 'leak-scaled-with-suction');
		expect(Number(note!.leak) * 36).toBeCloseTo(4.472, 3);
		expect(value(result, 'floor')).toBeGreaterThan(value(run({ leak, suction: { value: 3, unit: 'mbar' } }), 'floor'));
	});

	test('less suction is not credited', () => {
		expect(run({ leak, suction: { value: 1, unit: 'mbar' } }).values.floor).toEqual(run({ leak }).values.floor);
	});

	test('a leak without suction is used and marked', () => {
		expect(kinds(run({ leak: { flow: leak.flow } }))).toContain('leak-without-suction');
	});
});

describe('stock', () => {
	test.each([
		[400, 'stock-too-small'],
		[700, 'stock-without-repeat'],
		[1200, undefined],
	])('%d m³(n) for a purge of 500', (stock, kind) => {
		const stockKinds = kinds(run({ stock: { value: stock, unit: 'm3(n)' } })).filter((each) =>
			each.startsWith('stock'),
		);
		expect(stockKinds).toEqual(kind === undefined ? [] : [kind]);
	});

	test('the reserve is counted apart: purge, one repeat and reserve leave what is left', () => {
		const result = run({ stock: { value: 1500, unit: 'm3(n)' }, reserve: { value: 300, unit: 'm3(n)' } });
		expect(value(result, 'stockNeeded')).toBeCloseTo(1000, 9);
		expect(value(result, 'stockLeft')).toBeCloseTo(200, 9);
		expect(run().values.stockLeft).toEqual({ value: null, unit: 'm3(n)', because: 'not-given' });
	});
});

describe('uncertainty', () => {
	test('time and gas carry the uncertainty of flow, volume and mixing', () => {
		const result = run({
			...{ temperature: { value: 0, unit: 'degC', U: 0 }, pressure: { value: 1013.25, unit: 'hPa(a)', U: 0 } },
			...{ mixing: { value: 0.5, unit: '1', U: 0.1 }, inertOxygen: { value: 0, unit: '%', U: 0 } },
			volumes: [{ ...base.volumes[0], volume: { value: 500, unit: 'm3', U: 25 } }],
			inertFlow: { value: 1000, unit: 'm3(n)/h', U: 20 },
		});
		// By hand, t = V ln(.)/(K Q): relative uncertainties 0.2, 0.05, 0.02; gas = V ln(.)/K has no flow in it.
		expect(result.values.timeByMixing!.U! / value(result, 'timeByMixing')).toBeCloseTo(Math.hypot(0.2, 0.05, 0.02), 5);
		expect(result.values.gasByMixing!.U! / value(result, 'gasByMixing')).toBeCloseTo(Math.hypot(0.2, 0.05), 5);
		const rows = result.budget!.filter(({ output }) => output === 'time');
		expect(rows.map(({ input }) => input)).toEqual(['inertFlow', 'mixing', 'volumes.loop']);
		expect(rows.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
	});

	test('a plan from bare numbers states none, and says for which inputs', () => {
		expect(run().notes).toContainEqual({
			...{ level: 'warning', kind: 'uncertainty-not-stated' },
			inputs: ['temperature', 'pressure', 'inertFlow', 'mixing', 'inertOxygen', 'volumes.loop'],
		});
		expect(run().values.time).toEqual({ value: expect.closeTo(1800, 6) as number, unit: 's' });
	});
});

test('floor within 1 % of the line is warned of', () => {
	// Source: engineering-checks.json, A4: V 500, leak 600, inert 1000 m³/h: floor 7.856250 %, target 8 % minus a guard of 0.1.
	const leak = { flow: { value: 600, unit: 'm3(n)/h' } };
	expect(kinds(run({ leak, guard: { value: 0.1, unit: '%' } }))).toContain('floor-close-to-line');
	expect(kinds(run({ leak }))).not.toContain('floor-close-to-line');
});

test('more than 1 % of unburnt gas brings the limit of the gas', () => {
	expect(kinds(run({ unburntGas: { value: 1.2, unit: '%' } }))).toContain('unburnt-gas-limit-applies');
});

test('the plot runs from the start to past the line, with limit, guard and the time needed', () => {
	const [plot] = run({ guard: { value: 0.3, unit: '%' } }).plots!;
	expect(plot!.marks.map(({ kind }) => kind)).toEqual(['limit', 'guard', 'event']);
	expect(plot!.curves[0]!.y[0]).toBe(0.2095);
	expect(plot!.curves[0]!.y.at(-1)).toBeLessThan(0.077);
});

test('a plan is plain JSON and says its calculator, constants and inputs as typed', () => {
	const result = run();
	expect(JSON.parse(JSON.stringify(result))).toEqual(result);
	expect(result).toMatchObject({ calc: 'sweep-purge@1', constants: 'constants@1', inputs: base, scope: 'in scope' });
});

test('more volume, more leak, less flow, less mixing or more guard never shorten a plan', () => {
	const some = (min: number, max: number) => fc.double({ min, max, noNaN: true });
	fc.assert(
		fc.property(some(0, 300), some(0.2, 0.9), some(500, 3000), some(0, 1), (leak, mixing, flow, guard) => {
			const at = (change: Inputs): number => {
				const result = run({
					...{ leak: { flow: { value: leak, unit: 'm3(n)/h' } }, mixing, guard: { value: guard, unit: '%' } },
					...{ inertFlow: { value: flow, unit: 'm3(n)/h' }, ...change },
				});
				return result.values.time!.value ?? Infinity;
			};
			const time = at({});
			expect(at({ leak: { flow: { value: leak + 50, unit: 'm3(n)/h' } } })).toBeGreaterThanOrEqual(time);
			expect(at({ mixing: mixing - 0.1 })).toBeGreaterThanOrEqual(time);
			expect(at({ inertFlow: { value: flow - 100, unit: 'm3(n)/h' } })).toBeGreaterThanOrEqual(time);
			expect(at({ guard: { value: guard + 0.2, unit: '%' } })).toBeGreaterThanOrEqual(time);
			expect(at({ volumes: [{ ...base.volumes[0], volume: 550 }] })).toBeGreaterThanOrEqual(time);
		}),
	);
});
