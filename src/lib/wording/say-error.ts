import type { JsonError } from '../base';
import type { Refusal } from '../calc';
import type { PlantFinding, ShapeError } from '../plant';
import type { ConditionFinding, ProcedureFinding } from '../procedure';
import type { NumberError, QuantityError } from '../quantity';
import type { EventError, TrendError } from '../record';
import { sayNote } from './note';
import { sayWord } from './word';
import { asksFor, isKey, type Facts, type Key, type Say } from './say';

/** Each says what is wrong and where, as the end of a sentence: app and command line put it where they need it. */
export const sayJsonError = (error: JsonError, say: Say): string => say(`json.${error.kind}`, factsOf(error));

export const sayShapeError = (error: ShapeError, say: Say): string =>
	say(`shape.${error.kind}`, { ...factsOf(error), path: error.path === '' ? say('word.the document') : error.path });

export const sayEventError = (error: EventError, say: Say): string =>
	say(`event.${error.kind}`, {
		...factsOf(error),
		...(error.kind === 'not-an-event' && error.path === '' ? { path: say('word.the whole of it') } : {}),
	});

export const sayTrendError = (error: TrendError, say: Say): string => say(`trend.${error.kind}`, factsOf(error));

export const sayQuantityError = (error: QuantityError | NumberError, say: Say): string =>
	say(`quantity.${error.kind}`, factsOf(error));

export const sayConditionFinding = (finding: ConditionFinding, say: Say): string => say(finding.kind, factsOf(finding));

/** "points[3].at: there is no duct ..." */
export function sayPlantFinding(finding: PlantFinding, say: Say): string {
	const because = finding.kind === 'bad-value' ? { because: sayQuantityError(finding.error, say) } : {};
	return `${finding.path}: ${say(`plant.${finding.kind}`, { ...factsOf(finding), ...because })}`;
}

export function sayProcedureFinding(finding: ProcedureFinding, say: Say): string {
	const place =
		finding.step === undefined ? finding.path : `${finding.path} (${say('problem.of step', { step: finding.step })})`;
	return `${place}: ${sayWhat(finding, say)}`;
}

function sayWhat(finding: ProcedureFinding, say: Say): string {
	switch (finding.kind) {
		case 'condition':
			return say('procedure.condition', { because: sayConditionFinding(finding.finding, say) });
		case 'circle':
			return say('procedure.circle', { through: finding.through.join(' \u2192 ') });
		case 'unknown-quantity':
		case 'unknown-unit':
		case 'unknown-input':
		case 'unknown-output':
		case 'unknown-plant-path':
			return say(`procedure.${finding.kind}`, factsOf(finding));
		default:
			break;
	}
	if (!('name' in finding) || !finding.kind.startsWith('unknown-'))
		return say(`procedure.${finding.kind}` as Key, factsOf(finding));
	const facts = { ...factsOf(finding), thing: sayWord(finding.kind.slice('unknown-'.length).replace('-', ' '), say) };
	return say('known' in finding ? 'procedure.unknown-name' : 'procedure.unknown-name alone', facts);
}

/**
 * Why a calculator gives no result. Kinds that belong to one calculator only are said by their name and facts, as its
 * notes are: nothing that it said is lost.
 */
export function sayRefusal(refusal: Refusal, say: Say): string {
	const { kind, input, ...facts } = refusal;
	const at = input === undefined ? '' : `${input}: `;
	const key = [`refusal.${kind}`, `quantity.${kind}`].find(isKey);
	const known = { ...factsOf(facts), range: rangeOf(refusal, say) };
	if (key !== undefined && asksFor(key).every((name) => Object.hasOwn(known, name))) return at + say(key, known);
	return at + sayNote({ kind, level: 'reason', ...definedFacts(facts) }, say);
}

function rangeOf({ min, max, unit }: Refusal, say: Say): string {
	const bound = (word: string, value: unknown): readonly string[] =>
		typeof value === 'number' ? [`${word} ${value} ${typeof unit === 'string' ? unit : ''}`.trimEnd()] : [];
	return [...bound(say('word.at least'), min), ...bound(say('word.at most'), max)].join(', ');
}

const definedFacts = (facts: Omit<Refusal, 'kind'>): { readonly [fact: string]: NonNullable<Refusal[string]> } =>
	Object.fromEntries(
		Object.entries(facts).flatMap(([name, fact]) => (fact === undefined || fact === null ? [] : [[name, fact]])),
	);

/** Lists are read out; what is an object has its own sentence. */
const factsOf = (error: object): Facts =>
	Object.fromEntries(
		Object.entries(error).map(([name, fact]: [string, unknown]) => [
			name,
			typeof fact === 'number' || typeof fact === 'string'
				? fact
				: Array.isArray(fact)
					? fact.join(', ')
					: JSON.stringify(fact),
		]),
	);
