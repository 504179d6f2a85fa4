import type { Procedure } from '../lib/procedure';
import { offsetMinutes, type GateStanding, type Standing } from '../lib/record';
import { duration, momentsAt, sayCause, speaker, type Names } from '../lib/wording';

const say = speaker('en');
const MINUTE = 60_000;

/** What stands, as lines that a person reads at a terminal: gates, why not, and what must be proved again. */
export function tellStanding(found: Standing, procedure: Procedure): string {
	const moments = momentsAt(offsetMinutes(found.at), say);
	const names = namesOf(procedure);
	const why = (causes: Standing['steps'][number]['why']): string =>
		causes.map((cause) => sayCause(cause, say, moments, names)).join('; ');
	const down = found.steps.filter(({ state }) => state === 'failed' || state === 'lapsed' || state === 'waits');
	const { reproof } = found;
	return [
		`${found.startUp}, ${found.procedure.id} revision ${found.procedure.revision}, as of ${moments.full(found.at)}${
			found.knownTo === undefined ? '' : `, as far as ${found.knownTo} knew`
		}`,
		'',
		...found.gates.map((gate) => `${titleOf(gate, procedure)}: ${gate.state}${whyNot(gate)}`),
		...(down.length === 0 ? [] : ['', 'Does not stand']),
		...down.map(({ step, state, why: causes }) => `  ${step}: ${state}; ${why(causes)}`),
		...(found.permissives.length === 0 ? [] : ['', 'Permissives']),
		...found.permissives.map(
			({ permissive, value, because }) =>
				`  ${names.permissive(permissive)}: ${value}${because.length === 0 ? '' : ` (${because.join('; ')})`}`,
		),
		'',
		reproof.steps.length === 0
			? 'Nothing must be proved again.'
			: `To prove again: ${reproof.steps.length} steps, ${duration(reproof.minutes * MINUTE)} of work, done in ${duration(
					reproof.earliestFinishMinutes * MINUTE,
				)} at the earliest`,
		...reproof.inWorkingOrder.map(
			({ step, title, minutes, why: causes }) => `  ${step} ${title}, ${duration(minutes * MINUTE)}: ${why(causes)}`,
		),
	].join('\n');
}

const titleOf = ({ gate }: GateStanding, { gates }: Procedure): string =>
	`Gate ${gate} ${gates.find(({ number }) => number === gate)?.title ?? ''}`.trimEnd();

function whyNot({ why }: GateStanding): string {
	if (why.length === 0) return '';
	const said = why.map((cause) => {
		switch (cause.kind) {
			case 'step':
				return `${cause.step} ${cause.state}`;
			case 'lower gate':
				return `gate ${cause.gate} ${cause.state}`;
			case 'deviation':
				return `deviation ${cause.deviation} is open`;
			case 'refusal':
				return `refused: ${cause.reason}`;
			case 'permissive':
				return `${cause.permissive} ${cause.value}`;
			case 'values to replace':
				return `values of ${cause.from} still to be replaced: ${cause.items.join(', ')}`;
			case 'needs release again':
				return 'needs release again';
		}
	});
	return ` (${said.join(', ')})`;
}

const namesOf = ({ plantEvents, permissives }: Procedure): Names => ({
	plantEvent: (what) => plantEvents.find(({ id }) => id === what)?.title ?? what,
	permissive: (id) => permissives?.find((each) => each.id === id)?.title ?? id,
});
