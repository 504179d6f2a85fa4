import { parsePlant, type Plant } from '../../lib/plant';
import { parseProcedure, type Procedure } from '../../lib/procedure';
import { allOf, isOf, parseEvents, standing, type RecordEvent, type Standing } from '../../lib/record';
import { sayEventError, sayShapeError, speaker } from '../../lib/wording';
import { unusable, type Command, type Outcome, type Terminal } from '../command';
import { readJson, readText } from '../files';
import { readOptions, type Given } from '../options';
import { tellStanding } from '../tell-standing';

const say = speaker('en');

/** What stands after the events of a file, signed or not. */
export const standingCommand: Command = {
	usage: 'standing PROCEDURE EVENTS [--site FILE] [--plant FILE] [--at INSTANT] [--known-to DEVICE] [--json]',
	does: 'says what stands by the events of a file: steps, gates, permissives, what must be proved again',
	run: async (args, terminal) => {
		const given = readOptions(args, { switches: ['json'], values: ['site', 'plant', 'at', 'known-to'] });
		if (!given.ok) return unusable(terminal, given.error);
		const asked = await readQuestion(given.value);
		if (typeof asked === 'string') return unusable(terminal, asked);
		terminal.complain('Signatures are not checked here: verify does that. What stands is said by what the events say.');
		return answer(terminal, asked, given.value);
	},
};

type Question = {
	readonly procedure: Procedure;
	readonly events: readonly RecordEvent[];
	readonly site: readonly RecordEvent[];
	readonly plant: Plant | undefined;
	readonly at: string;
};

function answer(terminal: Terminal, { procedure, events, site, plant, at }: Question, given: Given): Outcome {
	const known = withPlant(events, plant);
	const found: Standing = standing(procedure, known, site, at, given.value('known-to'));
	terminal.print(given.has('json') ? JSON.stringify(found, null, '\t') : tellStanding(found, procedure));
	return 'passed';
}

/** @returns a sentence when something cannot be read */
async function readQuestion(given: Given): Promise<Question | string> {
	const [procedureFile, eventsFile, ...more] = given.files;
	if (procedureFile === undefined || eventsFile === undefined || more.length > 0)
		return 'A procedure file and an event file are asked for.';
	const procedure = await readProcedure(procedureFile);
	if (typeof procedure === 'string') return procedure;
	const events = await readEvents(eventsFile);
	if (typeof events === 'string') return events;
	const siteFile = given.value('site');
	const site = siteFile === undefined ? [] : await readEvents(siteFile);
	if (typeof site === 'string') return site;
	const plantFile = given.value('plant');
	const plant = plantFile === undefined ? undefined : await readPlant(plantFile);
	if (typeof plant === 'string') return plant;
	const at = given.value('at') ?? newestEntered(events);
	if (at === undefined) return `${eventsFile} holds no event, and no --at says which moment is asked about.`;
	if (!INSTANT.test(at) || Number.isNaN(Date.parse(at)))
		return `--at ${at} is no moment: it reads like 2026-05-04T16:00:00+02:00.`;
	return { procedure, events, site, plant, at };
}

const INSTANT = /^\d{4}-\d\d-\d\dT\d\d:\d\d(:\d\d(\.\d{1,3})?)?(Z|[+-]\d\d:\d\d)$/;

async function readProcedure(file: string): Promise<Procedure | string> {
	const json = await readJson(file);
	if (!json.ok) return json.error;
	const procedure = parseProcedure(json.value);
	return procedure.ok ? procedure.value : `${file} is no procedure: ${firstOf(procedure.error)}.`;
}

async function readPlant(file: string): Promise<Plant | string> {
	const json = await readJson(file);
	if (!json.ok) return json.error;
	const plant = parsePlant(json.value);
	return plant.ok ? plant.value : `${file} is no plant description: ${firstOf(plant.error)}.`;
}

const firstOf = (errors: readonly Parameters<typeof sayShapeError>[0][]): string => {
	const [first, ...rest] = errors;
	const said = first === undefined ? '' : sayShapeError(first, say);
	return rest.length === 0 ? said : `${said}, and ${rest.length} more; check-procedure names them all`;
};

async function readEvents(file: string): Promise<readonly RecordEvent[] | string> {
	const text = await readText(file);
	if (!text.ok) return text.error;
	const events = parseEvents(text.value);
	return events.ok
		? events.value
		: `${file} is no record: ${sayEventError(events.error, say)}. Nothing was taken from it. Correct that line, or leave it out, and ask again.`;
}

function newestEntered(events: readonly RecordEvent[]): string | undefined {
	return [...events].sort((a, b) => a.enteredAt - b.enteredAt).at(-1)?.entered;
}

/** The plant beside a record that holds none: what the record itself holds always counts. */
function withPlant(events: readonly RecordEvent[], plant: Plant | undefined): readonly RecordEvent[] {
	const holdsOne = allOf(events, 'start-up opened').some(({ body }) => body.documents?.plant !== undefined);
	if (plant === undefined || holdsOne) return events;
	return events.map((event) =>
		isOf(event, 'start-up opened')
			? { ...event, body: { ...event.body, documents: { ...event.body.documents, plant } } }
			: event,
	);
}
