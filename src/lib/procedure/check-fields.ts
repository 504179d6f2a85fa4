import { differenceOf, type Plant } from '../plant';
import { isQuantityName, quantitiesIn, toSi, unitsFor, type Measure } from '../quantity';
import { fieldsOf, type Field } from './fields';
import type { ProcedureFinding } from './finding';
import type { LimitUse, Procedure, Step } from './schema';

/** Where a finding is: the path, and the step it belongs to when it belongs to one. */
type Place = { readonly path: string; readonly step?: string };

/** [P16] to [P22]: what a step asks for can be read where it says, and its limits are of the same kind and have a source. */
export const checkFields = ({ steps }: Procedure, plant?: Plant): readonly ProcedureFinding[] =>
	steps.flatMap((step, i) => {
		const at = (part: string): Place => ({ path: `steps[${i}].${part}`, step: step.id });
		return [
			...fieldsOf(step).flatMap((field, k) => checkField(field, at(`fields[${k}]`), plant)),
			...checkKind(step, at),
			...(step.kind === 'coverage' && plant !== undefined ? uncovered(step, at('rows'), plant) : []),
		];
	});

function checkField(field: Field, place: Place, plant: Plant | undefined): readonly ProcedureFinding[] {
	const { quantity, unit, limit } = field;
	const wrong = checkQuantity(field, place);
	if (wrong.length > 0) return wrong;
	const inside = (part: string): Place => ({ ...place, path: `${place.path}.${part}` });
	return [
		...pointOf(field, place, plant),
		...(limit === undefined ? [] : checkLimitUse(limit, { quantity, unit }, inside('limit'), plant)),
	];
}

/** The quantity exists, is given in that unit, and a concentration says its basis: here, or by the point that is read. */
export function checkQuantity(
	{ quantity, unit, basis, point }: Pick<Field, 'quantity' | 'unit' | 'basis' | 'point'>,
	{ path, ...of }: Place,
): readonly ProcedureFinding[] {
	if (!isQuantityName(quantity)) return [{ kind: 'unknown-quantity', path: `${path}.quantity`, ...of, quantity }];
	if (!quantitiesIn(unit).includes(quantity))
		return [{ kind: 'unknown-unit', path: `${path}.unit`, ...of, unit, quantity, known: unitsFor(quantity) }];
	const own = /-(wet|dry)$/.exec(quantity)?.[1];
	const mustSay = point === undefined && /^(oxygen|carbon-monoxide)-/.test(quantity);
	if (basis === undefined ? !mustSay : basis === own) return [];
	return [{ kind: 'basis-disagrees', path: `${path}.basis`, ...of, quantity, basis: basis ?? 'none' }];
}

function pointOf({ point: tag, quantity, basis }: Field, { path, ...of }: Place, plant: Plant | undefined) {
	const point = plant?.points.find((each) => each.tag === tag);
	if (point === undefined) return [];
	const disagrees = (what: 'quantity' | 'basis', field: string, ofPoint: string): readonly ProcedureFinding[] => [
		{ kind: 'field-disagrees-with-point', path: `${path}.${what}`, ...of, point: point.tag, what, field, ofPoint },
	];
	if (quantity !== point.quantity) return disagrees('quantity', quantity, point.quantity);
	return basis !== undefined && basis !== point.basis ? disagrees('basis', basis, point.basis ?? 'none') : [];
}

/** A limit of the unit, or one written here with its source: of the quantity that is compared, with at least one side. */
export function checkLimitUse(
	use: LimitUse,
	{ quantity }: { readonly quantity: string; readonly unit: string },
	{ path, ...of }: Place,
	plant: Plant | undefined,
): readonly ProcedureFinding[] {
	if ('limit' in use) {
		if (plant === undefined) return [];
		const limit = plant.limits.find(({ id }) => id === use.limit);
		if (limit === undefined) {
			const known = plant.limits.map(({ id }) => id);
			return [{ kind: 'unknown-limit', path: `${path}.limit`, ...of, name: use.limit, known }];
		}
		if (limit.quantity === quantity) return [];
		return [{ kind: 'limit-of-another-quantity', path, ...of, limit: use.limit, quantity, ofLimit: limit.quantity }];
	}
	const sides = (['atMost', 'atLeast', 'guard'] as const).flatMap((side) => checkSide(use, side, quantity));
	return [
		...(use.source.text.trim() === ''
			? [{ kind: 'limit-without-source' as const, path: `${path}.source`, ...of }]
			: []),
		...(use.atMost === undefined && use.atLeast === undefined
			? [{ kind: 'limit-without-side' as const, path, ...of }]
			: []),
		...sides.map((side) => ({ ...side, path: `${path}.${side.path}`, ...of })),
	];
}

type Written = Exclude<LimitUse, { readonly limit: string }>;

function checkSide(use: Written, side: 'atMost' | 'atLeast' | 'guard', quantity: string): readonly ProcedureFinding[] {
	const measure: Measure | undefined = use[side];
	if (measure === undefined || !isQuantityName(quantity)) return [];
	const read = toSi(measure, side === 'guard' ? differenceOf(quantity) : quantity);
	if (read.ok) return [];
	const value = `${measure.value} ${measure.unit}`;
	return [{ kind: 'bad-value', path: side, value, quantity, because: read.error.kind }];
}

function checkKind(step: Step, at: (part: string) => Place): readonly ProcedureFinding[] {
	const readsFields = step.kind === 'reading' || step.kind === 'quick sheet' || step.kind === 'watch';
	if (readsFields && step.fields.length === 0) return [{ kind: 'reads-nothing', ...at('fields') }];
	if (step.kind === 'series' && step.points.length === 0) return [{ kind: 'reads-nothing', ...at('points') }];
	if (step.kind === 'choice' && !step.options.some(({ passes }) => passes))
		return [{ kind: 'no-option-passes', ...at('options') }];
	if (step.kind !== 'line-up') return [];
	return step.rows.flatMap(({ required, choices }, k) =>
		choices.includes(required)
			? []
			: [{ kind: 'required-not-a-choice' as const, ...at(`rows[${k}].required`), required, choices }],
	);
}

/** [P22] Every enclosed volume of the plant description stands in the coverage table: a corner left out is what burns. */
function uncovered(step: Extract<Step, { kind: 'coverage' }>, place: Place, plant: Plant): readonly ProcedureFinding[] {
	const listed = new Set(step.rows.map(({ volume }) => volume));
	const left = plant.volumes.filter(({ id }) => !listed.has(id));
	return left.map(({ id }) => ({ kind: 'volume-without-row', ...place, volume: id }));
}
