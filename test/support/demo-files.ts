import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { parsePlant, type Plant } from '../../src/lib/plant';
import { parseProcedure, type Procedure } from '../../src/lib/procedure';

export const DEMO = join(import.meta.dirname, '../../static/demo');

export const readDemo = (file: string): unknown => JSON.parse(readFileSync(join(DEMO, file), 'utf8'));

/** Every file of the demonstration by its name beside start-up.json. */
export function demoFiles(): ReadonlyMap<string, Uint8Array<ArrayBuffer>> {
	const folder = join(import.meta.dirname, '../../static/demo');
	const names = readdirSync(folder, { recursive: true, encoding: 'utf8' });
	return new Map(
		names
			.filter((name) => statSync(join(folder, name)).isFile())
			.map((name) => [name, new Uint8Array(readFileSync(join(folder, name)))]),
	);
}

/** The demonstration unit FM-1; a test that cannot read it has nothing to test. */
export function demoPlant(): Plant {
	const plant = parsePlant(readDemo('plant.json'));
	if (!plant.ok) throw new Error(JSON.stringify(plant.error));
	return plant.value;
}

/** GD-1, the test procedure of the start-up night. */
export function nightProcedure(): Procedure {
	const procedure = parseProcedure(readDemo('night/procedure.json'));
	if (!procedure.ok) throw new Error(JSON.stringify(procedure.error));
	return procedure.value;
}
