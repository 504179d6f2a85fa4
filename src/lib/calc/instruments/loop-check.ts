import { fail, ok, type Result } from '../../base';
import { answered } from '../answered';
import type { CalcNote, CalcResult, Plot, Refusal, Verdict } from '../calculator';
import { defineCalculator } from '../define-calculator';
import { propagate, type Numbers, type Propagated } from '../uncertainty';
import { LOOP_CHECK_PAGE } from './loop-check-page';
import { LOOP_INPUTS, LOOP_OUTPUTS, type LoopGiven, type LoopPoint } from './loop-inputs';
import { seenBy, type Seen } from './seen-characteristic';

/**
 * Check of a 4-20 mA loop in five points up and down: how far the signal is from what was applied, and whether a root is
 * taken that nobody asked for, or twice.
 *
 *     e = (I − 4 mA)/16 mA − g(x),   g(x) = x (linear), √x (root);   hysteresis = max |e_up − e_down| at the same x
 *
 * @param inputs points: x, part of the span applied [1], 0 to 1; I [A], 3.8 to 20.5 mA; direction; what is shown [1];
 *   allowed error [1 of span]
 * @returns largest error, errors at zero and span, hysteresis [1 of span], with U of the largest error
 *
 * Source: IEC 61298-2, five points up and down (from memory, verify); IEC 60381-1 for the signal.
 * Checked against: worked by hand (test/calc/instruments/loop-check.test.ts).
 */
export const loopCheck = defineCalculator({
	id: 'loop-check',
	version: 1,
	title: 'Check of a 4-20 mA loop',
	answers: 'Does this loop show what is applied, and is a root taken once, never, or twice?',
	sources: [
		'IEC 61298-2, measured error and hysteresis (from memory, verify)',
		'IEC 60381-1, 4-20 mA; NAMUR NE 43 for a live signal (from memory, verify)',
		'JCGM 106:2012, guarded acceptance (clause from memory, verify)',
	],
	fields: LOOP_INPUTS,
	outputs: LOOP_OUTPUTS,
	page: LOOP_CHECK_PAGE,
	compute,
});

function compute(given: LoopGiven): Result<Omit<CalcResult, 'calc' | 'constants' | 'inputs'>, readonly Refusal[]> {
	const { points, characteristic } = given;
	if (points.length < LEAST_POINTS)
		return fail([{ kind: 'too-few-points', input: 'points', count: points.length, least: LEAST_POINTS }]);
	const errors = points.map((point) => ({ point, error: errorOf(point, characteristic) }));
	const worst = errors.reduce((most, each) => (Math.abs(each.error) > Math.abs(most.error) ? each : most));
	const { U, budget, unstated } = uncertaintyOf(worst.point, characteristic);
	const hysteresis = hysteresisOf(errors);
	const at = (applied: number): number | undefined =>
		errors.find(({ point }) => Math.abs(point.applied.value - applied) < SAME)?.error;
	const values = {
		largestError: Math.abs(worst.error),
		zeroError: at(0),
		spanError: at(1),
		hysteresis,
	};
	const notes: readonly CalcNote[] = [
		...rootNotes(given),
		...(hysteresis === undefined ? [{ kind: 'no-points-downwards', level: 'outside scope' } as const] : []),
		...(unstated.length > 0 ? [{ kind: 'uncertainty-not-stated', level: 'warning', inputs: ['points'] } as const] : []),
		...(values.largestError > given.allowedError.value / 2 && values.largestError <= given.allowedError.value
			? [{ kind: 'error-over-half', level: 'warning', error: values.largestError } as const]
			: []),
	];
	return ok({
		values: answered(LOOP_OUTPUTS, values, U, BECAUSE),
		verdict: verdictOf(given, worst, U.largestError ?? 0),
		scope: notes.some(({ level }) => level === 'outside scope') ? 'outside scope' : 'in scope',
		notes,
		budget,
		plots: [plotOf(errors, given.allowedError.value)],
	});
}

type Characteristic = LoopGiven['characteristic'];
type Judged = { readonly point: LoopPoint; readonly error: number };

const signalOf = (current: number): number => (current - 4e-3) / 16e-3;
const expected = (applied: number, characteristic: Characteristic): number =>
	characteristic === 'linear' ? applied : Math.sqrt(Math.max(0, applied));

const errorOf = ({ applied, current }: LoopPoint, characteristic: Characteristic): number =>
	signalOf(current.value) - expected(applied.value, characteristic);

function uncertaintyOf({ applied, current }: LoopPoint, characteristic: Characteristic): Propagated {
	const model = ({ current: I = NaN, applied: x = NaN }: Numbers): Numbers => ({
		largestError: signalOf(I) - expected(x, characteristic),
	});
	return propagate(model, [
		{ ...current, name: 'current', symbol: 'I', unit: 'A' },
		// A calibrator's own error counts where it is stated; the point itself is where it was set.
		{ U: 0, ...applied, name: 'applied', symbol: 'x', unit: '1' },
	]);
}

/** Largest difference between going up and coming down at the same point. */
function hysteresisOf(errors: readonly Judged[]): number | undefined {
	const pairs = errors.flatMap(({ point, error }) =>
		point.direction === 'up'
			? errors
					.filter((other) => other.point.direction === 'down' && isSame(other.point, point))
					.map((other) => Math.abs(other.error - error))
			: [],
	);
	return pairs.length === 0 ? undefined : Math.max(...pairs);
}

const isSame = (a: LoopPoint, b: LoopPoint): boolean => Math.abs(a.applied.value - b.applied.value) < SAME;

/** What signal and display look like against what was applied: a root that was taken twice is a fourth root. */
function rootNotes({ points, characteristic }: LoopGiven): readonly CalcNote[] {
	const signal = seenBy(points.map(({ applied, current }) => ({ x: applied.value, y: signalOf(current.value) })));
	const shown = seenBy(
		points.flatMap(({ applied, shown: y }) => (y === undefined ? [] : [{ x: applied.value, y: y.value }])),
	);
	const isWrong = (seen: Seen): boolean => seen === 'root twice' || seen === 'neither';
	return [
		{
			kind: 'characteristic-seen',
			level: signal !== characteristic && signal !== 'cannot tell' ? 'outside scope' : 'remark',
			seen: signal,
			setTo: characteristic,
		},
		...(shown === 'cannot tell'
			? []
			: [{ kind: 'display-seen', level: isWrong(shown) ? 'outside scope' : 'remark', seen: shown } as const]),
	];
}

function verdictOf({ allowedError }: LoopGiven, { error, point }: Judged, U: number): Verdict {
	const facts = { error: Math.abs(error), U, allowed: allowedError.value, applied: point.applied.value };
	const isWithin = facts.error + U <= allowedError.value;
	return {
		word: isWithin ? 'adequate' : 'not yet',
		reasons: [{ kind: isWithin ? 'loop-error-within' : 'loop-error-beyond', level: 'reason', ...facts }],
	};
}

function plotOf(errors: readonly Judged[], allowed: number): Plot {
	const curve = (direction: 'up' | 'down', decides: boolean) => {
		const own = errors
			.filter(({ point }) => point.direction === direction)
			.sort((a, b) => a.point.applied.value - b.point.applied.value);
		return {
			...{ id: direction, label: direction, kind: 'line' as const, ...(decides ? { decides: true as const } : {}) },
			x: own.map(({ point }) => point.applied.value),
			y: own.map(({ error }) => error),
		};
	};
	return {
		id: 'error',
		title: 'Error over the range',
		x: { label: 'applied', unit: '1' },
		y: { label: 'error, of span', unit: '1' },
		curves: [curve('up', true), curve('down', false)].filter(({ x }) => x.length > 0),
		marks: [
			{ kind: 'limit', label: 'allowed', axis: 'y', at: allowed },
			{ kind: 'limit', label: 'allowed', axis: 'y', at: -allowed },
		],
	};
}

const LEAST_POINTS = 5;
/** Two points within a tenth of a percent of the span are the same point. */
const SAME = 1e-3;
const BECAUSE = {
	zeroError: 'zero was not applied',
	spanError: 'the end of the span was not applied',
	hysteresis: 'no point was taken both up and down',
};
