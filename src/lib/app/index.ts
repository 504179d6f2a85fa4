/**
 * app: what a screen holds and can do: this tablet and its people, an open start-up, the demonstration, archive, calculators.
 * The place where clock, chance and storage meet the pure rooms; knows no component and no address.
 * May import: every room but ui and server.
 */
export { BUILD } from '../demo';
export { systemClock, type Clock } from './clock';
export { Tablet, type TabletPerson } from './tablet.svelte';
export type { Problem } from './problem';
export { sayProblem } from './say-problem';
export { ThisTablet } from './this-tablet.svelte';
export { DEMONSTRATION, hasOwnSite, OWN_SITE, showStorage } from './which-storage';
export { BeginSite } from './begin-site.svelte';
export type { SiteObjection } from './own-site';
export { OpenDesk } from './open-desk.svelte';
export { PlantBook } from './plant-book.svelte';
export { AppUpdate, holdRecord } from './app-update.svelte';
export { Preferences } from './preferences.svelte';
export { lookAtStorage, sayBytes, type StorageFacts } from './storage-facts';
export { OpenStartUp, type Held } from './open-start-up.svelte';
export {
	attachSeries,
	calculate,
	endPlantEvent,
	enter,
	note,
	raiseDeviation,
	recordPlantEvent,
	type TrendFile,
} from './entries';
export {
	answerRefusal,
	beginShift,
	disposeDeviation,
	goOn,
	newestCopy,
	noteCopy,
	recordFinding,
	refuse,
	release,
	sheetOf,
	type CopySaid,
	type ShownSheet,
} from './gate-acts';
export { handOverShift, temporaryStates, unconfirmedImpact, type HandOver, type HandOverProblem } from './hand-over';
export { findingImpact, type FindingImpact } from './finding';
export { SheetDraft } from './sheet-draft.svelte';
export {
	agreeNotApplicable,
	inviteWitness,
	mayAgree,
	noticeHasRunOut,
	witnessAttended,
	witnessWaived,
	withdrawEntry,
	type StepSigner,
} from './step-acts';
export { ReadingTimer } from './reading-timer.svelte';
export { SecondHand } from './second-hand.svelte';
export { tone } from './tone';
export { coverageFor, judgesPurge } from './purge-view';
export { PhotoUrls } from './photo-urls.svelte';
export { enteredBefore, invitationOf, waitsForAgreement, type EnteredBefore, type Invitation } from './step-history';
export {
	DEMONSTRATION_PIN,
	playDemonstration,
	suppliedTrend,
	suppliedTrends,
	type ReadFile,
	type SuppliedTrend,
} from './demonstration';
export { shiftTimes } from './shift-times';
export { nextStep, StepDesk, type TypedSoFar } from './step-desk.svelte';
export { previewCalculation, type CalculationPreview } from './calculation-preview';
export { objectionsNow } from './objections';
export { copyFile } from './copy-file';
export { objectionsToSeal, seal, sealSheetOf, type ShownSeal } from './seal-act';
export { leftOnTablet, stillOpen, type StillOpen } from './still-open';
export { DossierDesk, type ClosingPlace } from './dossier-desk.svelte';
export { outsideSeal } from './dossier-input';
export { Archive, type TrustedRoot } from './archive.svelte';
export { closedFile, sealedRecords, type SealedRecord } from './sealed-records';
export { checkFile, type CheckedFile } from './check-file';
export { nowFacts } from './now/now-facts';
export { logHeads, logLines } from './log-lines';
export { NoteDesk } from './note-desk.svelte';
export { CalculatorDesk } from './calculator-desk.svelte';
export { asHash, fromHash, keptCases, type Shelf } from './calculator-shelf';
export { sayPlan } from './say-plan';
export { sweepable } from './sweep-curve';
export { stepsThatUse, useInStep, type UsableStep } from './use-in-step';
export { Overview, type Listed } from './overview.svelte';
export { blockingOf } from './now/now-facts';
export { runsOut, waitsFor, type RunsOut, type Waiting } from './waits';
