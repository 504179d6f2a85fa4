import type { CalcNote } from '../calculator';
import { STEEL_EXPANSION, T_20 } from '../constants';
import { straightLength } from './straight-length';
import type { VenturiGiven } from './venturi-inputs';
import { isInside, VENTURI_TYPES, type Limits } from './venturi-types';
import type { WorkingPoint } from './working-point';

/** Everything that takes a result out of the standard's scope, and what else a reader must know about it. */
export function venturiScope(given: VenturiGiven, point: WorkingPoint): readonly CalcNote[] {
	return [...limitNotes(given, point), ...readingNotes(given, point), ...installationNotes(given, point)];
}

function limitNotes(given: VenturiGiven, point: WorkingPoint): readonly CalcNote[] {
	const limits: Limits = VENTURI_TYPES[given.type];
	const { edition } = limits;
	const judged = [
		{ limit: 'D', value: point.D, unit: 'm', range: limits.D },
		{ limit: 'beta', value: point.beta, unit: '1', range: limits.beta },
		{ limit: 'Re_D', value: point.reynolds, unit: '1', range: limits.Re_D },
	];
	const outside = judged
		.filter(({ value, range }) => !isInside(value, range))
		.map(({ range: [min, max], ...each }): CalcNote => ({
			kind: 'outside-limit',
			level: 'outside scope',
			...each,
			min,
			max,
			edition,
		}));
	const { coefficient, massFlowAtConstant } = point;
	if (coefficient.from === 'standard') return outside;
	const { C, U = null, from } = coefficient;
	return [
		...outside,
		{
			kind: 'coefficient-not-of-the-standard',
			level: 'outside scope',
			C,
			U,
			from,
			constant: limits.C,
			massFlowAtConstant,
		},
	];
}

function readingNotes(given: VenturiGiven, { dp, p1, kappa }: WorkingPoint): readonly CalcNote[] {
	const notes: CalcNote[] = [];
	const { dpSpan, dpZero, temperature, temperatureTaken, thermalExpansion } = given;
	if (dpSpan !== undefined && dp < LEAST_PART * dpSpan.value) {
		notes.push({ kind: 'dp-low-in-span', level: 'outside scope', dp, span: dpSpan.value, least: LEAST_PART });
	}
	if (dpZero !== undefined && dpZero.value !== 0) {
		const flowError = Math.sqrt(Math.max(0, dp + dpZero.value) / dp) - 1;
		const level = Math.abs(flowError) > ZERO_EFFECT ? 'outside scope' : 'remark';
		notes.push({ kind: 'zero-shifted', level, dpZero: dpZero.value, flowError });
	}
	if (temperatureTaken === 'downstream') {
		const colderByAtMost = temperature.value * (1 - (1 - dp / p1) ** ((kappa - 1) / kappa));
		notes.push({ kind: 'temperature-from-downstream', level: 'warning', colderByAtMost });
	}
	const growth = 2 * STEEL_EXPANSION * Math.abs(temperature.value - T_20);
	if (thermalExpansion === undefined && growth > GROWTH_EFFECT) {
		notes.push({ kind: 'diameters-taken-as-hot', level: 'warning', flowErrorIfFromDrawing: growth });
	}
	return notes;
}

function installationNotes(given: VenturiGiven, { D }: WorkingPoint): readonly CalcNote[] {
	const notes: CalcNote[] = [];
	const { dpCalibration, dust, flowCalibration, throatCondition } = given;
	if (dpCalibration === 'none') notes.push({ kind: 'no-calibration-certificate', level: 'outside scope' });
	if (dust === 'present' && flowCalibration === 'none') notes.push({ kind: 'dust-laden', level: 'outside scope' });
	if (throatCondition === 'worn or built up') notes.push({ kind: 'throat-changed', level: 'outside scope' });
	notes.push(...straightLength(given, D).notes);
	const unknown = Object.entries({
		dpCalibration,
		dust,
		throatCondition,
		straightLength: given.straightLength,
		straightLengthNeeded: given.straightLengthNeeded,
	})
		.filter(([, value]) => value === undefined)
		.map(([name]) => name);
	if (unknown.length > 0) notes.push({ kind: 'installation-not-stated', level: 'remark', inputs: unknown });
	return notes;
}

/** Below this part of the span the root makes too much of the transmitter's error (common practice). */
const LEAST_PART = 0.05;
const ZERO_EFFECT = 0.01;
const GROWTH_EFFECT = 1e-3;
