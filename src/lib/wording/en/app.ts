/** What the app says when something could not be done: what happened, what is safe, what to do. */
export const APP = {
	'problem.storage-full':
		'This tablet has no space left. Nothing of this was kept; everything saved before is safe. Make space or copy photos elsewhere, then try again.',
	'problem.storage-closed':
		'The storage of this tab was closed, by a newer version of the app in another tab or by the browser. What was saved is safe. Load this page again.',
	'problem.storage-blocked':
		'Another tab holds the storage at an older version. Close the other tabs of this app, then load this page again.',
	'problem.storage-newer':
		'A newer version of the app has been here. Load this page again to use it; nothing was written.',
	'problem.storage-missing':
		'This browser gives the app no storage, so nothing could be kept. Leave private browsing or use another browser.',
	'problem.storage-failed':
		'The storage failed ({name}: {message}). Nothing of this was kept; what was saved before is safe.',
	'problem.chain-moved-on': 'Another tab wrote at the same time, again and again. Nothing of this was kept; try again.',
	'problem.no-gate-key': 'This person has no key on this tablet and must be enrolled here first.',
	'problem.destroyed': 'The key was destroyed after ten wrong PINs. Its owner must be enrolled again, in person.',
	'problem.weak-wrap':
		'The stored key is not protected well enough and was not opened. Its owner must be enrolled again.',
	'problem.damaged-wrap': 'The stored key is damaged and was not opened. Its owner must be enrolled again.',
	'problem.wait': 'Too many wrong PINs. Wait {time}; {left} tries are left.',
	'problem.wrong-pin': 'That PIN is wrong. {left} tries are left. Nothing was signed.',
	'problem.no-site': 'This tablet belongs to no site yet.',
	'problem.nobody-chosen': 'Nobody holds this tablet. Say who you are first.',
	'problem.not-enrolled-here': '{person} is not enrolled on this tablet.',
	'problem.no-shift': 'No shift of {person} was begun in this start-up. Begin it with the PIN; what is typed stays.',
	'problem.no-such-start-up': 'There is no start-up {startUp} on this tablet.',
	'problem.start-up-unreadable': 'The {what} of start-up {startUp} cannot be read. Nothing was changed.',
	'problem.sealed': 'Start-up {startUp} is sealed and takes no more entries.',
	'problem.no-such-field': 'Step {step} has no field {field}. Nothing was kept.',
	'problem.wrong-step': 'Step {step} takes no such entry. Nothing was kept.',
	'problem.inputs-missing': 'It cannot be calculated yet. Missing: {missing}.',
	'problem.of step': 'step {step}',
	'problem.calculation-refused': 'It was not calculated: {because}.',
	'problem.no-such-point': 'The trend was not taken: its column {column} names no measuring point of this plant.',
	'problem.other-basis': 'The trend was not taken: column {column} says {found}, the measuring point is read {point}.',
	'problem.trend': 'The trend was not taken: {because}.',
	'problem.sheet-changed':
		'The record went on while this sheet was open. Nothing was signed: read the sheet again, it is new.',
	'problem.refused-act': 'The rules do not allow this: {because}. The attempt is kept and changed nothing.',
	'problem.demonstration-stopped': 'The demonstration could not be prepared: {because}.',
} as const;
