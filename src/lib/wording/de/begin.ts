import type { BEGIN as EN } from '../en/begin';

/** Ein eigenes Werk beginnen: sein Name, seine ersten Personen, seine Wurzel und eine Anlage für den Anfang. */
export const BEGIN: { readonly [key in keyof typeof EN]: string } = {
	'begin.title': 'Ein eigenes Werk beginnen',
	'begin.title.0': 'Ein eigenes Werk beginnen: Werk und Anlage',
	'begin.title.1': 'Ein eigenes Werk beginnen: die ersten Personen',
	'begin.title.2': 'Ein eigenes Werk beginnen: sieben Wörter für Papier',
	'begin.step': '{n} von 3',
	'begin.does': 'Ein eigenes Werk beginnen',
	'begin.already': 'Dieses Tablet gehört zu einem Werk. Ein weiteres beginnt auf einem anderen Tablet.',
	'begin.site text':
		'Alles bleibt auf diesem Tablet. Das Werk bekommt eine eigene Wurzel, die für seine Personen und Tablets bürgt; sonst kann es niemand.',
	'begin.site': 'Name des Werks',
	'begin.site note': 'So, wie er in jedem Dossier gedruckt werden soll.',
	'begin.unit': 'Name der Anlage',
	'begin.unit note': 'Ihr Kennzeichen wie in den Zeichnungen: Buchstaben, Ziffern, Bindestriche.',
	'begin.device': 'Name dieses Tablets',
	'begin.device note': 'Wie auf seinem Schild. Die Anlagenzeit kommt von seiner Uhr: UTC {time}.',
	'begin.people text':
		'Mindestens zwei Personen: wer einen Schritt nachweist, gibt seine Stufe nicht frei. Jede tippt eine eigene PIN, ungesehen von der anderen.',
	'begin.person': 'Person Nr. {n}',
	'begin.person.name': 'Name, wie er neben einer Unterschrift gedruckt wird',
	'begin.person.roles': 'Rollen',
	'begin.person.pin': 'PIN, 8 bis 12 Ziffern',
	'begin.person.again': 'Dieselbe PIN noch einmal',
	'begin.person.add': 'Weitere Person hinzufügen',
	'begin.person.remove': 'Diese Person wegnehmen',
	'begin.role.technician': 'weist Schritte an der Anlage nach',
	'begin.role.shift supervisor': 'gibt die Stufen 0 bis 4 frei, nimmt ab',
	'begin.role.commissioning lead': 'eröffnet Anfahrvorgänge, gibt den Brennstoff frei, siegelt',
	'begin.role.process engineer': 'beschreibt die Anlage, genehmigt Vorschriften',
	'begin.role.instrument engineer': 'beschreibt Messgeräte, bestätigt Werte',
	'begin.role.QA': 'genehmigt Vorschriften, siegelt, nimmt Personen auf',
	'begin.role.site administrator': 'nimmt Personen und Tablets auf',
	'begin.later.no-supervisor':
		'Noch ist niemand Schichtführung (shift supervisor). Die Stufen 0 bis 4 warten so lange.',
	'begin.later.no-lead': 'Noch ist niemand Inbetriebnahmeleitung (commissioning lead). Der Brennstoff wartet so lange.',
	'begin.later.alone':
		'Mit einer Person allein wird keine Stufe freigegeben: wer einen Schritt darunter ausgeführt hat, darf es nicht.',
	'begin.wrong.name':
		'Gebraucht wird ein Name aus Buchstaben, Ziffern, Leerzeichen und . , ’ ( ) -, höchstens 64, alle aus einer Schrift.',
	'begin.wrong.same-name':
		'Diesen Namen trägt schon jemand. Ergänzen Sie einen Buchstaben oder zweiten Namen, damit Unterschriften sich unterscheiden.',
	'begin.wrong.tag':
		'Gebraucht werden Buchstaben, Ziffern, Punkte, Bindestriche oder Unterstriche, höchstens 32, zuerst ein Buchstabe oder eine Ziffer.',
	'begin.wrong.no-role': 'Mindestens eine Rolle wird gebraucht.',
	'begin.wrong.pin-too-short': 'Zu kurz: mindestens {n} Ziffern.',
	'begin.wrong.pin-too-long': 'Zu lang: höchstens {n}.',
	'begin.wrong.pin-too-easy':
		'Das würde jemand aus dem Kollegenkreis zuerst versuchen: {because}. Nehmen Sie eine andere.',
	'begin.wrong.differs': 'Die beiden PINs sind verschieden.',
	'begin.wrong.nobody-enrols':
		'Jemand muss site administrator oder QA sein: sonst kann nie eine Person aufgenommen werden.',
	'begin.wrong.nobody-describes':
		'Jemand muss process engineer oder instrument engineer sein: sonst kann niemand die Anlage beschreiben.',
	'begin.easy.one character': 'ein Zeichen immer wieder',
	'begin.easy.a run': 'Ziffern der Reihe nach',
	'begin.easy.a repeated block': 'ein wiederholter Block',
	'begin.easy.a date': 'ein Datum',
	'begin.easy.known': 'ein Teil des Namens',
	'begin.easy.common': 'eine, die viele benutzen',
	'begin.root text':
		'Diese Wörter öffnen die Wurzel des Werks, um die nächste Person oder das nächste Tablet aufzunehmen. Sie werden nirgends aufbewahrt und nie wieder gezeigt: schreiben Sie sie jetzt auf Papier und legen Sie es dorthin, wo das Werk seine Schlüssel hat.',
	'begin.root written': 'Sie stehen auf Papier.',
	'begin.plant text':
		'{unit} beginnt als Kopie der Anlage aus der Vorführung. Ihre Werte sind gekennzeichnet: keine Stufe wird freigegeben, bis jeder unter Anlage ersetzt ist.',
	'begin.go on': 'Weiter',
	'begin.back': 'Zurück',
	'begin.make': 'Werk anlegen',
	'begin.goes on': 'Schlüssel und Zertifikate werden gemacht: {done} von {of}',
	'begin.does text':
		'Eigene Personen, eine eigene Anlage, eine eigene Wurzel, auf diesem Tablet gemacht. Drei kurze Seiten.',
	'begin.switch': 'Welches Werk',
	'begin.switch.is own': 'Das ist das eigene Werk.',
	'begin.switch.is demonstration': 'Das ist die Vorführung, oder ein Tablet ohne Werk.',
	'begin.switch.own': 'Zum eigenen Werk',
	'begin.switch.demonstration': 'Zur Vorführung',
	'begin.switch text':
		'Die Vorführung und das eigene Werk liegen auf diesem Tablet getrennt, mit anderen Personen und Schlüsseln. Die App wird neu geladen.',
	'begin.no start-up': '{site} hat noch keinen Anfahrvorgang',
	'begin.no start-up text': 'Beschreiben Sie die Anlage unter Anlage, dann eröffnen Sie den ersten Anfahrvorgang.',
	'begin.values left': 'Werte von {unit}, die noch zu ersetzen sind: {n}',
};
