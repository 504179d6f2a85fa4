import type { Procedure } from '../../procedure';
import type { GateSheet } from '../../record';

export type CoveredGroup = {
	readonly title: string;
	readonly stand: number;
	readonly all: number;
	/** Everything asked of it stands. */
	readonly stands: boolean;
	/** The values that its proofs rest on, as typed. */
	readonly values: readonly string[];
};

/** What a signature covers, by group of steps as on the ladder; what was agreed not applicable is not counted. */
export function coveredGroups({ steps }: Procedure, sheet: GateSheet): readonly CoveredGroup[] {
	const groups = new Map<string, GateSheet['list'][number][]>();
	for (const line of sheet.list) {
		const title = steps.find(({ id }) => id === line.step)?.group ?? line.step;
		groups.set(title, [...(groups.get(title) ?? []), line]);
	}
	return [...groups].map(([title, lines]) => {
		const asked = lines.filter(({ state }) => state !== 'not applicable');
		const stand = asked.filter(({ state }) => state === 'stands').length;
		const values = lines.flatMap(({ value }) => value ?? []);
		return { title, stand, all: asked.length, stands: stand === asked.length, values: values.slice(0, 2) };
	});
}
