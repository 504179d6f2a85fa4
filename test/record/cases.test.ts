import { readdirSync, readFileSync } from 'node:fs';
import * as v from 'valibot';
import { describe, expect, test } from 'vitest';
import { ProcedureSchema } from '../../src/lib/procedure';
import { isEventKind, standing, type BodyOf, type RecordEvent } from '../../src/lib/record';
import { clock, SITE, Teller } from '../support/night';
import { MINI_PLANT } from '../support/mini-plant';
import { stepsIn } from '../support/states';

// One case per file, the expected states by hand from the rule that the file names (test/vectors/record/SOURCE.md).
const FOLDER = new URL('../vectors/record/', import.meta.url);
const read = (file: string): unknown => JSON.parse(readFileSync(new URL(file, FOLDER), 'utf8'));

type Case = {
	readonly desc: string;
	readonly rule: string;
	readonly procedure: string;
	readonly startType?: string;
	readonly openedBy?: string;
	readonly tell: readonly (
		| { readonly copy: readonly [string, string] }
		| {
				readonly say: string;
				readonly at: number;
				readonly seen?: number;
				readonly by: string;
				readonly on?: string;
				readonly log?: string;
				readonly as?: string;
				readonly body: unknown;
		  }
	)[];
	readonly at: number;
	readonly expect: {
		readonly gates: readonly string[];
		readonly lapsed: readonly string[];
		readonly failed: readonly string[];
		readonly waits: readonly string[];
		readonly reproof: readonly string[];
		readonly rows?: { readonly [step: string]: readonly string[] };
		readonly ahead?: readonly string[];
		readonly permissives?: { readonly [id: string]: string };
		readonly didNotStand?: readonly string[];
		readonly afterSeal?: number;
	};
};

const PEOPLE = [
	{ person: 'Tech', roles: ['technician'] },
	{ person: 'Tech2', roles: ['technician'] },
	{ person: 'Inst', roles: ['instrument engineer'] },
	{ person: 'Sup', roles: ['shift supervisor'] },
	{ person: 'Lead', roles: ['commissioning lead'] },
	{ person: 'Both', roles: ['commissioning lead', 'shift supervisor'] },
];

/** Minutes become instants, and $names the ids of the events that were told under them. */
function fill(value: unknown, named: ReadonlyMap<string, RecordEvent>): unknown {
	if (typeof value === 'string') return value.startsWith('$') ? (named.get(value.slice(1))?.id ?? value) : value;
	if (Array.isArray(value)) return value.map((item) => fill(item, named));
	if (typeof value !== 'object' || value === null) return value;
	if ('minute' in value) return clock(value.minute as number);
	return Object.fromEntries(Object.entries(value).map(([key, item]) => [key, fill(item, named)]));
}

function told(one: Case): Teller {
	const teller = new Teller();
	const named = new Map<string, RecordEvent>();
	const start = one.startType === undefined ? {} : { startType: one.startType };
	teller.say(
		'start-up opened',
		{ procedure: { id: 'MINI', revision: 1 }, ...start, people: PEOPLE, documents: { plant: MINI_PLANT } },
		{ person: one.openedBy ?? 'Lead', device: 'T-1', entered: 0 },
	);
	for (const line of one.tell) {
		if ('copy' in line) {
			teller.copy(line.copy[0], line.copy[1]);
			continue;
		}
		if (!isEventKind(line.say)) throw new Error(`no such event: ${line.say}`);
		const { by: person, on: device = 'T-1', at: entered, seen: observed, log } = line;
		const when = {
			person,
			device,
			entered,
			...(observed === undefined ? {} : { observed }),
			...(log === 'site' ? { log: SITE } : {}),
		};
		const event = teller.say(line.say, fill(line.body, named) as BodyOf<typeof line.say>, when);
		if (line.as !== undefined) named.set(line.as, event);
	}
	return teller;
}

describe('hand-made cases of the rules', () => {
	const files = readdirSync(new URL('cases/', FOLDER));
	test.each(files.map((file) => [file.replace('.json', ''), read(`cases/${file}`) as Case] as const))(
		'%s',
		(_, one) => {
			const teller = told(one);
			const procedure = v.parse(ProcedureSchema, read(one.procedure));
			const found = standing(procedure, teller.events, teller.site, clock(one.at));
			const { gates, lapsed, failed, waits, reproof, rows, ahead, permissives, didNotStand, afterSeal } = one.expect;
			expect({
				gates: found.gates.map(({ state }) => state),
				lapsed: stepsIn(found, 'lapsed'),
				failed: stepsIn(found, 'failed'),
				waits: stepsIn(found, 'waits'),
				reproof: found.reproof.steps,
			}).toEqual({ gates, lapsed, failed, waits, reproof });
			if (rows !== undefined)
				expect(
					Object.fromEntries(found.steps.flatMap((step) => (step.rows === undefined ? [] : [[step.step, step.rows]]))),
				).toEqual(rows);
			if (ahead !== undefined)
				expect(found.steps.filter((step) => step.aheadOfRelease).map(({ step }) => step)).toEqual(ahead);
			if (permissives !== undefined)
				expect(Object.fromEntries(found.permissives.map(({ permissive, value }) => [permissive, value]))).toEqual(
					permissives,
				);
			if (didNotStand !== undefined)
				expect(found.acts.at(-1)?.didNotStand.map(({ step }) => step)).toEqual(didNotStand);
			if (afterSeal !== undefined) expect(found.afterSeal).toHaveLength(afterSeal);
		},
	);
});
