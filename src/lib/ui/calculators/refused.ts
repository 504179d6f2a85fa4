import type { Json } from '../../base';
import {
	placeOf,
	rowsTyped,
	titleOf,
	usualUnit,
	type CalcNote,
	type Calculator,
	type InputPart,
	type Refusal,
	type TypedInputs,
} from '../../calc';
import { isQuantityName, toSi } from '../../quantity';
import { sayQuantityError, sayRefusal, type Say } from '../../wording';

export type Refused = {
	/** What is wrong with one field, by its place. */
	readonly fields: ReadonlyMap<string, readonly string[]>;
	/** Inputs without which there is no result, as they are called beside their field. */
	readonly needed: readonly string[];
	/** What belongs to no one field. */
	readonly other: readonly string[];
};

export const NOTHING_REFUSED: Refused = { fields: new Map(), needed: [], other: [] };

/** Why there is no result: beside the field that it is about, and all the rest in words. */
export function refusedOf(calculator: Calculator, refusals: readonly Refusal[], typed: TypedInputs, say: Say): Refused {
	const fields = new Map<string, readonly string[]>(unreadable(calculator, typed, say));
	const [needed, other]: [string[], string[]] = [[], []];
	for (const refusal of refusals) {
		const { input, ...rest } = refusal;
		if (refusal.kind === 'missing-input' && input !== undefined) needed.push(titleOf(calculator, input));
		else {
			const sentence = sayRefusal(withTitles(calculator, rest), say);
			if (input === undefined) other.push(sentence);
			else fields.set(input, [...new Set([...(fields.get(input) ?? []), sentence])]);
		}
	}
	const places = placesOf(calculator);
	for (const [place, sentences] of fields) {
		if (!places(place)) other.push(...sentences.map((sentence) => `${titleOf(calculator, place)}: ${sentence}`));
	}
	return { fields, needed, other };
}

/** Names of inputs in the facts of a note become what they are called on the page. */
export function withTitles<N extends CalcNote | Refusal>(calculator: Calculator, note: N): N {
	const { inputs } = note;
	if (!Array.isArray(inputs)) return note;
	const named = (inputs as readonly Json[]).map((name) =>
		typeof name === 'string' ? titleOf(calculator, name) : name,
	);
	return { ...note, inputs: named };
}

/** Whether a place has a field, a row or a fieldset of its own on the page. */
const placesOf =
	({ inputs }: Calculator) =>
	(place: string): boolean => {
		const [, name, , part] = /^(\w+)(\[\d+\])?(?:\.(\w+))?$/.exec(place) ?? [];
		const spec = inputs.find((each) => each.name === name);
		return spec !== undefined && (part === undefined || spec.parts?.some((each) => each.name === part) === true);
	};

type Placed = readonly [at: string, sentences: readonly string[]];

/** Numbers that cannot be read, each said at its field as soon as it is typed, whatever else is still missing. */
function unreadable({ inputs }: Calculator, typed: TypedInputs, say: Say): readonly Placed[] {
	const at = (part: InputPart, place: string): readonly Placed[] => {
		const field = typed[place];
		if (field === undefined || field.text.trim() === '' || !isQuantityName(part.quantity)) return [];
		const { text, unit = usualUnit(part), U = '' } = field;
		const read = toSi({ value: text, unit, ...(U.trim() === '' ? {} : { U }) }, part.quantity);
		return read.ok ? [] : [[place, [sayQuantityError(read.error, say)]]];
	};
	return inputs.flatMap(({ name, parts, repeats, ...spec }) => {
		if (parts === undefined) return at({ name, ...spec }, name);
		const rows = repeats === true ? Array.from({ length: rowsTyped(name, typed) }, (_, row) => row) : [undefined];
		return rows.flatMap((row) => parts.flatMap((part) => at(part, placeOf(name, part.name, row))));
	});
}
