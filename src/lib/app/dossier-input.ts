import { fail, fromBase64, ok, type Result } from '../base';
import { BUILD } from '../demo';
import { CLOSING, type DossierInput } from '../dossier';
import { allOf, inOrder, Knowledge, printEventLine, type EventOf, type RecordEvent } from '../record';
import type { Language } from '../wording';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';

type Bytes = Uint8Array<ArrayBuffer>;
type Named = { readonly hash: string; readonly name: string; readonly mediaType: string };

/**
 * Everything that the dossier of a sealed start-up is made from, as this tablet keeps it. What came after the seal stays
 * outside, so that the dossier is the same whenever it is made.
 *
 * @returns besides, the photos and trends that events name and that this tablet does not hold
 */
export async function dossierInputOf(
	startUp: OpenStartUp,
	language: Language,
): Promise<Result<{ readonly input: DossierInput; readonly notHere: readonly string[] }, Problem>> {
	const sealed = sealOf(startUp);
	if (sealed === undefined) return fail({ kind: 'not-sealed-yet', startUp: startUp.id });
	const { tablet, procedure, plant } = startUp;
	const root = await tablet.store.site.read('root certificate');
	if (!root.ok) return root;
	if (root.value === undefined) return fail({ kind: 'no-site' });
	const events = insideSeal(startUp.log, sealed);
	const site = siteUntil(startUp.siteLog, sealed);
	const files: { name: string; mediaType: string; bytes: Bytes }[] = [];
	const notHere: string[] = [];
	for (const { hash, name, mediaType } of attachmentsOf(events)) {
		const held = await tablet.store.attachments.read(hash);
		if (!held.ok) return held;
		if (held.value === undefined) notHere.push(name);
		else files.push({ name, mediaType, bytes: new Uint8Array(await held.value.blob.arrayBuffer()) });
	}
	const input: DossierInput = {
		lines: events.map(printEventLine),
		siteLines: site.map(printEventLine),
		procedure,
		plant,
		root: root.value,
		certificates: [...certificatesIn(site), ...tablet.people.map(({ certificate }) => certificate.der)],
		files,
		language,
		writer: BUILD,
		signatures: CLOSING,
	};
	return ok({ input, notHere });
}

export const sealOf = ({ log }: OpenStartUp): EventOf<'sealed'> | undefined =>
	[...allOf(log, 'sealed')].sort(inOrder)[0];

/** What came after the seal, and is no countersignature: it belongs into a supplement. */
export function outsideSeal(startUp: OpenStartUp): readonly RecordEvent[] {
	const sealed = sealOf(startUp);
	if (sealed === undefined) return [];
	const inside = new Set(insideSeal(startUp.log, sealed));
	return startUp.log.filter((event) => !inside.has(event) && !AROUND.has(event.kind));
}

/** What a tablet says of itself and of its copies. */
const AROUND: ReadonlySet<RecordEvent['kind']> = new Set(['chain head', 'copy made', 'copy received', 'shift key']);

function insideSeal(log: readonly RecordEvent[], sealed: RecordEvent): readonly RecordEvent[] {
	const past = new Knowledge(log).past(sealed);
	return log.filter(({ id }) => id === sealed.id || past.has(id)).sort(inOrder);
}

/** The site's chains, each up to its last event entered by the seal: no number is missing, whatever a clock says. */
function siteUntil(site: readonly RecordEvent[], { enteredAt }: RecordEvent): readonly RecordEvent[] {
	const last = new Map<string, number>();
	for (const event of site)
		if (event.enteredAt <= enteredAt) last.set(event.device, Math.max(event.number, last.get(event.device) ?? 0));
	return site.filter(({ device, number }) => number <= (last.get(device) ?? 0)).sort(inOrder);
}

const certificatesIn = (site: readonly RecordEvent[]): readonly Bytes[] =>
	[...allOf(site, 'person enrolled'), ...allOf(site, 'device enrolled')].flatMap(({ body: { certificate } }) =>
		certificate === undefined ? [] : (fromBase64(certificate) ?? []),
	);

/** Each once; the first name stays. */
export function attachmentsOf(events: readonly RecordEvent[]): readonly Named[] {
	const named: readonly Named[] = [
		...allOf(events, 'entry').flatMap(({ body }) => body.attachments ?? []),
		...allOf(events, 'note').flatMap(({ body }) => body.attachments ?? []),
		...allOf(events, 'series attached').map(({ body }) => body.attachment),
	];
	return [...new Map([...named].reverse().map((one) => [one.hash, one])).values()].reverse();
}
