import { fail, ok, type Result } from '../../base';
import type { InSi } from '../../quantity';
import type { CalcNote, Refusal } from '../calculator';
import { LIVE_SIGNAL } from '../constants';
import type { Uncertain } from '../uncertainty';
import { characteristicSeen, differencePressureOf } from './flow-signal';
import { meanOfRoots, PULSATION_LIMIT } from './mean-of-roots';
import type { VenturiGiven } from './venturi-inputs';

export type DifferencePressure = { readonly dp: Uncertain; readonly notes: readonly CalcNote[] };

/**
 * The difference pressure that counts, from one reading, a series or a signal: none below the low-flow cut-off, refused
 * when negative, since the root of its size would hide a reverse flow.
 */
export function differencePressure(given: VenturiGiven): Result<DifferencePressure, readonly Refusal[]> {
	const read = given.signal === undefined || given.dp !== undefined ? byReading(given) : bySignal(given);
	if (!read.ok) return read;
	const { dp, notes } = read.value;
	const span = given.dpSpan?.value;
	if (span !== undefined && dp.value > span * RANGE_END) {
		return fail([{ kind: 'above-span', input: dp.name, value: dp.value, span, unit: 'Pa' }]);
	}
	const cutOff = cutOffOf(given);
	const cutOffNote = { cutOff, part: given.lowFlowCutOff.value, dp: dp.value };
	if (isReverse(dp.value, cutOff)) return fail([reverse(dp.name, dp.value)]);
	if (dp.value <= 0 || dp.value < cutOff) {
		return ok({
			dp: { ...dp, value: 0 },
			notes: [...notes, { kind: 'below-low-flow-cut-off', level: 'outside scope', ...cutOffNote }],
		});
	}
	const printed: readonly CalcNote[] =
		span === undefined ? [] : [{ kind: 'low-flow-cut-off', level: 'remark', ...cutOffNote }];
	return ok({ dp, notes: [...notes, ...printed] });
}

function byReading(given: VenturiGiven): Result<DifferencePressure, readonly Refusal[]> {
	const { dp, dpSeries } = given;
	if ((dp === undefined) === (dpSeries === undefined)) {
		return fail([{ kind: 'one-of', inputs: ['dp', 'dpSeries', 'signal'], given: dp === undefined ? 0 : 2 }]);
	}
	if (dp !== undefined) {
		return ok({ dp: { ...dp, name: 'dp', symbol: 'dp', unit: 'Pa' }, notes: characteristicNotes(given, dp.value) });
	}
	return bySeries(dpSeries ?? [], cutOffOf(given));
}

/** The mean by roots. A reading below zero by less than the cut-off is noise and counts as zero; below that it is refused. */
function bySeries(
	series: readonly InSi<'pressure-difference'>[],
	cutOff: number,
): Result<DifferencePressure, readonly Refusal[]> {
	const reversed = series.flatMap(({ value }, i) =>
		isReverse(value, cutOff) ? [reverse(`dpSeries[${i}]`, value)] : [],
	);
	if (reversed.length > 0) return fail(reversed);
	const { dp: value, pulsation, overread } = meanOfRoots(series.map((reading) => Math.max(0, reading.value)));
	// Twice the standard uncertainty of the mean, s/√n (JCGM 100:2008, 4.2.3), beside what all readings have in common.
	const scatter = (2 * pulsation * value) / Math.sqrt(series.length - 1);
	const systematic = series.map((reading) => reading.U ?? NaN).reduce((most, U) => Math.max(most, U), 0);
	const notes: readonly CalcNote[] = [
		{ kind: 'mean-of-roots', level: 'remark', readings: series.length, pulsation, overread },
		...(pulsation > PULSATION_LIMIT
			? [{ kind: 'pulsating-flow', level: 'outside scope', pulsation, limit: PULSATION_LIMIT } as const]
			: []),
	];
	const U = Number.isNaN(systematic) ? {} : { U: Math.hypot(systematic, scatter) };
	return ok({ dp: { name: 'dpSeries', symbol: 'dp', value, unit: 'Pa', ...U }, notes });
}

function bySignal(given: VenturiGiven): Result<DifferencePressure, readonly Refusal[]> {
	const { signal, dpSpan, transmitter, dpSeries } = given;
	if (signal === undefined || dpSeries !== undefined) {
		return fail([{ kind: 'one-of', inputs: ['dp', 'dpSeries', 'signal'], given: 2 }]);
	}
	if (dpSpan === undefined) return fail([{ kind: 'missing-input', input: 'dpSpan', neededBy: 'signal' }]);
	if (!(signal.value >= LIVE_SIGNAL.min && signal.value <= LIVE_SIGNAL.max)) {
		return fail([{ kind: 'signal-fault', input: 'signal', value: signal.value, unit: 'A', ...LIVE_SIGNAL }]);
	}
	const at = (current: number) => differencePressureOf(current, dpSpan.value, transmitter);
	const U =
		signal.U === undefined ? {} : { U: Math.abs(at(signal.value + signal.U) - at(signal.value - signal.U)) / 2 };
	return ok({
		dp: { name: 'signal', symbol: 'dp', value: at(signal.value), unit: 'Pa', ...U },
		notes: characteristicNotes(given, undefined),
	});
}

/** Whether the root is taken twice: by what the two ends are set to, and by a second reading when there is one. */
function characteristicNotes(given: VenturiGiven, dp: number | undefined): readonly CalcNote[] {
	const { signal, dpSpan, transmitter, controlSystem } = given;
	const notes: CalcNote[] = [];
	if (transmitter === 'root' && controlSystem === 'root')
		notes.push({ kind: 'root-taken-twice', level: 'outside scope' });
	if (signal !== undefined && dpSpan !== undefined && dp !== undefined) {
		const seen = characteristicSeen(signal.value, dpSpan.value, dp);
		const agrees = seen === transmitter || seen === 'cannot tell';
		notes.push({ kind: 'characteristic-seen', level: agrees ? 'remark' : 'outside scope', seen, setTo: transmitter });
	}
	return notes;
}

const cutOffOf = ({ dpSpan, lowFlowCutOff }: VenturiGiven): number => (dpSpan?.value ?? 0) * lowFlowCutOff.value;

const isReverse = (dp: number, cutOff: number): boolean => dp < 0 && !(-dp < cutOff);

const reverse = (input: string, value: number): Refusal => ({
	kind: 'negative-difference-pressure',
	input,
	value,
	unit: 'Pa',
});

/** 20.5 mA: beyond it the sensor is out of its range. */
const RANGE_END = (LIVE_SIGNAL.max - 4e-3) / 16e-3;
