import type { OPEN as EN } from '../en/open';

/** Einen Anfahrvorgang eröffnen: worauf er festgelegt ist und welcher Art er ist. */
export const OPEN: { readonly [key in keyof typeof EN]: string } = {
	'open.title': 'Einen Anfahrvorgang eröffnen',
	'open.unit': 'Anlage',
	'open.revision': 'Anlagenbeschreibung, Revision {n}',
	'open.left':
		'Ein Anfahrvorgang behält die Beschreibung, mit der er eröffnet wurde. Jetzt eröffnet, wird seine Stufe 0 nie freigegeben: zuerst die Werte ersetzen, außer zur Übung.',
	'open.to plant': 'Werte ersetzen',
	'open.procedure': 'Anfahrvorschrift',
	'open.procedure is': '{id}, Revision {revision}: {gates} Stufen, {steps} Schritte',
	'open.findings':
		'Sie widerspricht der Anlagenbeschreibung an {n} Stellen; so kann kein Anfahrvorgang eröffnet werden.',
	'open.not approved':
		'Niemand aus diesem Werk hat sie für diese Anlage genehmigt. Ein process engineer oder QA liest sie und genehmigt sie mit der PIN; ihre Sauerstoffbedingungen folgen dem Spülziel dieser Anlage.',
	'open.approve': 'Vorschrift genehmigen',
	'open.fuel': 'Brennstoff',
	'open.no report': 'Kein Bericht über eine Sauerstoffgrenzkonzentration. Ohne ihn hat Stufe 2 keine Grundlage.',
	'open.report': 'Sauerstoffgrenzkonzentration {value} {unit} mit {gas}. {report}, {date}',
	'open.start type': 'Welche Art von Anfahren ist es?',
	'open.steps': 'Schritte: {n}.',
	'open.type.first-start': 'Nichts an dieser Anlage wurde bisher nachgewiesen.',
	'open.type.after-overhaul': 'Die Anlage lief schon, und an vielem wurde gearbeitet.',
	'open.type.after-opening': 'Ein Teil wurde geöffnet und wieder geschlossen; alles Übrige ist, wie es war.',
	'open.type.standstill-with-fuel': 'Sie stand eine Zeit lang mit Brennstoff im Inneren, und nichts wurde geöffnet.',
	'open.type.after-trip':
		'Sie fiel in dieser Schicht aus, und nichts wurde geöffnet. Der Weg zurück hält den Brennstoff im Inneren unter Inertgas.',
	'open.type.after-drill': 'Die Notinertisierung wurde erprobt; Vorrat und Räume werden neu angesehen.',
	'open.name': 'Titel, wie er auf dem Dossier stehen soll',
	'open.pin of': 'PIN von {name}',
	'open.does': 'Anfahrvorgang eröffnen',
};
