import { canonicalJson } from '../base';
import type { Right } from '../identity';
import type { EventKind } from './event';

/** The gate key is opened by the PIN for one signature; the entry key of a shift signs what is only seen and noted. */
export type KeyNeeded = 'gate key' | 'entry key';

/** Which key signs an event of this kind. What the entry key may sign, the gate key may sign too. */
export const keyFor = (kind: EventKind): KeyNeeded => RULES[kind][0];

/** The right that its signer must hold by certificate. Which role releases which gate is the procedure's to say. */
export const rightFor = (kind: EventKind): Right => RULES[kind][1];

/** What a tablet's own key signs inside a `chain head`: its chain of this log has got so far, to this event. */
export const headText = (head: {
	readonly log: string;
	readonly device: string;
	readonly number: number;
	readonly head: string;
}): string => canonicalJson({ log: head.log, device: head.device, number: head.number, head: head.head });

const RULES: { readonly [kind in EventKind]: readonly [KeyNeeded, Right] } = {
	'start-up opened': ['gate key', 'enter'],
	entry: ['entry key', 'enter'],
	'entry withdrawn': ['gate key', 'enter'],
	'not applicable agreed': ['gate key', 'agree not applicable'],
	'series attached': ['entry key', 'enter'],
	'deviation raised': ['entry key', 'enter'],
	'deviation progressed': ['entry key', 'enter'],
	'deviation dispositioned': ['gate key', 'dispose of a deviation'],
	'plant event begun': ['entry key', 'enter'],
	'plant event ended': ['entry key', 'enter'],
	// Anyone may widen an event; narrowing one asks for more, and replay judges that.
	'plant event corrected': ['gate key', 'enter'],
	fact: ['entry key', 'enter'],
	'instrument assigned': ['entry key', 'enter'],
	'gate released': ['gate key', 'release'],
	'gate refused': ['gate key', 'refuse'],
	'refusal answered': ['gate key', 'answer a refusal'],
	// Signed by those who heard the voice or hold the paper, not by who released.
	'gate released by voice': ['gate key', 'enter'],
	'gate released on paper': ['gate key', 'enter'],
	'witness invited': ['entry key', 'enter'],
	'witness attended': ['entry key', 'enter'],
	'witness waived': ['gate key', 'enter'],
	note: ['entry key', 'enter'],
	'shift hand-over': ['gate key', 'hand over'],
	'clock noted': ['entry key', 'enter'],
	'copy made': ['entry key', 'enter'],
	'copy received': ['entry key', 'enter'],
	'refused act': ['entry key', 'enter'],
	'shift key': ['gate key', 'enter'],
	'chain head': ['entry key', 'enter'],
	sealed: ['gate key', 'seal'],
	addendum: ['gate key', 'enter'],
	'instrument registered': ['gate key', 'record a finding'],
	'instrument checked': ['gate key', 'record a finding'],
	'instrument finding': ['gate key', 'record a finding'],
	'value confirmed': ['gate key', 'confirm a re-judged value'],
	'person enrolled': ['gate key', 'enrol'],
	'device enrolled': ['gate key', 'enrol'],
	'training recorded': ['gate key', 'enrol'],
	'trust list issued': ['gate key', 'issue a trust list'],
	'plant described': ['gate key', 'approve plant data'],
	'procedure approved': ['gate key', 'approve a procedure'],
	'fuel data recorded': ['gate key', 'approve plant data'],
	'temporary state': ['gate key', 'enter'],
	'archive receipt': ['gate key', 'seal'],
};
