/**
 * ui: components and the tokens of the look (tokens.css). They get data and callbacks, and keep nothing.
 * Screens only: imports types from the rooms, never store, sync, app or server.
 * May import: ranks 0 to 5, verify (types to show).
 */
export { isLook, LOOKS, type Look } from './look';
export { giveWords, words } from './words';

export { default as EmptyState } from './parts/EmptyState.svelte';
export { default as ErrorNote } from './parts/ErrorNote.svelte';
export { default as Glyph } from './parts/Glyph.svelte';
export { default as LookSwitch } from './parts/LookSwitch.svelte';
export { default as StartUpPlaces } from './parts/StartUpPlaces.svelte';
export { default as TopLine } from './parts/TopLine.svelte';
export { default as UndoBar } from './parts/UndoBar.svelte';
export { default as UprightContact } from './parts/UprightContact.svelte';
export { default as UprightMark } from './parts/UprightMark.svelte';
export { default as WarnLine } from './parts/WarnLine.svelte';
export { default as WorkProgress } from './parts/WorkProgress.svelte';

export { default as DrawingView } from './drawn/DrawingView.svelte';
export { default as PlotView } from './drawn/PlotView.svelte';

export { default as LadderView } from './ladder/LadderView.svelte';
export { default as LineView } from './ladder/LineView.svelte';
export { default as OutlineView } from './ladder/OutlineView.svelte';
export { gateMarks } from './ladder/gate-marks';
export { default as StartUpRung } from './ladder/StartUpRung.svelte';
export { rungInWork, shownRungs, stopsAt, type ShownRung } from './ladder/shown-rungs';
export { leaderNotes, namesOf } from './ladder/leader-notes';

export type { StepDraft } from './step/step-draft';
export { default as StepSheet } from './step/StepSheet.svelte';
export { default as CalculationBody } from './step/CalculationBody.svelte';
export { default as CalculationInputs } from './step/CalculationInputs.svelte';
export { default as ChoiceBody } from './step/ChoiceBody.svelte';
export { default as CoverageBody } from './step/CoverageBody.svelte';
export { default as LineUpBody } from './step/LineUpBody.svelte';
export { default as PhotoBody } from './step/PhotoBody.svelte';
export { default as ReadingBody } from './step/ReadingBody.svelte';
export { default as RoundsBody } from './step/RoundsBody.svelte';
export { default as SeriesBody } from './step/SeriesBody.svelte';
export { default as TimedHoldBody } from './step/TimedHoldBody.svelte';
export { default as EarlierEntries, type EarlierEntry } from './step/EarlierEntries.svelte';
export { default as PhotoTake } from './step/PhotoTake.svelte';
export { default as SignedAct, type Signed, type Signer } from './step/SignedAct.svelte';
export type { ShownPhoto } from './step/shown-photo';
export { default as TouchedBody } from './step/TouchedBody.svelte';
export { default as WitnessBody } from './step/WitnessBody.svelte';

export { default as PinField } from './acts/PinField.svelte';
export { default as RefusalAnswer } from './acts/RefusalAnswer.svelte';
export { default as ClosingSign } from './acts/ClosingSign.svelte';
export { default as SealSheet } from './acts/SealSheet.svelte';
export { default as SigningSheet } from './acts/SigningSheet.svelte';
export { default as DeviationSheet } from './acts/DeviationSheet.svelte';
export { default as HappenedSheet } from './acts/HappenedSheet.svelte';
export { default as FindingSheet } from './acts/FindingSheet.svelte';
export { default as HandOverSheet } from './acts/HandOverSheet.svelte';
export { default as PersonSwitch } from './acts/PersonSwitch.svelte';

export { default as CalculatorList } from './calculators/CalculatorList.svelte';
export { default as CalculatorSheet } from './calculators/CalculatorSheet.svelte';
export { default as CompareTable } from './calculators/CompareTable.svelte';
export { default as SweepSheet } from './calculators/SweepSheet.svelte';
export { findCalculators } from './calculators/find-calculators';

export { default as ArchiveDrop } from './pages/ArchiveDrop.svelte';
export { default as ArchiveFiles } from './pages/ArchiveFiles.svelte';
export { default as SealedRecords } from './pages/SealedRecords.svelte';
export { default as TrustRoot } from './pages/TrustRoot.svelte';
export { default as DeviationList } from './pages/DeviationList.svelte';
export { default as DossierSheet } from './pages/DossierSheet.svelte';
export { default as LapsedPage } from './pages/LapsedPage.svelte';
export { default as LogView } from './pages/LogView.svelte';
export type { LogLine } from './pages/log-line';
export { default as NowPage } from './pages/NowPage.svelte';
export type { NowFacts } from './pages/now-facts';
export { default as PeopleList } from './pages/PeopleList.svelte';
export type { ShownPerson } from './pages/shown-person';
export { default as PurgeSheet } from './pages/PurgeSheet.svelte';
export { default as StorageHealth } from './pages/StorageHealth.svelte';
export type { StorageLine } from './pages/storage-line';
export { default as VerifyReport } from './pages/VerifyReport.svelte';

export { default as PersonForm } from './site/PersonForm.svelte';
export { default as PlantItem } from './site/PlantItem.svelte';
export { default as WaitRows } from './pages/WaitRows.svelte';
export type { WaitRow } from './pages/wait-row';
