import type { Json } from '../base';
import { isQuantityName, unitsFor } from '../quantity';
import type { Calculator, InputPart, InputSpec } from './calculator';

/** One field as it was typed: nothing is corrected and nothing refused here. */
export type TypedField = { readonly text: string; readonly unit?: string; readonly U?: string };

/** What is typed into a calculator, by the place that a refusal names: "dp", "leak.flow", "volumes[2].volume". */
export type TypedInputs = { readonly [at: string]: TypedField };

/** The place of a part of an input; in a table, of a part of its row. */
export const placeOf = (input: string, part: string, row?: number): string =>
	row === undefined ? `${input}.${part}` : `${input}[${row}].${part}`;

/** How many rows of a table hold something. */
export function rowsTyped(input: string, typed: TypedInputs): number {
	const rows = Object.entries(typed).flatMap(([at, { text }]) => {
		const [, name, row] = ROW.exec(at) ?? [];
		return name === input && text.trim() !== '' ? [Number(row) + 1] : [];
	});
	return Math.max(0, ...rows);
}

/** The unit that a field is shown in while nobody chose another: what the trade uses first. */
export function usualUnit({ typedIn, quantity: said }: Pick<InputPart, 'typedIn' | 'quantity'>): string {
	const quantity = said.replace(/^list of /, '');
	if (typedIn !== undefined || !isQuantityName(quantity)) return typedIn ?? '';
	const units = unitsFor(quantity);
	const usual = quantity === 'fraction' ? undefined : USUAL.find((unit) => units.includes(unit));
	return usual ?? units[0] ?? '';
}

// A temperature in degC, an oxygen in %, a duct in mm. A fraction may be a factor: it says by itself what it is typed in.
const USUAL = ['degC', '%', 'mm', 'm3(n)/h', 'm3/h', 'hPa(a)', 'min', 'mA', '%span', '1/h'];

/** An input, an output or a part of one in words, by the name that results and refusals use: "volumes.MILL", "leak.flow". */
export function titleOf({ inputs, outputs }: Calculator, name: string): string {
	const [, whole = name, , part] = /^(\w+)(\[\d+\])?(?:\.(.+))?$/.exec(name) ?? [];
	const spec = inputs.find((each) => each.name === whole);
	const output = outputs.find((each) => each.name === whole);
	const gas = /^x_(\w+)$/.exec(name)?.[1];
	if (gas !== undefined && spec === undefined)
		return `${inputs.find((each) => each.name === 'composition')?.label ?? ''} ${gas}`;
	const title = spec?.label ?? spec?.means ?? output?.means ?? whole;
	if (part === undefined) return title;
	const inside = spec?.parts?.find((each) => each.name === part);
	return `${title}: ${inside?.label ?? inside?.symbol ?? part}`;
}

/** The inputs as the calculator takes them: numbers as typed with their unit. What is empty is left out. */
export const inputsFrom = ({ inputs }: Calculator, typed: TypedInputs): { readonly [input: string]: Json } =>
	Object.fromEntries(
		inputs.flatMap((spec) => {
			const value = valueOf(spec, typed);
			return value === undefined ? [] : [[spec.name, value] as const];
		}),
	);

function valueOf(spec: InputSpec, typed: TypedInputs): Json | undefined {
	const { name, parts } = spec;
	if (parts === undefined) return fieldValue(spec, typed[name]);
	if (spec.repeats !== true) {
		const whole = partsOf(parts, typed, (part) => placeOf(name, part));
		return Object.keys(whole).length === 0 ? undefined : whole;
	}
	const rows = Array.from({ length: rowsTyped(name, typed) }, (_, row) =>
		partsOf(parts, typed, (part) => placeOf(name, part, row)),
	);
	return rows.length === 0 ? undefined : rows;
}

const partsOf = (
	parts: readonly InputPart[],
	typed: TypedInputs,
	at: (part: string) => string,
): { readonly [part: string]: Json } =>
	Object.fromEntries(
		parts.flatMap((part) => {
			const value = fieldValue(part, typed[at(part.name)]);
			// A question answered by yes or no is answered by no where nobody said yes.
			if (value === undefined) return part.quantity === YES_NO ? [[part.name, false]] : [];
			return [[part.name, value]];
		}),
	);

function fieldValue(part: InputPart, field: TypedField | undefined): Json | undefined {
	const { quantity, choices } = part;
	const text = field?.text.trim() ?? '';
	if (field === undefined || text === '') return undefined;
	if (quantity === YES_NO) return text === 'yes';
	if (choices !== undefined || quantity === 'text') return text;
	if (isQuantityName(quantity)) return measureOf(field, part);
	const each = quantity.replace(/^list of /, '');
	if (each !== quantity && isQuantityName(each)) {
		return text.split(/[;\n]+/).flatMap((one) => (one.trim() === '' ? [] : [measureOf({ ...field, text: one }, part)]));
	}
	return fromJson(text);
}

const measureOf = ({ text, unit, U = '' }: TypedField, part: InputPart): Json => ({
	value: text.trim(),
	unit: unit ?? usualUnit(part),
	...(U.trim() === '' ? {} : { U: U.trim() }),
});

/** Text that is no JSON stays a text: the calculator refuses what it cannot take, with its place. */
function fromJson(text: string): Json {
	try {
		return JSON.parse(text) as Json;
	} catch {
		return text;
	}
}

/** Fields as they would have been typed to give these inputs: an example, a stored calculation, a link. */
export const typedFrom = ({ inputs }: Calculator, given: { readonly [input: string]: Json | undefined }): TypedInputs =>
	Object.fromEntries(
		inputs.flatMap((spec) => {
			const value = given[spec.name];
			return value === undefined ? [] : fieldsOf(spec, value);
		}),
	);

type Placed = readonly [at: string, field: TypedField];

function fieldsOf({ name, parts, repeats, ...spec }: InputSpec, value: Json): readonly Placed[] {
	if (parts === undefined) return [[name, fieldOf({ name, ...spec }, value)]];
	const rows = repeats === true && Array.isArray(value) ? (value as readonly Json[]) : [value];
	return rows.flatMap((row, i) =>
		parts.flatMap((part): readonly Placed[] => {
			const cell = isObject(row) ? row[part.name] : undefined;
			return cell === undefined
				? []
				: [[placeOf(name, part.name, repeats === true ? i : undefined), fieldOf(part, cell)]];
		}),
	);
}

function fieldOf({ quantity, unit }: InputPart, value: Json): TypedField {
	if (typeof value === 'boolean' && quantity === YES_NO) return { text: value ? 'yes' : 'no' };
	if (typeof value === 'number' && isQuantityName(quantity)) return { text: String(value), unit: unit ?? '1' };
	if (isObject(value) && isQuantityName(quantity)) {
		const { value: number, unit: typed, U } = value;
		return {
			text: textOf(number),
			unit: textOf(typed),
			...(U === undefined ? {} : { U: textOf(U) }),
		};
	}
	return { text: textOf(value) };
}

const textOf = (value: Json | undefined): string =>
	typeof value === 'string' ? value : value === undefined ? '' : JSON.stringify(value);

const isObject = (value: Json): value is { readonly [name: string]: Json } =>
	typeof value === 'object' && value !== null && !Array.isArray(value);

const YES_NO = 'yes or no';
const ROW = /^(\w+)\[(\d+)\]\./;
