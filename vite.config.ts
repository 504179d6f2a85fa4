import { sveltekit } from '@sveltejs/kit/vite';
import { defineConfig, type ViteUserConfig } from 'vitest/config';

const app: ViteUserConfig = {
	plugins: [sveltekit()],
	test: { include: ['test/**/*.test.ts'], environment: 'node', testTimeout: 60_000 },
};

/** The command line: one plain Node module, its dependencies resolved from node_modules as in the tests. */
const commandLine: ViteUserConfig = {
	publicDir: false,
	build: {
		ssr: 'src/cli/gatehold.ts',
		outDir: 'build/cli',
		target: 'node20',
		rolldownOptions: { output: { entryFileNames: 'gatehold.mjs' } },
	},
};

export default defineConfig(({ mode }) => (mode === 'cli' ? commandLine : app));
