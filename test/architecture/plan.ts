/** The plan of the house as data: what may stand where, and who may import whom. The checks beside it read only this. */

export const TOP_LEVEL = [
	'package.json',
	'package-lock.json',
	'tsconfig.json',
	'svelte.config.js',
	'vite.config.ts',
	'eslint.config.js',
	'README.md',
	'DEVELOPERS.md',
	'.gitignore',
	'.ci',
	'src',
	'static',
	'test',
] as const;

/** Beside lib, routes and cli. */
export const SRC_FILES = [
	'app.html',
	'app.d.ts',
	'service-worker.ts',
	'hooks.server.ts',
	'start.mjs',
	'build.mjs',
] as const;

const RANKS = [
	['base'],
	['quantity', 'identity'],
	['calc', 'plant'],
	['procedure'],
	['record'],
	['drawing', 'wording'],
	['dossier', 'verify', 'protocol', 'store', 'demo'],
	['sync', 'server', 'ui'],
	['app'],
] as const;

export type Room = (typeof RANKS)[number][number];

export const ROOMS: readonly Room[] = RANKS.flat();

const upTo = (rank: number): readonly Room[] => RANKS.slice(0, rank + 1).flat();

/** Strictly downward. Type imports count: who knows a type of another room knows the room. */
export const MAY_IMPORT: Readonly<Record<Room | 'cli' | 'routes' | 'outside', readonly Room[]>> = {
	base: [],
	quantity: ['base'],
	identity: ['base'],
	calc: ['base', 'quantity'],
	plant: ['base', 'quantity'],
	procedure: ['base', 'quantity', 'calc', 'plant'],
	record: upTo(3),
	drawing: upTo(4),
	wording: upTo(4),
	dossier: upTo(5),
	// Never dossier: the writer's bug must not be invisible to the reader.
	verify: upTo(4),
	protocol: ['base', 'identity', 'record'],
	demo: upTo(5),
	store: ['base', 'identity', 'plant', 'procedure', 'record'],
	sync: ['base', 'identity', 'record', 'protocol', 'store'],
	server: ['base', 'identity', 'procedure', 'record', 'protocol', 'verify'],
	ui: [...upTo(5), 'verify'],
	app: [...upTo(5), 'dossier', 'verify', 'protocol', 'store', 'demo', 'sync'],
	routes: ROOMS,
	cli: upTo(6).filter((room) => room !== 'store'),
	// start.mjs, build.mjs, service-worker.ts: no room at all.
	outside: [],
};

/** No clock, no chance, no network, no browser, no process. */
export const PURE: readonly Room[] = [
	'base',
	'quantity',
	'calc',
	'plant',
	'procedure',
	'record',
	'drawing',
	'wording',
	'protocol',
	'verify',
];

/** Where a stranger must be able to rebuild our reader in ten years. */
export const ROOMS_WITH_SPEC: readonly Room[] = ['procedure', 'record', 'dossier', 'protocol'];

export const TEST_FOLDERS = [
	...ROOMS,
	'cli',
	'architecture',
	'vectors',
	'support',
	'reference',
	'e2e',
	'faults',
	'bench',
] as const;

export const LONGEST_FILE = 400;

/** A name that fits everything says nothing. */
export const VAGUE_WORDS = ['util', 'utils', 'helper', 'helpers', 'common', 'manager', 'service', 'services'] as const;

// Written in two halves, so that this file does not hold what it forbids.
export const FORBIDDEN_WORDS = [
	...['lec|ture', 'trans|cript', 'seed doc|ument', 'speaker sa|id'].map((word) => word.replace('|', '')),
] as const;
export const LEFT_BEHIND = ['TO|DO', 'FIX|ME', 'XX|X'].map((word) => word.replace('|', ''));
export const MACHINE_PATHS = ['/wo|rk/', '/fa|rm/', '/ro|ot/', '/ho|me/', 'registry.np|mjs'].map((word) =>
	word.replace('|', ''),
);
