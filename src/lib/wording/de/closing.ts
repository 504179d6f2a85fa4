import type { CLOSING as EN } from '../en/closing';

/** Die letzten Blätter: Unterschriften, wie man prüft, Vorsicht; und was die angehängten Dateien sind. */
export const CLOSING: { readonly [key in keyof typeof EN]: string } = {
	'sign.sheet': 'Unterschriften',
	'sign.caption': 'Abschließende Unterschriften; jede unterschreibt jedes Byte dieser Datei bis zu ihr',
	'sign.field': '{meaning}: {roles}',
	'sign.not signed': 'Nicht unterschrieben',
	'sign.hold points': 'Haltepunkte, während der Arbeit unterschrieben',
	'sign.meaning': 'Bedeutung',
	'sign.person': 'Person',
	'sign.role': 'Rolle',
	'sign.code': 'Code der Erklärung',
	'check.title': 'Wie diese Datei geprüft wird',
	'check.reader':
		'Jedes Programm, das PDF-Unterschriften liest, zeigt, wer unterschrieben hat und ob nach einer Unterschrift ein Byte geändert wurde. Als vertrauenswürdig zeigt es die Unterzeichner, sobald die Wurzel des Werks, angehängt als root.pem und auf anderem Weg mit dem Werk verglichen, dort aufgenommen ist.',
	'check.count':
		'Ein Leseprogramm sieht nicht, dass eine letzte Unterschrift abgeschnitten wurde, auch keine Änderung vor einer späteren Unterschrift: hierher gehören {signatures} Unterschriften, und die letzte verschließt die Datei.',
	'check.root':
		'Auf der Kommandozeile: root.pem mit certutil einlesen und pdfsig ausführen; die Datei ist gewöhnliches PDF, und qpdf listet ihre Anhänge. Die Aufzeichnung ist record.ndjson: ein Ereignis je Zeile, jedes mit dem Text, über den der Hash gebildet wurde, und seiner Unterschrift.',
	'check.full':
		'Die volle Prüfung, von der Wurzel des Werks bis zu jedem Ereignis, jeder Regel und jeder Rechnung, macht „gatehold verify FILE --root ROOT“, ebenso das Öffnen der Datei im Archiv.',
	'check.digest':
		'Digest der Aufzeichnung {code}: der SHA-256 von manifest.json, das jede angehängte Datei mit ihrem eigenen Hash nennt.',
	'files.title': 'Angehängte Dateien',
	'files.name': 'Name',
	'files.bytes': 'Bytes',
	'files.hash': 'SHA-256',
	'file.record': 'Der Anfahrvorgang als unterschriebene Ereignisse, eines je Zeile',
	'file.site': 'Das Protokoll des Werks, auf dem der Anfahrvorgang beruht, ein Ereignis je Zeile',
	'file.procedure': 'Die Revision der Anfahrvorschrift, nach der gearbeitet wurde',
	'file.plant': 'Die verwendete Anlagenbeschreibung',
	'file.root': 'Das Zertifikat der Wurzel des Werks',
	'file.certificates': 'Zertifikate der Personen und Tablets',
	'file.attachment': '{name}, in der Aufzeichnung mit seinem Hash genannt',
	'file.manifest': 'Jede angehängte Datei mit ihrem Hash, und woraus das Dossier geschrieben wurde',
	'cautions.title': 'Vorsicht',
	'cautions.computes':
		'Das Werkzeug, das diese Datei schrieb, zeichnet auf und rechnet. Es löst nichts aus, verriegelt nichts und ersetzt weder Brennersteuerung noch Sicherheitseinrichtungen der Prozessleittechnik, Gaswarnanlage oder Erlaubnisschein. Betriebsanweisungen, örtliche Vorschriften und befugte Fachleute gehen vor.',
	'cautions.gas':
		'Stickstoff und Kohlendioxid ersticken ohne Warnung; Kohlenmonoxid vergiftet. Kein Einstieg ohne Freigabe und Gasmessung.',
	'cautions.ignition':
		'Tablets und Telefone sind Zündquellen: in explosionsgefährdeten Bereichen (Staub oder Gas) nur Geräte, die für die Zone zugelassen sind.',
	'cautions.adequate':
		'Ein errechnetes „ausreichend“ ist eine Aussage über Messwerte und ein Modell, keine Erlaubnis: die Freigabe erteilt ein Mensch.',
	'cautions.electronic':
		'Unterschriften sind elektronische Signaturen unter der eigenen Wurzel des Werks, keine qualifizierten im Sinne von eIDAS. Eine unveränderte Datei zeigt nicht, dass Messwerte, Uhren oder Menschen recht hatten.',
};
