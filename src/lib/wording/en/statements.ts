/**
 * The sentences that people sign. They stand in signed records word for word: once released they never change; other
 * sentences are a new version (`statement.version`) beside these.
 */
export const STATEMENTS = {
	'statement.version': 'statement-en/1',
	'statement.act': 'Gate {gate}, {title}: {meaning}. This lets {holdPoint} happen.',
	'statement.meaning.released': 'released',
	'statement.meaning.accepted': 'accepted',
	'statement.meaning.reviewed': 'reviewed',
	'statement.meaning.witnessed': 'witnessed',
	'statement.meaning.refused': 'refused',
	'statement.step': 'Of {n} step under it {stand} stand as listed{agreed}{seen}.',
	'statement.steps': 'Of {n} steps under it {stand} stand as listed{agreed}{seen}.',
	'statement.agreed': ', {n} agreed not applicable',
	'statement.seen': '; the newest was observed {newest} before, the oldest {oldest}',
	'statement.no event': 'No plant event is recorded since the last act on this gate.',
	'statement.events': 'Plant events since the last act on this gate: {events}.',
	'statement.event over': '{what} {begin} to {end}',
	'statement.event goes on': '{what} {begin} to not ended',
	'statement.finding': '{instrument} was found bad; what rested on it was proved again.',
	'statement.finding with error': '{instrument} was found bad (as found {error}); what rested on it was proved again.',
	'statement.refused before': 'Refused before: "{reason}". Answer: "{answer}".',
	'statement.no answer': 'none',
	'statement.deviations': 'Open deviations that do not block this gate: {deviations}.',
	'statement.tablet':
		'Tablet {device} was last heard at {heard} (number {number}, head {head}); its later entries are not covered.',
	'statement.tablet never':
		'Tablet {device} was last heard never (number {number}, head {head}); its later entries are not covered.',
	'statement.head unknown': 'unknown',
	'statement.clock': 'Clock not agreed: ages are judged by the last agreed time.',
	'statement.no permission':
		'This is a statement about what was recorded. It is no permission to enter, and replaces no permit, interlock or gas test.',
	'statement.declaration':
		'I know of no fan stop, opening, loss of inert gas, burner trip, feed stop or power dip other than those listed.',
	'statement.seal':
		'The record of {startUp} is closed. It takes no more entries, only addenda. Sealing says that the record is complete as far as this tablet knows; it does not say that readings, clocks or people were right.',
} as const;
