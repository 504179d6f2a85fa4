import { describe, expect, test } from 'vitest';
import { changed, kinds, place, purgeInputs, reasons, run, value, word, type Inputs } from './purge-scene';

describe('(a) coverage: unmet cannot be shown', () => {
	const row = (inputs: Inputs, volume: string): Record<string, unknown> =>
		inputs.coverage.find((each) => each.volume === volume)!;
	test.each<[string, (inputs: Inputs) => void, string]>([
		[
			'a volume without a row',
			(of) => (of.coverage = of.coverage.filter(({ volume }) => volume !== 'bypass')),
			'not-covered',
		],
		['a blank row', (of) => (of.coverage[4] = { volume: 'bypass', answer: '' }), 'not-covered'],
		['a place that nobody knows', (of) => (row(of, 'mill').place = 'AT-999'), 'covered-by-unknown-place'],
		['a place that reads another volume', (of) => (row(of, 'mill').place = 'AT-212'), 'place-reads-another-volume'],
		['a place at the inert inlet', (of) => (place(of, 'AT-211').atInertInlet = true), 'place-at-inert-inlet'],
		['an outlet that was not read', (of) => delete row(of, 'bypass').outlet, 'outlet-not-read'],
		[
			'an outlet read before the purge',
			(of) => Object.assign(row(of, 'bypass').outlet!, { t: -60 }),
			'outlet-read-outside-purge',
		],
		[
			'an outlet above the line',
			(of) => Object.assign(row(of, 'bypass').outlet!, { oxygen: { value: 7.8, unit: '%' } }),
			'outlet-above-line',
		],
		['a shut-off volume that nothing inerts', (of) => (row(of, 'chute').inertedBy = ' '), 'not-said-what-inerts-it'],
		[
			'a shut-off volume read above the line',
			(of) => (row(of, 'chute').reading = { tag: 'portable', basis: 'dry', t: 600, oxygen: { value: 9, unit: '%' } }),
			'shut-off-above-line',
		],
	])('%s', (_, change, kind) => {
		// With the volume changes given, nothing else than coverage asks for anything.
		const result = run({ ...changed(change), minimumVolumeChanges: 1 });
		expect(word(result)).toBe('cannot be shown');
		expect(reasons(result)).toEqual([`a ${kind}`]);
	});

	test('volumes that no analyser reads are listed, so that the sentence can name them', () => {
		expect(run(purgeInputs()).notes).toContainEqual({
			...{ level: 'remark', kind: 'covered-without-analyser' },
			...{ answer: 'swept, outlet read', volumes: ['bypass'] },
		});
	});

	test('a plant description without any dead leg is doubted', () => {
		const result = run(changed((of) => of.volumes.forEach((each) => (each.deadLeg = false))));
		expect(kinds(result)).toContain('no-dead-leg-named');
	});
});

describe('(b) readings of the hold window: unmet is not yet', () => {
	test('one reading above limit less guard in the window', () => {
		const inputs = changed((of) => {
			const { t, values } = of.series['AT-212']!;
			values[t.indexOf(4300)] = 7.71;
		});
		expect(word(run(inputs))).toBe('not yet');
		expect(reasons(run(inputs))).toEqual(['b above-line', 'c hold-too-short']);
		expect(run(inputs).verdict!.reasons[0]).toMatchObject({ place: 'AT-212', oxygen: 0.0771, t: 4300, count: 1 });
	});

	test('a reading exactly at limit less guard is below it', () => {
		const inputs = changed((of) => {
			const { t, values } = of.series['AT-212']!;
			values[t.indexOf(4300)] = 7.7;
		});
		expect(reasons(run(inputs))).not.toContain('b above-line');
	});

	test('readings that rise', () => {
		const inputs = changed((of) => {
			const { t, values } = of.series['AT-213']!;
			t.forEach((at, i) => at >= 4100 && (values[i] = Math.round(100 * (4.9 + (at - 4100) / 400)) / 100));
		});
		expect(word(run(inputs))).toBe('not yet');
		expect(reasons(run(inputs))).toEqual(['b rising']);
	});

	test('two minutes and more without a reading', () => {
		const inputs = changed((of) => {
			const series = of.series['AT-211']!;
			const keep = (_: number, i: number): boolean => !(series.t[i]! > 4200 && series.t[i]! < 4340);
			of.series['AT-211'] = { unit: '%', t: series.t.filter(keep), values: series.values.filter(keep) };
		});
		expect(reasons(run(inputs))).toEqual(['b gap-in-readings', 'c hold-too-short']);
	});

	test('a place that fell silent before the end', () => {
		const inputs = changed((of) => {
			const series = of.series['AT-211']!;
			of.series['AT-211'] = { unit: '%', t: series.t.slice(0, -60), values: series.values.slice(0, -60) };
		});
		expect(reasons(run(inputs))).toEqual(['b too-few-readings', 'b gap-in-readings', 'c hold-too-short']);
	});
});

describe('(c) hold: unmet is not yet', () => {
	const at = (inputs: Inputs): number => inputs.series['AT-211']!.t.at(-1)!;
	test.each<[string, (inputs: Inputs) => void, string]>([
		['a place that came below its line a minute ago', () => undefined, 'hold-too-short'],
		[
			'a fan below the flow of the next gate',
			(of) => (of.fan.least = { value: 46_000, unit: 'm3/h' }),
			'fan-below-next-gate',
		],
		['cleaning that does not run', (of) => (of.cleaning.runningSince = null), 'cleaning-not-running'],
		['cleaning begun a minute ago', (of) => (of.cleaning.runningSince = at(of) - 60), 'hold-too-short'],
		['a damper that was not stroked', (of) => (of.dampers[0]!.strokedAt = null), 'damper-not-stroked'],
		['a damper stroked before the purge', (of) => (of.dampers[0]!.strokedAt = -5), 'damper-not-stroked'],
		['a damper stroked a minute ago', (of) => (of.dampers[0]!.strokedAt = at(of) - 60), 'hold-too-short'],
		[
			'a damper moved a minute ago',
			(of) => Object.assign(of, { disturbances: [{ t: at(of) - 60, what: 'damper moved', tag: 'HV-14' }] }),
			'hold-too-short',
		],
	])('%s', (what, change, kind) => {
		const since = value(run(purgeInputs()), 'adequateSince')!;
		const inputs = changed(change);
		Object.assign(inputs.coverage[4]!.outlet!, { t: since });
		const result = run(what.startsWith('a place') ? { ...inputs, judgedAt: since + 60 } : inputs);
		expect(word(result)).toBe('not yet');
		expect(reasons(result).filter((each) => each.startsWith('c'))).toEqual([`c ${kind}`]);
	});

	test.each<[string, (inputs: Inputs) => void, string, number]>([
		['five minutes', (of) => (of.cleaning.cycle = { value: 1, unit: 'min' }), 'least hold', 300],
		[
			'one filter cleaning cycle',
			(of) => (of.cleaning.cycle = { value: 9, unit: 'min' }),
			'filter cleaning cycle',
			540,
		],
		[
			'three times lag and T90',
			(of) => Object.assign(place(of, 'AT-213'), { lag: 150, T90: 60 }),
			'response of the analysers',
			630,
		],
		// 3 · 592 m³ / (4500 m³/h) = 1420.8 s
		[
			'three turns of the circuit gas',
			(of) => {
				of.fan.least = { value: 4000, unit: 'm3/h' };
				of.series['FT-201']!.values = of.series['FT-201']!.values.map(() => 4500);
			},
			'turns of the circuit gas',
			1420.8,
		],
	])('the longest rule decides: %s', (_, change, rule, needed) => {
		const inputs = changed((of) => {
			change(of);
			of.dampers[0]!.strokedAt = null;
		});
		const result = run({ ...inputs, disturbances: [{ t: 4490, what: 'flow raised', tag: 'FT-201' }] });
		expect(result.verdict!.reasons[0]).toMatchObject({
			...{ kind: 'hold-too-short', rule, by: 'flow raised', since: 4490 },
			needed: expect.closeTo(needed, 6) as number,
		});
	});
});

describe('(d) inert gas admitted: unmet is not yet', () => {
	test('less than the least volume changes, whatever the readings say', () => {
		const result = run({ ...purgeInputs(), minimumVolumeChanges: 2.1 });
		expect(word(result)).toBe('not yet');
		expect(reasons(result)).toEqual(['d too-little-inert-gas']);
	});

	test('the uncertainty of the meter counts against it', () => {
		// 1110 m³(n) into 549.84 m³(n) are 2.0188 changes; less 2 % they are 1.978.
		expect(reasons(run({ ...purgeInputs(), minimumVolumeChanges: 2 }))).toEqual(['d too-little-inert-gas']);
		const sure = changed((of) => (of.inertGas.meters = [{ tag: 'FT-241', medium: 'inert gas', reads: 'flow' }]));
		expect(reasons(run({ ...sure, minimumVolumeChanges: 2 }))).toEqual([]);
	});

	test('where not every outlet is read, three volume changes are the least', () => {
		const inputs = changed((of) => of.coverage.forEach((row) => delete row.atOutlet));
		expect(run(inputs).verdict!.reasons).toEqual([
			expect.objectContaining({ kind: 'too-little-inert-gas', volumeChanges: 3 }),
		]);
	});

	test('time without a reading of the meter admits nothing, and says so', () => {
		const inputs = changed((of) => {
			const series = of.series['FT-241']!;
			const keep = (_: number, i: number): boolean => !(series.t[i]! > 600 && series.t[i]! < 1200);
			of.series['FT-241'] = { unit: series.unit, t: series.t.filter(keep), values: series.values.filter(keep) };
		});
		expect(value(run(inputs), 'admitted')).toBeCloseTo(1110 - 148, 6);
		expect(kinds(run(inputs))).toContain('meter-gap-not-counted');
	});

	test('a totaliser counts by its difference', () => {
		const inputs = changed((of) => {
			of.inertGas.meters = [{ tag: 'FQ-241', medium: 'inert gas', reads: 'totaliser' }];
			const t = of.series['FT-241']!.t;
			of.series['FQ-241'] = { unit: 'm3(n)', t, values: t.map((at) => 5000 + (888 * at) / 3600) };
		});
		expect(value(run(inputs), 'admitted')).toBeCloseTo(1110, 6);
		expect(word(run(inputs))).toBe('adequate');
	});
});

describe('(e) flow without a gap: unmet cannot be shown', () => {
	const stop = (tag: string, from: number, to: number) => (of: Inputs) => {
		const series = of.series[tag]!;
		series.values = series.values.map((each, i) => (series.t[i]! >= from && series.t[i]! <= to ? 0 : each));
	};
	test.each<[string, (inputs: Inputs) => void, string]>([
		['a fan that stood in the hold window', stop('FT-201', 4260, 4290), 'fan-broken'],
		['inert gas that stopped in the hold window', stop('FT-241', 4260, 4290), 'inert-flow-broken'],
		['an outlet that was shut in the hold window', stop('ZS-216', 4260, 4290), 'outlet-broken'],
		['a fan that nobody recorded', (of) => delete of.series['FT-201'], 'fan-broken'],
		['an outlet that nobody watched', (of) => delete of.outlet.tag, 'outlet-broken'],
	])('%s', (_, change, kind) => {
		const result = run(changed(change));
		expect(word(result)).toBe('cannot be shown');
		expect(reasons(result)).toContain(`e ${kind}`);
	});

	test('a stop before the hold window asks for a new hold only, and prints', () => {
		const result = run(changed(stop('FT-201', 3600, 3690)));
		expect(word(result)).toBe('adequate');
		expect(value(result, 'adequateSince')).toBe(3720);
		expect(result.notes).toContainEqual(
			expect.objectContaining({
				kind: 'flow-broken-before-hold',
				record: 'FT-201',
				from: 3600,
				to: 3720,
				why: 'stopped',
			}),
		);
	});

	test('what a person saw counts where nothing recorded it, and is marked; it does not count against a record', () => {
		const seen = { from: -60, to: 4600, by: 'TechA' };
		const vouched = run(changed((of) => (of.outlet = { name: 'stack damper HV-16', seen })));
		expect(word(vouched)).toBe('adequate');
		expect(vouched.notes).toContainEqual(expect.objectContaining({ kind: 'seen-not-recorded', by: 'TechA' }));
		const against = changed((of) => {
			stop('ZS-216', 4260, 4290)(of);
			of.outlet.seen = seen;
		});
		expect(reasons(run(against))).toContain('e outlet-broken');
	});
});

describe('(f) live analysers: unmet cannot be shown', () => {
	test.each<[string, (of: Record<string, unknown>) => unknown, string]>([
		['whose check does not stand', (of) => (of.check = 'does not stand'), 'check-does-not-stand'],
		['whose check nobody knows', (of) => (of.check = 'not known'), 'check-does-not-stand'],
		['in hold', (of) => (of.mode = 'hold'), 'not-measuring'],
		['in calibration', (of) => (of.mode = 'calibration'), 'not-measuring'],
		['in a mode that nobody knows', (of) => (of.mode = 'not known'), 'not-measuring'],
	])('an analyser %s', (_, change, kind) => {
		const result = run(changed((of) => change(place(of, 'AT-214'))));
		expect(word(result)).toBe('cannot be shown');
		expect(reasons(result)).toEqual([`f ${kind}`]);
	});

	const fromInside = (of: Inputs): void => {
		// A series that begins when the gas is already below air, as after a repeat purge.
		const series = of.series['AT-214']!;
		const first = series.t.indexOf(1200);
		of.series['AT-214'] = { unit: '%', t: series.t.slice(first), values: series.values.slice(first) };
	};
	test.each<[string, unknown, string[]]>([
		['20.9 % before the purge', { t: -600, oxygen: { value: 20.9, unit: '%' } }, []],
		['20.4 %, the last that counts as air', { t: -600, oxygen: { value: 20.4, unit: '%' } }, []],
		['20.3 %', { t: -600, oxygen: { value: 20.3, unit: '%' } }, ['f air-not-read']],
		['21.5 %', { t: -600, oxygen: { value: 21.5, unit: '%' } }, ['f air-not-read']],
		['air, but during the purge', { t: 600, oxygen: { value: 20.9, unit: '%' } }, ['f air-not-read']],
		['nothing', undefined, ['f air-not-read']],
	])('an analyser that read %s', (_, airBefore, expected) => {
		const result = run(
			changed((of) => {
				fromInside(of);
				place(of, 'AT-214').airBefore = airBefore;
			}),
		);
		expect(reasons(result)).toEqual(expected);
	});

	test('air in its own series before the purge, or a standing system check at the probe, is as good', () => {
		const own = run(changed((of) => delete place(of, 'AT-214').airBefore));
		expect(reasons(own)).toEqual([]);
		const system = run(
			changed((of) => {
				fromInside(of);
				Object.assign(place(of, 'AT-214'), { airBefore: undefined, systemCheck: 'stands' });
			}),
		);
		expect(reasons(system)).toEqual([]);
	});

	test('an analyser that shows the same few hundredths all along has not moved', () => {
		const result = run(
			changed((of) => {
				const series = of.series['AT-214']!;
				series.values = series.values.map((_, i) => 5 + (i % 3) / 100);
				Object.assign(place(of, 'AT-214'), { airBefore: undefined, systemCheck: 'stands' });
			}),
		);
		expect(word(result)).toBe('cannot be shown');
		expect(reasons(result)).toEqual(['f has-not-moved']);
	});

	test('a place without any series', () => {
		const result = run(changed((of) => delete of.series['AT-214']));
		expect(word(result)).toBe('cannot be shown');
		expect(reasons(result)).toContain('f no-valid-samples');
		expect(result.values['AT-214.last']).toEqual({ value: null, unit: '1', because: 'no-valid-samples' });
	});
});

describe('(g) unburnt gas at a zirconia cell: unmet cannot be shown', () => {
	test.each<[string, Record<string, unknown>, string[]]>([
		['not known', {}, ['g unburnt-gas-not-known']],
		['0.5 %', { unburntGas: { value: 0.5, unit: '%' } }, ['g unburnt-gas']],
		['40 ppm', { unburntGas: { value: 40, unit: 'ppm' } }, []],
	])('unburnt gas %s', (_, facts, expected) => {
		const result = run(changed((of) => Object.assign(place(of, 'AT-212'), { principle: 'zirconia', ...facts })));
		expect(reasons(result)).toEqual(expected);
	});

	test('a paramagnetic cell burns nothing; above 1 % the limit of the gas is named', () => {
		const result = run(changed((of) => (place(of, 'AT-212').unburntGas = { value: 1.5, unit: '%' })));
		expect(reasons(result)).toEqual([]);
		expect(kinds(result)).toContain('unburnt-gas-limit-applies');
	});
});
