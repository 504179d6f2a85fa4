import type { STATEMENTS as EN } from '../en/statements';

/** Die Sätze, die Menschen unterschreiben; einmal herausgegeben ändern sie sich nie. */
export const STATEMENTS: { readonly [key in keyof typeof EN]: string } = {
	'statement.version': 'statement-de/1',
	'statement.act': 'Stufe {gate}, {title}: {meaning}. Das lässt geschehen: {holdPoint}.',
	'statement.meaning.released': 'freigegeben',
	'statement.meaning.accepted': 'abgenommen',
	'statement.meaning.reviewed': 'geprüft',
	'statement.meaning.witnessed': 'bezeugt',
	'statement.meaning.refused': 'verweigert',
	'statement.step': 'Unter ihr steht {n} Schritt, wie aufgeführt gelten {stand}{agreed}{seen}.',
	'statement.steps': 'Unter ihr stehen {n} Schritte, wie aufgeführt gelten {stand}{agreed}{seen}.',
	'statement.agreed': ', {n} entfallen mit Zustimmung',
	'statement.seen': '; der neueste wurde {newest} zuvor gesehen, der älteste {oldest}',
	'statement.no event': 'Seit der letzten Handlung an dieser Stufe ist kein Anlagenereignis aufgezeichnet.',
	'statement.events': 'Anlagenereignisse seit der letzten Handlung an dieser Stufe: {events}.',
	'statement.event over': '{what} {begin} bis {end}',
	'statement.event goes on': '{what} ab {begin}, nicht beendet',
	'statement.finding': '{instrument} wurde schlecht vorgefunden; was darauf beruhte, wurde neu nachgewiesen.',
	'statement.finding with error':
		'{instrument} wurde schlecht vorgefunden (vor Justierung {error}); was darauf beruhte, wurde neu nachgewiesen.',
	'statement.refused before': 'Zuvor verweigert: „{reason}“. Antwort: „{answer}“.',
	'statement.no answer': 'keine',
	'statement.deviations': 'Offene Abweichungen, die diese Stufe nicht sperren: {deviations}.',
	'statement.tablet':
		'Tablet {device} wurde zuletzt um {heard} gehört (Nummer {number}, Stand {head}); seine späteren Einträge sind nicht erfasst.',
	'statement.tablet never':
		'Tablet {device} wurde nie gehört (Nummer {number}, Stand {head}); seine späteren Einträge sind nicht erfasst.',
	'statement.head unknown': 'unbekannt',
	'statement.clock': 'Uhr nicht abgeglichen: Alter wird nach der letzten abgeglichenen Zeit beurteilt.',
	'statement.no permission':
		'Dies ist eine Aussage über das Aufgezeichnete. Sie ist keine Erlaubnis zum Einstieg und ersetzt weder Erlaubnisschein noch Verriegelung noch Gasmessung.',
	'statement.declaration':
		'Mir ist kein Ventilatorstillstand, kein Öffnen, kein Ausfall des Inertgases, keine Brennerabschaltung, kein Ausfall der Aufgabe und kein Spannungseinbruch außer den aufgeführten bekannt.',
	'statement.seal':
		'Die Aufzeichnung von {startUp} ist geschlossen. Sie nimmt keine Einträge mehr an, nur Nachträge. Das Siegel sagt, dass die Aufzeichnung vollständig ist, soweit dieses Tablet weiß; es sagt nicht, dass Messwerte, Uhren oder Menschen recht hatten.',
};
