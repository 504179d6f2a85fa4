import { flushSync, mount, unmount } from 'svelte';
import '../../../src/lib/ui/tokens.css';
import Gallery from './Gallery.svelte';
import type { GalleryData } from './moments-of-the-night';

/** What a test asks of the page: show one scene with this data, in one look. */
export type GalleryPage = { readonly show: (data: GalleryData, scene: string, look: string) => void };

let shown: ReturnType<typeof mount> | undefined;

const page: GalleryPage = {
	show(data, scene, look) {
		if (shown !== undefined) void unmount(shown);
		document.documentElement.dataset.look = look;
		shown = mount(Gallery, { target: document.body, props: { data, scene } });
		flushSync();
	},
};

Object.assign(globalThis, { gallery: page });
