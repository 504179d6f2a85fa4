import type { GateStanding } from '../../record';
import type { Moments, Say } from '../../wording';
import type { CoilState, ContactState } from '../ladder/states';

/** What is still open in a start-up before it is sealed. */
export type OpenThings = {
	readonly gates: readonly { readonly gate: number; readonly title: string; readonly state: GateStanding['state'] }[];
	readonly deviations: readonly { readonly id: string; readonly title: string }[];
	readonly refusals: readonly { readonly gate: number; readonly reason: string }[];
	readonly lapsed: number;
	readonly goingOn: readonly { readonly title: string; readonly begin: string }[];
	/** Steps with values that somebody typed and did not save. */
	readonly halfTyped: readonly string[];
	/** Files that events name and that this tablet does not hold. */
	readonly notHere: readonly string[];
};

export type OpenLine = {
	readonly id: string;
	readonly mark: { readonly state?: ContactState; readonly coil?: CoilState; readonly fact?: 'red' | 'yellow' };
	readonly title: string;
	readonly text: string;
};

/** One line for each open thing; what weighs most comes first. */
export function openLines(open: OpenThings, say: Say, moments: Moments): readonly OpenLine[] {
	const some = (key: string, n: number, line: Omit<OpenLine, 'id'>): readonly OpenLine[] =>
		n === 0 ? [] : [{ id: key, ...line }];
	return [
		...open.gates.map(({ gate, title, state }) => ({
			id: `gate ${String(gate)}`,
			mark: { coil: state },
			title: say('ui.seal.gate', { gate, title }),
			text: say(`ui.coil.${state}`),
		})),
		...open.refusals.map(({ gate, reason }) => ({
			id: `refusal ${String(gate)}`,
			mark: { coil: 'refused' as const },
			title: say('ui.seal.refusal', { gate }),
			text: reason,
		})),
		...open.deviations.map(({ id, title }) => ({
			id: `deviation ${id}`,
			mark: { state: 'blocks' as const },
			title: say('ui.seal.deviation', { id }),
			text: title,
		})),
		...open.goingOn.map(({ title, begin }) => ({
			id: `event ${title} ${begin}`,
			mark: { fact: 'yellow' as const },
			title: say('ui.seal.going', { what: title }),
			text: say('ui.seal.going since', { at: moments.short(begin) }),
		})),
		...some('lapsed', open.lapsed, {
			mark: { state: 'lapsed' },
			title: say('ui.seal.lapsed', { n: open.lapsed }),
			text: say('ui.seal.lapsed why'),
		}),
		...some('half', open.halfTyped.length, {
			mark: { state: 'not yet' },
			title: say('ui.seal.half', { n: open.halfTyped.length }),
			text: open.halfTyped.join(', '),
		}),
		...some('not here', open.notHere.length, {
			mark: { state: 'unknown' },
			title: say('ui.seal.not here', { n: open.notHere.length }),
			text: open.notHere.join(', '),
		}),
	];
}
