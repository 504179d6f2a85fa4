import type { Result } from '../base';

/** The value of a step of the demonstration that cannot fail unless its data are wrong: then the run stops and says so. */
export function must<T>(result: Result<T, unknown>, what = 'the demonstration'): T {
	if (result.ok) return result.value;
	throw new DemoStopped(`${what}: ${JSON.stringify(result.error)}`);
}

export class DemoStopped extends Error {}
