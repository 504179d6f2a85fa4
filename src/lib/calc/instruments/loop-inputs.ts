import * as v from 'valibot';
import { fail, ok, type Result } from '../../base';
import { QUANTITIES, type InSi } from '../../quantity';
import type { InputPart, OutputSpec, Refusal } from '../calculator';
import { LIVE_SIGNAL } from '../constants';
import { all, choice, measured, readMeasure, shaped, typedMeasure, withDefault, type Given } from '../read-inputs';

export type LoopPoint = {
	readonly applied: InSi<'percent-of-span'>;
	readonly current: InSi<'current'>;
	readonly direction: 'up' | 'down';
	readonly shown?: InSi<'percent-of-span'>;
};

const APPLIED = { quantity: 'percent-of-span', min: 0, max: 1 } as const;
const SHOWN = { quantity: 'percent-of-span', min: -0.1, max: 1.2 } as const;
const POINT_PARTS: readonly InputPart[] = [
	{ name: 'applied', symbol: 'x', label: 'Applied', means: 'part of the span that was applied', unit: '1', ...APPLIED },
	{
		...{ name: 'current', symbol: 'I', label: 'Signal', means: 'signal of the transmitter' },
		...{ quantity: 'current', unit: 'A', typedIn: 'mA' },
	},
	{
		...{ name: 'direction', label: 'Coming', means: 'whether the point was reached from below or from above' },
		...{ quantity: 'choice', choices: ['up', 'down'] },
	},
	{
		...{ name: 'shown', label: 'Shown', means: 'what the control system shows, as part of its range' },
		...{ unit: '1', optional: true, ...SHOWN },
	},
];
const pointSchema = v.strictObject({
	applied: typedMeasure,
	current: typedMeasure,
	direction: v.picklist(['up', 'down']),
	shown: v.optional(typedMeasure),
});

const points = shaped(
	v.pipe(v.array(pointSchema), v.maxLength(100)),
	{
		...{ quantity: 'table of points', label: 'Points', repeats: true, parts: POINT_PARTS, from: 'reading' },
		means: 'at least five points over the span, upwards and then downwards',
	},
	(rows, at) => all(rows.map((row, i) => readPoint(row, `${at}[${i}]`))),
);

function readPoint(row: v.InferOutput<typeof pointSchema>, at: string): Result<LoopPoint, readonly Refusal[]> {
	const applied = readMeasure(row.applied, APPLIED, `${at}.applied`);
	const current = readMeasure(row.current, { quantity: 'current' }, `${at}.current`);
	const shown = row.shown === undefined ? undefined : readMeasure(row.shown, SHOWN, `${at}.shown`);
	if (!applied.ok || !current.ok || shown?.ok === false) {
		return fail([applied, current, shown].flatMap((read) => (read === undefined || read.ok ? [] : read.error)));
	}
	const { value } = current.value;
	if (!(value >= LIVE_SIGNAL.min && value <= LIVE_SIGNAL.max))
		return fail([{ kind: 'signal-fault', input: `${at}.current`, value, unit: 'A', ...LIVE_SIGNAL }]);
	const { direction } = row;
	return ok({
		...{ applied: applied.value, current: current.value, direction },
		...(shown === undefined ? {} : { shown: shown.value }),
	});
}

/** Everything `loop-check@1` can be told. */
export const LOOP_INPUTS = {
	points,
	characteristic: withDefault(
		choice(['linear', 'root'], {
			label: 'Transmitter sends',
			means: 'what the transmitter is set to send: the quantity itself, or its root',
			from: 'instrument',
		}),
		'linear',
	),
	allowedError: measured({
		...{ quantity: 'percent-of-span', from: 'site', min: 1e-6, max: 0.5 },
		label: 'Allowed error',
		means: 'largest error of the loop that the site accepts, of span',
	}),
};

export type LoopGiven = Given<typeof LOOP_INPUTS>;

const output = (name: string, means: string, symbol?: string): OutputSpec => ({
	...{ name, means, quantity: 'percent-of-span', unit: QUANTITIES['percent-of-span'] },
	...(symbol === undefined ? {} : { symbol }),
});
export const LOOP_OUTPUTS: readonly OutputSpec[] = [
	output('largestError', 'largest error', 'e'),
	output('zeroError', 'error at zero'),
	output('spanError', 'error at the end of the span'),
	output('hysteresis', 'hysteresis'),
];
