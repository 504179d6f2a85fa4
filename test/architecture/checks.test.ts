import { describe, expect, test } from 'vitest';
import * as imports from './checks/imports';
import * as layout from './checks/layout';
import * as text from './checks/text';
import { LEFT_BEHIND, MACHINE_PATHS } from './plan';
import type { Check, Tree } from './tree';

const sign = (room: string): string => `/**\n * ${room}: one line.\n * Pure.\n * May import: base.\n */\n`;

/** A small house in which everything is right. */
const sound = {
	'package.json': '{}',
	'src/app.html': '',
	'src/lib/base/index.ts': `${sign('base')}export { ok } from './result';\n`,
	'src/lib/base/result.ts': 'export const ok = 1;\n',
	'src/lib/calc/index.ts': `${sign('calc')}export { flow } from './flow';\n`,
	'src/lib/calc/flow.ts': "import { ok } from '../base';\nexport const flow = ok;\n",
	'src/lib/verify/index.ts': `${sign('verify')}export { report } from './report';\n`,
	'src/lib/verify/report.ts': 'export const report = 1;\n',
	'src/lib/dossier/index.ts': `${sign('dossier')}export { pages } from './pages/pages';\n`,
	'src/lib/dossier/pages/pages.ts': "import { ok } from '../../base';\nexport const pages = ok;\n",
	'src/lib/identity/index.ts': `${sign('identity')}export type { Person } from './person';\n`,
	'src/lib/identity/person.ts': 'export type Person = string;\n',
	'src/lib/ui/index.ts': `${sign('ui')}export { default as Rung } from './ladder/Rung.svelte';\n`,
	'src/lib/ui/ladder/Rung.svelte': '<script lang="ts">\n\timport { flow } from \'../../calc\';\n</script>\n{flow}\n',
	'src/routes/+page.svelte': '<script lang="ts">\n\timport { Rung } from \'$lib/ui\';\n</script>\n<Rung />\n',
	'src/cli/gatehold.ts': "import { pages } from '../lib/dossier';\nconsole.log(pages);\n",
	'test/run.mjs': '',
	'test/calc/flow.test.ts': "test('a fan moves gas', () => {});\n",
} as const;

const houseWith = (changes: Readonly<Record<string, string>>): Tree =>
	new Map(Object.entries({ ...sound, ...changes }));

const everyCheck: readonly Check[] = [layout, imports, text].flatMap((checks) => Object.values(checks));

test('a sound house passes every check', () => {
	expect(everyCheck.flatMap((check) => check(houseWith({})))).toEqual([]);
});

type Planted = {
	readonly what: string;
	readonly check: Check;
	readonly file: string;
	readonly text: string;
	/** Where it is found, if not where it was planted. */
	readonly at?: string;
};

const planted: readonly Planted[] = [
	{ what: 'a docs folder', check: layout.topLevelIsThePlan, file: 'docs', text: '' },
	{ what: 'a stray file in src', check: layout.srcHoldsThePlan, file: 'src/misc.ts', text: '' },
	{ what: 'a test folder without a room', check: layout.testsMirrorTheRooms, file: 'test/unit', text: '' },
	{
		what: 'a SPEC.md where nobody needs one',
		check: layout.specsStandWhereAStrangerNeedsThem,
		file: 'src/lib/calc/SPEC.md',
		text: '',
	},
	{ what: 'a file of 401 lines', check: layout.filesStayShort, file: 'src/lib/calc/flow.ts', text: '\n'.repeat(401) },
	{ what: 'a file in camelCase', check: layout.namesFollowTheHouse, file: 'src/lib/calc/dewPoint.ts', text: '' },
	{ what: 'a component in kebab-case', check: layout.namesFollowTheHouse, file: 'src/lib/ui/rung.svelte', text: '' },
	{ what: 'a folder of helpers', check: layout.namesSaySomething, file: 'src/lib/calc/helpers/mean.ts', text: '' },
	{ what: 'a vague file', check: layout.namesSaySomething, file: 'src/lib/calc/flow-utils.ts', text: '' },
	{
		what: 'an import upward',
		check: imports.importsGoDownward,
		file: 'src/lib/base/result.ts',
		text: "import { flow } from '../calc';",
	},
	{
		what: 'a type import upward',
		check: imports.importsGoDownward,
		file: 'src/lib/base/result.ts',
		text: "import type { Flow } from '../calc';",
	},
	{
		what: 'a type named by import()',
		check: imports.importsGoDownward,
		file: 'src/lib/base/result.ts',
		text: "export type F = import('../calc').Flow;",
	},
	{
		what: 'a re-export upward',
		check: imports.importsGoDownward,
		file: 'src/lib/base/result.ts',
		text: "export * from '../calc';",
	},
	{
		what: 'a late import upward',
		check: imports.importsGoDownward,
		file: 'src/lib/base/result.ts',
		text: "export const late = () => import('../calc');",
	},
	{
		what: 'a calculator that knows people',
		check: imports.importsGoDownward,
		file: 'src/lib/calc/flow.ts',
		text: "import type { Person } from '../identity';",
	},
	{
		what: 'a reader that shares code with the writer',
		check: imports.importsGoDownward,
		file: 'src/lib/verify/report.ts',
		text: "import { pages } from '../dossier';",
	},
	{
		what: 'a component that writes the PDF',
		check: imports.importsGoDownward,
		file: 'src/lib/ui/ladder/Rung.svelte',
		text: "<script>\n\timport { pages } from '../../dossier';\n</script>",
	},
	{
		what: 'a start script that knows a room',
		check: imports.importsGoDownward,
		file: 'src/start.mjs',
		text: "import { ok } from './lib/base/index.ts';",
	},
	{
		what: 'an import past the door',
		check: imports.roomsAreEnteredByTheirDoor,
		file: 'src/lib/calc/flow.ts',
		text: "import { ok } from '../base/result';",
	},
	{
		what: 'a route past the door',
		check: imports.roomsAreEnteredByTheirDoor,
		file: 'src/routes/+page.svelte',
		text: "<script>\n\timport Rung from '$lib/ui/ladder/Rung.svelte';\n</script>",
	},
	{
		what: "a room's file through its own door",
		check: imports.roomsAreEnteredByTheirDoor,
		file: 'src/lib/calc/mean.ts',
		text: "import { flow } from './index';",
	},
	{
		what: 'a room that imports a command',
		check: imports.nothingImportsRoutesOrCommands,
		file: 'src/lib/calc/flow.ts',
		text: "import '../../cli/gatehold';",
	},
	{
		what: 'an import into the void',
		check: imports.importsLeadSomewhere,
		file: 'src/lib/calc/flow.ts',
		text: "import { x } from '../bass';",
	},
	{
		what: 'a circle of two files',
		check: imports.noCircles,
		file: 'src/lib/base/result.ts',
		text: "import type { Ok } from './index';",
		at: 'src/lib/base/index.ts',
	},
	{
		what: 'a room without a door',
		check: text.everyDoorHasItsSign,
		file: 'src/lib/plant/volume.ts',
		text: '',
		at: 'src/lib/plant/index.ts',
	},
	{
		what: 'a door without its sign',
		check: text.everyDoorHasItsSign,
		file: 'src/lib/calc/index.ts',
		text: "export { flow } from './flow';",
	},
	{ what: 'a default export', check: text.noDefaultExports, file: 'src/lib/calc/flow.ts', text: 'export default 1;' },
	{ what: 'markup from data', check: text.noHtmlFromData, file: 'src/routes/+page.svelte', text: '{@html note}' },
	{
		what: 'a test that leaves the others out',
		check: text.everyTestRuns,
		file: 'test/calc/flow.test.ts',
		text: "test('one', () => {});".replace('(', '.only('),
	},
	{
		what: 'a test that is left out',
		check: text.everyTestRuns,
		file: 'test/calc/flow.test.ts',
		text: "describe.concurrent('one', () => {});".replace('(', '.skip('),
	},
	{
		what: 'a note to self',
		check: text.nothingIsLeftBehind,
		file: 'src/lib/calc/flow.ts',
		text: `// ${LEFT_BEHIND[0]}: later`,
	},
	{
		what: 'a silenced type error',
		check: text.nothingIsLeftBehind,
		file: 'src/lib/calc/flow.ts',
		text: '// @ts-' + 'ignore',
	},
	{
		what: 'where the idea came from',
		check: text.noForbiddenWords,
		file: 'README.md',
		text: `As the ${'lec' + 'ture'} says`,
	},
	{
		what: 'a path of one machine',
		check: text.noPlacesOfOneMachine,
		file: 'README.md',
		text: `see ${MACHINE_PATHS[0]}notes`,
	},
	...[
		'export const now = Date.now();',
		'export const now = new Date();',
		'export const dice = Math.random();',
		"export const answer = fetch('/limits');",
		'export const width = window.innerWidth;',
		'export const page = { document };',
		"export const kept = localStorage.getItem('o2');",
		'export const home = process.env.HOME;',
		'export const id = crypto.randomUUID();',
		'export const sneaky = globalThis.Date;',
	].map((code) => ({ what: code, check: text.pureRoomsAreBlind, file: 'src/lib/calc/flow.ts', text: code })),
];

describe('a planted error is found, and nothing else is', () => {
	test.each(planted)('$what', ({ check, file, text: content, at = file }) => {
		const findings = check(houseWith({ [file]: content }));
		expect([...new Set(findings.map((finding) => finding.file))]).toEqual([at]);
	});
});

test('a hold window, a document of the record and a given date are no clock and no browser', () => {
	const code = [
		'export const hold = (window: number): number => window * 2;',
		'type Sheet = { readonly document: string; process: number };',
		'export const title = (sheet: Sheet): string => sheet.document;',
		'export const day = new Date(0);',
	].join('\n');
	expect(text.pureRoomsAreBlind(houseWith({ 'src/lib/calc/flow.ts': code }))).toEqual([]);
});
