import { sha256Hex } from '../../base';
import { lettering, rectangle, stroke } from '../../drawing';
import { allOf } from '../../record';
import { AREA } from '../layout/sheet';
import type { Flow } from '../layout/flow';
import { wrap } from '../layout/wrap';
import { readJpeg } from '../pdf/jpeg';
import type { Story } from '../story/story';

/** Photos that entries under a gate name: small, with step, name, who, when, and the hash by which the record knows them. */
export function photosOfGate(flow: Flow, story: Story, gate: number): void {
	const { say, input, names, moments } = story;
	const files = new Map(input.files.map((file) => [sha256Hex(file.bytes), file]));
	const shown = allOf(story.events, 'entry')
		.filter(({ body }) => names.step(body.step)?.gate === gate)
		.flatMap((event) =>
			(event.body.attachments ?? []).flatMap(({ hash, name }) => {
				const bytes = files.get(hash)?.bytes;
				const jpeg = bytes === undefined ? undefined : readJpeg(bytes);
				return bytes === undefined || jpeg === undefined ? [] : [{ event, hash, name, bytes, jpeg }];
			}),
		);
	if (shown.length === 0) return;
	flow.heading(say('photos.title'), { with: HEIGHT + 8 });
	for (let i = 0; i < shown.length; i += 2) {
		flow.block(HEIGHT, ({ x, y }) =>
			shown.slice(i, i + 2).flatMap(({ event, hash, name, bytes, jpeg }, column) => {
				const left = x + column * (WIDTH + GAP);
				const scale = Math.min(WIDTH / jpeg.width, PICTURE / jpeg.height);
				const [width, height] = [jpeg.width * scale, jpeg.height * scale];
				flow.addPicture({ hash, bytes, ...jpeg, box: { x: left, y: y + 2, width, height } });
				const by = { person: names.person(event.person), seen: moments.short(event.observed ?? event.entered) };
				const about = say('photos.of', { step: event.body.step, name, ...by });
				const lines = [
					...wrap(about, WIDTH, { voice: 'text', size: SMALL })
						.slice(0, 2)
						.map((text) => ({ text, size: SMALL, voice: 'text' as const })),
					...[hash.slice(0, 32), hash.slice(32)].map((text) => ({ text, size: CODE, voice: 'code' as const })),
				];
				return [
					stroke(rectangle({ x: left, y: y + 2, width, height }), { pen: 'hair', tone: 'soft' }),
					...lines.map(({ text, size, voice }, n) =>
						lettering(text, { x: left, y: y + PICTURE + 13 + n * LEAD }, { size, voice, tone: 'soft' }),
					),
				];
			}),
		);
	}
}

const GAP = 16;
const WIDTH = (AREA.width - GAP) / 2;
const PICTURE = 150;
const HEIGHT = PICTURE + 60;
const SMALL = 8.6;
const CODE = 8;
const LEAD = 11;
