import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { CATALOGUE } from '../../src/lib/calc';

const ROOT = join(import.meta.dirname, '../..');
const ROOM = join(ROOT, 'src/lib/calc');

/** Parts of a docstring by house rule 2, in this order, and how each is recognised. */
const PARTS: readonly (readonly [part: string, pattern: RegExp])[] = [
	['what it means on the plant', /^\/\*\*\n \* [A-Z(]/],
	['the equation, set apart', /\n \* {4,}\S/],
	['inputs with unit', /@param \S+ [^]*\[[^\]]+\]/],
	['output with unit', /@returns [^]*\[[^\]]+\]/],
	['the source', /\n \* Source: \S/],
	['where it is checked', /\n \* Checked against: [^]*\(test\/calc\/\S+?\)/],
];

/** A docstring, and the name of what is exported right below it. */
const EXPORT = /(\/\*\*(?:(?!\*\/)[^])*\*\/)\nexport (?:function|const) (\w+)/g;

type Documented = { readonly file: string; readonly name: string; readonly doc: string };

const exported: readonly Documented[] = readdirSync(ROOM, { recursive: true, encoding: 'utf8' })
	.filter((file) => file.endsWith('.ts'))
	.flatMap((file) =>
		[...readFileSync(join(ROOM, file), 'utf8').matchAll(EXPORT)].map(([, doc = '', name = '']) => ({
			file,
			name,
			doc,
		})),
	);

/** A docstring that has any of the telling parts is that of a formula, and then it has them all. */
const formulas = exported.filter(({ doc }) => PARTS.slice(1).some(([, pattern]) => pattern.test(doc)));

test('every calculator of the catalogue has its docstring', () => {
	const documented = formulas.map(({ file }) => file.replace(/^.*\//, ''));
	for (const { id } of Object.values(CATALOGUE)) expect(documented).toContain(`${id}.ts`);
});

// A formula that loses its docstring altogether is missed here, not in the test below.
test.each([
	[
		'flow',
		'expansibility expansibilityUncertainty dischargeCoefficient massFlow reynoldsNumber hotDiameter permanentLoss',
	],
	[
		'flow',
		'normalFlow dryFlow meanOfRoots differencePressureOf characteristicSeen differencePressureForFlow throatForRange',
	],
	['gas', 'molarMass gasDensity isentropicExponent gasViscosity'],
	['moisture', 'saturationPressure saturationTemperature sublimationPressure dewPoint acidDewPoint acidDewPointOkkes'],
	['moisture', 'wetFromDryBasis wetFromHumidityRatio wetFromDry dryFromCooled'],
	['.', 'propagate'],
])('the formulas of %s are documented', (folder, names) => {
	const documented = formulas
		.filter(({ file }) => folder === '.' || file.startsWith(`${folder}/`))
		.map(({ name }) => name);
	for (const name of names.split(' ')) expect(documented).toContain(name);
});

test.each(formulas)(
	'$file: $name says what it means, its equation, units, source and where it is checked',
	({ doc }) => {
		expect(PARTS.filter(([, pattern]) => !pattern.test(doc)).map(([part]) => part)).toEqual([]);
		const places = PARTS.map(([, pattern]) => doc.search(pattern)).slice(3);
		expect(places).toEqual(places.toSorted((a, b) => a - b));
	},
);

test.each(formulas)('$file: the test that $name names exists', ({ doc }) => {
	for (const [path] of doc.matchAll(/test\/calc\/[\w/.-]+/g)) expect(existsSync(join(ROOT, path)), path).toBe(true);
});

test('the check itself finds what is missing: a docstring without source, one without unit', () => {
	const good =
		'/**\n * Heat.\n *\n *     Q = m c\n *\n * @param m mass [kg]\n * @returns Q [J]\n *\n * Source: a book.\n * Checked against: by hand (test/calc/heat.test.ts).\n */';
	const missing = (doc: string) => PARTS.filter(([, pattern]) => !pattern.test(doc)).map(([part]) => part);
	expect(missing(good)).toEqual([]);
	expect(missing(good.replace(' * Source: a book.\n', ''))).toEqual(['the source']);
	expect(missing(good.replace(' [J]', ''))).toEqual(['output with unit']);
	expect(missing(good.replace('     Q = m c', ' Q = m c'))).toEqual(['the equation, set apart']);
});
