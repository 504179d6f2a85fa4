import type { TrendFile } from './entries';

/** A photo drawn anew: smaller, and without what a camera writes beside it, such as the place where it was taken. */
export async function redrawnPhoto(photo: Blob, name: string): Promise<TrendFile> {
	const picture = await createImageBitmap(photo, { imageOrientation: 'from-image' });
	const scale = Math.min(1, LONGEST / Math.max(picture.width, picture.height));
	const canvas = new OffscreenCanvas(Math.round(picture.width * scale), Math.round(picture.height * scale));
	canvas.getContext('2d')?.drawImage(picture, 0, 0, canvas.width, canvas.height);
	picture.close();
	const blob = await canvas.convertToBlob({ type: 'image/jpeg', quality: 0.85 });
	return { name: name.replace(/\.[^.]*$/, '') + '.jpg', bytes: new Uint8Array(await blob.arrayBuffer()) };
}

const LONGEST = 2000;
