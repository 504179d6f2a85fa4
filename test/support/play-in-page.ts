import { toBase64 } from '../../src/lib/base';
import { openStore } from '../../src/lib/store';
import { playUpToTheSeal } from './played-tablet';
import { value } from './test-site';

/** Inside a page of the app: its own store is given a start-up that waits for its seal. */
const inPage = {
	async play(names: readonly string[]): Promise<string> {
		const held = new Map<string, Uint8Array<ArrayBuffer>>();
		for (const name of names) {
			const answer = await fetch(`/demo/${name}`);
			held.set(name, new Uint8Array(await answer.arrayBuffer()));
		}
		const store = value(await openStore('gatehold', { now: new Date().toISOString() }));
		const startUp = await playUpToTheSeal(store, held, Date.now());
		store.close();
		return startUp;
	},
	async root(): Promise<string> {
		const store = value(await openStore('gatehold', { now: new Date().toISOString() }));
		const root = value(await store.site.read('root certificate'));
		store.close();
		return toBase64(root ?? new Uint8Array());
	},
};

export type InPage = typeof inPage;

Object.assign(globalThis, { inPage });
