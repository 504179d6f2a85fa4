import type { ShownRung } from './shown-rungs';
import { passes, type CoilState, type ContactState } from './states';

/** A gate as one mark of a whole start-up: a contact while it is not ready, a coil when a person is asked for. */
export type GateMark = {
	readonly gate: number;
	readonly title: string;
	readonly contact?: ContactState;
	readonly coil?: CoilState;
	/** The line passes it. */
	readonly passed: boolean;
	/** The line ends at it. */
	readonly isLast: boolean;
};

/** The gates of a start-up in series. The line ends at the first that is not released. */
export function gateMarks(rungs: readonly ShownRung[]): readonly GateMark[] {
	const stops = rungs.findIndex(({ coil }) => coil !== 'released');
	return rungs.map((rung, i) => ({
		gate: rung.gate,
		title: rung.title,
		passed: stops === -1 || i < stops,
		isLast: i === stops,
		...markOf(rung, i === stops),
	}));
}

function markOf({ coil, contacts }: ShownRung, isLast: boolean): Pick<GateMark, 'contact' | 'coil'> {
	if (coil === 'released') return { contact: 'stands' };
	if (coil === 'ready' || coil === 'refused') return { coil };
	if (coil === 'lapsed') return { contact: 'lapsed' };
	const first = isLast ? contacts.find(({ state }) => !passes(state))?.state : undefined;
	return { contact: first === undefined || first === 'not yet' ? (isLast ? 'next' : 'not yet') : first };
}
