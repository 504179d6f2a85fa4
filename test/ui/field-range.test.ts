import { expect, test } from 'vitest';
import { CATALOGUE } from '../../src/lib/calc';
import { rangeOf } from '../../src/lib/ui/calculators/field-range';
import { speaker } from '../../src/lib/wording';

const input = (calc: string, name: string) => CATALOGUE[calc]!.inputs.find((each) => each.name === name)!;

test('a range is said in the unit that is typed in; what goes without saying is not said', () => {
	const say = speaker('en');
	expect(rangeOf(input('venturi-flow@1', 'pipeDiameter'), 'mm', say)).toBe('10 to 5000');
	expect(rangeOf(input('pressure-decay@1', 'temperatureStart'), 'degC', say)).toBe('−73.15 to 326.9');
	expect(rangeOf(input('pressure-decay@1', 'volume'), 'm3', say)).toBe('');
	expect(rangeOf(input('sweep-purge@1', 'mixing'), '1', say)).toBe('');
});
