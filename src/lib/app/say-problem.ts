import { unreachable } from '../base';
import type { DossierError } from '../dossier';
import { duration, sayEventError, sayObjection, sayRefusal, sayTrendError, sayWords, type Say } from '../wording';
import type { Problem } from './problem';

/** What happened, what is safe, what to do: one sentence or two for every problem. */
export function sayProblem(problem: Problem, say: Say): string {
	switch (problem.kind) {
		case 'storage-full':
		case 'storage-closed':
		case 'storage-blocked':
		case 'storage-newer':
		case 'storage-missing':
		case 'chain-moved-on':
		case 'no-gate-key':
		case 'destroyed':
		case 'no-site':
		case 'no-plant':
		case 'site-exists':
		case 'nobody-chosen':
		case 'sheet-changed':
		case 'weak-wrap':
		case 'damaged-wrap':
		case 'code-used-up':
		case 'resume-code-easy':
		case 'resume-code-in-pin':
			return say(`problem.${problem.kind}`);
		case 'storage-failed':
			return say('problem.storage-failed', { name: problem.name, message: problem.message });
		case 'wait':
			return say('problem.wait', { time: duration(problem.milliseconds), left: problem.left });
		case 'wrong-pin':
			return say('problem.wrong-pin', { left: problem.left });
		case 'wrong-code':
			return say('problem.wrong-code', { left: problem.left });
		case 'resume-code-length':
			return say('problem.resume-code-length', { atLeast: problem.atLeast, atMost: problem.atMost });
		case 'no-such-field':
			return say('problem.no-such-field', { step: problem.step, field: problem.field });
		case 'no-rows-here':
		case 'calculates-nothing':
		case 'no-such-step':
			return say('problem.wrong-step', { step: problem.step });
		case 'inputs-missing': {
			const missing = problem.missing.map(({ input, binding }) =>
				'step' in binding ? `${input} (${say('problem.of step', { step: binding.step })})` : input,
			);
			return say('problem.inputs-missing', { missing: [...new Set(missing)].join(', ') });
		}
		case 'calculation-refused':
			return say('problem.calculation-refused', {
				because: problem.refusals.map((refusal) => sayRefusal(refusal, say)).join('; '),
			});
		case 'no-such-point':
			return say('problem.no-such-point', { column: problem.column });
		case 'other-basis':
			return say('problem.other-basis', { column: problem.column, found: problem.found, point: problem.point });
		case 'no-such-column':
			return say('problem.no-such-column', { column: problem.column });
		case 'point-twice':
			return say('problem.point-twice', { point: problem.point });
		case 'other-unit':
			return say('problem.other-unit', { column: problem.column, found: problem.found, point: problem.point });
		case 'no-table':
		case 'ragged-line':
		case 'not-a-time':
		case 'time-runs-back':
		case 'not-a-number':
		case 'column-twice':
		case 'no-time-column':
			return say('problem.trend', { because: sayTrendError(problem, say) });
		case 'not-enrolled-here':
		case 'no-shift':
		case 'shift-covered':
			return say(`problem.${problem.kind}`, { person: problem.person });
		case 'work-stopped':
		case 'signing-refused':
			return say(`problem.${problem.kind}`, { because: problem.because });
		case 'not-this-signature':
			return say('problem.not-this-signature', { person: problem.person, meaning: problem.meaning });
		case 'no-root-in-file':
			return say('problem.no-root-in-file', { name: problem.name });
		case 'dossier-refused':
			return say('problem.dossier-refused', { because: sayDossierError(problem.error, say) });
		case 'no-such-start-up':
		case 'not-sealed-yet':
		case 'sealed':
			return say(`problem.${problem.kind}`, { startUp: problem.startUp });
		case 'start-up-unreadable':
			return say('problem.start-up-unreadable', { startUp: problem.startUp, what: problem.what });
		case 'not-a-picture':
		case 'not-utf8':
			return say(`problem.${problem.kind}`, { name: problem.name });
		case 'refused-act':
			return say('problem.refused-act', { because: problem.because.map((one) => sayObjection(one, say)).join('; ') });
		case 'site-incomplete':
			return say('problem.site-incomplete', { n: problem.n });
		case 'site-refused':
			return say('problem.site-refused', { because: problem.because });
		case 'no-right':
			return say('problem.no-right', { person: problem.person, roles: sayWords(problem.roles, say) });
		case 'plant-refused':
			return say('problem.plant-refused', { at: problem.at });
		case 'demonstration-stopped':
			return say('problem.demonstration-stopped', { because: problem.because });
		default:
			return unreachable(problem);
	}
}

/** Why no dossier can be made of a record, as the end of a sentence. */
function sayDossierError(error: DossierError, say: Say): string {
	switch (error.kind) {
		case 'after-the-seal':
			return say('dossier.after-the-seal', { n: error.events.length });
		case 'no-glyph':
			return say('dossier.no-glyph', { code: error.codePoint, text: error.text });
		case 'not-one-opening':
			return say('dossier.not-one-opening', { found: error.found });
		case 'not-sealed':
		case 'no-signature-asked-for':
			return say(`dossier.${error.kind}`);
		default:
			return sayEventError(error, say);
	}
}
