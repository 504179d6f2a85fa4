import type { Calculator } from '../../calc';

/** Calculators that know every word of a question, whatever the order: people ask by what they want to know. */
export function findCalculators(calculators: readonly Calculator[], question: string): readonly Calculator[] {
	const asked = wordsOf(question).filter((word) => !SMALL.has(word));
	return calculators.filter((calculator) => {
		const known = wordsOf(textOf(calculator));
		return asked.every((word) =>
			known.some((each) => each.startsWith(word) || (word.length > 4 && each.includes(word))),
		);
	});
}

const textOf = ({ id, title, answers, page, inputs, outputs }: Calculator): string =>
	[
		...[id, title, answers, page.findBy],
		...inputs.map(({ label, means }) => `${label ?? ''} ${means}`),
		...outputs.map(({ means }) => means),
	].join(' ');

const wordsOf = (text: string): readonly string[] => text.toLowerCase().match(/[\p{L}\d]+/gu) ?? [];

/** Words of a question that say nothing about its matter. */
const SMALL = new Set(
	'a an the is are do does did i we you it this that of in on at to from for with and or how what which when where why must need can will'.split(
		' ',
	),
);
