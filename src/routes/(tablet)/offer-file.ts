type OfferedFile = { readonly name: string; readonly bytes: Uint8Array<ArrayBuffer>; readonly mediaType?: string };

/** Hands a file to the person: the browser asks where, or keeps it where downloads go. */
export function offerFile(file: OfferedFile): void {
	const url = URL.createObjectURL(asFile(file));
	const link = document.createElement('a');
	link.href = url;
	link.download = file.name;
	link.click();
	URL.revokeObjectURL(url);
}

/** Whether this browser can hand the file to another program, such as mail. */
export const canShare = (file: OfferedFile): boolean =>
	typeof navigator.canShare === 'function' && navigator.canShare({ files: [asFile(file)] });

/** The person may turn back: that is no error. */
export const shareFile = (file: OfferedFile): Promise<void> =>
	navigator.share({ files: [asFile(file)], title: file.name }).catch(() => undefined);

const asFile = ({ name, bytes, mediaType = 'application/octet-stream' }: OfferedFile): File =>
	new File([bytes], name, { type: mediaType });
