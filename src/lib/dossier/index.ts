/**
 * dossier: writes the PDF of one start-up, and the signatures that close it, each as one incremental update.
 * Deterministic: the same record makes the same bytes; a signature adds the chance inside ECDSA and nothing else.
 * May import: every room below, never verify.
 */
export { buildDossier } from './build-dossier';
export { CLOSING } from './closing';
export type { DossierError, DossierInput, Progress, RequiredSignature } from './input';
export { INKS } from './fonts/inks';
export type { Ink, Inks, NoGlyph } from './sign/ink';
export type { Point } from './sign/appearance';
export { addSignatureFields, type SignatureField } from './sign/signature-fields';
export { signIncrement, type ClosingSignature, type Labels, type SignError } from './sign/sign-increment';
export { rebuildDossier } from './rebuild';
