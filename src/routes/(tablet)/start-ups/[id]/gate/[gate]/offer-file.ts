/** Hands a file to the person: the browser asks where, or keeps it where downloads go. */
export function offerFile(file: { readonly name: string; readonly bytes: Uint8Array<ArrayBuffer> }): void {
	const url = URL.createObjectURL(new Blob([file.bytes], { type: 'application/octet-stream' }));
	const link = document.createElement('a');
	link.href = url;
	link.download = file.name;
	link.click();
	URL.revokeObjectURL(url);
}
