import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { readJpeg } from '../../src/lib/dossier/pdf/jpeg';

const path = new URL('../../static/demo/photos/emergency-inerting-valve.jpg', import.meta.url).pathname;

test('the size of a photo is what another program reads from it', () => {
	// file(1), version 5.45: "baseline, precision 8, 640x480, components 3"
	expect(readJpeg(new Uint8Array(readFileSync(path)))).toEqual({ width: 640, height: 480, colours: 'DeviceRGB' });
});

test('what is no photo, or is torn off before its frame, is not drawn', () => {
	const photo = new Uint8Array(readFileSync(path));
	expect(readJpeg(photo.slice(0, 40))).toBeUndefined();
	expect(readJpeg(new TextEncoder().encode('no picture'))).toBeUndefined();
});
