/**
 * verify: reads a dossier back and says, check by check, what holds. It shares no code with what wrote it.
 * Pure: no clock, no chance, no storage; now and the site root are arguments.
 * May import: every room up to record, never dossier.
 */
export type { Check, Outcome, Verdict } from './pdf/check';
export type { Attachment } from './pdf/attachments';
export { readPdf, type PdfReading } from './pdf/read-pdf';
export { checkPdf, type PdfReport } from './pdf/check-pdf';
export type { PdfQuestion, RequiredSignature } from './pdf/question';
export type { SignatureReport } from './pdf/check-signature';
export { verifyRecord, type RecordQuestion } from './verify-record';
export { verifyDossier, type DossierQuestion, type DossierReport, type Rebuild } from './verify-dossier';
export type { Report } from './report';
export type { Counts, ProcessResult } from './process-result';
export type { TrustGiven } from './trust';
