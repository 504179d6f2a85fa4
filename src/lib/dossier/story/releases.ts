import { sayWords } from '../../wording';
import type { Story } from './story';

/** How each gate was released last, for the ladder and the list of hold points. */
export type Release = {
	readonly gate: number;
	readonly title: string;
	readonly holdPoint: string;
	/** Who signed, in the order of signing; empty while it is not released. */
	readonly by: readonly {
		readonly person: string;
		readonly roles: string;
		readonly device: string;
		readonly at: string;
		readonly code: string | undefined;
	}[];
	readonly at: string | undefined;
	/** "Released 15 Mar 07:10, Tove Arrensdal" */
	readonly caption: string;
};

export function releasesOf(story: Story): readonly Release[] {
	const { end, input, acts, names, say, moments } = story;
	return input.procedure.gates.map(({ number: gate, title, holdPoint, signatures }) => {
		const standing = end.gates.find((each) => each.gate === gate);
		const state = standing?.state ?? 'not ready';
		const wanted = signatures.flatMap(({ roles }) => roles);
		const by = acts
			.filter(({ event }) => standing?.acts.includes(event.id) === true)
			.map(({ event }) => ({
				person: names.person(event.person),
				roles:
					sayWords(
						names.roles(event.person).filter((role) => wanted.includes(role)),
						say,
					) || sayWords(names.roles(event.person), say),
				device: event.device,
				at: event.observed ?? event.entered,
				code: event.body.statement?.code,
			}));
		const at = standing?.releasedAt;
		const caption =
			state === 'released' && at !== undefined
				? say('cover.released', { at: moments.short(at), by: by.map(({ person }) => person).join(', ') })
				: say(`gate.${state}`);
		return { gate, title, holdPoint, by, at, caption };
	});
}
