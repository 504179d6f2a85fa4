import { expect, test } from 'vitest';
import { forecast } from '../../../src/lib/calc/purge/forecast';
import { placeFit } from '../../../src/lib/calc/purge/place-fit';

const decay = (t: number): number => 0.04 + 0.17 * Math.exp(-t / 1000);
const fitUntil = (end: number) => {
	const samples = Array.from({ length: 101 }, (_, i) => {
		const t = (i * end) / 100;
		return { t, C: decay(t) + 1e-5 * Math.sin(13 * i) };
	});
	const fit = placeFit(samples, { begins: 0, lag: 0, T90: 10 });
	if (!fit.ok) throw new Error(fit.error.kind);
	return fit.value;
};
const twin = { V: 600, K: 0.5, Q_I: 0.3, Q_L: 0, Ci: 0 };

test('a fit over two exchanges says when its curve meets the line', () => {
	const now = { t: 2100, last: decay(2100), accept: 0.05 };
	const found = forecast(now, { fit: fitUntil(2100), twin });
	// By hand: t = 1000 ln(0.17/0.01) − 2100.
	expect(found.seconds! / (1000 * Math.log(17) - 2100)).toBeCloseTo(1, 2);
	expect(found).toMatchObject({ rough: false, by: 'fit' });
	expect(found.latest!).toBeGreaterThan(found.seconds!);
});

test('below two exchanges the planning twin starts from the last reading, and is rough', () => {
	const now = { t: 1000, last: 0.1, accept: 0.05 };
	const found = forecast(now, { fit: fitUntil(1000), twin });
	// By hand: V/(K Q) ln 2.
	expect(found).toEqual({
		...{ latest: null, rough: true, by: 'planning twin' },
		seconds: expect.closeTo((600 / 0.15) * Math.log(2), 9) as number,
	});
});

test('a line at or below the floor has no time', () => {
	expect(forecast({ t: 2100, last: 0.06, accept: 0.039 }, { fit: fitUntil(2100), twin }).seconds).toBeNull();
	const leaking = { ...twin, Q_L: 0.3 };
	expect(forecast({ t: 0, last: 0.2, accept: 0.05 }, { fit: undefined, twin: leaking }).seconds).toBeNull();
});

test('without fit and without a metered flow there is no forecast', () => {
	expect(forecast({ t: 0, last: 0.2, accept: 0.05 }, { fit: undefined, twin: undefined }).seconds).toBeNull();
});

test('a place at its line needs no time', () => {
	expect(forecast({ t: 0, last: 0.05, accept: 0.05 }, { fit: undefined, twin })).toMatchObject({
		seconds: 0,
		rough: false,
	});
});
