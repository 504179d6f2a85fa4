import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { decayFit, type DecayFit, type DecaySample } from '../../../src/lib/calc/purge/decay-fit';
import checks from '../../vectors/purge/engineering-checks.json';
import { decayVectors, samplesOf } from './decay-vectors';

const fitted = (samples: readonly DecaySample[]): DecayFit => {
	const fit = decayFit(samples);
	if (!fit.ok) throw new Error(fit.error.kind);
	return fit.value;
};
const within = (actual: number | null, expected: number | null, relative: number): void => {
	if (expected === null || actual === null) expect(actual).toBe(expected);
	else
		expect(Math.abs(actual - expected), `${actual} for ${expected}`).toBeLessThanOrEqual(relative * Math.abs(expected));
};

const sixteen = samplesOf({ t: checks.A5_fit.t_min, C: checks.A5_fit.O2_pct });

describe('the sixteen readings of a purge, minutes and percent', () => {
	// Source: scipy 1.10.1, scipy.optimize.curve_fit; the profile bound by brentq on SSR(lambda).
	const fit = fitted(sixteen);
	const [Cf, C0, lambda] = checks.A5_fit.se as [number, number, number];

	test('floor, start and rate are those of an independent fit', () => {
		within(fit.Cf, checks.A5_fit.Cf, 1e-4);
		within(fit.C0, checks.A5_fit.C0, 1e-4);
		within(fit.lambda, checks.A5_fit.lam_per_min, 1e-4);
		within(fit.SSR, checks.A5_fit.SSR, 1e-8);
		within(fit.s, checks.A5_fit.s, 1e-8);
	});

	test('standard errors, t and the profile bound of the rate agree too', () => {
		within(fit.standardErrors.Cf, Cf, 1e-4);
		within(fit.standardErrors.C0, C0, 1e-4);
		within(fit.standardErrors.lambda, lambda, 1e-4);
		within(fit.t, checks.A5_fit.t_crit, 1e-9);
		within(fit.bounds.lambda.low, checks.A5_profile_lam95[0] ?? null, 1e-4);
		within(fit.bounds.lambda.high, checks.A5_profile_lam95[1] ?? null, 1e-4);
	});
});

test('trap: seven readings give a floor that is biased, and a bound of which the truth lies outside', () => {
	// Source: scipy 1.10.1, scipy.optimize.curve_fit on the first seven readings; the data were made with a floor of 3.2.
	const fit = fitted(sixteen.slice(0, checks.A5_fit_truncated.n));
	const [seCf, seC0, seLambda] = checks.A5_fit_truncated.se as [number, number, number];
	within(fit.Cf, checks.A5_fit_truncated.Cf, 1e-4);
	within(fit.lambda, checks.A5_fit_truncated.lam, 1e-4);
	within(fit.standardErrors.Cf, seCf, 1e-4);
	within(fit.standardErrors.C0, seC0, 1e-4);
	within(fit.standardErrors.lambda, seLambda, 1e-4);
	within(fit.t, checks.A5_fit_truncated.t_crit, 1e-9);
	expect(fit.linearBounds.Cf.low).toBeGreaterThan(3.2);
});

test('trap: a straight line through the logarithms, floor taken as zero, is wrong by a factor 2.4', () => {
	// Source: numpy.polyfit of log C against t, in the same check file.
	expect(fitted(sixteen).lambda / checks.A5_naive_loglin).toBeGreaterThan(2.4);
});

describe.each(decayVectors)('$name', (vector) => {
	const fit = fitted(samplesOf(vector));
	// Source: scipy 1.17.1, curve_fit and brentq (test/reference/purge/make-vectors.py).
	test('agrees with scipy to 1e-4, bounds included', () => {
		const { Cf, C0, lambda, SE, SSR, t } = vector.expect;
		// A floor close to zero is compared on the scale of the oxygen, not of itself.
		expect(Math.abs(fit.Cf - Cf)).toBeLessThan(1e-4 * Math.max(Math.abs(Cf), 1));
		within(fit.C0, C0, 1e-4);
		within(fit.lambda, lambda, 1e-4);
		within(fit.standardErrors.Cf, SE.Cf, 1e-4);
		within(fit.standardErrors.C0, SE.C0, 1e-4);
		within(fit.standardErrors.lambda, SE.lambda, 1e-4);
		within(fit.SSR, SSR, 1e-8);
		within(fit.t, t, 1e-9);
		within(fit.bounds.lambda.low, vector.expect['lambda bounds'][0], 1e-4);
		within(fit.bounds.lambda.high, vector.expect['lambda bounds'][1], 1e-4);
		within(fit.bounds.Cf.low, vector.expect['Cf bounds'][0], 1e-4);
		within(fit.bounds.Cf.high, vector.expect['Cf bounds'][1], 1e-4);
	});
});

/** Once found by chance: all but the first sample say the same, and values so small that their product is zero. */
const rowsOf = (pairs: readonly (readonly [number, number])[]) => pairs.map(([t, C]) => ({ t, C }));
const ONE_HIGH_FIRST = rowsOf([[441, 152], [224, 58], [831, 126], [92, 175], [32, 220], [714, 204], [93, 50], [748, 81], [278, 166]]); // prettier-ignore
const OVER_AT_ONCE = rowsOf([[155, 171], [587, 104], [592, 21], [622, 74]]); // prettier-ignore

describe('laws of the fit', () => {
	const decay = fc.record({
		floor: fc.double({ min: 0, max: 10, noNaN: true }),
		drop: fc.double({ min: 2, max: 20, noNaN: true }),
		turns: fc.double({ min: 1, max: 8, noNaN: true }),
		count: fc.integer({ min: 8, max: 60 }),
	});

	test('a decay without noise is found again', () => {
		fc.assert(
			fc.property(decay, ({ floor, drop, turns, count }) => {
				const at = (i: number): number => (i * 1800) / (count - 1);
				const samples = Array.from({ length: count }, (_, i) => ({
					t: at(i),
					C: floor + drop * Math.exp((-turns * at(i)) / 1800),
				}));
				const fit = fitted(samples);
				expect(fit.Cf).toBeCloseTo(floor, 6);
				expect(fit.lambda * 1800).toBeCloseTo(turns, 6);
			}),
		);
	});

	test('the order in which samples arrive, and the unit of time, change nothing', () => {
		const [first] = [fitted(sixteen)];
		const turned = fitted([...sixteen].reverse().map(({ t, C }) => ({ t: t * 60, C })));
		within(turned.Cf, first.Cf, 1e-9);
		within(turned.lambda * 60, first.lambda, 1e-9);
		within(turned.bounds.Cf.high, first.bounds.Cf.high, 1e-9);
	});

	test('whatever the samples are, it answers: a curve of finite numbers, or why there is none', () => {
		const sample = fc.record({ t: fc.integer({ min: 0, max: 900 }), C: fc.integer({ min: 0, max: 250 }) });
		fc.assert(
			fc.property(fc.array(sample, { maxLength: 40 }), fc.constantFrom('alike', 'independent'), (rows, neighbours) => {
				const fit = decayFit(
					rows.map(({ t, C }) => ({ t, C: C / 10 })),
					{ neighbours },
				);
				if (!fit.ok) return;
				const { Cf, C0, lambda, SSR, bounds } = fit.value;
				expect([Cf, C0, lambda, SSR].every(Number.isFinite)).toBe(true);
				const sides = [bounds.Cf.low, bounds.Cf.high, bounds.lambda.low, bounds.lambda.high];
				expect(sides.every((side) => side === null || Number.isFinite(side))).toBe(true);
				expect(bounds.Cf.low ?? Cf).toBeLessThanOrEqual(Cf);
				expect(bounds.Cf.high ?? Cf).toBeGreaterThanOrEqual(Cf);
				expect(bounds.lambda.low ?? lambda).toBeLessThanOrEqual(lambda);
				expect(bounds.lambda.high ?? lambda).toBeGreaterThanOrEqual(lambda);
			}),
			{
				numRuns: 300,
				examples: [
					[ONE_HIGH_FIRST, 'independent'],
					[OVER_AT_ONCE, 'independent'],
				],
			},
		);
	});

	test('the profile bound of the floor reaches further than its straight bound on the side of the start', () => {
		const short = fitted(samplesOf(decayVectors.find(({ name }) => name === 'short span of one exchange')!));
		expect(short.bounds.Cf.low!).toBeLessThan(short.linearBounds.Cf.low!);
	});

	test('like neighbours widen every bound', () => {
		const samples = samplesOf(decayVectors.find(({ name }) => name === 'many and close')!);
		const [plain, wide] = [decayFit(samples), decayFit(samples, { neighbours: 'alike' })];
		if (!plain.ok || !wide.ok) throw new Error('no fit');
		expect(wide.value.inflation).toBeGreaterThan(4);
		expect(wide.value.bounds.lambda.low!).toBeLessThan(plain.value.bounds.lambda.low!);
		expect(wide.value.bounds.Cf.high!).toBeGreaterThan(plain.value.bounds.Cf.high!);
		expect(wide.value.standardErrors.Cf).toBeCloseTo(
			plain.value.standardErrors.Cf * Math.sqrt(wide.value.inflation),
			12,
		);
	});
});

describe('what is no decay is refused', () => {
	const line = Array.from({ length: 12 }, (_, i) => ({ t: i * 60, C: 20 - 0.5 * i }));
	test.each([
		['three samples', sixteen.slice(0, 3), 'too-few-samples'],
		['a straight line', line, 'no-curvature'],
		[
			'a decay that is over before the second sample',
			line.map(({ t }, i) => ({ t, C: i === 0 ? 20.9 : 4 })),
			'too-coarse',
		],
		['oxygen that rises', sixteen.map(({ t, C }) => ({ t, C: 24 - C })), 'not-falling'],
	])('%s', (_, samples, kind) => {
		const fit = decayFit(samples);
		expect(fit.ok ? undefined : fit.error.kind).toBe(kind);
	});

	test('residuals of which fewer than four count give a curve without bounds', () => {
		const slow = Array.from({ length: 60 }, (_, i) => ({
			t: i * 10,
			C: 4 + 17 * Math.exp(-i / 15) + 0.5 * Math.sin(i / 8),
		}));
		const fit = decayFit(slow, { neighbours: 'alike' });
		const open = { low: null, high: null };
		expect(fit.ok && fit.value).toMatchObject({
			t: null,
			bounds: { Cf: open, lambda: open },
			linearBounds: { Cf: open },
		});
	});
});
