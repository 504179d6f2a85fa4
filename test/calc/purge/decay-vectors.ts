import { readdirSync, readFileSync } from 'node:fs';

type Pair = readonly [number | null, number | null];

/** A decay with noise and what scipy and statsmodels make of it. */
export type DecayVector = {
	readonly name: string;
	readonly t: readonly number[];
	readonly C: readonly number[];
	readonly expect: {
		readonly Cf: number;
		readonly C0: number;
		readonly lambda: number;
		readonly SE: { readonly Cf: number; readonly C0: number; readonly lambda: number };
		readonly SSR: number;
		readonly t: number;
		readonly 'lambda bounds': Pair;
		readonly 'Cf bounds': Pair;
		readonly 'runs z': number;
		readonly inflation: number;
	};
};

const FOLDER = 'test/vectors/purge';

export const decayVectors: readonly DecayVector[] = readdirSync(FOLDER)
	.filter((file) => file.endsWith('.json'))
	.map((file) => {
		const read = JSON.parse(readFileSync(`${FOLDER}/${file}`, 'utf8')) as DecayVector;
		return { ...read, name: file.replace('.json', '').replaceAll('-', ' ') };
	})
	.filter((vector) => Array.isArray(vector.C));

export const samplesOf = ({ t, C }: Pick<DecayVector, 't' | 'C'>): { t: number; C: number }[] =>
	t.map((at, i) => ({ t: at, C: C[i] ?? Number.NaN }));
