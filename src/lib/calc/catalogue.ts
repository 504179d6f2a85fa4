import { fail, type Result } from '../base';
import type { CalcResult, Calculator, Refusal } from './calculator';
import { loopCheck } from './instruments/loop-check';
import { venturiFlow } from './flow/venturi-flow';
import { acidDewPoints } from './moisture/acid-dew-points';
import { dewPointClearance } from './moisture/dew-point-clearance';
import { purgeAdequacy } from './purge/purge-adequacy';
import { sweepPurge } from './purge/sweep-purge';
import { swingPurge } from './purge/swing-purge';
import { inertStock } from './stock/inert-stock';
import { falseAir } from './tightness/false-air';
import { pressureDecay } from './tightness/pressure-decay';

/** Every calculator ever released, by id@version. A line is never taken out: old records recompute with it. */
export const CATALOGUE: { readonly [idAtVersion: string]: Calculator } = {
	'acid-dew-points@1': acidDewPoints,
	'dew-point-clearance@1': dewPointClearance,
	'false-air@1': falseAir,
	'inert-stock@1': inertStock,
	'loop-check@1': loopCheck,
	'pressure-decay@1': pressureDecay,
	'purge-adequacy@1': purgeAdequacy,
	'sweep-purge@1': sweepPurge,
	'swing-purge@1': swingPurge,
	'venturi-flow@1': venturiFlow,
};

/** The newest version of a calculator, for a new step; a step that is already approved names its version. */
export function latest(id: string): Calculator | undefined {
	const versions = Object.values(CATALOGUE).filter((calculator) => calculator.id === id);
	return versions.reduce<Calculator | undefined>(
		(newest, each) => (each.version > (newest?.version ?? 0) ? each : newest),
		undefined,
	);
}

export function runCalculator(idAtVersion: string, inputs: unknown): Result<CalcResult, readonly Refusal[]> {
	const calculator = Object.hasOwn(CATALOGUE, idAtVersion) ? CATALOGUE[idAtVersion] : undefined;
	return calculator === undefined
		? fail([{ kind: 'unknown-calculator', calc: idAtVersion, known: Object.keys(CATALOGUE) }])
		: calculator.run(inputs);
}
