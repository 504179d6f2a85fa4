import { buildDossier, CLOSING, INKS, signIncrement } from '../lib/dossier';
import { sha256Hex, readableCode } from '../lib/base';
import { openGateKey, sign } from '../lib/identity';
import { inOrder, printEventLine } from '../lib/record';
import { BUILD, type PlayedStartUp } from '../lib/demo';
import { must } from '../lib/demo';

type Bytes = Uint8Array<ArrayBuffer>;

/** The dossier of a played start-up, closed by the signatures that its file tells of. */
export async function closedDossier(played: PlayedStartUp): Promise<Bytes> {
	const { site, tablets, play, plant, procedure, closing, attachedFiles } = played;
	const device = closing[0]?.on ?? play.tablets.at(-1) ?? '';
	const base = must(
		await buildDossier({
			lines: [...tablets.startUp(device)].sort(inOrder).map(printEventLine),
			siteLines: [...tablets.siteLog(device)].sort(inOrder).map(printEventLine),
			procedure,
			plant,
			root: site.root.certificate.der,
			certificates: site.certificates.map(({ der }) => der),
			files: attachedFiles,
			language: 'en',
			writer: BUILD,
			signatures: CLOSING,
		}),
		'dossier',
	);
	let pdf = base;
	for (const act of closing) {
		const tablet = act.on ?? device;
		const { certificate, gateKey, pin } = site.personKey(act.by, tablet);
		const required = CLOSING.find(({ meaning }) => meaning === act.meaning);
		const roles = certificate.subject.kind === 'person' ? certificate.subject.roles : [];
		const key = must(await openGateKey(gateKey, pin), `PIN of ${act.by}`);
		pdf = must(
			await signIncrement(pdf, {
				field: required?.field ?? '',
				role: roles.find((role) => required?.roles.includes(role)) ?? '',
				meaning: act.meaning,
				at: played.around.instant(act.at),
				code: readableCode(sha256Hex(pdf), 16),
				inks: INKS,
				chain: [certificate.der, site.root.certificate.der],
				sign: (bytes) => sign(bytes, key),
			}),
			`signature of ${act.by}`,
		);
	}
	return pdf;
}
