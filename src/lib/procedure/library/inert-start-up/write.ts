import type { Source } from '../../../plant';
import type { Field } from '../../fields';
import type { Step } from '../../schema';

/** A step as it is written down here: what most steps have in common is filled in by `gate`. */
export type Draft = Step extends infer Each
	? Each extends Step
		? Omit<Each, keyof Filled | 'gate'> & Partial<Filled>
		: never
	: never;
type Filled = Pick<Step, 'validity' | 'lapsedBy' | 'redo' | 'waits' | 'instruments'>;

/** The steps of one gate. A proof that says nothing else stands for good, and only what it names lapses it. */
export const gate = (number: number, drafts: readonly Draft[]): readonly Step[] =>
	drafts.map((draft) => ({
		validity: { kind: 'once' },
		redo: [],
		waits: [],
		instruments: [],
		...draft,
		gate: number,
		lapsedBy: [...(draft.lapsedBy ?? []), ...(number >= 1 ? ['protection-operated'] : [])],
	}));

export const practice = (text: string): Source => ({ kind: 'common practice', text });
export const clause = (text: string): Source => ({ kind: 'clause', text });

/** An age of so many hours that is spent when a gate is released on it. */
export const hours = (age: number, until: number): Step['validity'] => ({ kind: 'once', ageMinutes: 60 * age, until });

/** A field that reads a measuring point, named by its tag. */
const reads =
	(quantity: string, unit: string) =>
	(tag: string, title: string, limit?: string): Field => ({
		id: tag,
		title,
		point: tag,
		quantity,
		unit,
		...(limit === undefined ? {} : { limit: { limit } }),
	});

export const temperature = reads('temperature', 'degC');
export const gauge = reads('pressure-gauge', 'bar(g)');
export const suction = reads('pressure-gauge', 'mbar(g)');
export const difference = reads('pressure-difference', 'mbar');
export const level = reads('fraction', '%');
export const carbonMonoxide = reads('carbon-monoxide-dry', 'ppm');
const oxygenAt = reads('oxygen-wet', '%');

/** A field that belongs to no measuring point: worked out, or read on a portable. */
export const value = (
	id: string,
	title: string,
	of: { readonly quantity: string; readonly unit: string; readonly basis?: 'wet' | 'dry'; readonly limit?: string },
): Field => ({
	id,
	title,
	quantity: of.quantity,
	unit: of.unit,
	...(of.basis === undefined ? {} : { basis: of.basis }),
	...(of.limit === undefined ? {} : { limit: { limit: of.limit } }),
});

/** The places where oxygen is read: both sides of the filter, its hopper, and the dust storage. */
export const PLACES = [
	{ tag: 'AT-211', place: 'mill outlet', check: '2.1' },
	{ tag: 'AT-212', place: 'after the bag filter', check: '2.2' },
	{ tag: 'AT-213', place: 'filter hopper', check: '2.3' },
	{ tag: 'AT-214', place: 'fine-fuel silo', check: '2.4' },
] as const;

export const ANALYSERS = PLACES.map(({ tag }) => tag);
export const ANALYSER_CHECKS = PLACES.map(({ check }) => check);

export const oxygen = (limit?: string): readonly Field[] =>
	PLACES.map(({ tag, place }) => oxygenAt(tag, `Oxygen, ${place}`, limit));

/** What ends everything that was proved about the gas in the circuit. */
export const LOST_PURGE = ['fan-stop', 'opened', 'inert-loss', 'burner-air', 'inerting-operated', 'unburnt-gas'];
