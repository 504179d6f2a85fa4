import type { Attachment, Store } from '../store';

export type ShownPhoto = { readonly name: string; readonly url: string; readonly hash: string };

/** Kept photos as addresses that a page can show, for as long as the page is open. */
export class PhotoUrls {
	readonly #store: Store;
	#urls = $state.raw<{ readonly [hash: string]: string }>({});
	#closed = false;

	constructor(store: Store) {
		this.#store = store;
	}

	/** Reads what is not yet shown; what this tablet does not hold stays away. */
	async show(attachments: readonly Attachment[]): Promise<void> {
		for (const { hash, mediaType } of attachments) {
			if (!mediaType.startsWith('image/') || !this.#isNew(hash)) continue;
			const kept = await this.#store.attachments.read(hash);
			if (!kept.ok || kept.value === undefined || this.#closed || !this.#isNew(hash)) continue;
			this.#urls = { ...this.#urls, [hash]: URL.createObjectURL(kept.value.blob) };
		}
	}

	#isNew(hash: string): boolean {
		return this.#urls[hash] === undefined;
	}

	of(attachments: readonly Attachment[]): readonly ShownPhoto[] {
		return attachments.flatMap(({ hash, name }) => {
			const url = this.#urls[hash];
			return url === undefined ? [] : [{ name, url, hash }];
		});
	}

	close(): void {
		this.#closed = true;
		for (const url of Object.values(this.#urls)) URL.revokeObjectURL(url);
		this.#urls = {};
	}
}
