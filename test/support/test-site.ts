import {
	enrolPerson,
	makeEntryKey,
	makeSiteRoot,
	openSiteRoot,
	webRandom,
	type Certificate,
	type OpenSiteRoot,
	type Role,
	type SigningKey,
	type TrustList,
} from '../../src/lib/identity';

/** An invented site with people who can sign: the real certificates, without PINs, which cost a second each. */
export type TestSite = { readonly root: OpenSiteRoot; readonly enrol: (person: TestPerson) => Promise<TestSigner> };

export type TestPerson = {
	readonly person: string;
	readonly printedName: string;
	readonly roles: readonly Role[];
	readonly device?: string;
	readonly notBefore?: string;
	readonly notAfter?: string;
};

export type TestSigner = { readonly certificate: Certificate; readonly key: SigningKey };

const PASSPHRASE = 'eight invented words that open one test root';

export async function makeTestSite(name = 'Invented Lime Works'): Promise<TestSite> {
	const file = value(
		await makeSiteRoot({ name, now: '2026-01-01T00:00:00Z', passphrase: PASSPHRASE, random: webRandom }),
	);
	const root = value(await openSiteRoot(file, PASSPHRASE));
	return { root, enrol: (person) => enrol(root, person) };
}

async function enrol(root: OpenSiteRoot, person: TestPerson): Promise<TestSigner> {
	const key = await makeEntryKey();
	const { notBefore = '2026-02-01T00:00:00Z', notAfter = '2028-01-31T00:00:00Z', device = 'T-1' } = person;
	const validity = { notBefore, notAfter };
	const issued = await enrolPerson(root, { ...person, device, publicKey: key.publicKey, validity, random: webRandom });
	return { certificate: value(issued), key };
}

/** A list that was in date when the test people signed, and revokes nobody. */
export const testTrustList = (site: TestSite, more: Partial<TrustList> = {}): TrustList => ({
	kind: 'trust list',
	v: 1,
	site: site.root.certificate.issuer.replace(/^CN=/, ''),
	sequence: 1,
	issued: '2026-05-10T00:00:00Z',
	nextUpdate: '2026-05-17T00:00:00Z',
	certificates: [],
	revocations: [],
	...more,
});

/** The value, where the test is about something else and a refusal would be a mistake of the test. */
export function value<T>(
	result: { readonly ok: true; readonly value: T } | { readonly ok: false; readonly error: unknown },
): T {
	if (result.ok) return result.value;
	throw new Error(`unexpected refusal: ${JSON.stringify(result.error)}`);
}
