import type { RequiredSignature } from './input';

/** Who must sign the closed file, in this order. After the last it takes no more. */
export const CLOSING: readonly RequiredSignature[] = [
	{ field: 'sig_performed', meaning: 'performed', roles: ['technician', 'shift supervisor', 'commissioning lead'] },
	{ field: 'sig_reviewed', meaning: 'reviewed', roles: ['commissioning lead', 'process engineer'] },
	{ field: 'sig_accepted', meaning: 'accepted', roles: ['shift supervisor', 'QA'] },
];
