import { fail, ok, type Result } from '../../base';
import { QUANTITIES } from '../../quantity';
import { answered } from '../answered';
import type { CalcNote, CalcResult, OutputSpec, Refusal } from '../calculator';
import { OXYGEN_IN_AIR } from '../constants';
import { defineCalculator } from '../define-calculator';
import { measured, optional, withDefault, type Given } from '../read-inputs';
import { propagate, type Numbers, type Uncertain } from '../uncertainty';
import { FALSE_AIR_PAGE } from './false-air-page';

const OXYGEN = { quantity: 'oxygen-dry', from: 'reading', min: 0, max: 0.25 } as const;
const INPUTS = {
	oxygenBefore: measured({
		...OXYGEN,
		symbol: 'O_1',
		label: 'Oxygen before',
		means: 'oxygen of the dry gas at the first point, in the direction of the flow',
	}),
	oxygenAfter: measured({
		...OXYGEN,
		symbol: 'O_2',
		label: 'Oxygen after',
		means: 'oxygen of the dry gas at the second point, at the same time',
	}),
	airOxygen: withDefault(
		measured({ ...OXYGEN, symbol: 'O_air', label: 'Oxygen in the air', means: 'oxygen of the air that leaks in, dry' }),
		OXYGEN_IN_AIR,
	),
	flowBefore: optional(
		measured({
			...{ quantity: 'volume-flow-normal-dry', from: 'reading', min: 0 },
			symbol: 'q_1',
			label: 'Dry flow before',
			means: 'normal flow of the dry gas at the first point, when the false air is wanted as a flow',
		}),
	),
};

const output = (name: string, symbol: string, means: string, quantity: keyof typeof QUANTITIES): OutputSpec => ({
	...{ name, symbol, means, quantity },
	unit: QUANTITIES[quantity],
});
const OUTPUTS: readonly OutputSpec[] = [
	output('falseAir', 'r_1', 'false air as part of the dry gas before', 'fraction'),
	output('falseAirOfOutlet', 'r_2', 'false air as part of the dry gas after', 'fraction'),
	output('leak', 'q_L', 'false air as a dry normal flow', 'volume-flow-normal-dry'),
	output('flowAfter', 'q_2', 'dry normal flow after', 'volume-flow-normal-dry'),
];

/**
 * False air between two points of a duct: how much air leaks in, from the rise of the oxygen along the way.
 *
 *     r = q_L/q_1 = (O_2 − O_1)/(O_air − O_2),   q_L/q_2 = (O_2 − O_1)/(O_air − O_1),   q_L = r q_1
 *
 * @param inputs O_1, O_2, dry, 0 ≤ O < O_air [1]; O_air [1]; q_1 ≥ 0, dry [m³(n)/s]
 * @returns r of the gas before and of the gas after [1], q_L and q_2, dry [m³(n)/s], each with U
 *
 * Source: balances of dry gas and oxygen over the stretch (derived); JCGM 100:2008, 5.1.2.
 * Checked against: the two balances solved by scipy 1.17.1 and uncertainties 3.2.3 (test/calc/tightness/false-air.test.ts).
 */
export const falseAir = defineCalculator({
	id: 'false-air',
	version: 1,
	title: 'False air between two points',
	answers: 'How much air leaks in between these two points?',
	sources: ['Balances of dry gas and oxygen over the stretch (derived)', 'JCGM 100:2008, 5.1.2'],
	fields: INPUTS,
	outputs: OUTPUTS,
	page: FALSE_AIR_PAGE,
	compute,
});

type FalseAirGiven = Given<typeof INPUTS>;

function compute(given: FalseAirGiven): Result<Omit<CalcResult, 'calc' | 'constants' | 'inputs'>, readonly Refusal[]> {
	const { oxygenBefore, oxygenAfter, airOxygen, flowBefore } = given;
	const refusals = [
		...notBelowAir('oxygenBefore', oxygenBefore.value, airOxygen.value),
		...notBelowAir('oxygenAfter', oxygenAfter.value, airOxygen.value),
	];
	if (refusals.length > 0) return fail(refusals);
	const inputs: readonly Uncertain[] = [
		{ ...oxygenBefore, name: 'oxygenBefore', symbol: 'O_1', unit: '1' },
		{ ...oxygenAfter, name: 'oxygenAfter', symbol: 'O_2', unit: '1' },
		// Air is what it is; an oxygen that was read has its uncertainty stated, or not.
		{ U: 0, ...airOxygen, name: 'airOxygen', symbol: 'O_air', unit: '1' },
		...(flowBefore === undefined ? [] : [{ ...flowBefore, name: 'flowBefore', symbol: 'q_1', unit: 'm3(n)/s' }]),
	];
	const values = balance(Object.fromEntries(inputs.map(({ name, value }) => [name, value])));
	const { U, budget, unstated } = propagate(balance, inputs);
	const notes = notesOf(values.falseAir ?? NaN, U.falseAir, unstated);
	return ok({
		values: answered(OUTPUTS, values, U, { leak: 'no flow stated', flowAfter: 'no flow stated' }),
		scope: notes.some(({ level }) => level === 'outside scope') ? 'outside scope' : 'in scope',
		notes,
		budget: budget.filter((row) => row.output === 'falseAir'),
	});
}

function balance({ oxygenBefore = NaN, oxygenAfter = NaN, airOxygen = NaN, flowBefore }: Numbers): Numbers {
	const [O1, O2, Oair, q1] = [oxygenBefore, oxygenAfter, airOxygen, flowBefore];
	const r = (O2 - O1) / (Oair - O2);
	const flows = q1 === undefined ? {} : { leak: r * q1, flowAfter: (1 + r) * q1 };
	return { falseAir: r, falseAirOfOutlet: (O2 - O1) / (Oair - O1), ...flows };
}

const notBelowAir = (input: string, oxygen: number, air: number): readonly Refusal[] =>
	oxygen < air ? [] : [{ kind: 'oxygen-not-below-air', input, oxygen, air }];

function notesOf(r: number, U: number | undefined, unstated: readonly string[]): readonly CalcNote[] {
	return [
		...(r < 0 ? [{ kind: 'oxygen-falls-along', level: 'outside scope', r } as const] : []),
		...(r >= 0 && U !== undefined && r < U
			? [{ kind: 'leak-not-told-from-zero', level: 'warning', r, U } as const]
			: []),
		...(unstated.length > 0 ? [{ kind: 'uncertainty-not-stated', level: 'warning', inputs: unstated } as const] : []),
	];
}
