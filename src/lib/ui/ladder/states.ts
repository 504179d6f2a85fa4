import type { GateStanding } from '../../record';

/** How a contact is drawn. The line passes what stands and what is not applicable, and nothing else. */
export type ContactState =
	'stands' | 'not yet' | 'next' | 'lapsed' | 'blocks' | 'failed' | 'unknown' | 'not applicable';

export type CoilState = GateStanding['state'];

export const passes = (state: ContactState): boolean => state === 'stands' || state === 'not applicable';
