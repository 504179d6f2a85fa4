/**
 * store: what a tablet keeps: events, attachments, drafts, gate keys, keys of shifts, the site and the storage's health, in IndexedDB.
 * Whatever says saved is durable; events are only ever added; what storage cannot do comes back as data.
 * May import: base, identity, plant, procedure, record.
 */
export { openStore, type OpenOptions, type Store } from './open-store';
export type { ChainMovedOn, EventStore, ReadLog } from './events';
export type { DamagedRow } from './event-row';
export type { StartUp } from './log-row';
export type { Attachments } from './attachments';
export type { Drafts } from './drafts';
export type { CannotOpen, GateKeys, Owner } from './gate-keys';
export type { ShiftKeys } from './shift-keys';
export type { SiteStore } from './site';
export type { CopiedChain, Health, HealthStore } from './health';
export type { Memory } from './memory';
export type { Reserve } from './reserve';
export type {
	Attachment,
	Copy,
	Draft,
	DraftKey,
	GateKeyRow,
	KeptAttachment,
	ShiftKeyRow,
	SiteValues,
	Tablet,
} from './rows';
export type { StorageError } from './storage-error';
