import { expect, test } from 'vitest';
import { sha256Hex, utf8 } from '../../src/lib/base';
import { parseEventLine, textOf, type RecordEvent } from '../../src/lib/record';
import { checkManifest, readManifest, type Manifest } from '../../src/lib/verify/manifest';

const photo = utf8('an invented photo');
const files = [
	{ name: 'attachment-1.jpg', bytes: photo },
	{ name: 'manifest.json', bytes: utf8('{}') },
];

const seal = parseEventLine(
	textOf({
		v: 1,
		log: 'FM-9/small',
		kind: 'sealed',
		body: { heads: {} },
		person: 'QA',
		device: 'T-1',
		number: 1,
		previous: null,
		seen: {},
		clock: 1,
		entered: '2026-05-14T09:00:00+02:00',
	}),
);
const events: readonly RecordEvent[] = seal.ok ? [seal.value] : [];

const manifest: Manifest = {
	format: 'gatehold-dossier/1',
	writer: 'Gatehold 0.1.0',
	startUp: 'FM-9/small',
	sealed: events[0]!.id,
	signatures: [],
	files: [{ name: 'attachment-1.jpg', bytes: photo.length, sha256: sha256Hex(photo) }],
};

const [one] = manifest.files;
const bad = (of: Manifest | undefined, among = files): readonly string[] =>
	checkManifest(of, among, { events })
		.filter(({ outcome }) => outcome === 'failed')
		.map(({ because }) => because);

test('a table of contents that says what is there', () => {
	expect(bad(manifest)).toEqual([]);
});

test.each([
	['another hash', { ...manifest, files: [{ ...one!, sha256: '0'.repeat(64) }] }, 'attachment-1.jpg has another hash.'],
	['another length', { ...manifest, files: [{ ...one!, bytes: 5 }] }, 'attachment-1.jpg has another hash.'],
	['a file that is not here', { ...manifest, files: [one!, { ...one!, name: 'gone.csv' }] }, 'gone.csv is not here.'],
	['a file that it does not list', { ...manifest, files: [] }, 'attachment-1.jpg is not in it.'],
	[
		'another seal',
		{ ...manifest, sealed: '1'.repeat(64) },
		'The dossier is of FM-9/small, sealed as 1111111111111111; the record inside is not.',
	],
])('%s', (_what, wrong, because) => {
	expect(bad(wrong)).toEqual([because]);
});

test.each(['', 'no JSON', '[]', '{"format":"gatehold-dossier/2"}', '{"format":"gatehold-dossier/1","files":[]}'])(
	'%j is no table of contents',
	(text) => {
		expect(readManifest(utf8(text))).toBeUndefined();
		expect(bad(undefined)).toHaveLength(1);
	},
);
