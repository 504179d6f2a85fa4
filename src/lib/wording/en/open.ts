/** Open a start-up: what it is pinned to, and of what kind it is. */
export const OPEN = {
	'open.title': 'Open a start-up',
	'open.unit': 'Unit',
	'open.revision': 'Plant description, revision {n}',
	'open.left':
		'A start-up keeps the description that it was opened with. Opened now, its gate 0 is never released: replace the values first, unless this is an exercise.',
	'open.to plant': 'Replace them',
	'open.procedure': 'Procedure',
	'open.procedure is': '{id}, revision {revision}: {gates} gates, {steps} steps',
	'open.findings': 'It contradicts the plant description in {n} places, so that no start-up can be opened on it.',
	'open.not approved':
		'Nobody of this site has approved it for this unit yet. A process engineer or QA reads it and approves it with a PIN; its oxygen conditions follow the purge target of this unit.',
	'open.approve': 'Approve the procedure',
	'open.fuel': 'Fuel',
	'open.no report': 'No report of a limiting oxygen concentration. Gate 2 has no basis without one.',
	'open.report': 'Limiting oxygen concentration {value} {unit} with {gas}. {report}, {date}',
	'open.start type': 'What kind of start is it?',
	'open.steps': 'Steps: {n}.',
	'open.type.first-start': 'Nothing of this unit has been proved before.',
	'open.type.after-overhaul': 'The unit ran before, and much of it was worked on.',
	'open.type.after-opening': 'One item was opened up and shut again; the rest is as it was.',
	'open.type.standstill-with-fuel': 'It stood for a while with fuel inside, and nothing was opened.',
	'open.type.after-trip':
		'It tripped in this shift, and nothing was opened. The way back keeps the fuel inside under inert gas.',
	'open.type.after-drill': 'Emergency inerting was tried; stock and rooms are looked at again.',
	'open.name': 'Title, as it shall stand on the dossier',
	'open.pin of': 'PIN of {name}',
	'open.does': 'Open the start-up',
} as const;
