import { offerFile } from '../../../../offer-file';

type File = { readonly name: string; readonly bytes: Uint8Array<ArrayBuffer> };

/** What became of a file that was handed out. Only where it was read back is it known to be there. */
export type Offered = 'compared' | 'differs' | 'handed out' | 'given up';

type Picker = (options: { readonly suggestedName: string }) => Promise<FileSystemFileHandle>;

/** Writes a copy where the person says, and reads it back; where a browser cannot do that, it is handed out as a download. */
export async function copyElsewhere(file: File): Promise<Offered> {
	const picker = (globalThis as { readonly showSaveFilePicker?: Picker }).showSaveFilePicker;
	if (picker === undefined) return download(file);
	let handle: FileSystemFileHandle;
	try {
		handle = await picker({ suggestedName: file.name });
	} catch (thrown) {
		// The person closed the question; or this page is not allowed to ask it.
		return thrown instanceof DOMException && thrown.name === 'AbortError' ? 'given up' : download(file);
	}
	try {
		const writing = await handle.createWritable();
		await writing.write(file.bytes);
		await writing.close();
		const back = new Uint8Array(await (await handle.getFile()).arrayBuffer());
		return back.length === file.bytes.length && back.every((byte, i) => byte === file.bytes[i])
			? 'compared'
			: 'differs';
	} catch {
		return 'differs';
	}
}

function download(file: File): Offered {
	offerFile(file);
	return 'handed out';
}
