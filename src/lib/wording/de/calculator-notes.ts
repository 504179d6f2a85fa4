/** What the calculators of flow, moisture and the planned purge note and refuse, as sentences; forms as in notes.ts. */
export const CALCULATOR_NOTES = {
	'note.outside-limit': '{limit} = {value} liegt außerhalb von {min} bis {max} ({edition}).',
	'note.coefficient-not-of-the-standard':
		'Durchflusskoeffizient {C} aus {from}: unter den Reynolds-Zahlen der Norm, wo ihr {constant} nicht gilt.',
	'note.dp-low-in-span':
		'Der Differenzdruck {dp:Pa} liegt unter {least:%} der Spanne von {span:Pa}: die Wurzel vergrößert dort den Fehler des Messumformers.',
	'note.zero-shifted':
		'Bei geöffnetem Ausgleichsventil zeigt er {dpZero:Pa}: ein Fehler von {flowError:%} des Durchflusses.',
	'note.temperature-from-downstream':
		'Die Temperatur wird nach dem Rohr gemessen, wo das Gas um höchstens {colderByAtMost:K} kälter ist.',
	'note.diameters-taken-as-hot':
		'Durchmesser wie im Betrieb angenommen; stammen sie aus der Zeichnung, ist der Durchfluss um {flowErrorIfFromDrawing:%} falsch.',
	'note.no-calibration-certificate': 'Der Messumformer hat keinen Kalibrierschein.',
	'note.dust-laden': 'Das Gas führt Staub, und das Rohr wurde nicht damit kalibriert.',
	'note.throat-changed': 'Die Kehle ist verschlissen oder bewachsen: ihr Durchmesser ist nicht bekannt.',
	'note.installation-not-stated': 'Nicht angegeben und nicht beurteilt: {inputs}.',
	'note.straight-length-short': 'Zu wenig gerades Rohr vor dem Venturirohr.',
	'note.straight-length-reduced': 'Das gerade Rohr ist kürzer als verlangt: zur Unsicherheit von C kommen 0,5 % hinzu.',
	'note.moisture-not-stated': 'Keine Feuchte angegeben: das Gas gilt als trocken.',
	'note.density-and-composition-disagree':
		'Angegebene Dichte {given} kg/m³, aus der Zusammensetzung {calculated} kg/m³; gerechnet wird mit der angegebenen.',
	'note.composition-normalised': 'Die Anteile ergeben zusammen {sum}; sie wurden auf 1 gebracht.',
	'note.pulsating-flow':
		'Der Differenzdruck schwankt um {pulsation:%} um sein Mittel; über {limit:%} gilt die Norm nicht.',
	'note.below-low-flow-cut-off':
		'Differenzdruck {dp:Pa} unter der Schleichmenge {cutOff:Pa}: gilt als kein Durchfluss.',
	'note.root-taken-twice': 'Messumformer und Leitsystem ziehen beide die Wurzel: der angezeigte Durchfluss ist falsch.',
	'note.characteristic-seen': 'Signal und Ablesung zusammen sehen aus wie: {seen}; eingestellt ist: {setTo}.',
	'note.uncertainty-over-limit': 'Dass die Unsicherheit des Durchflusses in {limit:%} bleibt, ist nicht gezeigt.',
	'note.rectangular-duct': 'Ein rechteckiger Kanal ist kein Fall der Norm; stattdessen: {use}.',
	'note.throat-not-smaller': 'Die Kehle mit {d} m muss kleiner sein als das Rohr mit {D} m.',
	'note.difference-above-pressure':
		'Eine Differenz von {dp:Pa} ist mehr als der Druck von {pressure:Pa}: ist das ein Überdruck?',
	'note.pressure-ratio-too-low': 'Kehle zu Vordruck ist {tau}; unter {min} gilt die Formel nicht.',
	'note.above-span': 'Der Differenzdruck {value:Pa} liegt über der Spanne von {span:Pa}: der Sensor ist außer Bereich.',
	'note.signal-fault': '{value:mA} ist ein Fehlersignal, kein Messwert (gültig: {min:mA} bis {max:mA}).',
	'note.negative-difference-pressure':
		'{value:Pa} liegt unter null: Wirkdruckleitungen vertauscht, Nullpunkt verschoben, oder das Gas strömt zurück.',
	'note.liquid-present':
		'Bei {temperature:degC} läge eine Feuchte von {waterVapour:%} unter ihrem Taupunkt {dewPoint:degC}: es ist Wasser da.',
	'note.acid-dew-point': 'Säuretaupunkt {temperature:degC} mit SO₃ {from}: eine Bemerkung, kein Nachweis.',
	'note.acid-dew-point-above-wall':
		'Der Säuretaupunkt {temperature:degC} liegt über der kältesten Fläche {wall:degC}: dort kondensiert Säure.',
	'note.sulphur-trioxide-estimated': 'SO₃ ist geschätzt, nicht gemessen: so unsicher ist auch der Säuretaupunkt.',
	'note.acid-without-water': 'Ein Säuretaupunkt braucht Wasser im Gas.',
	'note.surface-named-twice': 'Doppelt benannte Flächen: {names}.',
	'note.already-condensing':
		'Das Gas mit {gasTemperature:degC} liegt unter seinem eigenen Taupunkt {dewPoint:degC}: Feuchte oder Temperatur ist falsch.',
	'note.surface-reading-old': 'Länger als {limit:time} nicht abgelesen: {surfaces}.',
	'note.surface-reading-without-age': 'Niemand hat gesagt, wie alt der Messwert ist: {surfaces}.',
	'note.filter-cold': 'Der Filter wurde nicht vorgewärmt: feuchtes Gas kondensiert daran, bis er warm ist.',
	'note.present-state-not-stated': 'Die Feuchte jetzt ist nicht angegeben; beurteilt wird nur der Zustand mit Aufgabe.',
	'note.predicted-drier-than-present':
		'Mit Aufgabe {predictedWaterVapour:%}, jetzt {waterVapour:%}: mit Aufgabe nimmt das Gas Wasser auf, es verliert keines.',
	'note.frost-point': 'Bei {temperature:degC} ({state}) bildet das Gas Reif statt Tropfen.',
	'note.gas-below-predicted-dew-point':
		'Mit Aufgabe liegt der Taupunkt {dewPoint:degC} über dem Gas mit {gasTemperature:degC}: es würde im Kreis regnen.',
	'note.predicted-state-not-stated': 'Die Feuchte mit Aufgabe ist nicht angegeben; sie entscheidet.',
	'note.predicted-state-dry': 'Ein Gas ohne Wasser mit Aufgabe sagt nichts über diesen Brennstoff.',
	'note.clearance-kept':
		'{surface}, {state}: {clearance:K} über dem Taupunkt, abzüglich {guard:K} Unsicherheit; verlangt sind {margin:K}.',
	'note.inside-guard-band':
		'{surface}, {state}: {clearance:K} über dem Taupunkt halten {margin:K} ein, mit {guard:K} Unsicherheit aber nicht.',
	'note.below-margin': '{surface}, {state}: nur {clearance:K} über dem Taupunkt; verlangt sind {margin:K}.',
	'note.surface-below-dew-point': '{surface}, {state}: {clearance:K} gegen den Taupunkt: dort kondensiert Wasser.',
	'note.guard-leaves-nothing': 'Ein Schutzband von {guard:%} lässt vom Grenzwert {limit:%} nichts übrig.',
	'note.target-not-below-start': 'Die Linie {target:%} liegt nicht unter den {start:%} vom Beginn: nichts zu spülen.',
	'note.not-an-inert-gas-meter':
		'{tag} misst {medium}, kein Inertgas: umgewälzt wird ein Vielfaches dessen, was eintritt.',
	'note.no-outlet': 'Niemand hat gesagt, wo das Gas austritt: ohne Austritt wird nicht gespült.',
	'note.named-twice': '{name} ist doppelt benannt.',
	'note.limit-without-source': 'Ein Grenzwert braucht seine Quelle.',
	'note.bounds-crossed': 'Die untere Grenze {low:%} liegt über der oberen {high:%}.',
	'note.judged-before-it-began': 'Beurteilt, bevor das Spülen begann.',
	'note.totaliser-ran-backwards': 'Der Zähler ging von {before} auf {value} zurück.',
	'note.basis-needs-moisture':
		'{tag} misst {basis:basis}, der Grenzwert ist {limitBasis:basis}: nachgewiesene Feuchte ist nötig.',
	'note.oxygen-not-below-air':
		'Sauerstoff {oxygen:%} liegt nicht unter dem der Luft, {air:%}: daraus lässt sich nichts ablesen.',
	'note.oxygen-falls-along':
		'Der Sauerstoff fällt entlang des Wegs: Analysatoren oder Zeitpunkte passen nicht zusammen. Das ist keine Falschluft von null.',
	'note.leak-not-told-from-zero':
		'Falschluft {r:%} mit einer Unsicherheit von {U:%} ist von null nicht zu unterscheiden; das ist keine Dichtheit.',
	'note.temperature-swing':
		'Die Temperatur änderte sich um {swing:K}; über {most:K} ist die Prüfung ungültig: ein Fühler ist nicht das ganze Gas.',
	'note.pressure-rose':
		'Ohne den Anteil der Temperatur stieg der Druck um mehr als seine Unsicherheit: die Temperatur ist nicht die des Gases. Die Prüfung ist ungültig.',
	'note.walls-flexible': 'Nachgiebige Wände ändern das Volumen: der Druck verrät dann kein Leck.',
	'note.pressure-changed-much':
		'Der Druck änderte sich um {part:%}; über {most:%} gehört das Leck nicht mehr zum Prüfdruck.',
	'note.temperature-moved': 'Die Temperatur wanderte um {swing:K}: warten, bis sie ruht, oder den Kanal beschatten.',
	'note.drop-inside-uncertainty':
		'Der Abfall von {drop:Pa} ist mit einer Unsicherheit von {U:Pa} kaum von null zu unterscheiden: länger prüfen.',
	'note.leak-without-uncertainty': 'Ein Leck von {leak:flow} ohne Unsicherheit zeigt nichts gegen {allowed:flow}.',
	'note.leak-within': 'Leck {leak:flow} und Unsicherheit {U:flow} liegen in den erlaubten {allowed:flow}.',
	'note.leak-inside-guard':
		'Leck {leak:flow} liegt unter den erlaubten {allowed:flow}, mit der Unsicherheit {U:flow} aber nicht.',
	'note.leak-beyond': 'Leck {leak:flow}, U {U:flow}, ist mehr als die erlaubten {allowed:flow}.',
	'note.no-swing': 'Der obere Druck muss über dem unteren liegen.',
	'note.inert-gas-above-target':
		'Das Inertgas enthält selbst {inert:%} Sauerstoff; {target:%} werden damit nie erreicht.',
	'note.swing-held':
		'm = 1 gilt nur, wo jeder Wechsel gehalten und nachgefüllt wird, bis seine Temperatur sich gesetzt hat.',
	'note.branches-not-swept':
		'Ein toter Zweig nimmt bei jedem Wechsel sein eigenes Gas zurück: Sauerstoff an seinem Ende messen oder ihn durchspülen.',
	'note.one-swing-more':
		'Nach diesen Wechseln liegen {after:%} mit einer Unsicherheit von {U:%} nicht sicher unter {line:%}: einen Wechsel mehr planen.',
	'note.swings-rounded-up': 'Die Formel ergibt {needed}; nötig sind {swings} ganze Wechsel.',
	'note.too-few-points': '{count} Punkte sind zu wenige: verlangt sind mindestens {least}.',
	'note.no-points-downwards': 'Kein Punkt wurde aufwärts und abwärts angefahren: die Hysterese ist nicht gezeigt.',
	'note.error-over-half': 'Die größte Abweichung {error:%} der Spanne ist mehr als die Hälfte des Erlaubten.',
	'note.display-seen': 'Was angezeigt wird, sieht aus wie: {seen}, von dem, was aufgegeben wurde.',
	'note.loop-error-within':
		'Größte Abweichung {error:%} der Spanne bei {applied:%}, U {U:%}: in den erlaubten {allowed:%}.',
	'note.loop-error-beyond':
		'Größte Abweichung {error:%} der Spanne bei {applied:%}, U {U:%}: nicht in den erlaubten {allowed:%}.',
	'note.acid-dew-point-no-proof': 'Ein Säuretaupunkt ist ein Grund, nach dem Metall zu sehen, kein Nachweis.',
	'note.correlations-apart': 'Die beiden Gleichungen liegen {apart:K} auseinander.',
	'note.carbon-dioxide-by-weight':
		'Kohlendioxid ist in der Flasche flüssig: sein Druck sagt nichts. Wiegen und das Nettogewicht angeben.',
	'note.stop-above-pressure': 'Der Druck, bei dem Schluss ist, liegt über dem jetzigen: nichts ist nutzbar.',
	'note.bottles-at-rest':
		'Gilt für Flaschen in Ruhe: eben entnommen sind sie kalt und zeigen zu wenig, in der Sonne zeigen sie zu viel.',
} as const;
