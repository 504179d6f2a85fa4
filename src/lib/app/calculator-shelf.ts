import { fromUtf8, utf8 } from '../base';
import type { TypedInputs } from '../calc';

/** Where a tablet keeps what is typed into its calculators: they belong to no start-up and are no record. */
export type Shelf = Pick<Storage, 'getItem' | 'setItem'>;
export type Cases = { readonly A: TypedInputs; readonly B?: TypedInputs; readonly before?: TypedInputs };

/** @returns undefined where nothing readable is kept */
export function keptCases(shelf: Shelf, calculator: string): Cases | undefined {
	try {
		const kept = JSON.parse(shelf.getItem(keyOf(calculator)) ?? 'null') as unknown;
		if (!isObject(kept)) return undefined;
		const [A, B, before] = [typedIn(kept.A), typedIn(kept.B), typedIn(kept.before)];
		return {
			A: A ?? {},
			...(B === undefined ? {} : { B }),
			...(before === undefined ? {} : { before }),
		};
	} catch {
		return undefined;
	}
}

/** @returns whether the tablet kept it */
export function keepCases(shelf: Shelf, calculator: string, cases: Cases): boolean {
	try {
		shelf.setItem(keyOf(calculator), JSON.stringify(cases));
		return true;
	} catch {
		return false;
	}
}

/** What is typed, as the end of an address: nothing of it goes to a server. */
export const asHash = (typed: TypedInputs): string => {
	const filled = Object.fromEntries(Object.entries(typed).filter(([, { text }]) => text.trim() !== ''));
	const bytes = utf8(JSON.stringify(filled));
	return `#1.${btoa(String.fromCharCode(...bytes))
		.replaceAll('+', '-')
		.replaceAll('/', '_')
		.replaceAll('=', '')}`;
};

/** @returns undefined for an address that holds no inputs, or damaged ones */
export function fromHash(hash: string): TypedInputs | undefined {
	const [, text] = /^#1\.([\w-]+)$/.exec(hash) ?? [];
	if (text === undefined) return undefined;
	try {
		const bytes = Uint8Array.from(atob(text.replaceAll('-', '+').replaceAll('_', '/')), (sign) => sign.charCodeAt(0));
		return typedIn(JSON.parse(fromUtf8(bytes)));
	} catch {
		return undefined;
	}
}

function typedIn(value: unknown): TypedInputs | undefined {
	if (!isObject(value)) return undefined;
	return Object.fromEntries(
		Object.entries(value).flatMap(([at, field]) => {
			if (!isObject(field) || typeof field.text !== 'string') return [];
			const { text, unit, U } = field;
			return [
				[at, { text, ...(typeof unit === 'string' ? { unit } : {}), ...(typeof U === 'string' ? { U } : {}) }] as const,
			];
		}),
	);
}

const isObject = (value: unknown): value is { readonly [name: string]: unknown } =>
	typeof value === 'object' && value !== null && !Array.isArray(value);

const keyOf = (calculator: string): string => `calculator ${calculator}`;
