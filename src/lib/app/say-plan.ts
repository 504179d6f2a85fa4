import { titleOf, usualUnit, type CalcResult, type Calculator, type TypedInputs } from '../calc';
import { fromSi, isQuantityName, shownUnit } from '../quantity';
import { sayNumber, type Say } from '../wording';

type Plan = { readonly calculator: Calculator; readonly result: CalcResult; readonly typed: TypedInputs };

/** A calculation in one sentence, for the note of a step: the results asked for and what was typed. */
export const sayPlan = ({ calculator, result, typed }: Plan, say: Say): string =>
	say('ui.calc.use note', {
		title: calculator.title,
		calc: result.calc,
		result: calculator.page.results.flatMap((name) => saidResult(calculator, result, name, say)).join(', '),
		inputs: Object.entries(typed)
			.flatMap(([at, { text, unit, U }]) =>
				text.trim() === ''
					? []
					: [
							`${titleOf(calculator, at)} ${text.trim()}${saidU(U)}${unit === undefined ? '' : ` ${shownUnit(unit)}`}`.trim(),
						],
			)
			.join('; '),
	});

const saidU = (U: string | undefined): string => (U === undefined || U.trim() === '' ? '' : ` ± ${U.trim()}`);

function saidResult({ outputs }: Calculator, { values }: CalcResult, name: string, say: Say): readonly string[] {
	const output = outputs.find((each) => each.name === name);
	const value = values[name]?.value;
	if (output === undefined || typeof value !== 'number' || !isQuantityName(output.quantity)) return [];
	const unit = usualUnit(output);
	const shown = fromSi(value, output.quantity, unit);
	return shown.ok ? [`${output.means} ${sayNumber(shown.value, say)} ${shownUnit(unit)}`.trim()] : [];
}
