import { expect, test } from 'vitest';
import { CATALOGUE } from '../../src/lib/calc';
import { inputsFrom } from '../../src/lib/ui';

test('a number goes to the calculator as it was typed, with its unit; a table as JSON; what is empty is left out', () => {
	const venturi = CATALOGUE['venturi-flow@1']!;
	const typed = {
		type: { text: 'machined', unit: '' },
		dp: { text: '4,65', unit: 'mbar' },
		pipeDiameter: { text: ' ', unit: 'm' },
		dpSeries: { text: '[460, 465]', unit: '' },
	};
	expect(inputsFrom(venturi, typed)).toEqual({
		type: 'machined',
		dp: { value: '4,65', unit: 'mbar' },
		dpSeries: [460, 465],
	});
});
