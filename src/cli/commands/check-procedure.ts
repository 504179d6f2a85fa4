import type { Json } from '../../lib/base';
import { ROLES } from '../../lib/identity';
import { checkPlant, parsePlant, type Plant } from '../../lib/plant';
import { checkProcedure, parseProcedure } from '../../lib/procedure';
import { sayPlantFinding, sayProcedureFinding, sayShapeError, speaker } from '../../lib/wording';
import { unusable, type Command, type Outcome, type Terminal } from '../command';
import { readJson } from '../files';
import { readOptions } from '../options';

const say = speaker('en');

export const checkProcedureCommand: Command = {
	usage: 'check-procedure FILE [--plant FILE]',
	does: 'names every mistake in a procedure with its place; with a plant, also tags and limits that it does not have',
	run: async (args, terminal) => {
		const given = readOptions(args, { values: ['plant'] });
		const [file, ...more] = given.ok ? given.value.files : [];
		if (!given.ok || file === undefined || more.length > 0)
			return unusable(terminal, given.ok ? 'One procedure file is asked for.' : given.error);
		const plant = given.value.value('plant');
		const unit = plant === undefined ? { plant: undefined, mistakes: [] } : await readPlant(plant);
		if (typeof unit === 'string') return unusable(terminal, unit);
		const json = await readJson(file);
		if (!json.ok) return unusable(terminal, json.error);
		return check(terminal, file, json.value, unit);
	},
};

type Unit = { readonly plant: Plant | undefined; readonly mistakes: readonly string[] };

function check(terminal: Terminal, file: string, document: Json, { plant, mistakes }: Unit): Outcome {
	const procedure = parseProcedure(document);
	if (!procedure.ok) {
		const ofAnotherFormat = procedure.error.find(({ path }) => path === 'format');
		if (ofAnotherFormat !== undefined)
			return unusable(terminal, `${file} is no procedure: ${sayShapeError(ofAnotherFormat, say)}.`);
		return report(terminal, file, [
			...mistakes,
			...procedure.error.map((error) => `${file}: ${sayShapeError(error, say)}`),
		]);
	}
	const against = { roles: ROLES, ...(plant === undefined ? {} : { plant }) };
	const found = checkProcedure(procedure.value, against).map(
		(finding) => `${file}: ${sayProcedureFinding(finding, say)}`,
	);
	if (found.length + mistakes.length > 0) return report(terminal, file, [...mistakes, ...found]);
	const { id, revision, gates, steps } = procedure.value;
	const against_ =
		plant === undefined ? 'tags and limits were not looked up: no plant was given' : `for plant ${plant.unit}`;
	terminal.print(
		`${id} revision ${revision}: ${gates.length} gates, ${steps.length} steps, no mistake found (${against_}).`,
	);
	return 'passed';
}

function report(terminal: Terminal, file: string, mistakes: readonly string[]): Outcome {
	for (const mistake of mistakes) terminal.print(mistake);
	const count = mistakes.length === 1 ? '1 mistake' : `${mistakes.length} mistakes`;
	terminal.complain(`${count} found. Nothing was changed. Correct the places above in ${file} and check it again.`);
	return 'failed';
}

/** @returns a sentence when the file is no plant description */
async function readPlant(file: string): Promise<Unit | string> {
	const json = await readJson(file);
	if (!json.ok) return json.error;
	const plant = parsePlant(json.value);
	if (!plant.ok)
		return `${file} is no plant description: ${plant.error.map((error) => sayShapeError(error, say)).join('; ')}.`;
	return {
		plant: plant.value,
		mistakes: checkPlant(plant.value).map((finding) => `${file}: ${sayPlantFinding(finding, say)}`),
	};
}
