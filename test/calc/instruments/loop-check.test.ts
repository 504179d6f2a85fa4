import { expect, test } from 'vitest';
import { runCalculator } from '../../../src/lib/calc';
import { agreesWith } from '../../support/printed';

type Direction = 'up' | 'down';
const point = (applied: number, mA: number, direction: Direction, shown?: number) => ({
	applied: { value: applied, unit: '%span' },
	current: { value: mA, unit: 'mA', U: 0.002 },
	direction,
	...(shown === undefined ? {} : { shown: { value: shown, unit: '%span' } }),
});
const UP = [4.012, 8.004, 11.988, 15.99, 19.996].map((mA, i) => point(25 * i, mA, 'up'));
const DOWN = [4.02, 8.03, 12.016, 16.008, 19.996].map((mA, i) => point(25 * i, mA, 'down'));
const LOOP = { points: [...UP, ...DOWN], allowedError: { value: 0.25, unit: '%span' } };
const run = (inputs: object) => {
	const result = runCalculator('loop-check@1', inputs);
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
};

// By hand: (8.030 - 8)/16 = 0.1875 % at 25 % coming down; (4.012 - 4)/16 = 0.0750 %; (19.996 - 20)/16 = -0.0250 %; at 50 %
// 0.1000 % down less -0.0750 % up is 0.1750 %.
test('errors and hysteresis of ten points as worked by hand', () => {
	const { values, verdict, scope } = run(LOOP);
	expect(agreesWith(values.largestError!.value! * 100, '0.1875')).toBe(true);
	expect(agreesWith(values.zeroError!.value! * 100, '0.0750')).toBe(true);
	expect(agreesWith(values.spanError!.value! * 100, '-0.0250')).toBe(true);
	expect(agreesWith(values.hysteresis!.value! * 100, '0.1750')).toBe(true);
	// 0.002 mA of 16 mA.
	expect(agreesWith(values.largestError!.U! * 100, '0.0125')).toBe(true);
	expect(verdict?.word).toBe('adequate');
	expect(scope).toBe('in scope');
});

test('an error is accepted only together with its uncertainty', () => {
	expect(run({ ...LOOP, allowedError: { value: 0.195, unit: '%span' } }).verdict).toMatchObject({
		word: 'not yet',
		reasons: [{ kind: 'loop-error-beyond' }],
	});
});

test('points that were only taken upwards show no hysteresis, and prove nothing', () => {
	const { values, scope, notes } = run({ ...LOOP, points: UP });
	expect(values.hysteresis).toEqual({ value: null, unit: '1', because: 'no point was taken both up and down' });
	expect(scope).toBe('outside scope');
	expect(notes.map(({ kind }) => kind)).toContain('no-points-downwards');
});

const root = (applied: number, direction: Direction, shown: number) =>
	point(applied * 100, 4 + 16 * Math.sqrt(applied), direction, shown * 100);
const rootLoop = (power: number) => ({
	characteristic: 'root',
	allowedError: { value: 0.5, unit: '%span' },
	points: [0, 0.1, 0.3, 0.6, 1].flatMap((x) => [root(x, 'up', x ** power), root(x, 'down', x ** power)]),
});

test('a transmitter that takes the root, and a display that does not, show one root', () => {
	const { notes, scope } = run(rootLoop(1 / 2));
	expect(scope).toBe('in scope');
	expect(notes).toEqual([
		{ kind: 'characteristic-seen', level: 'remark', seen: 'root', setTo: 'root' },
		{ kind: 'display-seen', level: 'remark', seen: 'root' },
	]);
});

test('a root that is taken in the transmitter and again in the control system is seen', () => {
	const { notes, scope } = run(rootLoop(1 / 4));
	expect(scope).toBe('outside scope');
	expect(notes).toContainEqual({ kind: 'display-seen', level: 'outside scope', seen: 'root twice' });
});

test('a transmitter that takes a root nobody asked for is seen', () => {
	const { notes, scope } = run({ ...rootLoop(1 / 2), characteristic: 'linear' });
	expect(scope).toBe('outside scope');
	expect(notes).toContainEqual({
		kind: 'characteristic-seen',
		level: 'outside scope',
		seen: 'root',
		setTo: 'linear',
	});
});

test('fewer than five points, and a signal that is a fault, are refused', () => {
	const few = runCalculator('loop-check@1', { ...LOOP, points: UP.slice(1) });
	expect(few).toEqual({ ok: false, error: [{ kind: 'too-few-points', input: 'points', count: 4, least: 5 }] });
	const broken = runCalculator('loop-check@1', { ...LOOP, points: [...UP, point(0, 3.5, 'down')] });
	expect(broken).toMatchObject({ ok: false, error: [{ kind: 'signal-fault', input: 'points[5].current' }] });
});
