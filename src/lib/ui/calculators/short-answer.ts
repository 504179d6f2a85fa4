import { usualUnit, type CalcResult, type Calculator } from '../../calc';
import { fromSi, isQuantityName, shownUnit } from '../../quantity';
import { sayNumber, type Say } from '../../wording';

/** The result that is asked for, in a few words: "30 710 m³/h". */
export function shortAnswer({ outputs, page }: Calculator, { values }: CalcResult, say: Say): string {
	const output = outputs.find(({ name }) => name === page.results[0]);
	const value = output === undefined ? undefined : values[output.name];
	if (output === undefined || typeof value?.value !== 'number' || !isQuantityName(output.quantity))
		return value?.because ?? '';
	const unit = usualUnit(output);
	const shown = fromSi(value.value, output.quantity, unit);
	return `${sayNumber(shown.ok ? shown.value : value.value, say)} ${shownUnit(shown.ok ? unit : value.unit)} ${output.means}`;
}
