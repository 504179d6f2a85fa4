/**
 * wording: message catalogues and the sentences made from data (causes, moments, notes), one place for every language.
 * Pure: the same data, the same sentence.
 * May import: base, quantity, identity, calc, plant, procedure, record.
 */
export {
	capitalised,
	counted,
	isLanguage,
	LANGUAGE_NAMES,
	LANGUAGES,
	speaker,
	speakerOf,
	type Facts,
	type Key,
	type Language,
	type Say,
} from './say';
export { duration, momentsAt, type Moments } from './moment';
export { sayObjection, sayWord, sayWords } from './word';
export { sayEntry } from './entry';
export { shownIn, shownText } from './shown-in';
export { sayCause, type Names } from './cause';
export { sayNote, sayNumber, withMark, type SeriesClock } from './note';
export { handOverSummary, type TemporaryState } from './hand-over';
export { purgeSentence } from './purge-sentence';
export {
	sayConditionFinding,
	sayEventError,
	sayJsonError,
	sayPlantFinding,
	sayProcedureFinding,
	sayQuantityError,
	sayRefusal,
	sayShapeError,
	sayTrendError,
} from './say-error';
export { declarationOf, releaseStatement, restate, sealStatement, statementVersion, writtenHour } from './statement';
