import type { Procedure } from '../../src/lib/procedure';
import type { GateStanding, Standing, StepStanding } from '../../src/lib/record';
import type { PathShape, Shape, TextShape } from '../../src/lib/drawing';
import { NIGHT_PROCEDURE } from '../support/night';

type Given = {
	readonly steps?: { readonly [step: string]: StepStanding['state'] };
	readonly gates?: { readonly [gate: number]: GateStanding['state'] };
	readonly deviations?: Standing['deviations'];
};

/** A standing made by hand: every step and gate in the state that is given, or not yet and not ready. */
export const standingOf = (procedure: Procedure, { steps = {}, gates = {}, deviations = [] }: Given): Standing => ({
	format: 'gatehold-standing/1',
	startUp: 'FM-1/drawn',
	procedure: { id: procedure.id, revision: procedure.revision },
	at: '2026-03-14T16:00:00+01:00',
	checksSignatures: false,
	steps: procedure.steps.map(({ id, gate }) => ({
		step: id,
		gate,
		state: steps[id] ?? 'not yet',
		why: [],
		waitsFor: [],
		tries: 0,
	})),
	permissives: [],
	gates: procedure.gates.map(({ number }) => ({
		gate: number,
		state: gates[number] ?? 'not ready',
		acts: [],
		missing: [],
		why: [],
	})),
	reproof: { steps: [], minutes: 0, inWorkingOrder: [], earliestFinishMinutes: 0 },
	deviations,
	plantEvents: [],
	late: [],
	watchGaps: [],
	tries: [],
	refusedActs: [],
	acts: [],
	withoutEffect: [],
	afterSeal: [],
	clock: { state: 'agreed', skewMinutes: 0 },
});

/** Eight gates of thirty groups each: the largest ladder that must be drawn. */
export const LARGE: Procedure = {
	...NIGHT_PROCEDURE,
	steps: NIGHT_PROCEDURE.gates.flatMap(({ number }) =>
		Array.from({ length: 30 }, (_, i) => ({
			...NIGHT_PROCEDURE.steps[0]!,
			id: `S${number}-${i}`,
			gate: number,
			group: `Group ${i}`,
		})),
	),
};

export const flat = (shapes: readonly Shape[]): readonly (PathShape | TextShape)[] =>
	shapes.flatMap((shape) => (shape.kind === 'group' ? flat(shape.shapes) : [shape]));

export const paths = (shapes: readonly Shape[]): readonly PathShape[] =>
	flat(shapes).filter((shape): shape is PathShape => shape.kind === 'path');

export const texts = (shapes: readonly Shape[]): readonly TextShape[] =>
	flat(shapes).filter((shape): shape is TextShape => shape.kind === 'text');

/** Every coordinate of a path, as pairs. */
export const pointsOf = ({ path }: PathShape): readonly (readonly [number, number])[] =>
	path.flatMap((segment): readonly (readonly [number, number])[] => {
		switch (segment[0]) {
			case 'Z':
				return [];
			case 'C':
				return [
					[segment[1], segment[2]],
					[segment[3], segment[4]],
					[segment[5], segment[6]],
				];
			default:
				return [[segment[1], segment[2]]];
		}
	});

export const numbersIn = (shapes: readonly Shape[]): readonly number[] => [
	...paths(shapes).flatMap((path) => pointsOf(path).flat()),
	...texts(shapes).flatMap(({ x, y, size }) => [x, y, size]),
];
