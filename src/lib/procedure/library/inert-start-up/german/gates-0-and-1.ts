/** Titles of the gates; authority and area, line-up. German beside the exact English words: a changed word shows its English until it is translated anew. */
export const GATES_0_AND_1 = {
	'Inert start-up of a closed grinding-drying circuit': 'Inertes Anfahren eines geschlossenen Mahltrocknungskreislaufs',
	'Authority and area': 'Befugnis und Bereich',
	'work on the line-up': 'die Arbeit an der Stellungskontrolle',
	'Line-up': 'Stellungskontrolle',
	'inert gas and gas flow into the circuit': 'Inertgas und Gasstrom in den Kreislauf',
	'Purged and analysed': 'Gespült und analysiert',
	'the first movement of the mill': 'die erste Bewegung der Mühle',
	'Mill ready': 'Mühle bereit',
	'lighting the burner': 'das Zünden des Brenners',
	'Warm and dry': 'Warm und trocken',
	'preparing the fuel feed': 'das Vorbereiten der Brennstoffaufgabe',
	'Feed release': 'Freigabe der Aufgabe',
	'the release of fuel feed': 'die Freigabe der Brennstoffaufgabe',
	'Feed on, self-inert running': 'Aufgabe läuft, selbstinerter Betrieb',
	'hand-over to operation': 'die Übergabe an den Betrieb',
	'Hand-over': 'Übergabe',
	'acceptance by operation': 'die Abnahme durch den Betrieb',
	'Permits and locks': 'Erlaubnis und Schlösser',
	'Permits closed': 'Erlaubnisscheine geschlossen',
	'Read every permit of the unit at the permit board and see that it is signed back.':
		'Jeden Erlaubnisschein der Anlage an der Scheintafel lesen und sehen, dass er zurückgezeichnet ist.',
	'An open permit means that somebody may still be inside or at an open flange.':
		'Ein offener Erlaubnisschein heißt: es kann noch jemand drinnen oder an einem offenen Flansch sein.',
	'No permit of this unit is open.': 'Kein Erlaubnisschein dieser Anlage ist offen.',
	'Every isolation named in them is removed.': 'Jede darin genannte Absperrung ist aufgehoben.',
	'Every lock accounted for': 'Jedes Schloss nachgezählt',
	'Count the personal locks back onto their board against the list of issue.':
		'Die persönlichen Schlösser an ihrer Tafel gegen die Ausgabeliste zählen.',
	'A lock that is missing on the board hangs on a machine, and its owner may be there.':
		'Ein Schloss, das an der Tafel fehlt, hängt an einer Maschine, und sein Besitzer ist vielleicht dort.',
	'As many locks hang on the board as were issued.':
		'Es hängen so viele Schlösser an der Tafel, wie ausgegeben wurden.',
	Review: 'Durchsicht',
	'Pre-start review closed': 'Prüfung vor dem Anfahren abgeschlossen',
	'Go through the four documents and see that none has an open action that blocks this start.':
		'Die vier Unterlagen durchgehen und sehen, dass keine einen offenen Punkt hat, der dieses Anfahren sperrt.',
	'Before the first start nobody has yet seen the unit do what the drawings promise.':
		'Vor dem ersten Anfahren hat noch niemand die Anlage tun sehen, was die Zeichnungen versprechen.',
	'Built as designed: as-built drawings and punch list': 'Gebaut wie geplant: Bestandszeichnungen und Mängelliste',
	'Procedures for start, shutdown and emergency in force': 'Anweisungen für Anfahren, Abfahren und Notfall in Kraft',
	'Actions of the hazard study closed': 'Maßnahmen der Gefährdungsstudie abgeschlossen',
	'Training of everybody on shift recorded': 'Unterweisung aller in der Schicht aufgezeichnet',
	'Changes since the last start known': 'Änderungen seit dem letzten Anfahren bekannt',
	'Read the list of changes to plant, programs and set points and name those that this procedure does not know.':
		'Die Liste der Änderungen an Anlage, Programmen und Sollwerten lesen und die nennen, die diese Vorschrift nicht kennt.',
	'A changed damper or set point makes a step below prove the wrong thing.':
		'Eine geänderte Klappe oder ein geänderter Sollwert lässt einen Schritt weiter unten das Falsche nachweisen.',
	'Changes to equipment': 'Änderungen an der Ausrüstung',
	'Changes to the control system and its set points': 'Änderungen am Leitsystem und seinen Sollwerten',
	'Changes to suppliers and fuel': 'Änderungen bei Lieferanten und Brennstoff',
	'Fuel data': 'Brennstoff',
	'Fuel of the day is the tested fuel': 'Brennstoff des Tages ist der geprüfte Brennstoff',
	'Compare the delivery note with the fuel of the limiting oxygen report.':
		'Den Lieferschein mit dem Brennstoff im Bericht der Sauerstoffgrenzkonzentration vergleichen.',
	'The oxygen limits are those of one fuel with one inert gas. Another fuel has other limits.':
		'Die Sauerstoffgrenzwerte gelten für einen Brennstoff mit einem Inertgas. Ein anderer Brennstoff hat andere Grenzwerte.',
	'Same fuel, report not older than the site allows': 'Derselbe Brennstoff, Bericht nicht älter, als das Werk zulässt',
	'Other fuel or another blend': 'Anderer Brennstoff oder andere Mischung',
	'Not known': 'Nicht bekannt',
	'In date': 'Fristen',
	'Instruments in calibration beyond the planned end': 'Messgeräte über das geplante Ende hinaus kalibriert',
	'Read the due dates of all instruments of this procedure and name each that ends within 24 h after the planned end.':
		'Die Fälligkeiten aller Messgeräte dieser Vorschrift lesen und jedes nennen, das binnen 24 h nach dem geplanten Ende abläuft.',
	'An instrument that runs out in the night takes its proofs with it.':
		'Ein Messgerät, das in der Nacht abläuft, nimmt seine Nachweise mit.',
	'No calibration ends before the planned end and 24 h.':
		'Keine Kalibrierung endet vor dem geplanten Ende und 24 h danach.',
	'Nothing else runs out on the way': 'Sonst läuft unterwegs nichts ab',
	'List trainings, certificates, gas bundles and rented equipment with the date on which each ends.':
		'Unterweisungen, Zertifikate, Gasbündel und Mietgeräte mit dem Tag auflisten, an dem sie enden.',
	'What ends at midnight is cheap to renew by day.': 'Was um Mitternacht endet, ist bei Tag billig zu erneuern.',
	'The list is written, and everything on it lasts.': 'Die Liste ist geschrieben, und alles darauf reicht.',
	'Temporary states': 'Vorübergehende Zustände',
	'Bypasses, forced signals and blinds': 'Überbrückungen, gesetzte Signale und Steckscheiben',
	'Read the lists of bypasses, forced signals and blinds together with the person who leaves the shift.':
		'Die Listen der Überbrückungen, gesetzten Signale und Steckscheiben gemeinsam mit der Person lesen, die die Schicht verlässt.',
	'A bypass that nobody owns is a trip that does not come.':
		'Eine Überbrückung, für die niemand zuständig ist, ist eine Abschaltung, die nicht kommt.',
	None: 'Keine',
	'Each is allowed for this start, has an owner and an end':
		'Jede ist für dieses Anfahren erlaubt, hat einen Zuständigen und ein Ende',
	'One has no owner or no end': 'Eine hat keinen Zuständigen oder kein Ende',
	'Fuel inside': 'Brennstoff im Inneren',
	'Nothing moves air through the circuit': 'Nichts bewegt Luft durch den Kreislauf',
	'Hold fan, mill, burner air and doors as they are, and keep inert gas on where fuel lies.':
		'Ventilator, Mühle, Brennerluft und Türen lassen, wie sie sind, und Inertgas an lassen, wo Brennstoff liegt.',
	'Air that reaches a nest of glowing fuel is how a stopped mill explodes at its restart.':
		'Luft, die ein Glutnest erreicht: so explodiert eine stehende Mühle beim Wiederanfahren.',
	'Fan, mill and burner air are off and stay off until this group is proved.':
		'Ventilator, Mühle und Brennerluft sind aus und bleiben aus, bis diese Gruppe nachgewiesen ist.',
	'Inert gas is on wherever fuel lies, or no fuel lies anywhere.':
		'Inertgas ist überall an, wo Brennstoff liegt, oder nirgends liegt Brennstoff.',
	'Fuel in mill, filter, hopper, screws and storage': 'Brennstoff in Mühle, Filter, Trichter, Schnecken und Silo',
	'Say what lies inside, and how long ago feed stopped.':
		'Sagen, was drinnen liegt und wie lange die Aufgabe schon steht.',
	'What is not known counts as hot.': 'Was nicht bekannt ist, gilt als heiß.',
	'None: looked at, at every place': 'Keiner: an jeder Stelle nachgesehen',
	'Some: places, amount and hours since the last feed noted':
		'Etwas: Stellen, Menge und Stunden seit der letzten Aufgabe notiert',
	'Not known at one place or more': 'An einer Stelle oder mehr nicht bekannt',
	'Burning fuel confirmed absent, or removed': 'Brennender Brennstoff bestätigt nicht vorhanden oder entfernt',
	'Confirm at every place with fuel that none of it burns, or have it removed under inert gas and permit.':
		'An jeder Stelle mit Brennstoff bestätigen, dass nichts davon brennt, oder ihn unter Inertgas und mit Erlaubnisschein entfernen lassen.',
	'Most fires of pulverising mills began at shutdown or restart, and neither temperature nor carbon monoxide told of them in time.':
		'Die meisten Brände in Kohlemühlen begannen beim Abfahren oder Wiederanfahren, und weder Temperatur noch Kohlenmonoxid meldeten sie rechtzeitig.',
	'No fuel inside': 'Kein Brennstoff im Inneren',
	'Fuel inside, found not burning at every place by a person who looked, within the site time limit':
		'Brennstoff im Inneren, an jeder Stelle von einer Person, die nachsah, nicht brennend gefunden, binnen der Frist des Werks',
	'Fuel removed under inert gas and permit': 'Brennstoff unter Inertgas und mit Erlaubnisschein entfernt',
	'Site time limit passed and fuel still inside': 'Frist des Werks überschritten und noch Brennstoff im Inneren',
	'Judged by temperature or carbon monoxide alone': 'Nur nach Temperatur oder Kohlenmonoxid beurteilt',
	'Keep inert gas on, keep air out, keep people away from mill, filter and vents.':
		'Inertgas an lassen, Luft fernhalten, Menschen von Mühle, Filter und Druckentlastungen fernhalten.',
	'Temperatures and carbon monoxide at rest': 'Temperaturen und Kohlenmonoxid in Ruhe',
	'Read all places at the beginning and at the end of 30 min without any flow and enter the end.':
		'Alle Stellen am Anfang und am Ende von 30 min ohne jede Strömung ablesen und das Ende eintragen.',
	'Readings at rest are the baseline: once gas moves, dilution hides a rise. They do not exclude a smouldering nest.':
		'Ruhewerte sind die Grundlinie: sobald Gas sich bewegt, verdeckt die Verdünnung einen Anstieg. Sie schließen ein Glutnest nicht aus.',
	'Steel of the filter hopper': 'Stahl des Filtertrichters',
	'Steel of the silo cone': 'Stahl des Silotrichters',
	'Carbon monoxide after the bag filter': 'Kohlenmonoxid nach dem Schlauchfilter',
	'Carbon monoxide in the fine-fuel silo': 'Kohlenmonoxid im Feinkohlesilo',
	People: 'Menschen',
	'Gas monitors bump-tested this shift': 'Gaswarngeräte in dieser Schicht mit Prüfgas getestet',
	'Test the personal monitor of everybody who goes to the plant, with gas, in front of the supervisor.':
		'Das persönliche Gaswarngerät von allen, die an die Anlage gehen, mit Gas vor dem Schichtleiter prüfen.',
	'Nitrogen has no smell. The monitor is the only one who notices.':
		'Stickstoff riecht nicht. Das Gaswarngerät ist das Einzige, das ihn bemerkt.',
	'Every monitor alarmed on its test gas.': 'Jedes Gaswarngerät alarmierte auf sein Prüfgas.',
	'The monitors have the sensor for the inert gas in use.':
		'Die Gaswarngeräte haben den Sensor für das verwendete Inertgas.',
	'Pairs and radio checks agreed': 'Zweiergruppen und Funkabfragen vereinbart',
	'Name who works with whom, and the interval of the radio check.':
		'Nennen, wer mit wem arbeitet, und den Abstand der Funkabfrage.',
	'Two people who both go in after the first are two victims.':
		'Zwei Menschen, die beide dem ersten nachgehen, sind zwei Opfer.',
	'Nobody works alone where gas can collect; the radio check runs.':
		'Niemand arbeitet allein, wo Gas sich sammeln kann; die Funkabfrage läuft.',
	Area: 'Bereich',
	'Rooms that can lose oxygen signed and alarmed': 'Räume, denen Sauerstoff fehlen kann, beschildert und überwacht',
	'Walk the rooms below and beside filter, silo and bundles and see sign and oxygen alarm working in each.':
		'Die Räume unter und neben Filter, Silo und Gasbündeln abgehen und in jedem Schild und Sauerstoffwarner funktionieren sehen.',
	'Leaked nitrogen collects where nobody expects it.':
		'Ausgetretener Stickstoff sammelt sich, wo niemand ihn erwartet.',
	'Each room has its sign, and its alarm answered the test.':
		'Jeder Raum hat sein Schild, und sein Warner sprach auf die Prüfung an.',
	'Fire-fighting and rescue ready, vent outlet clear': 'Brandbekämpfung und Rettung bereit, Abblasemündung frei',
	'Look at hoses, breathing sets and the outlet of the vent, and photograph the outlet.':
		'Schläuche, Atemschutzgeräte und die Abblasemündung ansehen und die Mündung fotografieren.',
	'What leaves the circuit must leave where nobody breathes it.':
		'Was den Kreislauf verlässt, muss ihn dort verlassen, wo niemand es atmet.',
	'The outlet of stack and vent, nobody and no air intake near it':
		'Die Mündung von Kamin und Abblaseleitung, niemand und keine Luftansaugung in ihrer Nähe',
	'Raw fuel': 'Rohbrennstoff',
	'Raw fuel seals the feeder': 'Rohbrennstoff dichtet die Aufgabe ab',
	'Read the level of the raw-fuel bin.': 'Den Füllstand des Rohkohlebunkers ablesen.',
	'The column of fuel is the only seal between circuit and open air at the feeder.':
		'Die Brennstoffsäule ist an der Aufgabe die einzige Abdichtung zwischen Kreislauf und freier Luft.',
	'Level of the raw-fuel bin': 'Füllstand des Rohkohlebunkers',
	'Doors and vents': 'Türen, Entlastung',
	'Doors and manholes shut and seen shut': 'Türen und Mannlöcher zu, am Ort gesehen',
	'Go to each door and manhole and put your hand on its bolts.':
		'An jede Tür und jedes Mannloch gehen und die Hand an die Schrauben legen.',
	'A door ajar is the largest leak of all, and it opens outward when the circuit explodes.':
		'Eine angelehnte Tür ist die größte Undichtheit von allen, und sie schlägt nach außen auf, wenn der Kreislauf explodiert.',
	'Mill door': 'Mühlentür',
	'shut and bolted': 'zu und verschraubt',
	open: 'offen',
	'Filter door': 'Filtertür',
	'Silo manhole': 'Silo-Mannloch',
	'Explosion vents, isolation and suppression armed': 'Druckentlastung, Entkopplung und Unterdrückung scharf',
	'Look at every vent from a place that it does not point at, and read the panel of isolation and suppression.':
		'Jede Druckentlastung von einer Stelle ansehen, auf die sie nicht zeigt, und die Tafel von Entkopplung und Unterdrückung lesen.',
	'They are what is left when everything below has failed.': 'Sie bleiben übrig, wenn alles darunter versagt hat.',
	'Explosion vent of the filter': 'Druckentlastung des Filters',
	'in place, sensor healthy': 'vorhanden, Fühler in Ordnung',
	operated: 'angesprochen',
	missing: 'fehlt',
	'Explosion vent of the silo': 'Druckentlastung des Silos',
	'Isolation between filter and silo': 'Entkopplung zwischen Filter und Silo',
	'armed, no fault': 'scharf, keine Störung',
	disarmed: 'unscharf',
	fault: 'Störung',
	'Suppression of the silo': 'Unterdrückung des Silos',
	Filter: 'Filter',
	'Filter earthed': 'Filter geerdet',
	'See the earthing of filter head, cages and bags, and read the date of its last measurement.':
		'Die Erdung von Filterkopf, Stützkörben und Schläuchen ansehen und das Datum ihrer letzten Messung lesen.',
	'A bag that is not earthed is charged by the dust it catches.':
		'Ein nicht geerdeter Schlauch lädt sich an dem Staub auf, den er fängt.',
	'Earthing complete, last measurement after the last bag change.':
		'Erdung vollständig, letzte Messung nach dem letzten Schlauchwechsel.',
	Auxiliaries: 'Nebenanlagen',
	'Dust discharge runs through to the silo': 'Staubaustrag läuft bis zum Silo durch',
	'Run rotary valve and screw below the hopper and see dust or nothing leave, not a plug.':
		'Zellenradschleuse und Schnecke unter dem Trichter laufen lassen und sehen, dass Staub oder nichts austritt, kein Pfropfen.',
	'A plugged hopper fills the filter with fuel within the hour.':
		'Ein verstopfter Trichter füllt den Filter binnen einer Stunde mit Brennstoff.',
	'Valve and screw turn, their speed monitors answer, the hopper is empty.':
		'Schleuse und Schnecke drehen, ihre Drehzahlwächter sprechen an, der Trichter ist leer.',
	'Foreign metal is caught': 'Fremdmetall wird gefangen',
	'Pass the test piece under detector and magnet.': 'Das Prüfstück unter Suchgerät und Magnet durchgeben.',
	'A bolt between the grinding elements is a spark in the finest dust of the plant.':
		'Eine Schraube zwischen den Mahlkörpern ist ein Funke im feinsten Staub der Anlage.',
	'Detector and magnet caught the test piece.': 'Suchgerät und Magnet fingen das Prüfstück.',
	'Lubrication in range': 'Schmierung im Bereich',
	'Read oil temperature and pressure with the pumps running.': 'Öltemperatur und Öldruck bei laufenden Pumpen ablesen.',
	'Cold oil does not reach the thrust bearing, and a hot bearing is an ignition source.':
		'Kaltes Öl erreicht das Spurlager nicht, und ein heißes Lager ist eine Zündquelle.',
	'Lubricating oil in the tank': 'Schmieröl im Behälter',
	'Lubricating oil after the filter': 'Schmieröl nach dem Filter',
	'Accumulator precharge': 'Vorspannung des Druckspeichers',
	'Read the precharge with the oil side empty and correct it to 20 degC by the table at the accumulator.':
		'Die Vorspannung bei leerer Ölseite ablesen und nach der Tafel am Druckspeicher auf 20 °C umrechnen.',
	'Without its gas the accumulator hammers, and the grinding elements with it.':
		'Ohne sein Gas hämmert der Druckspeicher, und die Mahlkörper mit ihm.',
	'Precharge, corrected to 20 degC': 'Vorspannung, auf 20 °C umgerechnet',
	'Cleaning gas and instrument air in range': 'Abreinigungsgas und Instrumentenluft im Bereich',
	'Read both headers at the filter head.': 'Beide Verteiler am Filterkopf ablesen.',
	'Bags that are not cleaned choke the flow; dampers without air go where their springs send them.':
		'Nicht abgereinigte Schläuche drosseln den Strom; Klappen ohne Luft gehen, wohin ihre Federn sie schicken.',
	'Cleaning gas is nitrogen and its pressure is in the green field of the gauge.':
		'Abreinigungsgas ist Stickstoff, und sein Druck steht im grünen Feld des Manometers.',
	'Instrument air is in the green field of the gauge.': 'Instrumentenluft steht im grünen Feld des Manometers.',
	'Line-up table': 'Stellungsliste',
	'Go to every element and write down the position that you see, not the one on the screen.':
		'An jede Armatur gehen und die Stellung aufschreiben, die man sieht, nicht die am Bildschirm.',
	'One damper that stands otherwise than believed turns the purge into a bypass.':
		'Eine einzige Klappe, die anders steht als geglaubt, macht aus dem Spülen einen Umweg.',
	'Hot-gas damper before the mill': 'Heißgasklappe vor der Mühle',
	shut: 'zu',
	'Fresh-air damper': 'Frischluftklappe',
	'Dilution-air damper': 'Verdünnungsluftklappe',
	'By-pass damper': 'Bypassklappe',
	'Stack damper': 'Kaminklappe',
	'automatic, open for purge': 'Automatik, offen zum Spülen',
	'Return-gas damper': 'Rückgasklappe',
	'Isolating damper after the mill': 'Absperrklappe nach der Mühle',
	'Fan inlet damper': 'Ventilator-Eintrittsklappe',
	'start position': 'Anfahrstellung',
	'Inert gas valve to the mill': 'Inertgasventil zur Mühle',
	'Inert gas valve to the filter hopper': 'Inertgasventil zum Filtertrichter',
	'Inert gas valve to the silo': 'Inertgasventil zum Silo',
	'Isolating valve of emergency inerting': 'Absperrventil der Notinertisierung',
	'open and locked': 'offen und verschlossen',
	'Rotary valve of the feeder': 'Zellenradschleuse der Aufgabe',
	stopped: 'steht',
	running: 'läuft',
	'Slide gate below the raw-fuel bin': 'Schieber unter dem Rohkohlebunker',
} as const;
