import { beforeAll, expect, test } from 'vitest';
import { checkPdf, readPdf } from '../../../src/lib/verify';
import { makeSigners, signThree } from '../../support/small-dossier';
import { appendUnsigned, findObjects, latin1 } from '../../support/tamper';
import { makeTestSite } from '../../support/test-site';

type Bytes = Uint8Array<ArrayBuffer>;

let two: Bytes;
let three: Bytes;

beforeAll(async () => {
	const site = await makeTestSite();
	[, , two, three] = await signThree(site, await makeSigners(site));
});

/** What is said about the last update of a file: whether it is one signature and nothing else. */
async function saidOfLast(file: Bytes) {
	const { checks } = await checkPdf(readPdf(file), { now: '2026-06-01T00:00:00Z' });
	const check = checks.findLast(({ name }) => /^update \d+ is one signature and nothing else$/.test(name));
	return `${check?.outcome}: ${check?.because.replace(/^Bytes \d+ to \d+/, '')}`;
}

/** Changes the third signature's update alone, and keeps its length. */
function edit(from: RegExp, to: string): Bytes {
	const update = latin1(three.slice(two.length));
	const found = from.exec(update)!;
	const changed =
		update.slice(0, found.index) + to.padEnd(found[0].length) + update.slice(found.index + found[0].length);
	expect(changed).toHaveLength(update.length);
	return new Uint8Array(Buffer.concat([two, Buffer.from(changed, 'latin1')]));
}

test('[PS2] one signature and nothing else is what an update may be', async () => {
	expect(await saidOfLast(three)).toBe('passed:  fill the field sig_accepted.');
});

test.each([
	['the field moves on the page', /\/Rect \[ 60 340/, '/Rect [ 60 350', 'it changes /Rect of the field sig_accepted'],
	['the field is no longer printed', /\/F 4\n/, '/F 2\n', 'it changes /F of the field sig_accepted'],
	['the field has another name', /\(sig_accepted\)/, '(sig_accepter)', 'it fills no open signature field'],
	[
		'the field shows a second appearance',
		/\/AP <<\n\/N (\d+) 0 R/,
		'/AP <<\n/D $ 0 R',
		'shows something that is not an appearance of its own',
	],
	['the appearance is larger than its box', /484 98 \]/, '999 98 ]', 'the appearance of sig_accepted differs in /BBox'],
	['the appearance fills an area', / S Q/, ' f Q', 'the appearance of sig_accepted holds more than text and strokes'],
	[
		'the appearance calls a picture',
		/\/Ink 9\.5 Tf/,
		'/Ink     Do',
		'the appearance of sig_accepted holds more than text and strokes',
	],
	[
		'the dictionary lacks the name',
		/\/Name/,
		'/Nom ',
		'the signature dictionary holds /Nom; the signature dictionary lacks /Name',
	],
	[
		'the dictionary is for another handler',
		/\/Adobe\.PPKLite/,
		'/Adobe.PPKHeav',
		'the signature is of the form Adobe.PPKHeav',
	],
	['the lock leaves a field open', /\/Action \/All/, '/Action /Inc', 'the last signature does not lock the fields'],
	['the lock is of another kind', /\/FieldMDP/, '/DocMDP', 'the last signature does not lock the fields'],
	['the document begins elsewhere', /\/Root \d+ 0 R/, '/Root 9 0 R', 'it changes /Root of the trailer'],
	['another document is named', /\/ID \[<00/, '/ID [<01', 'it names another document in /ID'],
	['the objects are counted wrongly', /\/Size 24/, '/Size 99', 'its trailer counts 99 objects, not 24'],
] as const)('[PS2] [PS3] %s: the update is refused in words', async (_, from, to, expected) => {
	const number = from.source.includes('(\\d+)') ? from.exec(latin1(three.slice(two.length)))![1]! : '';
	const said = await saidOfLast(edit(from, to.replace('$', number)));
	expect(said).toMatch(/^failed/);
	expect(said).toContain(expected);
});

test('[PS2] an update that brings an object that no signature needs is refused in words', async () => {
	const update = appendUnsigned(three, [{ number: 24, body: '<< /Type /Nothing >>' }]);
	expect(await saidOfLast(update)).toBe(
		'failed: : it adds object 24, which no signature needs; it fills no open signature field.',
	);
});

test('[PS2] an update that fills two fields at once is refused in words', async () => {
	const { bodyOf } = await findObjects(two);
	const base = readPdf(three).base!;
	const numbers = [...latin1(base).matchAll(/(\d+) 0 obj\n<<\n\/Type \/Annot/g)].map(([, number]) => Number(number));
	const filled = numbers.slice(0, 2).map((number) => ({ number, body: bodyOf(number) }));
	expect(await saidOfLast(appendUnsigned(base, filled))).toContain('it fills 2 signature fields at once');
});
