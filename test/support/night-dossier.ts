import { readFileSync } from 'node:fs';
import * as v from 'valibot';
import { canonicalJson, sha256Hex, utf8, type Json } from '../../src/lib/base';
import { runCalculator } from '../../src/lib/calc';
import type { DossierInput } from '../../src/lib/dossier';
import { PlantSchema, type Plant } from '../../src/lib/plant';
import { ProcedureSchema, type Procedure } from '../../src/lib/procedure';
import {
	fromChecked,
	inOrder,
	printEventLine,
	standing,
	type BodyOf,
	type Envelope,
	type RecordEvent,
} from '../../src/lib/record';
import { purgeInputs } from '../calc/purge/purge-scene';
import { clock, NIGHT_PROCEDURE, PEOPLE, START_UP, tellNight } from './night';
import { makeTestSite, type TestSite } from './test-site';

const read = (file: string): unknown => JSON.parse(readFileSync(new URL(file, import.meta.url), 'utf8'));

export const PLANT: Plant = v.parse(PlantSchema, read('../../static/demo/plant.json'));
const NAMES = new Map(
	(read('../../static/demo/people.json') as { people: { person: string; name: string }[] }).people.map(
		({ person, name }) => [person, name],
	),
);

/** The night's procedure with what its record needs to be printed: a line-up table, readings, a purge calculation. */
export const PROCEDURE: Procedure = v.parse(ProcedureSchema, {
	...NIGHT_PROCEDURE,
	steps: NIGHT_PROCEDURE.steps
		.map((step) => ({ ...step, ...(KINDS()[step.id] ?? {}) }))
		.map(({ confirms, ...step }: Record<string, unknown>) => (step.kind === 'confirm' ? { ...step, confirms } : step)),
});

function KINDS(): { readonly [step: string]: Record<string, unknown> } {
	const oxygen = ['AT-211', 'AT-212', 'AT-213', 'AT-214'].map((tag) => ({
		id: tag,
		title: `Oxygen at ${tag}`,
		point: tag,
		quantity: 'oxygen-wet',
		unit: '%',
		limit: { limit: 'purge-oxygen' },
	}));
	const flow = {
		id: 'flow',
		title: 'Process gas flow',
		point: 'FT-201',
		quantity: 'volume-flow',
		unit: 'm3/h',
		limit: { atLeast: { value: '46 000', unit: 'm3/h' }, source: { kind: 'demonstration', text: 'invented' } },
	};
	const suction = {
		id: 'suction',
		title: 'Suction at the mill inlet',
		point: 'PT-202',
		quantity: 'pressure-gauge',
		unit: 'mbar(g)',
		limit: {
			atLeast: { value: '-4.0', unit: 'mbar(g)' },
			atMost: { value: '-2.0', unit: 'mbar(g)' },
			source: { kind: 'common practice', text: 'near -3 mbar' },
		},
	};
	return {
		A1: {
			confirms: [
				{ id: 'permits', text: 'Permits are closed' },
				{ id: 'locks', text: 'Every lock is accounted for' },
			],
		},
		B2: {
			kind: 'line-up',
			rows: PLANT.elements.slice(0, 14).map(({ tag, title, positions }) => ({
				id: tag,
				element: tag,
				title,
				required: positions[0],
				choices: [...positions],
			})),
		},
		C5: { kind: 'reading', fields: [flow] },
		C6: { kind: 'calculation', calculator: 'purge-adequacy@1', bind: {}, proves: 'verdict' },
		C7: { kind: 'reading', fields: [suction] },
		F1: { kind: 'quick sheet', fields: oxygen },
	};
}

/** The night's events, each retold with values, statements and documents; ids and links follow. */
function retold(): { readonly events: readonly RecordEvent[]; readonly site: readonly RecordEvent[] } {
	const night = tellNight();
	const siteIds = new Set(night.site.map(({ id }) => id));
	const ids = new Map<string, string>();
	const told: RecordEvent[] = [];
	const renamed = (text: string): string => text.replace(/[0-9a-f]{64}/g, (id) => ids.get(id) ?? id);
	const all = [...night.events, ...night.site].filter(({ kind }) => kind !== 'addendum');
	for (const event of all.sort((a, b) => a.clock - b.clock || a.enteredAt - b.enteredAt || inOrder(a, b))) {
		const envelope = JSON.parse(renamed(event.text)) as Envelope;
		const body = bodyOf(event, told, siteIds);
		const changed: Envelope = { ...envelope, body: { ...envelope.body, ...body } };
		const text = canonicalJson(changed as unknown as Json);
		ids.set(event.id, sha256Hex(text));
		told.push(fromChecked(text, changed, {}));
	}
	return { events: told.filter(({ log }) => log === START_UP), site: told.filter(({ log }) => log !== START_UP) };
}

function bodyOf(event: RecordEvent, told: readonly RecordEvent[], _site: ReadonlySet<string>): Record<string, unknown> {
	switch (event.kind) {
		case 'start-up opened':
			return {
				title: 'Inert start-up of the fuel mill FM-1',
				plant: { id: PLANT.unit, revision: PLANT.revision },
				people: PEOPLE.map((each) => ({ ...each, name: NAMES.get(each.person) ?? each.person })),
				demonstration: true,
				inertGas: 'nitrogen',
			};
		case 'entry':
			return entryBody(event.body, (event.observedAt - Date.parse(clock(0))) / 60_000);
		case 'gate released':
		case 'gate refused':
			return { statement: statementOf(event, told) };
		case 'sealed':
			return { heads: headsOf(told) };
		default:
			return {};
	}
}

function entryBody({ step, outcome }: BodyOf<'entry'>, minutes: number): Record<string, unknown> {
	const oxygen = ['7.0', '7.1', minutes < 340 ? '7.6' : '7.5', '6.9'];
	switch (step) {
		case 'CW':
		case 'F1':
			return {
				values: ['AT-211', 'AT-212', 'AT-213', 'AT-214'].map((point, i) => ({
					point,
					typed: oxygen[i],
					unit: '%',
					basis: 'wet',
					instrument: point,
					where: 'screen',
				})),
				...(step === 'CW' ? { flow: 'unbroken' } : {}),
			};
		case 'C5':
			return { values: [{ field: 'flow', point: 'FT-201', typed: '52 400', unit: 'm3/h' }] };
		case 'C7':
			return { values: [{ field: 'suction', point: 'PT-202', typed: '-3,1', unit: 'mbar(g)' }] };
		case 'B2':
			return {
				rows: PLANT.elements.slice(0, 14).map(({ tag, positions }) => {
					const found = tag === 'HV-14' && outcome === 'fail' ? 'open' : (positions[0] ?? '');
					return { row: tag, found, passes: found === positions[0] };
				}),
				...(outcome === 'fail' ? { note: 'HV-14 stands open, hand wheel stiff' } : {}),
			};
		case 'A1':
			return { confirmed: ['permits', 'locks'] };
		case 'C6':
			return { calculation: purgeResult(outcome), limit: 'at most 8.0 % moist, guard 0.3' };
		default:
			return { note: 'seen at the plant' };
	}
}

const results = new Map<string, unknown>();

function purgeResult(outcome: string): unknown {
	const kept = results.get(outcome);
	if (kept !== undefined) return kept;
	const run = runCalculator('purge-adequacy@1', purgeInputs(outcome === 'try' ? { minutes: 40 } : {}, 60));
	if (!run.ok) throw new Error(JSON.stringify(run.error));
	results.set(outcome, JSON.parse(JSON.stringify(run.value)));
	return results.get(outcome);
}

function statementOf(
	event: Extract<RecordEvent, { kind: 'gate released' | 'gate refused' }>,
	told: readonly RecordEvent[],
): Record<string, unknown> {
	const { gate } = event.body;
	const known = told.filter(({ log }) => log === START_UP);
	const stood = standing(
		PROCEDURE,
		known,
		told.filter(({ log }) => log !== START_UP),
		event.entered,
	);
	const title = PROCEDURE.gates.find(({ number }) => number === gate)?.title ?? '';
	const text =
		event.kind === 'gate refused'
			? `I refuse gate ${gate}, ${title}.`
			: `I release gate ${gate}, ${title}. I have read the list of its ${stood.steps.filter((each) => each.gate === gate).length} proofs; each stood when I signed. Adequate is a statement about these readings at these places. This is not a permission to enter anything.`;
	return {
		text,
		language: 'en',
		textVersion: '1',
		build: '0.1.0',
		code: `${sha256Hex(text + event.entered)
			.slice(0, 4)
			.toUpperCase()}-0TDR-7WHB-2JKE`,
		list: stood.steps
			.filter((each) => each.gate === gate)
			.map(({ step, state, entry }) => ({ step, state, proof: entry ?? null })),
		counts: { tries: stood.tries.length },
		openDeviations: [],
		lapsesSince: [],
		late: [],
		others:
			event.device === 'T-2' && event.enteredAt < Date.parse(clock(870))
				? [{ device: 'T-1', number: 80, head: 'QW3RTY', lastHeard: clock(770) }]
				: [],
		clock: 'agreed',
		declaration:
			'No fan stop, opening, loss of inert gas, burner trip, feed stop or power dip since my last act other than listed.',
	};
}

function headsOf(told: readonly RecordEvent[]): Record<string, unknown> {
	const heads: { [device: string]: { number: number; id: string } } = {};
	for (const { device, number, id, log } of told)
		if (log === START_UP && number > (heads[device]?.number ?? 0)) heads[device] = { number, id };
	return heads;
}

export const SIGNATURES: DossierInput['signatures'] = [
	{ field: 'sig_performed', meaning: 'performed', roles: ['technician'] },
	{ field: 'sig_reviewed', meaning: 'reviewed', roles: ['shift supervisor'] },
	{ field: 'sig_accepted', meaning: 'accepted', roles: ['commissioning lead'] },
];

/** The input of the night's dossier: unsigned events, real certificates of an invented site. */
export async function nightInput(site?: TestSite): Promise<DossierInput> {
	const { root } = site ?? (await makeTestSite());
	const { events, site: siteEvents } = retold();
	return {
		lines: events.map(printEventLine),
		siteLines: siteEvents.map(printEventLine),
		procedure: PROCEDURE,
		plant: PLANT,
		root: root.certificate.der,
		certificates: [],
		files: [{ name: 'trend.csv', mediaType: 'text/csv', bytes: utf8('t;AT-211\n0;20.9\n') }],
		language: 'en',
		writer: 'Gatehold 0.1.0',
		signatures: SIGNATURES,
	};
}
