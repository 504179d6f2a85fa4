/**
 * record: the append-only log of a start-up, and what stands by it: events, chains, knowledge, standing, gates, merging.
 * Pure: the same events and instant give the same answer, in whatever order they came. SPEC.md has the rules.
 * May import: base, quantity, identity, calc, plant, procedure.
 */
export { standing } from './standing';
export type { ActJudged, Cause, GateStanding, PermissiveStanding, ReproofItem, Standing, StepStanding } from './answer';
export { AnswerSchema } from './answer';
export {
	allOf,
	fromChecked,
	isEventKind,
	isOf,
	parseEventLine,
	parseEvents,
	printEventLine,
	type BodyOf,
	type EventError,
	type EventKind,
	type EventOf,
	type RecordEvent,
} from './event';
export { SITE_BODIES, START_UP_BODIES, type SiteKind, type StartUpKind } from './bodies';
export { nextEnvelope, textOf, unsignedEvent, type Draft } from './write';
export { checkChains, headCode, headsOf, type ChainFinding } from './chain';
export { headText, keyFor, rightFor, type KeyNeeded } from './signing-rules';
export {
	columnName,
	parseTrend,
	tableOf,
	type Trend,
	type TrendColumn,
	type TrendError,
	type TrendReading,
	type TrendTable,
} from './trend';
export { judgeEntry, type EntryFault } from './judge-entry';
export {
	calculatedBody,
	enteredBody,
	type ComposeError,
	type Typed,
	type TypedRow,
	type TypedValue,
} from './compose-entry';
export { guessedColumns, seriesBody, trendKey, type SeriesColumn, type SeriesError } from './compose-series';
export { signedEvent } from './sign-event';
export { gateSheet, headline, otherTablets, statementOf, type GateSheet, type Statement } from './gate-sheet';
export { lookupIn } from './lookup';
export { impactOf, objectionsTo, standingWith, type Impact } from './what-if';
export { withErrorOff, type AsFoundError } from './error-off';
export { EnvelopeSchema, type Envelope } from './envelope';
export { inOrder, Knowledge, merge } from './knowledge';
export { MINUTE, millis, offsetMinutes, printInstant, type Millis } from './instants';
export { lastTimeAt } from './last-time-at';
