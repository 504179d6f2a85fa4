import { fail, ok, type Result } from '../base';
import type { TrendFile } from './entries';
import type { Problem } from './problem';

/** A photo drawn anew: smaller, and without what a camera writes beside it, such as the place where it was taken. */
export async function redrawnPhoto(photo: Blob, name: string): Promise<Result<TrendFile, Problem>> {
	const picture = await pictureOf(photo);
	if (picture === undefined) return fail({ kind: 'not-a-picture', name });
	const scale = Math.min(1, LONGEST / Math.max(picture.width, picture.height));
	const canvas = new OffscreenCanvas(
		Math.max(1, Math.round(picture.width * scale)),
		Math.max(1, Math.round(picture.height * scale)),
	);
	canvas.getContext('2d')?.drawImage(picture, 0, 0, canvas.width, canvas.height);
	picture.close();
	const blob = await canvas.convertToBlob({ type: 'image/jpeg', quality: 0.85 });
	return ok({ name: name.replace(/\.[^.]*$/, '') + '.jpg', bytes: new Uint8Array(await blob.arrayBuffer()) });
}

const LONGEST = 2000;

async function pictureOf(photo: Blob): Promise<ImageBitmap | undefined> {
	try {
		return await createImageBitmap(photo, { imageOrientation: 'from-image' });
	} catch {
		// The browser says no more than that it cannot read it.
		return undefined;
	}
}
