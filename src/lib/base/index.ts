/**
 * base: result, bytes, SHA-256, canonical JSON (RFC 8785), readable codes. Knows no plant, no record, no screen.
 * Pure: no clock, no chance, no storage.
 * May import: nothing of the house.
 */
export type { DeepReadonly } from './readonly';
export { fail, ok, unreachable, type Result } from './result';
export { concat, fromBase64, fromHex, fromUtf8, sameBytes, toBase64, toHex, utf8 } from './bytes';
export { sha256, sha256Hex } from './sha256';
export { canonicalJson, type Json } from './canonical-json';
export { MAX_DEPTH, parseJson, type JsonError } from './parse-json';
export { readableCode } from './code';
