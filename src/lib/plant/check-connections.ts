import type { PlantFinding } from './finding';
import type { Plant } from './schema';

/**
 * A volume that the circuit gas does not reach is not swept by it. Such a volume must say so (`deadLeg`), because only then
 * the coverage table asks how it was inerted by itself.
 */
export function checkConnections(plant: Plant): readonly PlantFinding[] {
	const swept = circuit(plant);
	return plant.volumes.flatMap(({ id, deadLeg }, i) =>
		deadLeg || swept.has(id) ? [] : [{ kind: 'unconnected-volume', path: `volumes[${i}]`, id }],
	);
}

/** The largest set of volumes that ducts join. */
function circuit(plant: Plant): ReadonlySet<string> {
	let largest: ReadonlySet<string> = new Set();
	for (const { id } of plant.volumes) {
		if (largest.has(id)) continue;
		const reached = reachedFrom(id, plant);
		const isJoined = reached.size > 1 || plant.volumes.length === 1;
		if (isJoined && reached.size > largest.size) largest = reached;
	}
	return largest;
}

function reachedFrom(start: string, { volumes, ducts }: Plant): ReadonlySet<string> {
	const names = new Set(volumes.map(({ id }) => id));
	const reached = new Set([start]);
	// A set that grows while it is walked: every volume is visited once.
	for (const here of reached) {
		for (const { from, to } of ducts) {
			const there = from === here ? to : to === here ? from : undefined;
			if (there !== undefined && names.has(there)) reached.add(there);
		}
	}
	return reached;
}
