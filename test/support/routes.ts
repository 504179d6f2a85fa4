import { readdirSync } from 'node:fs';
import { join } from 'node:path';

const ROUTES = join(import.meta.dirname, '../../src/routes');

/** Every page of the app by its pattern, read from the routes themselves: "/start-ups/[id]/gate/[gate]". */
export const routePatterns = (): readonly string[] =>
	readdirSync(ROUTES, { recursive: true, withFileTypes: true })
		.filter(({ name }) => name === '+page.svelte')
		.map(({ parentPath }) => parentPath.slice(ROUTES.length).replace(/\/\([^)]+\)/g, ''))
		.map((path) => (path === '' ? '/' : path))
		.sort();

/** The pattern that an address belongs to: one with fewer parameters goes first. */
export function patternOf(pathname: string): string | undefined {
	const parts = pathname.split('/');
	const fits = (pattern: string): boolean => {
		const wanted = pattern.split('/');
		return wanted.length === parts.length && wanted.every((part, i) => part.startsWith('[') || part === parts[i]);
	};
	const parameters = (pattern: string): number => pattern.split('[').length;
	return [...routePatterns()].sort((a, b) => parameters(a) - parameters(b)).find(fits);
}
