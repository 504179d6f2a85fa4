import { lettering } from '../../drawing';
import { STYLES, type Flow } from '../layout/flow';
import { sayWord, sayWords } from '../../wording';
import { table } from '../layout/table';
import type { Story } from '../story/story';
import type { Manifest } from '../manifest';

/** The closing signatures, every hold point signed on the way, how to check all of it, and what has to be said besides. */
export function signatures(flow: Flow, story: Story, manifest: Manifest): void {
	const { say, input } = story;
	flow.newSheet(say('sign.sheet'));
	flow.head(say('sign.caption'), say('sign.sheet'));
	for (const { field, meaning, roles } of input.signatures) {
		const title = say('sign.field', {
			meaning: say(`meaning.${meaning}`),
			roles: roles.map((role) => sayWord(role, say)).join(` ${say('or')} `),
		});
		flow.block(FIELD + 24, ({ x, y, width }) => {
			flow.addField({ name: field, title, box: { x, y: y + 16, width, height: FIELD } });
			return [lettering(title, { x, y: y + 11 }, { size: 9.4, voice: 'strong' })];
		});
		flow.rule();
		flow.space(6);
	}
	flow.heading(say('sign.hold points'), { with: 70 });
	table(
		flow,
		[
			{ head: say('hold.gate'), width: 34, voice: 'strong' },
			{ head: say('sign.meaning'), width: 60 },
			{ head: say('sign.person') },
			{ head: say('sign.role'), width: 104 },
			{ head: say('hold.when'), width: 64 },
			{ head: say('sign.code'), width: 128, voice: 'code' },
		],
		story.acts.map(({ event, judged }) => ({
			...(judged?.counted === false ? { superseded: true as const } : {}),
			cells: [
				String(event.body.gate),
				event.kind === 'gate refused' ? say('gate.meaning.refused') : sayWord(event.body.meaning ?? 'released', say),
				story.names.person(event.person),
				sayWords(story.names.roles(event.person), say),
				story.moments.short(event.observed ?? event.entered),
				event.body.statement?.code ?? '–',
			],
		})),
	);
	howToCheck(flow, story, manifest);
	cautions(flow, story);
}

function howToCheck(flow: Flow, { say, input }: Story, { digest, code, files }: Manifest): void {
	flow.heading(say('check.title'), { with: 60 });
	for (const key of ['check.reader', 'check.count', 'check.root', 'check.full'] as const) {
		flow.write(say(key, { signatures: input.signatures.length }), STYLES.body);
		flow.space(3);
	}
	flow.write(say('check.digest', { code }), STYLES.body);
	flow.write(digest, { ...STYLES.note, voice: 'code', size: 8 });
	flow.heading(say('files.title'), { with: 60 });
	table(
		flow,
		[
			{ head: say('files.name'), width: 150, voice: 'strong' },
			{ head: say('files.bytes'), width: 60, align: 'end' },
			{ head: say('files.hash') },
		],
		files.map(({ name, bytes, sha256 }) => ({ cells: [name, String(bytes), sha256] })),
	);
}

/** The safety wording of the product, in full. */
function cautions(flow: Flow, { say }: Story): void {
	flow.heading(say('cautions.title'), { with: 60 });
	for (const key of [
		'cautions.computes',
		'cautions.gas',
		'cautions.ignition',
		'cautions.adequate',
		'cautions.electronic',
	] as const) {
		flow.write(say(key), STYLES.body);
		flow.space(3);
	}
}

/** A field with room for a drawn hand, a name and six facts. */
const FIELD = 92;
