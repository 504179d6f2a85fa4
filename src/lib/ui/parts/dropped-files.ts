/** Every file that was dropped, folders opened to their bottom. */
export async function droppedFiles(transfer: DataTransfer): Promise<readonly File[]> {
	const entries = [...transfer.items].flatMap((item) => item.webkitGetAsEntry() ?? []);
	if (entries.length === 0) return [...transfer.files];
	const found = await Promise.all(entries.map(filesUnder));
	return found.flat();
}

async function filesUnder(entry: FileSystemEntry): Promise<readonly File[]> {
	if (entry.isFile) {
		const file = await new Promise<File>((resolve, reject) => (entry as FileSystemFileEntry).file(resolve, reject));
		return [file];
	}
	const found: File[] = [];
	const reader = (entry as FileSystemDirectoryEntry).createReader();
	for (;;) {
		// A folder is read in portions; an empty one is the end.
		const some = await new Promise<readonly FileSystemEntry[]>((resolve, reject) =>
			reader.readEntries(resolve, reject),
		);
		if (some.length === 0) return found;
		for (const each of some) found.push(...(await filesUnder(each)));
	}
}
