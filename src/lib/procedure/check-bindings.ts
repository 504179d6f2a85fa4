import { unreachable } from '../base';
import { CATALOGUE, type Calculator } from '../calc';
import type { Plant } from '../plant';
import type { Binding } from './binding';
import { checkLimitUse } from './check-fields';
import { fieldsOf } from './fields';
import type { ProcedureFinding } from './finding';
import { atPlantPath } from './plant-path';
import type { Procedure, Step, StepKind } from './schema';

type Calculation = Extract<Step, { readonly kind: 'calculation' }>;
type Place = { readonly path: string; readonly step: string };

/** [P23] to [P27]: a calculation names a calculator, gives it all that it must have, and proves by what it answers. */
export const checkBindings = (procedure: Procedure, plant?: Plant): readonly ProcedureFinding[] =>
	procedure.steps.flatMap((step, i) =>
		step.kind === 'calculation' ? checkCalculation(step, `steps[${i}]`, procedure, plant) : [],
	);

function checkCalculation(
	step: Calculation,
	path: string,
	procedure: Procedure,
	plant: Plant | undefined,
): readonly ProcedureFinding[] {
	const calculator = Object.hasOwn(CATALOGUE, step.calculator) ? CATALOGUE[step.calculator] : undefined;
	const bindings = Object.entries(step.bind).flatMap(([input, binding]) =>
		checkBinding(binding, { path: `${path}.bind.${input}`, step: step.id }, { step, procedure, plant }),
	);
	if (calculator === undefined) {
		const place = { path: `${path}.calculator`, step: step.id };
		return [
			{ kind: 'unknown-calculator', ...place, name: step.calculator, known: Object.keys(CATALOGUE) },
			...bindings,
		];
	}
	return [...inputsOf(step, path, calculator), ...bindings, ...provesOf(step, path, calculator, plant)];
}

function inputsOf(step: Calculation, path: string, calculator: Calculator): readonly ProcedureFinding[] {
	const known = calculator.inputs.map(({ name }) => name);
	const about = { step: step.id, calculator: step.calculator };
	return [
		...Object.keys(step.bind)
			.filter((input) => !known.includes(input))
			.map((input) => ({ kind: 'unknown-input' as const, path: `${path}.bind.${input}`, ...about, input, known })),
		...calculator.inputs
			.filter(({ name, optional }) => optional !== true && !Object.hasOwn(step.bind, name))
			.map(({ name }) => ({ kind: 'input-not-bound' as const, path: `${path}.bind`, ...about, input: name })),
	];
}

function provesOf(
	{ id: step, proves, calculator: name }: Calculation,
	path: string,
	{ outputs }: Calculator,
	plant: Plant | undefined,
): readonly ProcedureFinding[] {
	if (proves === 'verdict') return [];
	const place = { path: `${path}.proves.output`, step };
	const output = outputs.find((each) => each.name === proves.output);
	if (output === undefined) {
		const known = outputs.map((each) => each.name);
		return [{ kind: 'unknown-output', ...place, calculator: name, output: proves.output, known }];
	}
	if (output.quantity !== proves.quantity) {
		const quantities = { quantity: proves.quantity, ofOutput: output.quantity };
		return [{ kind: 'output-of-another-quantity', ...place, output: proves.output, ...quantities }];
	}
	return checkLimitUse(proves.limit, proves, { path: `${path}.proves.limit`, step }, plant);
}

type Around = { readonly step: Calculation; readonly procedure: Procedure; readonly plant: Plant | undefined };

function checkBinding(binding: Binding, place: Place, around: Around): readonly ProcedureFinding[] {
	const inside = (part: string): Place => ({ ...place, path: `${place.path}.${part}` });
	switch (binding.from) {
		case 'field':
		case 'age':
		case 'mode':
			return fieldOf(binding, place, around);
		case 'series':
		case 'zero':
			return stepOf(binding, inside('step'), around, ['series']);
		case 'observed':
			return [
				...stepOf(binding, inside('step'), around),
				...stepOf({ ...binding, step: binding.zero }, inside('zero'), around, ['series']),
			];
		case 'person':
		case 'standing':
			return stepOf(binding, inside('step'), around);
		case 'coverage':
			return [
				...stepOf(binding, inside('step'), around, ['coverage']),
				...stepOf({ ...binding, step: binding.zero }, inside('zero'), around, ['series']),
			];
		case 'result':
			return resultOf(binding, place, around);
		case 'plant':
			return pathOf(binding, place, around.plant);
		case 'limit':
			return limitOf(binding, place, around.plant);
		case 'calibration':
			return instrumentOf(binding, inside('instrument'), around.plant);
		case 'procedure':
		case 'typed':
			return [];
		case 'group':
			return Object.entries(binding.of).flatMap(([name, part]) => checkBinding(part, inside(`of.${name}`), around));
		case 'list':
			return binding.of.flatMap((part, k) => checkBinding(part, inside(`of[${k}]`), around));
		default:
			return unreachable(binding);
	}
}

type From<F extends Binding['from']> = Extract<Binding, { readonly from: F }>;

/** The step that is bound to: there, of the right kind, and not done only after this calculation. */
function stepOf(
	{ from, step: name }: { readonly from: string; readonly step: string },
	place: Place,
	{ step, procedure }: Around,
	kinds?: readonly StepKind[],
): readonly ProcedureFinding[] {
	const bound = procedure.steps.find(({ id }) => id === name);
	if (bound === undefined) return [{ kind: 'unknown-step', ...place, name }];
	if (kinds !== undefined && !kinds.includes(bound.kind))
		return [{ kind: 'binding-to-another-kind', ...place, from, stepKind: bound.kind }];
	if (bound.gate <= step.gate) return [];
	return [{ kind: 'bound-to-higher-gate', ...place, to: name, gate: step.gate, higher: bound.gate }];
}

function fieldOf(binding: From<'field' | 'age' | 'mode'>, place: Place, around: Around): readonly ProcedureFinding[] {
	const path = `${place.path}.step`;
	const wrong = stepOf(binding, { ...place, path }, around);
	const step = around.procedure.steps.find(({ id }) => id === binding.step);
	if (wrong.length > 0 || step === undefined) return wrong;
	const known = fieldsOf(step).map(({ id }) => id);
	if (known.includes(binding.field)) return [];
	return [{ kind: 'unknown-field', path: `${place.path}.field`, step: place.step, name: binding.field, known }];
}

function resultOf(binding: From<'result'>, place: Place, around: Around): readonly ProcedureFinding[] {
	const wrong = stepOf(binding, { ...place, path: `${place.path}.step` }, around, ['calculation']);
	const step = around.procedure.steps.find(({ id }) => id === binding.step);
	if (wrong.length > 0 || step?.kind !== 'calculation') return wrong;
	const known = CATALOGUE[step.calculator]?.outputs.map(({ name }) => name);
	if (known === undefined || known.includes(binding.output)) return [];
	const about = { calculator: step.calculator, output: binding.output, known };
	return [{ kind: 'unknown-output', path: `${place.path}.output`, step: place.step, ...about }];
}

function pathOf({ path: plantPath }: From<'plant'>, { path, step }: Place, plant: Plant | undefined) {
	const found = plant && atPlantPath(plant, plantPath);
	if (found === undefined || found.ok) return [];
	return [{ kind: 'unknown-plant-path' as const, path: `${path}.path`, step, plantPath, ...found.error }];
}

function limitOf({ limit: name, side }: From<'limit'>, place: Place, plant: Plant | undefined) {
	if (plant === undefined) return [];
	const limit = plant.limits.find(({ id }) => id === name);
	const known = plant.limits.map(({ id }) => id);
	if (limit === undefined)
		return [{ kind: 'unknown-limit' as const, ...place, path: `${place.path}.limit`, name, known }];
	if (limit[side] !== undefined) return [];
	return [{ kind: 'limit-lacks-side' as const, ...place, path: `${place.path}.side`, limit: name, side }];
}

function instrumentOf({ instrument: name }: From<'calibration'>, place: Place, plant: Plant | undefined) {
	if (plant === undefined || plant.instruments.some(({ id }) => id === name)) return [];
	return [{ kind: 'unknown-instrument' as const, ...place, name, known: plant.instruments.map(({ id }) => id) }];
}
