import { sveltekit } from '@sveltejs/kit/vite';
import { defineConfig } from 'vitest/config';

export default defineConfig({
	plugins: [sveltekit()],
	test: { include: ['test/**/*.test.ts'], environment: 'node', testTimeout: 60_000 },
});
