/** Wer das Tablet hat, wessen Schicht läuft, und was nach dem Verdecken gefragt wird. */
export const PEOPLE = {
	'problem.shift-covered':
		'Der Bildschirm war inzwischen verdeckt. Sagen Sie vor dem nächsten Eintrag von {person}, wer Sie sind; Getipptes bleibt.',
	'problem.wrong-code':
		'Dieser Code ist falsch. Noch {left} Versuche, dann muss es die PIN sein. Es wurde nichts eingetragen.',
	'problem.code-used-up': 'Der kurze Code zählt nicht mehr. Weiter mit der PIN.',
	'problem.resume-code-length': 'Der kurze Code hat {atLeast} bis {atMost} Ziffern.',
	'problem.resume-code-easy': 'Dieser kurze Code ist zu leicht: nehmen Sie andere Ziffern.',
	'problem.resume-code-in-pin':
		'Der kurze Code ist ein Teil der PIN: wer ihn sieht, wüsste zu viel. Nehmen Sie andere Ziffern.',
	'shift.begin': 'Schicht von {person} beginnen',
	'shift.begin text':
		'Einträge werden mit einem Schlüssel dieser Schicht unterschrieben. Jetzt einmal die PIN, bis zum Schichtende keine für Einträge; Haltepunkte fragen jedes Mal nach der PIN.',
	'shift.code': 'Kurzer Code, wenn Sie mögen: vier Ziffern, mit denen es nach dem Verdecken weitergeht',
	'shift.begin does': 'Schicht beginnen',
	'shift.go on': '{person} macht weiter',
	'shift.go on code': 'Der Bildschirm war verdeckt. Ihr kurzer Code, und Eintragen geht weiter; Getipptes ist da.',
	'shift.go on pin': 'Der Bildschirm war verdeckt. Ihre PIN, und Eintragen geht weiter; Getipptes ist da.',
	'shift.short code': 'Kurzer Code',
	'shift.go on does': 'Weiter',
	'shift.with pin': 'Weiter mit der PIN',
	'shift.end': 'Schicht von {person} beenden',
	'shift.ended': 'Die Schicht von {person} auf diesem Tablet ist beendet. Der nächste Eintrag fragt nach der PIN.',
	'cover.soon': 'Der Bildschirm verdeckt sich in {seconds} s. Berühren Sie ihn, um weiterzumachen.',
	'person.who': 'Wer hat das Tablet?',
	'person.keeps': 'Halb Getipptes bleibt bei dem, der es getippt hat.',
	'person.holds': 'hat das Tablet',
	'person.runs': 'Schicht bis {at}',
	'person.no shift': 'keine Schicht',
	'person.no key': 'Schlüssel nach zehn falschen PINs vernichtet: neu aufzunehmen, persönlich',
	'person.wrong pin': '{n} falsche PIN auf diesem Tablet seit der letzten richtigen',
	'person.wrong pins': '{n} falsche PINs auf diesem Tablet seit der letzten richtigen',
	'person.certificate': 'Zertifikat {from} bis {until}',
	'person.certificate ended': 'Zertifikat endete {until}: Unterschriften gehen weiter und sagen es',
	'person.certificate later': 'Zertifikat beginnt {from}',
	'person.take': 'Tablet übernehmen',
	'person.all': 'Personen und Zertifikate',
	'people.sign here': '{n} Personen unterschreiben auf diesem Tablet',
	'people.wrong pin':
		'Nach drei falschen PINs hintereinander lässt das Tablet warten, jedes Mal länger; die zehnte vernichtet den Schlüssel. Sein Besitzer wird dann neu aufgenommen, persönlich. Was vorher unterschrieben wurde, bleibt.',
	'people.none': 'Auf diesem Tablet ist niemand aufgenommen',
} as const;
