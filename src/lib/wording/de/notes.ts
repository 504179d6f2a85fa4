import { CALCULATOR_NOTES } from './calculator-notes';

import type { NOTES as EN } from '../en/notes';

/** Hinweise der Rechner als Sätze; Platzhalter wie im Englischen. */
export const NOTES: { readonly [key in keyof typeof EN]: string } = {
	...CALCULATOR_NOTES,
	'note.not-covered': '{volume} {title} ist nicht abgedeckt.',
	'note.covered-by-unknown-place':
		'{volume} {title} soll durch {place} abgedeckt sein; diese Stelle gehört nicht zu den Messstellen.',
	'note.place-reads-another-volume': '{place} misst {reads}, nicht {volume} {title}.',
	'note.place-at-inert-inlet': '{place} misst {volume} {title} dort, wo das Inertgas eintritt.',
	'note.outlet-not-read': 'Der Austritt von {volume} {title} wurde nicht gemessen.',
	'note.outlet-read-outside-purge': 'Der Austritt von {volume} {title} wurde außerhalb des Spülens gemessen.',
	'note.outlet-above-line': 'Der Austritt von {volume} {title} lag bei {oxygen:%}, angenommen wird {accept:%}.',
	'note.not-said-what-inerts-it': 'Niemand hat gesagt, was Sauerstoff von {volume} {title} fernhält.',
	'note.shut-off-above-line': '{volume} {title} lag bei {oxygen:%}, angenommen wird {accept:%}.',
	'note.above-line':
		'{place}: {count} Messwerte der Haltezeit über {accept:%}, der schlechteste {oxygen:%} um {t:clock}, der letzte {last:%}.',
	'note.too-few-readings': '{place}: {count} Messwerte in der Haltezeit, mindestens {least} sind gefordert.',
	'note.gap-in-readings':
		'{place}: kein Messwert von {from:clock} bis {to:clock}; höchstens {longest:time} sind erlaubt.',
	'note.rising': '{place}: die Messwerte der Haltezeit steigen.',
	'note.hold-too-short': '{held:time} gehalten, {needed:time} sind nötig (Regel: {rule}).',
	'note.fan-below-next-gate': '{tag}: Ventilatorstrom unter dem, was die nächste Stufe braucht.',
	'note.cleaning-not-running': 'Die Filterabreinigung lief nicht.',
	'note.damper-not-stroked': 'Klappe {tag} wurde nicht durch ihren Weg gefahren.',
	'note.too-little-inert-gas':
		'{admitted:m3n} Inertgas zugeführt, U {U:m3n}; für {volumeChanges} Volumenwechsel sind {needed:m3n} nötig.',
	'note.fan-broken': 'Ventilatorstrom von {from:clock} bis {to:clock} nicht gezeigt ({record}: {why}).',
	'note.inert-flow-broken': 'Inertgasstrom von {from:clock} bis {to:clock} nicht gezeigt ({record}: {why}).',
	'note.outlet-broken': 'Austritt von {from:clock} bis {to:clock} nicht als offen gezeigt ({record}: {why}).',
	'note.check-does-not-stand': '{place}: seine Funktionsprüfung gilt nicht ({state}).',
	'note.not-measuring': '{place}: sein Analysator war nicht im Messbetrieb ({mode}).',
	'note.air-not-read': '{place}: hat vor dem Spülen nicht Luft angezeigt.',
	'note.has-not-moved': '{place}: seine Anzeige hat sich um {moved:%} bewegt, mindestens {least:%} sind gefordert.',
	'note.no-valid-samples': '{place}: kein gültiger Messwert.',
	'note.unburnt-gas-not-known': '{place}: Brenngase sind nicht bekannt, wo eine Zirkondioxidzelle misst.',
	'note.unburnt-gas': '{place}: Brenngase {fraction:%}, höchstens {most:%} sind erlaubt.',
	'note.floor-above-limit': '{place}: der angepasste Endwert {floor:%} liegt nicht unter dem Grenzwert {limit:%}.',
	'note.slowest-place': 'Am langsamsten: {place}.',
	'note.forecast': '{place}: noch etwa {seconds:time} bis zu seiner Linie.',
	'note.residuals-in-runs':
		'{place}: die Residuen der Anpassung kommen in Serien (z = {z}); die Kurve beschreibt nicht alles.',
	'note.fit-refused': '{place}: keine Anpassung ({because}).',
	'note.fit-window':
		'{place}: angepasst an {samples} Messwerte von {from:clock} bis {to:clock}, {exchanges} Wechsel, Totzeit {deadTime:time} abgezogen.',
	'note.basis-differs':
		'{place} misst {basis:basis}, der Grenzwert gilt {limitBasis:basis}; Wasserdampf {credited:%} angerechnet, {charged:%} angelastet.',
	'note.above-allowed-oxygen':
		'Das Ziel {target:%} liegt über den {allowed:%}, die eine Sauerstoffgrenzkonzentration von {limitingOxygen:%} erlaubt.',
	'note.limit-not-from-a-test-of-this-fuel':
		'Der Grenzwert stammt nicht aus einer Prüfung dieses Brennstoffs ({source}).',
	'note.unburnt-gas-limit-applies': 'Brenngase {fraction:%}: es gilt der Grenzwert des Gases, nicht der des Staubs.',
	'note.mixing-assumed-good': 'Ein Mischfaktor von {mixing} ist angenommen, nicht gemessen.',
	'note.carbon-dioxide-discharge':
		'Kohlendioxid: nie aus einem Schneerohr in eine Staubwolke abblasen; es lädt sich auf. Der Inhalt wird gewogen.',
	'note.floor-close-to-line': 'Der Endwert {floor:%} liegt nahe an der Linie {accept:%}.',
	'note.unreachable': 'Das Ziel {target:%} ist nicht erreichbar: das Gas stellt sich auf {floor:%} ein.',
	'note.least-volume-changes-decide':
		'Die geringste Zahl der Volumenwechsel entscheidet ({least}); die Mischung allein bräuchte {byMixing}.',
	'note.leak-without-suction': 'Die Falschluft ist ohne den Unterdruck angegeben, bei dem sie gefunden wurde.',
	'note.leak-scaled-with-suction':
		'Die Falschluft ist mit der Wurzel des Unterdrucks umgerechnet, als untere Schranke: {leak:flow}.',
	'note.leak-asks-for-sensor-check':
		'{place}: eine Falschluft von {leak:flow} verlangt eine Prüfung des Analysators; sie sagt nicht, dass nichts undicht ist.',
	'note.stock-too-small': 'Der Vorrat ist kleiner, als dieses Spülen braucht.',
	'note.stock-without-repeat': 'Der Vorrat reicht für dieses Spülen, nicht für eine Wiederholung.',
	'note.flow-broken-before-hold': 'Ein Strom war vor Beginn der Haltezeit unterbrochen; die Haltezeit zählt ab danach.',
	'note.inert-flow-varied': 'Der Inertgasstrom schwankte von {least:flow} bis {most:flow}.',
	'note.meter-gap-not-counted': '{meter}: von {from:clock} bis {to:clock} wird nichts gezählt, dort hat er eine Lücke.',
	'note.samples-excluded': '{place}: {count} Messwerte ausgelassen ({why}).',
	'note.no-dead-leg-named': 'Unter den Räumen ist kein Totraum genannt.',
	'note.covered-without-analyser': 'Ohne Analysator, {answer}: {volumes}.',
	'note.in-leakage':
		'Falschluft aus dem Endwert an {place}: etwa {leak:flow}, bei dem Unterdruck, bei dem sie gefunden wurde.',
	'note.mixing-above-one': '{place}: Mischfaktor {mixing} über eins.',
	'note.floor-above-readings': '{place}: der angepasste Endwert {floor:%} liegt über dem letzten Messwert {last:%}.',
	'note.floor-may-exceed-line': '{place}: Endwert {floor:%}, höchstens {high:%}; die Linie ist {accept:%}.',
	'note.seen-not-recorded': '{record}: von {by} gesehen, {from:clock} bis {to:clock}, nicht aufgezeichnet.',
	'note.coldest-surface': 'Kälteste von {of} Oberflächen: {name}.',
	'note.uncertainty-not-stated': 'Unsicherheit nicht angegeben für: {inputs}.',
	'note.uncertainty-by-default': 'Unsicherheit als Vorgabewert für: {inputs}.',
	'note.low-flow-cut-off': 'Unter seiner Schleichmengenunterdrückung zeigt der Messumformer keinen Durchfluss.',
	'note.mean-of-roots': 'Mittel der Wurzeln aus {readings} Messwerten.',
	'note.ideal-gas-dew-point':
		'Taupunkt eines idealen Gases; bei einem realen Gas liegt er um höchstens {realGasIsLowerBy:K} tiefer.',
	'purge.adequate':
		'Messwerte ausreichend seit {since}: an allen {places} gemessenen Stellen bei oder unter {accept} {basis} (Grenzwert {limit}, Schutzband {guard}) über {held}, Ventilator und Inertgasstrom ununterbrochen.',
	'purge.swept': '{n} Räume ohne Analysator: {list}.',
	'purge.slowest': 'Am langsamsten: {place}.',
	'purge.no permission': 'Keine Erlaubnis.',
};
