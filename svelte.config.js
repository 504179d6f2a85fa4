import process from 'node:process';
import adapter from '@sveltejs/adapter-node';
import { vitePreprocess } from '@sveltejs/vite-plugin-svelte';

/** @type {import('@sveltejs/kit').Config} */
export default {
	preprocess: vitePreprocess(),
	kit: {
		adapter: adapter({ out: 'build/app' }),
		// The same sources are the same version: a tablet is offered nothing new where nothing is.
		version: { name: process.env.GATEHOLD_BUILD ?? 'unbuilt' },
		// A deep link must find its files without the server that it came from.
		paths: { relative: false },
		// Written into each page as a meta element with the hash of the one inline script that starts it;
		// src/start.mjs adds the headers that a meta element cannot carry.
		csp: {
			mode: 'hash',
			directives: {
				'default-src': ['none'],
				'script-src': ['self'],
				'style-src': ['self'],
				// The one style attribute that SvelteKit writes: it hides its announcer, which tells screen readers of a new page.
				'style-src-attr': ['unsafe-hashes', 'sha256-S8qMpvofolR8Mpjy4kQvEm7m1q8clzU4dfDH0AmvZjo='],
				'font-src': ['self'],
				'img-src': ['self', 'blob:', 'data:'],
				'connect-src': ['self'],
				'worker-src': ['self'],
				'manifest-src': ['self'],
				'base-uri': ['none'],
				'form-action': ['self'],
				'frame-ancestors': ['none'],
			},
		},
	},
};
