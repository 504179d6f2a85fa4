import { BUILD } from '../../src/lib/demo';
import { buildDossier, INKS, signIncrement, type DossierInput } from '../../src/lib/dossier';
import { sign } from '../../src/lib/identity';
import { PlantSchema } from '../../src/lib/plant';
import * as v from 'valibot';
import type { SignedRecord } from './signed-record';
import { PLANT } from './signed-record';
import { SMALL_PROCEDURE } from './small-procedure';
import { value } from './test-site';

type Bytes = Uint8Array<ArrayBuffer>;

const CLOSING = [
	{ field: 'sig_performed', meaning: 'performed', roles: ['technician'], by: 'TechA T-1' },
	{ field: 'sig_reviewed', meaning: 'reviewed', roles: ['commissioning lead'], by: 'Lead T-1' },
	{ field: 'sig_accepted', meaning: 'accepted', roles: ['QA'], by: 'QA T-1' },
] as const;

/** The small start-up as a dossier with its three closing signatures; what differs from the truth is an insider's work. */
export async function makeSignedDossier(record: SignedRecord, differs: Partial<DossierInput> = {}): Promise<Bytes> {
	const { site, tablets, events, lines } = record;
	const ofSite = (i: number): boolean => events[i]!.log === 'site';
	const base = value(
		await buildDossier({
			lines: lines.filter((_, i) => !ofSite(i)),
			siteLines: lines.filter((_, i) => ofSite(i)),
			procedure: SMALL_PROCEDURE,
			plant: v.parse(PlantSchema, PLANT),
			root: site.root.certificate.der,
			certificates: tablets.certificates.map(({ der }) => der),
			files: [],
			language: 'en',
			writer: BUILD,
			signatures: CLOSING.map(({ field, meaning, roles }) => ({ field, meaning, roles })),
			...differs,
		}),
	);
	let pdf = base;
	for (const [i, { field, meaning, roles, by }] of CLOSING.entries()) {
		const signer = tablets.signers.get(by)!;
		pdf = value(
			await signIncrement(pdf, {
				field,
				role: roles[0],
				meaning,
				at: `2026-05-14T09:1${i}:00+02:00`,
				code: 'M4XQ-0TDR-7WHB-2JKE',
				inks: INKS,
				chain: [signer.certificate.der, site.root.certificate.der],
				sign: (bytes) => sign(bytes, signer.key),
			}),
		);
	}
	return pdf;
}
