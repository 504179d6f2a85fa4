import type { Step } from './schema';

/** A number that a step asks for. */
export type Field = Extract<Step, { readonly kind: 'reading' }>['fields'][number];

/** The numbers that a step asks for, whatever its kind. */
export function fieldsOf(step: Step): readonly Field[] {
	switch (step.kind) {
		case 'reading':
		case 'quick sheet':
		case 'watch':
			return step.fields;
		case 'timed hold':
			return step.fields ?? [];
		default:
			return [];
	}
}
