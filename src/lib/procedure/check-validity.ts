import type { ProcedureFinding } from './finding';
import type { Procedure, Step } from './schema';

/** [P12] to [P15]: an age and the gate that ends it come together, and a watch is watched. */
export const checkValidity = ({ steps }: Procedure): readonly ProcedureFinding[] =>
	steps.flatMap((step, i) => [...agesOf(step, `steps[${i}].validity`), ...watchOf(step, `steps[${i}]`)]);

function agesOf({ id, gate, validity }: Step, path: string): readonly ProcedureFinding[] {
	if (validity.kind !== 'once' && validity.kind !== 'watch') return [];
	const { until } = validity;
	const findings: ProcedureFinding[] = [];
	if (until !== undefined && until < gate)
		findings.push({ kind: 'until-below-own-gate', path: `${path}.until`, step: id, until, gate });
	if (validity.kind === 'watch') return findings;
	const { ageMinutes } = validity;
	if (ageMinutes !== undefined && until === undefined)
		findings.push({ kind: 'age-without-until', path, step: id, ageMinutes });
	if (ageMinutes === undefined && until !== undefined)
		findings.push({ kind: 'until-without-age', path, step: id, until });
	return findings;
}

function watchOf(step: Step, path: string): readonly ProcedureFinding[] {
	const isWatched = step.validity.kind === 'watch';
	if (isWatched && step.kind !== 'watch')
		return [{ kind: 'watch-on-another-kind', path: `${path}.kind`, step: step.id, stepKind: step.kind }];
	if (!isWatched && step.kind === 'watch')
		return [
			{ kind: 'watch-step-without-watch', path: `${path}.validity`, step: step.id, validity: step.validity.kind },
		];
	return [];
}
