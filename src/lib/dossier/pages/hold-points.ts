import type { Drawing } from '../../drawing';
import { STYLES, type Flow } from '../layout/flow';
import { table } from '../layout/table';
import { releasesOf } from '../story/releases';
import type { Story } from '../story/story';
import type { Anchors } from './anchors';

/** Who let what happen, when, and where its evidence stands; under it the plant with its last values. */
export function holdPoints(flow: Flow, story: Story, anchors: Anchors, sketch: Drawing): void {
	const { say, moments } = story;
	flow.newSheet(say('hold.sheet'));
	flow.head(say('hold.caption'), say('hold.title'));
	table(
		flow,
		[
			{ head: say('hold.gate'), width: 30, voice: 'strong' },
			{ head: say('hold.lets') },
			{ head: say('hold.by'), width: 150 },
			{ head: say('hold.when'), width: 62 },
			{ head: say('hold.evidence'), width: 60 },
		],
		releasesOf(story).map(({ gate, title, holdPoint, by }) => ({
			cells: [
				String(gate),
				{ text: `${title}: ${holdPoint}`, voice: 'text' },
				by.length === 0 ? say('hold.not released') : by.map(({ person, roles }) => `${person}, ${roles}`).join('\n'),
				by.map(({ at }) => moments.short(at)).join('\n'),
				say('hold.on sheet', { sheet: anchors.sheetOf(`gate ${gate}`) }),
			],
		})),
	);
	flow.space(6);
	flow.heading(say('sketch.title'), { with: 300 });
	flow.figure(sketch);
	flow.space(4);
	flow.write(say('sketch.note'), STYLES.note);
}
