import { ok, type Result } from '../base';
import type { Store } from '../store';
import { DOSSIER, readDossierDraft, type DossierDraft } from './dossier-draft';
import type { Problem } from './problem';

/** A sealed start-up on this tablet and how far its dossier is. */
export type SealedRecord = {
	readonly startUp: string;
	readonly title: string;
	readonly signatures: number;
	/** Hash of the closed file, once every signature is there. */
	readonly closed: string | undefined;
	readonly verified: DossierDraft['verified'];
};

/** Newest first. */
export async function sealedRecords(store: Store): Promise<Result<readonly SealedRecord[], Problem>> {
	const startUps = await store.events.listStartUps();
	if (!startUps.ok) return startUps;
	const drafts = await store.drafts.list();
	if (!drafts.ok) return drafts;
	return ok(
		startUps.value
			.filter(({ sealed }) => sealed)
			.map(({ id, title }) => {
				const kept = drafts.value.find(({ startUp, step }) => startUp === id && step === DOSSIER);
				const draft = kept === undefined ? undefined : readDossierDraft(kept.typed);
				return {
					startUp: id,
					title,
					signatures: draft?.updates.length ?? 0,
					closed: draft?.closed,
					verified: draft?.verified,
				};
			}),
	);
}

type KeptFile = { readonly name: string; readonly arrayBuffer: () => Promise<ArrayBuffer> };

/** The closed file as it lies on this tablet. */
export async function closedFile(store: Store, hash: string): Promise<Result<KeptFile | undefined, Problem>> {
	const kept = await store.attachments.read(hash);
	if (!kept.ok) return kept;
	if (kept.value === undefined) return ok(undefined);
	const { name, blob } = kept.value;
	return ok({ name, arrayBuffer: () => blob.arrayBuffer() });
}
