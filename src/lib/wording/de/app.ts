import type { APP as EN } from '../en/app';

/** Was die App sagt, wenn etwas nicht ging: was geschah, was sicher ist, was zu tun ist. */
export const APP: { readonly [key in keyof typeof EN]: string } = {
	'problem.storage-full':
		'Auf diesem Tablet ist kein Platz mehr. Hiervon wurde nichts behalten; alles früher Gespeicherte ist sicher. Platz schaffen oder Fotos anderswohin kopieren, dann noch einmal versuchen.',
	'problem.storage-closed':
		'Der Speicher dieses Tabs wurde geschlossen, von einer neueren Version der App in einem anderen Tab oder vom Browser. Das Gespeicherte ist sicher. Diese Seite neu laden.',
	'problem.storage-blocked':
		'Ein anderer Tab hält den Speicher in einer älteren Version fest. Die anderen Tabs dieser App schließen, dann diese Seite neu laden.',
	'problem.storage-newer':
		'Eine neuere Version der App war hier. Diese Seite neu laden, um sie zu verwenden; es wurde nichts geschrieben.',
	'problem.storage-missing':
		'Dieser Browser gibt der App keinen Speicher, es könnte also nichts behalten werden. Den privaten Modus verlassen oder einen anderen Browser verwenden.',
	'problem.storage-failed':
		'Der Speicher hat versagt ({name}: {message}). Hiervon wurde nichts behalten; das früher Gespeicherte ist sicher.',
	'problem.chain-moved-on':
		'Ein anderer Tab schrieb gleichzeitig, immer wieder. Hiervon wurde nichts behalten; noch einmal versuchen.',
	'problem.no-gate-key': 'Diese Person hat auf diesem Tablet keinen Schlüssel und muss hier erst aufgenommen werden.',
	'problem.destroyed':
		'Der Schlüssel wurde nach zehn falschen PINs vernichtet. Sein Inhaber muss neu aufgenommen werden, persönlich.',
	'problem.weak-wrap':
		'Der gespeicherte Schlüssel ist nicht gut genug geschützt und wurde nicht geöffnet. Sein Inhaber muss neu aufgenommen werden.',
	'problem.damaged-wrap':
		'Der gespeicherte Schlüssel ist beschädigt und wurde nicht geöffnet. Sein Inhaber muss neu aufgenommen werden.',
	'problem.wait': 'Zu viele falsche PINs. {time} warten; es bleiben {left} Versuche.',
	'problem.wrong-pin': 'Diese PIN ist falsch. Es bleiben {left} Versuche. Es wurde nichts unterschrieben.',
	'problem.no-plant':
		'Dieses Tablet kennt noch keine Anlagenbeschreibung. Sehen Sie die Vorführung an oder beginnen Sie ein eigenes Werk.',
	'problem.site-exists':
		'Dieses Tablet hat schon ein eigenes Werk. Es wurde nichts angelegt; die Einstellungen führen dorthin.',
	'problem.site-incomplete':
		'Das Werk wurde nicht angelegt: {n} Angaben fehlen oder stimmen nicht. Es wurde nichts aufbewahrt.',
	'problem.site-refused':
		'Das Werk wurde nicht angelegt ({because}). Damit kann nichts unterschrieben worden sein; beginnen Sie neu.',
	'problem.no-right':
		'{person} darf das nicht unterschreiben. Gebraucht wird eine Rolle aus: {roles}. Es wurde nichts unterschrieben.',
	'problem.plant-refused':
		'Die Beschreibung wurde nicht genehmigt: {at} hat nicht die Form einer Anlagenbeschreibung. Was getippt war, ist noch da.',
	'problem.no-site': 'Dieses Tablet gehört noch zu keinem Werk.',
	'problem.nobody-chosen': 'Niemand hat dieses Tablet in der Hand. Erst sagen, wer es hat.',
	'problem.not-enrolled-here': '{person} ist auf diesem Tablet nicht aufgenommen.',
	'problem.no-shift':
		'In diesem Anfahrvorgang hat {person} keine Schicht begonnen. Sie mit der PIN beginnen; Getipptes bleibt.',
	'problem.no-such-start-up': 'Den Anfahrvorgang {startUp} gibt es auf diesem Tablet nicht.',
	'problem.start-up-unreadable': '{what} des Anfahrvorgangs {startUp} ist nicht lesbar. Es wurde nichts geändert.',
	'problem.sealed': 'Der Anfahrvorgang {startUp} ist versiegelt und nimmt keine Einträge mehr an.',
	'problem.no-such-field': 'Schritt {step} hat kein Feld {field}. Es wurde nichts behalten.',
	'problem.wrong-step': 'Schritt {step} nimmt einen solchen Eintrag nicht an. Es wurde nichts behalten.',
	'problem.inputs-missing': 'Es kann noch nicht gerechnet werden. Es fehlt: {missing}.',
	'problem.of step': 'Schritt {step}',
	'problem.calculation-refused': 'Es wurde nicht gerechnet: {because}.',
	'problem.no-such-point':
		'Der Trend wurde nicht übernommen: seine Spalte {column} nennt keine Messstelle dieser Anlage.',
	'problem.other-basis':
		'Der Trend wurde nicht übernommen: Spalte {column} sagt {found}, die Messstelle misst {point}.',
	'problem.no-such-column': 'Der Trend wurde nicht übernommen: er hat keine Spalte {column}.',
	'problem.point-twice': 'Der Trend wurde nicht übernommen: zwei Spalten sollen {point} sein. Eine weglassen.',
	'problem.other-unit':
		'Der Trend wurde nicht übernommen: {found} ist keine Einheit von {point}; für Spalte {column} eine andere wählen.',
	'problem.not-utf8':
		'Der Trend wurde nicht übernommen: {name} ist kein Text in UTF-8. Als Text (CSV, UTF-8) ausgeben oder seine Zeilen kopieren und einfügen.',
	'problem.trend': 'Der Trend wurde nicht übernommen: {because}.',
	'problem.sheet-changed':
		'Die Aufzeichnung ging weiter, während dieses Blatt offen war. Es wurde nichts unterschrieben: das Blatt noch einmal lesen, es ist neu.',
	'problem.refused-act':
		'Die Regeln lassen das nicht zu: {because}. Der Versuch ist festgehalten und hat nichts geändert.',
	'problem.demonstration-stopped': 'Die Vorführung konnte nicht vorbereitet werden: {because}.',
	'app.origin.plant': 'Anlagenbeschreibung',
	'app.origin.procedure': 'Anfahrvorschrift',
	'app.origin.instrument': 'Kalibrierung von {instrument}',
	'app.origin.typed': 'hier getippt',
	'app.origin.several': 'mehrere Stellen',
	'app.origin.entries': '{n} Werte',
	'app.today': 'Heute',
	'app.start-ups': 'Anfahren',
	'app.calculators': 'Rechner',
	'app.people': 'Personen',
	'app.archive': 'Archiv',
	'app.saved': 'Auf diesem Tablet gespeichert {at}',
	'app.no site': 'Auf diesem Tablet ist noch kein Anfahrvorgang',
	'app.no site text':
		'Einen Anfahrvorgang einer erfundenen Anlage ansehen, mitten im Spülen. Er entsteht auf diesem Tablet mit eigenen Schlüsseln; nichts daran ist echt.',
	'app.demonstration': 'Vorführung zeigen',
	'app.demonstration goes on': 'Die Vorführung wird vorbereitet: {done} von {of}',
	'app.demonstration facts': 'Vorführung, nichts hier ist echt.',
	'app.pin of demonstration': 'Vorführung: alle haben hier die PIN {pin}.',
	'app.facts': '{id}. Anfahrvorschrift {procedure}, Revision {revision}. {at}.',
	'app.opened': 'Eröffnet {at}, {n} Ereignisse',
	'app.taken back': '{what} gespeichert.',
	'app.held entry': 'Schritt {step}',
	'app.held other': 'Dies',
	'app.use supplied': 'Mit der Vorführung gelieferte Trends',
	'app.supplied of': '{from} bis {to}',
	'app.blank title': 'Das Bild war verdeckt',
	'app.blank text': 'Fünf Minuten lang hat es niemand berührt. Getipptes ist behalten.',
	'app.blank does': 'Aufdecken',
	'app.deviation title': 'Was ist nicht wie gefordert?',
	'app.deviation does': 'Abweichung melden',
	'app.deviation blocks': 'Sie sperrt',
	'app.offline': 'Ganz auf diesem Tablet gespeichert: arbeitet ohne Netz.',
	'app.gate': 'Stufe {gate}',
	'app.unread': '{name} wurde nicht beurteilt: das Lesen brach ab. Die Datei wurde nicht geändert.',
	'app.disposition': 'Entscheidung',
	'app.disposition.repaired': 'instand gesetzt',
	'app.disposition.use as is': 'so belassen',
	'app.disposition.not a deviation': 'keine Abweichung',
	'app.disposition reason': 'Was getan und gesehen wurde',
	'app.disposition does': 'Entscheidung unterschreiben',
	'app.nothing': 'nichts',
	'app.nothing here': 'Unter dieser Adresse ist nichts',
	'app.not shown': 'Diese Seite konnte nicht gezeigt werden',
	'app.to first page': 'zur ersten Seite',
	'app.hand-over': 'die Übergabe',
	'app.storage closed':
		'Der Speicher wurde unter diesem Tab geschlossen. Das Gespeicherte ist sicher; die Seite neu laden.',
};
