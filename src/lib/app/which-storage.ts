/**
 * A tablet holds a demonstration and a site of its own in two storages, with other people, keys and records in each: nothing
 * of the one can be taken for the other. Which of them is shown is remembered beside both.
 */
export const DEMONSTRATION = 'gatehold';
export const OWN_SITE = 'gatehold.own';

export type StorageName = typeof DEMONSTRATION | typeof OWN_SITE;

type Remembered = Pick<Storage, 'getItem' | 'setItem'>;

const NAME = 'storage';

export const shownStorage = (memory: Remembered): StorageName =>
	memory.getItem(NAME) === OWN_SITE ? OWN_SITE : DEMONSTRATION;

/** Takes effect when the app is loaded anew. */
export const showStorage = (memory: Remembered, storage: StorageName): void => memory.setItem(NAME, storage);

/** Whether a site was begun on this tablet, shown or not. */
export const hasOwnSite = (memory: Remembered): boolean => memory.getItem(`gatehold.birth.${OWN_SITE}`) !== null;
