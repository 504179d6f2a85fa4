import { describe, expect, test } from 'vitest';
import { checkPlant, parsePlant, type PlantFinding } from '../../src/lib/plant';
import { demoPlant, readDemo } from '../support/demo-files';
import { withSet } from '../support/json-pointer';

const plant = demoPlant();
const pointAt = (name: string): number => plant.points.findIndex(({ tag }) => tag === name);
const limitAt = (name: string): number => plant.limits.findIndex(({ id }) => id === name);
const index = {
	AT211: pointAt('AT-211'),
	PT202: pointAt('PT-202'),
	TT221: pointAt('TT-221'),
	warmUp: limitAt('warm-up-outlet'),
	purge: limitAt('purge-oxygen'),
};

function findings(set: { readonly [pointer: string]: unknown }): readonly PlantFinding[] {
	const parsed = parsePlant(withSet(readDemo('plant.json'), set));
	if (!parsed.ok) throw new Error(JSON.stringify(parsed.error));
	return checkPlant(parsed.value);
}

type Mutation = readonly [string, { readonly [pointer: string]: unknown }, Partial<PlantFinding>];
const MUTATIONS: readonly Mutation[] = [
	[
		'two volumes have one id',
		{ '/volumes/6/id': 'SI-21' },
		{ kind: 'duplicate-id', path: 'volumes[6]', id: 'SI-21', first: 'volumes[5]' },
	],
	[
		'a duct and a volume have one id, and ducts name both',
		{ '/ducts/0/id': 'CH-21', '/elements/0/duct': 'CH-21' },
		{ kind: 'duplicate-id', path: 'ducts[0]', id: 'CH-21', first: 'volumes[7]' },
	],
	['a duct ends nowhere', { '/ducts/4/to': 'ST-22' }, { kind: 'unknown-place', path: 'ducts[4].to', id: 'ST-22' }],
	[
		'a point reads a volume that is not there',
		{ [`/points/${index.PT202}/at`]: 'ML-22' },
		{ kind: 'unknown-place', path: `points[${index.PT202}].at`, id: 'ML-22' },
	],
	[
		'a wall is read by a point that is not there',
		{ '/volumes/2/walls/0/point': 'TT-999' },
		{ kind: 'unknown-point', path: 'volumes[2].walls[0].point', tag: 'TT-999' },
	],
	[
		'the Venturi is read by a point that is not there',
		{ '/venturis/0/points/pressure': 'PT-999' },
		{ kind: 'unknown-point', path: 'venturis[0].points.pressure', tag: 'PT-999' },
	],
	[
		'the inert gas has a meter that is not there',
		{ '/inertSources/0/meter': 'FT-999' },
		{ kind: 'unknown-point', path: 'inertSources[0].meter', tag: 'FT-999' },
	],
	[
		'the fuel maximum is for a point that is not there',
		{ '/fuel/outletPoint': 'TT-999' },
		{ kind: 'unknown-point', path: 'fuel.outletPoint', tag: 'TT-999' },
	],
	[
		'a damper stands in a duct that is not there',
		{ '/elements/0/duct': 'D-99' },
		{ kind: 'unknown-duct', path: 'elements[0].duct', id: 'D-99' },
	],
	[
		'a point is read with an instrument that is not there',
		{ [`/points/${index.AT211}/instrument`]: 'AT-299' },
		{ kind: 'unknown-instrument', path: `points[${index.AT211}].instrument`, id: 'AT-299' },
	],
	[
		'a point is read with the instrument of another point',
		{ [`/points/${index.AT211}/instrument`]: 'AT-212' },
		{ kind: 'instrument-of-another-point', path: `points[${index.AT211}].instrument`, point: 'AT-212' },
	],
	[
		'the circulating flow is taken for the inert gas that enters',
		{ '/inertSources/0/meter': 'FT-201' },
		{ kind: 'not-an-inert-gas-meter', path: 'inertSources[0].meter', tag: 'FT-201', medium: 'process gas' },
	],
	[
		'the by-pass is said to be swept, and no duct reaches it',
		{ '/volumes/6/deadLeg': false },
		{ kind: 'unconnected-volume', path: 'volumes[6]', id: 'BY-21' },
	],
	[
		'a point has a quantity that nobody knows',
		{ [`/points/${index.PT202}/quantity`]: 'suction' },
		{ kind: 'unknown-quantity', path: `points[${index.PT202}].quantity`, quantity: 'suction' },
	],
	[
		'a gauge pressure is read in absolute millibar',
		{ [`/points/${index.PT202}/unit`]: 'mbar(a)' },
		{ kind: 'unknown-unit', path: `points[${index.PT202}].unit`, unit: 'mbar(a)', quantity: 'pressure-gauge' },
	],
	[
		'an oxygen analyser does not say whether it reads wet or dry gas',
		{ [`/points/${index.AT211}/basis`]: null },
		{ kind: 'basis-disagrees', path: `points[${index.AT211}].basis`, quantity: 'oxygen-wet', basis: 'none' },
	],
	[
		'moist oxygen is called dry',
		{ [`/points/${index.AT211}/basis`]: 'dry' },
		{ kind: 'basis-disagrees', path: `points[${index.AT211}].basis`, quantity: 'oxygen-wet', basis: 'dry' },
	],
	[
		'a temperature is called wet',
		{ [`/points/${index.TT221}/basis`]: 'wet' },
		{ kind: 'basis-disagrees', path: `points[${index.TT221}].basis`, quantity: 'temperature', basis: 'wet' },
	],
	['a volume is given in metres', { '/volumes/0/volume/unit': 'm' }, { kind: 'bad-value', path: 'volumes[0].volume' }],
	[
		'an uncertainty is given in a unit that differences do not have',
		{ [`/points/${index.TT221}/uncertainty/unit`]: 'K(a)' },
		{ kind: 'bad-value', path: `points[${index.TT221}].uncertainty` },
	],
	[
		'a range runs backwards',
		{ [`/points/${index.AT211}/range`]: { from: 25, to: 0 } },
		{ kind: 'range-reversed', path: `points[${index.AT211}].range`, from: 25, to: 0 },
	],
	[
		'the throat of the Venturi is as wide as its pipe',
		{
			'/venturis/0/throatDiameter/value': '0.70',
			'/venturis/0/throatDiameter/unit': 'm',
			'/venturis/0/throatDiameter/U': null,
		},
		{ kind: 'throat-not-smaller', path: 'venturis[0].throatDiameter', throat: '0.70 m', pipe: '700 mm' },
	],
	[
		'a calibration is due on a day that the calendar does not have',
		{ '/instruments/0/due': '2026-02-31' },
		{ kind: 'no-such-day', path: 'instruments[0].due', day: '2026-02-31' },
	],
	[
		'a limit limits nothing',
		{ [`/limits/${index.warmUp}/atLeast`]: null },
		{ kind: 'limit-without-side', path: `limits[${index.warmUp}]`, limit: 'warm-up-outlet' },
	],
	[
		'a guard is as large as its limit',
		{ [`/limits/${index.purge}/guard/value`]: '8.0' },
		{ kind: 'guard-leaves-nothing', path: `limits[${index.purge}]`, limit: 'purge-oxygen' },
	],
	[
		'the mill outlet must be warmer than the fuel allows',
		{ '/fuel/maximumOutletTemperature/value': '95' },
		{
			kind: 'limits-cross',
			path: `points[${index.TT221}]`,
			point: 'TT-221',
			atLeast: 'warm-up-outlet',
			atMost: 'fuel.maximumOutletTemperature',
		},
	],
	[
		'nobody has tested the limiting oxygen concentration of this fuel',
		{ '/fuel/limitingOxygen': null },
		{ kind: 'no-fuel-report', path: 'fuel.limitingOxygen' },
	],
];

describe('a plant description is refused where', () => {
	test.each(MUTATIONS)('%s', (_, set, expected) => {
		expect(findings(set)).toMatchObject([expected]);
	});

	test('every kind of finding is shown above', () => {
		const seen = new Set(MUTATIONS.map(([, , { kind }]) => kind));
		expect(Object.keys(KINDS).filter((kind) => !seen.has(kind as PlantFinding['kind']))).toEqual([]);
	});
});

describe('the demonstration unit', () => {
	test('contradicts itself nowhere', () => {
		expect(checkPlant(plant)).toEqual([]);
	});

	test('says that it is invented', () => {
		expect(plant.demonstration).toBe(true);
	});

	test('names the volumes that no analyser reads, dead legs among them', () => {
		const read = new Set(plant.points.filter(({ quantity }) => quantity === 'oxygen-wet').map((point) => point.at));
		const unread = plant.volumes.filter(({ id }) => !read.has(id)).map(({ id }) => id);
		expect(unread).toEqual(['HG-21', 'RD-21', 'BY-21', 'CH-21']);
		expect(plant.volumes.filter(({ deadLeg }) => deadLeg).map(({ id }) => id)).toEqual(['BY-21', 'CH-21']);
	});

	test('keeps every bubble of the sketch on the sheet and off every other bubble and outline', () => {
		const bubbles = plant.points.flatMap(({ tag, sketch }) => (sketch === undefined ? [] : [{ tag, ...sketch }]));
		const boxes = [...plant.volumes, ...(plant.surroundings ?? []), ...plant.inertSources].map(({ sketch }) => sketch);
		const RADIUS = 1.9;
		for (const { x, y } of bubbles) {
			expect(x).toBeGreaterThan(RADIUS);
			expect(x).toBeLessThan(100 - RADIUS);
			expect(y).toBeGreaterThan(RADIUS);
			expect(y).toBeLessThan(60 - RADIUS);
		}
		const near = bubbles.flatMap((a, i) =>
			bubbles.slice(i + 1).filter((b) => Math.hypot(a.x - b.x, a.y - b.y) < 2 * RADIUS),
		);
		const inside = bubbles.filter(({ x, y }) =>
			boxes.some(
				(box) =>
					x > box.x - RADIUS &&
					x < box.x + (box.width ?? 0) + RADIUS &&
					y > box.y - RADIUS &&
					y < box.y + (box.height ?? 0) + RADIUS,
			),
		);
		expect({ near, inside }).toEqual({ near: [], inside: [] });
	});
});

describe('a description of another shape', () => {
	test('is refused with every wrong place', () => {
		const read = parsePlant(withSet(readDemo('plant.json'), { '/unit': 7, '/volumes/0/colour': 'red' }));
		expect(read).toMatchObject({
			ok: false,
			error: [
				{ kind: 'wrong-shape', path: 'unit', expected: 'string', found: '7' },
				{ kind: 'wrong-shape', path: 'volumes[0].colour', expected: 'no such name' },
			],
		});
	});
});

/** Every kind of finding: a new one does not compile until it stands here, and does not pass until it is shown. */
const KINDS = {
	'bad-value': true,
	'basis-disagrees': true,
	'duplicate-id': true,
	'guard-leaves-nothing': true,
	'instrument-of-another-point': true,
	'limit-without-side': true,
	'limits-cross': true,
	'no-fuel-report': true,
	'no-such-day': true,
	'not-an-inert-gas-meter': true,
	'range-reversed': true,
	'throat-not-smaller': true,
	'unconnected-volume': true,
	'unknown-duct': true,
	'unknown-instrument': true,
	'unknown-place': true,
	'unknown-point': true,
	'unknown-quantity': true,
	'unknown-unit': true,
} satisfies { readonly [kind in PlantFinding['kind']]: true };
