import { drawTimeline, type Timeline } from '../../drawing';
import { measure } from '../fonts/faces';
import { STYLES, type Flow } from '../layout/flow';
import { AREA } from '../layout/sheet';
import type { Story } from '../story/story';

/** The whole start-up on one sheet. */
export function timeline(flow: Flow, story: Story, line: Timeline): void {
	const { say, moments, opened, sealed } = story;
	flow.newSheet(say('timeline.title'));
	flow.head(
		say('timeline.caption', { from: moments.full(opened.entered), to: moments.full(sealed.entered) }),
		say('timeline.title'),
	);
	flow.write(say('timeline.note'), STYLES.note);
	flow.space(4);
	flow.figure(drawTimeline(line, { width: AREA.width, height: flow.room - 4, lettering: 8.4, measure }));
}
