import { lettering, MARK_TONES, markShapes, rectangle, stroke, type Mark } from '../../drawing';
import type { CalcResult, Verdict } from '../../calc';
import { purgeSentence, sayNote } from '../../wording';
import { AREA } from '../layout/sheet';
import { STYLES, type Flow } from '../layout/flow';
import { wrap } from '../layout/wrap';
import { zeroOf } from '../story/calculations';
import type { Story } from '../story/story';

/** The verdict of a calculation in a frame: with every reason, and under an adequate one what it does not mean. */
export function verdict(flow: Flow, { say, moments }: Story, result: CalcResult): void {
	const { verdict: judged, scope } = result;
	const outside = scope === 'outside scope' ? [say('calc.outside scope')] : [];
	if (judged === undefined) {
		for (const line of outside) flow.write(line, { ...STYLES.body, tone: 'bad' });
		return;
	}
	const clock = { zero: zeroOf(result), moments };
	const mark = MARKS[judged.word];
	const said =
		judged.word === 'adequate'
			? [purgeSentence(result, say, clock) ?? say('calc.adequate')]
			: judged.reasons.map((reason) => sayNote(reason, say, clock));
	const lines = [...said, ...outside].filter((line) => line !== '');
	const left = 40;
	const set = lines.flatMap((line) => wrap(line, AREA.width - left - 14, STYLES.body));
	const height = 31 + set.length * STYLES.body.lead;
	flow.block(height + 6, ({ x, y, width }) => [
		stroke(rectangle({ x, y, width, height }), { pen: 'line' }),
		...markShapes(mark, { x: x + 21, y: y + 17 }, 15),
		lettering(
			say(`verdict.${judged.word}`),
			{ x: x + left, y: y + 20 },
			{ size: 12, voice: 'title', tone: toneOf(mark) },
		),
		...set.map((line, i) =>
			lettering(line, { x: x + left, y: y + 34 + i * STYLES.body.lead }, { size: STYLES.body.size }),
		),
	]);
	flow.space(4);
}

const toneOf = (mark: Mark) => (MARK_TONES[mark] === 'soft' ? 'ink' : MARK_TONES[mark]);

const MARKS: { readonly [word in Verdict['word']]: Mark } = {
	adequate: 'stands',
	'not yet': 'not yet',
	'cannot be shown': 'failed',
};
