import type { Result } from '../base';
import { processSketch, type Drawing, type Timeline } from '../drawing';
import type { DossierError, DossierInput, Progress } from './input';
import { measure } from './fonts/faces';
import { Flow } from './layout/flow';
import { frameShapes } from './layout/title-block';
import type { Sheet } from './layout/sheet';
import { manifestOf, type Manifest } from './manifest';
import { Anchors } from './pages/anchors';
import { calculations } from './pages/calculations';
import { cover, titleOf } from './pages/cover';
import { gatePages } from './pages/gate';
import { happenings } from './pages/happenings';
import { holdPoints } from './pages/hold-points';
import { instruments } from './pages/instruments';
import { peopleAndTablets } from './pages/people-and-tablets';
import { refusals } from './pages/refusals';
import { signatures } from './pages/signatures';
import { timeline } from './pages/timeline';
import { writePdf } from './pdf/write-pdf';
import { seenAtEnd } from './story/last-seen';
import { storyOf, type Story } from './story/story';
import { timelineOf } from './story/timeline';

/**
 * The dossier of one sealed start-up, before anybody signed it: the base revision, to which each closing signature adds one
 * update. A function of its input alone: the same record makes the same bytes, in Node and in a browser (SPEC.md, D1).
 */
export async function buildDossier(
	input: DossierInput,
	progress: Progress = () => undefined,
): Promise<Result<Uint8Array<ArrayBuffer>, DossierError>> {
	const told = storyOf(input);
	if (!told.ok) return told;
	const story = told.value;
	const manifest = manifestOf(story);
	const sheets = framed(layOut(story, manifest, progress), story, manifest);
	return writePdf({
		progress,
		sheets,
		attachments: manifest.attachments,
		metadata: {
			title: titleOf(story),
			language: input.language,
			writer: input.writer,
			date: story.sealed.entered,
			digest: manifest.digest,
		},
		unsigned: story.say('sign.not signed'),
	});
}

/** What is drawn once, however often the sheets are laid out. */
type Pictures = { readonly sketch: Drawing; readonly timeline: Timeline };

function picturesOf(story: Story): Pictures {
	const { readings, positions } = seenAtEnd(story);
	const look = { width: 1200, lettering: 16, measure, readings, positions };
	return { sketch: processSketch(story.input.plant, look), timeline: timelineOf(story) };
}

/** Laid out until every pointer names the sheet that it means: twice, unless pointing moved something. */
function layOut(story: Story, manifest: Manifest, progress: Progress): readonly Sheet[] {
	const pictures = picturesOf(story);
	let anchors = new Anchors();
	let flow = new Flow();
	for (let round = 0; round < ROUNDS; round++) {
		flow = new Flow();
		const next = new Anchors(anchors.marked);
		chapters(flow, story, { manifest, pictures, anchors: next, progress: round === 0 ? progress : () => undefined });
		if (next.settled) break;
		anchors = next;
	}
	return flow.sheets;
}

type Beside = {
	readonly manifest: Manifest;
	readonly pictures: Pictures;
	readonly anchors: Anchors;
	readonly progress: Progress;
};

function chapters(flow: Flow, story: Story, { manifest, pictures, anchors, progress }: Beside): void {
	const all: readonly (() => void)[] = [
		() => cover(flow, story),
		() => holdPoints(flow, story, anchors, pictures.sketch),
		() => timeline(flow, story, pictures.timeline),
		...story.input.procedure.gates.map(({ number }) => () => {
			const before = flow.sheets.length;
			gatePages(flow, story, number);
			anchors.mark(`gate ${number}`, before + 1);
		}),
		() => calculations(flow, story, anchors),
		() => happenings(flow, story),
		() => refusals(flow, story),
		() => peopleAndTablets(flow, story),
		() => instruments(flow, story),
		() => signatures(flow, story, manifest),
	];
	for (const [done, chapter] of all.entries()) {
		progress('chapter', done, all.length);
		chapter();
	}
}

const ROUNDS = 4;

function framed(sheets: readonly Sheet[], story: Story, manifest: Manifest): readonly Sheet[] {
	const { say, input, moments, sealed } = story;
	const { procedure, plant } = input;
	const field = (label: Parameters<typeof say>[0], value: string) => ({ label: say(label), value });
	return sheets.map((sheet, i) => ({
		...sheet,
		shapes: [
			...frameShapes({
				owner: field('block.owner', plant.site),
				title: field('block.title', sheet.title),
				startUp: field('block.start-up', story.opened.log),
				procedure: field('block.procedure', say('block.revision', { id: procedure.id, revision: procedure.revision })),
				sealed: field('block.sealed', moments.full(sealed.entered)),
				digest: field('block.digest', manifest.code),
				sheet: field('block.sheet', `${i + 1} / ${sheets.length}`),
			}),
			...sheet.shapes,
		],
	}));
}
