import { utf8, type Result } from '../base';
import { zipSync } from 'fflate';
import { allOf, inOrder, printEventLine, type RecordEvent } from '../record';
import { ok } from '../base';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';

/** The start-up as one file to be kept in a second place: its lines, the site's, and every attachment that the tablet holds. */
export async function copyFile(
	startUp: OpenStartUp,
): Promise<Result<{ name: string; bytes: Uint8Array<ArrayBuffer> }, Problem>> {
	const kept = await startUp.keepHeld();
	if (!kept.ok) return kept;
	const lines = (events: readonly RecordEvent[]) =>
		utf8([...events].sort(inOrder).map(printEventLine).join('\n') + '\n');
	const files: Record<string, Uint8Array> = {
		'record.ndjson': lines(startUp.log),
		'site.ndjson': lines(startUp.siteLog),
	};
	for (const hash of attachmentsOf(startUp.log)) {
		const held = await startUp.tablet.store.attachments.read(hash);
		if (!held.ok) return held;
		if (held.value !== undefined) files[`attachments/${hash}`] = new Uint8Array(await held.value.blob.arrayBuffer());
	}
	const name = `${startUp.id.replaceAll(/[^A-Za-z0-9.-]/g, '-')}.${startUp.tablet.device}.zip`;
	return ok({ name, bytes: new Uint8Array(zipSync(files)) });
}

function attachmentsOf(events: readonly RecordEvent[]): ReadonlySet<string> {
	const named = [
		...allOf(events, 'entry').flatMap(({ body }) => body.attachments ?? []),
		...allOf(events, 'note').flatMap(({ body }) => body.attachments ?? []),
		...allOf(events, 'series attached').map(({ body }) => body.attachment),
	];
	return new Set(named.map(({ hash }) => hash));
}
