/** What the trip of 02:11 undoes, by `lapsedBy` of the steps and by what relies on them. */
const PURGE = ['2.19', '2.21', '2.22', '2.23', '2.24', '2.25', '2.26', '2.27'];
const FLOW = ['2.14', '2.15', '2.16', '2.20'];
const WARM = ['4.3', '4.4', '4.5', '4.6', '4.7', '4.8', '4.9', '4.11'];
const FEED = ['5.1', '5.2', '5.3', '5.4', '5.5'];

/** Time, gates 0 to 7, steps to prove again, why. */
export type Row = readonly [time: string, gates: string, list: readonly string[], because: string];

/**
 * Gates 0 to 7 (R released, r ready, - not ready, L lapsed, H held, X refused) and the steps to prove again, worked out by
 * hand from the rules ST1 to ST11 and from what each step names; never our own output.
 */
export const ROWS: readonly Row[] = [
	['17:11', 'r-------', [], 'every step of gate 0 is proved'],
	['17:15', 'R-------', [], 'SupA releases gate 0'],
	['18:29', 'R-------', ['1.10'], 'HV-14 was found open and the line-up fails'],
	['18:41', 'R-------', [], 'the row is seen shut, and D-1 still blocks'],
	['18:42', 'Rr------', [], 'D-1 is dispositioned'],
	['18:46', 'Rr------', [], 'TechA may not release what she performed'],
	['18:50', 'RR------', [], 'SupA releases gate 1'],
	['21:21', 'RR------', [], 'the purge is not yet adequate: the hopper reads 7.9'],
	['21:36', 'RRr-----', [], 'the purge is adequate and the watch runs'],
	['21:45', 'RRR-----', [], 'SupA releases gate 2'],
	['22:05', 'RRR-----', [], 'a hand-over with confirmed temporary states lapses nothing'],
	['22:40', 'RRRr----', [], 'the mill is ready'],
	['22:54', 'RRRR----', [], 'SupB released gate 3; the last watch reading is 29 min old'],
	['22:55', 'RRLH----', ['2.26'], '30 min without a reading'],
	['23:05', 'RRRR----', [], 'a reading with unbroken flow brings both gates back without a signature'],
	['23:10', 'RRLH----', ['2.26'], 'HV-11 was moved and asks for a new reading'],
	['23:12', 'RRRR----', [], 'it is read again'],
	['23:22', 'RRRR----', [], 'a burner purge to the stack, HV-11 seen shut, lapses nothing'],
	['00:57', 'RRLH----', ['2.26'], 'the flow was raised'],
	['01:26', 'RRRRr---', [], 'SupB may not release what she performed'],
	['01:31', 'RRRRR---', [], 'TechB did 4.10 again, SupB releases gate 4'],
	['01:54', 'RRRRRr--', [], 'gate 5 is ready'],
	['01:58', 'RRRRRX--', [], 'SupB refuses gate 5'],
	['02:12', 'RRRRRX--', ['5.2'], 'the fan stands and nobody has typed it: only the ten minutes of 5.2 are over'],
	[
		'02:25',
		'RRLLLX--',
		[...FLOW, ...PURGE, '3.6', '4.1', '4.2', ...WARM, ...FEED],
		'fan stop and burner trip are typed',
	],
	[
		'02:40',
		'RRLLLX--',
		[...FLOW, ...PURGE, '3.6', '4.1', '4.2', ...WARM, ...FEED],
		'a reading of 02:09 and an attempt to withdraw change nothing',
	],
	[
		'02:52',
		'RRLLLX--',
		['2.3', '2.7', ...PURGE, '3.6', '4.1', '4.2', ...WARM, ...FEED],
		'the flow is proved again; AT-213 is found bad',
	],
	[
		'02:59',
		'RRLLLX--',
		['2.3', '2.7', '2.10', ...PURGE, '3.6', '4.1', '4.2', ...WARM, ...FEED],
		'the stock is too small for another purge',
	],
	[
		'03:10',
		'RRLLLX--',
		['2.7', ...PURGE, '3.6', '4.1', '4.2', ...WARM, ...FEED],
		'second bundle connected, AT-213 checked',
	],
	['03:16', 'RRLLLX--', [...PURGE, '3.6', '4.1', '4.2', ...WARM, ...FEED], 'sample lines checked'],
	['04:08', 'RRrLLX--', ['3.6', '4.1', '4.2', ...WARM, ...FEED], 'the circuit is purged again'],
	['04:10', 'RRRLLX--', ['3.6', '4.1', '4.2', ...WARM, ...FEED], 'SupB releases gate 2 again'],
	['04:21', 'RRRRLX--', ['4.1', '4.2', ...WARM, ...FEED], 'SupB releases gate 3 again'],
	['04:43', 'RRRRLX--', [...WARM, ...FEED], 'the burner is lit again'],
	['05:53', 'RRRRrX--', FEED, 'warm and dry'],
	['05:55', 'RRRRRX--', FEED, 'SupB releases gate 4 again, on T-2'],
	['07:04', 'RRRRRX--', [], 'everything is proved again, and the refusal waits for its answer'],
	['07:05', 'RRRRRr--', [], 'SupA answers'],
	['07:08', 'RRRRRR--', [], 'the lead releases the fuel feed'],
	['09:24', 'RRRRRRr-', [], 'self-inert running is shown'],
	['09:40', 'RRRRRRR-', [], 'the lead releases gate 6'],
	['10:46', 'RRRRRRR-', [], 'the post-check of the analysers is on T-1, and T-2 has not got it'],
	['10:48', 'RRRRRRRr', [], 'T-1 was copied to T-2'],
	['10:54', 'RRRRRRRr', [], 'one of two acceptances'],
	['10:57', 'RRRRRRRR', [], 'both'],
	['11:05', 'RRRRRRRR', [], 'sealed'],
];

/** How a row writes the state of a gate. */
export const LETTERS = {
	released: 'R',
	ready: 'r',
	'not ready': '-',
	lapsed: 'L',
	held: 'H',
	refused: 'X',
} as const;
