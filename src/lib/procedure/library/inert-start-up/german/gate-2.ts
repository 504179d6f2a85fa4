/** Purged and analysed. German beside the exact English words: a changed word shows its English until it is translated anew. */
export const GATE_2 = {
	Trips: 'Abschaltungen',
	'Oxygen trip proved end to end at each place': 'Sauerstoffabschaltung an jeder Stelle durchgehend nachgewiesen',
	'Put gas above the trip on each analyser and see feed, burner and mill trip.':
		'Auf jeden Analysator Gas über dem Abschaltwert geben und Aufgabe, Brenner und Mühle abschalten sehen.',
	'The oxygen limit may stand 2 % below the fuel limit only while this trip works.':
		'Der Sauerstoffgrenzwert darf nur so lange 2 % unter dem des Brennstoffs stehen, wie diese Abschaltung wirkt.',
	'AT-211 tripped feed, burner and mill, by test now or by a dated report inside its interval.':
		'AT-211 schaltete Aufgabe, Brenner und Mühle ab, jetzt durch Prüfung oder laut datiertem Bericht innerhalb seiner Frist.',
	'AT-212 did.': 'AT-212 ebenso.',
	'AT-213 did.': 'AT-213 ebenso.',
	'AT-214 did.': 'AT-214 ebenso.',
	'None of the four is bypassed.': 'Keiner der vier ist überbrückt.',
	'Stop the feed: without the trip the oxygen limit is the lower one.':
		'Aufgabe stoppen: ohne die Abschaltung gilt der niedrigere Sauerstoffgrenzwert.',
	'Every other trip proved end to end': 'Jede andere Abschaltung durchgehend nachgewiesen',
	'Simulate each trip at its switch or transmitter and see what it stops.':
		'Jede Abschaltung an ihrem Schalter oder Messumformer auslösen und sehen, was sie stoppt.',
	'A trip that was only seen on the screen has not been seen.':
		'Eine Abschaltung, die nur am Bildschirm gesehen wurde, ist nicht gesehen.',
	'Carbon monoxide: AT-231 and AT-232 tripped what they must.':
		'Kohlenmonoxid: AT-231 und AT-232 schalteten ab, was sie müssen.',
	'Temperature: TT-221 and TT-222 tripped what they must.':
		'Temperatur: TT-221 und TT-222 schalteten ab, was sie müssen.',
	'Fan stop tripped burner, mill and feed.': 'Ventilatorstillstand schaltete Brenner, Mühle und Aufgabe ab.',
	'Flame loss tripped the fuel of the burner.': 'Flammenausfall schaltete den Brennstoff des Brenners ab.',
	'The pressure differences of mill and filter tripped the feed.':
		'Die Differenzdrücke von Mühle und Filter schalteten die Aufgabe ab.',
	'Emergency inerting': 'Notinertisierung',
	'Emergency inerting proved end to end': 'Notinertisierung durchgehend nachgewiesen',
	'Fire it against its test valve, by each of its causes, and time the flow.':
		'Sie gegen ihr Prüfventil auslösen, durch jede ihrer Ursachen, und die Zeit bis zum Strom messen.',
	'It has one chance, and it comes without notice.': 'Sie hat eine einzige Gelegenheit, und die kommt unangemeldet.',
	'Every cause gave flow within the time of the hazard study.':
		'Jede Ursache brachte Strom binnen der Zeit der Gefährdungsstudie.',
	'Set points and software versions read back': 'Sollwerte und Programmstände zurückgelesen',
	'Print the set points from the controllers and compare them with the approved list, line by line.':
		'Die Sollwerte aus den Steuerungen drucken und Zeile für Zeile mit der genehmigten Liste vergleichen.',
	'A restart of a controller can bring back an old list.':
		'Der Neustart einer Steuerung kann eine alte Liste zurückbringen.',
	'Every set point is as approved.': 'Jeder Sollwert ist wie genehmigt.',
	'The versions are noted in this entry.': 'Die Stände sind in diesem Eintrag notiert.',
	'Emergency inerting in automatic, isolating valve open and locked':
		'Notinertisierung in Automatik, Absperrventil offen und verschlossen',
	'Stand before HV-24, put your hand on its lock, and photograph it with its tag.':
		'Vor HV-24 stehen, die Hand an sein Schloss legen und es mit seinem Schild fotografieren.',
	'A valve left shut after a drill is found by the next emergency.':
		'Ein nach einer Übung zu gelassenes Ventil findet der nächste Notfall.',
	'HV-24 open, its lock closed, its tag readable': 'HV-24 offen, sein Schloss geschlossen, sein Schild lesbar',
	'Stop the feed until emergency inerting is in automatic again.':
		'Aufgabe stoppen, bis die Notinertisierung wieder in Automatik ist.',
	'Oxygen analysers': 'O₂-Analysatoren',
	'Analyser AT-211, mill outlet': 'Analysator AT-211, Mühlenaustritt',
	'Give AT-211 zero gas, then check gas near 8 % oxygen, then air, and enter what it shows and how fast.':
		'AT-211 Nullgas geben, dann Prüfgas nahe 8 % Sauerstoff, dann Luft, und eintragen, was er zeigt und wie schnell.',
	'An analyser that was right at zero and at air can still be wrong where the decision falls.':
		'Ein Analysator, der bei null und bei Luft stimmt, kann dort falsch sein, wo die Entscheidung fällt.',
	'Error on zero gas, without its sign': 'Messabweichung auf Nullgas, ohne Vorzeichen',
	'Error on check gas near the limit, without its sign':
		'Messabweichung auf Prüfgas nahe dem Grenzwert, ohne Vorzeichen',
	'Reading on air': 'Anzeige auf Luft',
	'Transport lag': 'Transportverzug',
	'Time to 90 % of a step after it': 'Danach Zeit bis 90 % eines Sprungs',
	'Watch a checked portable at the same port, and have the analyser looked at.':
		'Ein geprüftes tragbares Gerät am selben Stutzen beobachten und den Analysator nachsehen lassen.',
	'Analyser AT-212, after the bag filter': 'Analysator AT-212, nach dem Schlauchfilter',
	'Give AT-212 zero gas, then check gas near 8 % oxygen, then air, and enter what it shows and how fast.':
		'AT-212 Nullgas geben, dann Prüfgas nahe 8 % Sauerstoff, dann Luft, und eintragen, was er zeigt und wie schnell.',
	'Analyser AT-213, filter hopper': 'Analysator AT-213, Filtertrichter',
	'Give AT-213 zero gas, then check gas near 8 % oxygen, then air, and enter what it shows and how fast.':
		'AT-213 Nullgas geben, dann Prüfgas nahe 8 % Sauerstoff, dann Luft, und eintragen, was er zeigt und wie schnell.',
	'Analyser AT-214, fine-fuel silo': 'Analysator AT-214, Feinkohlesilo',
	'Give AT-214 zero gas, then check gas near 8 % oxygen, then air, and enter what it shows and how fast.':
		'AT-214 Nullgas geben, dann Prüfgas nahe 8 % Sauerstoff, dann Luft, und eintragen, was er zeigt und wie schnell.',
	'Carbon monoxide analysers': 'CO-Analysatoren',
	'Analyser AT-231': 'Analysator AT-231',
	'Give AT-231 zero gas, then check gas, and enter the errors.':
		'AT-231 Nullgas geben, dann Prüfgas, und die Messabweichungen eintragen.',
	'Carbon monoxide is read to find a rise: the analyser must not drift by what it should find.':
		'Kohlenmonoxid wird gemessen, um einen Anstieg zu finden: der Analysator darf nicht um das driften, was er finden soll.',
	'Error on check gas, without its sign': 'Messabweichung auf Prüfgas, ohne Vorzeichen',
	'Analyser AT-232': 'Analysator AT-232',
	'Give AT-232 zero gas, then check gas, and enter the errors.':
		'AT-232 Nullgas geben, dann Prüfgas, und die Messabweichungen eintragen.',
	'Sample lines tight, checked through the probe': 'Probenahmeleitungen dicht, durch die Sonde geprüft',
	'With the sample line under its working suction, give air at the probe of each extractive analyser.':
		'Bei Betriebsunterdruck der Probenahmeleitung an der Sonde jedes extraktiven Analysators Luft aufgeben.',
	'A leak in the sample line reads high while the circuit is tight, and low when the leak draws nitrogen.':
		'Eine undichte Probenahmeleitung zeigt zu hoch, solange der Kreislauf dicht ist, und zu niedrig, wenn sie Stickstoff zieht.',
	'AT-213, air at its probe': 'AT-213, Luft an der Sonde',
	'AT-214, air at its probe': 'AT-214, Luft an der Sonde',
	'Fan flow': 'Gasstrom',
	Barometer: 'Barometer',
	'Read the barometer in the control room.': 'Das Barometer in der Warte ablesen.',
	'Every gas density needs an absolute pressure, and the weather changes it.':
		'Jede Gasdichte braucht einen absoluten Druck, und das Wetter ändert ihn.',
	'Inert gas stock': 'Inertgasvorrat',
	'Inert gas in stock': 'Inertgas im Vorrat',
	'Read the pressures of all bundles, take the content from their table, low side, and read the gas temperature.':
		'Die Drücke aller Bündel ablesen, den Inhalt aus ihrer Tafel nehmen, untere Seite, und die Gastemperatur ablesen.',
	'What the header can no longer give at its least pressure is not stock.':
		'Was der Verteiler bei seinem geringsten Druck nicht mehr abgeben kann, ist kein Vorrat.',
	'Inert gas header': 'Inertgasverteiler',
	'Usable content, emergency reserve included': 'Nutzbarer Inhalt, Notreserve eingeschlossen',
	'Gas in the circuit': 'Gas im Kreislauf',
	'Order gas now; at the reserve, stop the feed.': 'Jetzt Gas bestellen; an der Reserve die Aufgabe stoppen.',
	'Stock lasts for the purge and one repeat': 'Vorrat reicht für das Spülen und eine Wiederholung',
	'Run the plan of the purge with the stock that was read.': 'Den Plan des Spülens mit dem abgelesenen Vorrat rechnen.',
	'A purge that runs out of gas half-way has to begin again with less.':
		'Ein Spülen, dem unterwegs das Gas ausgeht, muss mit weniger von vorn beginnen.',
	'assumed: a fan-driven loop with dead legs': 'angenommen: vom Ventilator umgewälzter Kreislauf mit Toträumen',
	'not proved': 'nicht nachgewiesen',
	'Emergency inert gas': 'Notinertgas',
	'Emergency vessel': 'Notbehälter',
	'Read the pressure of the emergency vessel at the vessel.': 'Den Druck des Notbehälters am Behälter ablesen.',
	'The reserve is for the emergency, never for the purge.': 'Die Reserve ist für den Notfall, nie für das Spülen.',
	'Emergency inert gas vessel': 'Notinertgasbehälter',
	'Stop the feed until the vessel is full again.': 'Aufgabe stoppen, bis der Behälter wieder voll ist.',
	'Seal gas': 'Sperrgas',
	'Seal gas with its margin at every seal': 'Sperrgas mit seinem Abstand an jeder Dichtung',
	'Set seal gas on and read the difference to the process gas at every seal.':
		'Sperrgas anstellen und an jeder Dichtung die Differenz zum Prozessgas ablesen.',
	'A seal without its gas lets dust into the bearing and air into the circuit.':
		'Eine Dichtung ohne ihr Gas lässt Staub ins Lager und Luft in den Kreislauf.',
	'Mill rollers': 'Mahlwalzen',
	'Fan shaft': 'Ventilatorwelle',
	'Silo discharge': 'Siloaustrag',
	Purge: 'Spülen',
	'Way out open': 'Weg ins Freie offen',
	'See the stack damper HV-15 open at the damper, and gas able to leave.':
		'Die Kaminklappe HV-15 an der Klappe offen sehen, und dass Gas abziehen kann.',
	'Gas that cannot leave cannot be replaced.': 'Gas, das nicht hinaus kann, kann nicht ersetzt werden.',
	'HV-15 stands open.': 'HV-15 steht offen.',
	'Fan at its least flow': 'Ventilator auf seinem geringsten Strom',
	'Start the process-gas fan at its least speed, wait until it holds, and read the Venturi.':
		'Den Prozessgasventilator auf seiner geringsten Drehzahl starten, warten, bis er hält, und das Venturirohr ablesen.',
	'Only the flow of the fan carries inert gas into every corner that the circuit gas sweeps.':
		'Nur der Strom des Ventilators trägt Inertgas in jede Ecke, die das Kreislaufgas durchspült.',
	'Pressure difference of the Venturi': 'Differenzdruck des Venturirohrs',
	'Pressure at the Venturi inlet': 'Druck am Eintritt des Venturirohrs',
	'Temperature at the Venturi inlet': 'Temperatur am Eintritt des Venturirohrs',
	'Flow as the screen shows it': 'Strom, wie der Bildschirm ihn zeigt',
	'Stop the feed, inert gas on.': 'Aufgabe stoppen, Inertgas an.',
	'Flow by the Venturi': 'Strom nach dem Venturirohr',
	'Run the Venturi with the readings of the step before and compare with the screen.':
		'Das Venturirohr mit den Messwerten des vorigen Schritts rechnen und mit dem Bildschirm vergleichen.',
	'The factor in the control system belongs to another temperature and another gas.':
		'Der Faktor im Leitsystem gehört zu einer anderen Temperatur und einem anderen Gas.',
	'between air and nitrogen, wherever in the purge it is read: U spans both':
		'zwischen Luft und Stickstoff, wann immer beim Spülen abgelesen: U umfasst beide',
	'no fuel has been fed': 'es wurde kein Brennstoff aufgegeben',
	'measured against the drawing at erection': 'bei der Montage gegen die Zeichnung gemessen',
	'Velocity in the duct': 'Geschwindigkeit im Kanal',
	'Take the mean velocity from the same calculation.': 'Die mittlere Geschwindigkeit aus derselben Rechnung nehmen.',
	'Below it dust settles in the long ducts, and settled dust is what burns first.':
		'Darunter setzt sich Staub in den langen Kanälen ab, und abgelagerter Staub brennt zuerst.',
	'Filter cleaning runs': 'Filterabreinigung läuft',
	'Start the filter cleaning in its cycle.': 'Die Filterabreinigung in ihrem Zyklus starten.',
	'Gas held between the bags leaves only when each row is cleaned.':
		'Gas zwischen den Schläuchen zieht erst ab, wenn jede Reihe abgereinigt wird.',
	'The cleaning steps from row to row.': 'Die Abreinigung schaltet von Reihe zu Reihe.',
	'Inert gas on to every enclosed volume': 'Inertgas an jedem eingeschlossenen Raum an',
	'Open the inert gas valves one after the other and see flow on each.':
		'Die Inertgasventile nacheinander öffnen und an jedem Strom sehen.',
	'A volume that no gas enters keeps its air, whatever the circuit reads.':
		'Ein Raum, in den kein Gas eintritt, behält seine Luft, was immer der Kreislauf zeigt.',
	'Inert gas to the by-pass duct between its shut dampers':
		'Inertgas zum Bypasskanal zwischen seinen geschlossenen Klappen',
	'Inert gas to the raw-fuel chute': 'Inertgas zur Rohkohleschurre',
	'Each damper of the next gates stroked once': 'Jede Klappe der nächsten Stufen einmal durchgefahren',
	'Move HV-16, HV-17 and HV-18 once over their whole way and back.':
		'HV-16, HV-17 und HV-18 einmal über ihren ganzen Weg und zurück fahren.',
	'A damper that moves later lets out what it hid; it shall do that during the purge.':
		'Eine Klappe, die später fährt, lässt heraus, was sie verbarg; das soll sie während des Spülens tun.',
	'HV-16 went through and came back.': 'HV-16 fuhr durch und kam zurück.',
	'HV-17 did.': 'HV-17 ebenso.',
	'HV-18 did.': 'HV-18 ebenso.',
	Suction: 'Unterdruck',
	'Mill inlet suction under control': 'Unterdruck am Mühleneintritt geregelt',
	'Put the suction controller in automatic and read it after two minutes.':
		'Den Unterdruckregler auf Automatik stellen und nach zwei Minuten ablesen.',
	'The leak grows with the root of the suction, and an in-leakage means nothing without it.':
		'Die Falschluft wächst mit der Wurzel des Unterdrucks, und ohne ihn sagt sie nichts.',
	'Suction at the mill inlet': 'Unterdruck am Mühleneintritt',
	'Oxygen at every place during the purge': 'Sauerstoff an jeder Stelle während des Spülens',
	'Record all four places, the inert gas meter and the fan flow without a gap until every place has held its limit.':
		'Alle vier Stellen, den Inertgaszähler und den Ventilatorstrom lückenlos aufzeichnen, bis jede Stelle ihren Grenzwert gehalten hat.',
	'The worst place decides, not the mean, and the worst is known only when all are read.':
		'Die schlechteste Stelle entscheidet, nicht das Mittel, und die schlechteste kennt man erst, wenn alle abgelesen sind.',
	'All places once, with the mode of each analyser': 'Alle Stellen einmal, mit der Betriebsart jedes Analysators',
	'Go to each analyser, see that it measures, and read it.':
		'An jeden Analysator gehen, sehen, dass er misst, und ihn ablesen.',
	'An analyser in hold shows the best value of the night for ever.':
		'Ein Analysator, der den Wert hält, zeigt für immer den besten Wert der Nacht.',
	'Oxygen, mill outlet': 'Sauerstoff, Mühlenaustritt',
	'Oxygen, after the bag filter': 'Sauerstoff, nach dem Schlauchfilter',
	'Oxygen, filter hopper': 'Sauerstoff, Filtertrichter',
	'Oxygen, fine-fuel silo': 'Sauerstoff, Feinkohlesilo',
	'Way out still open': 'Weg ins Freie noch offen',
	'See HV-15 open at the end of the hold, by the person who saw it before.':
		'HV-15 am Ende der Haltezeit offen sehen, durch die Person, die sie zuvor sah.',
	'What nobody watched may have shut in between.': 'Was niemand beobachtete, kann inzwischen zugegangen sein.',
	'HV-15 stood open all the time; its position never left the end.':
		'HV-15 stand die ganze Zeit offen; ihre Stellung verließ nie das Ende.',
	'Coverage of every enclosed volume': 'Abdeckung jedes eingeschlossenen Raums',
	'Say for each volume how it was purged; where no analyser reads it, read its outlet with a checked portable.':
		'Für jeden Raum sagen, wie er gespült wurde; wo kein Analysator ihn misst, am Austritt mit einem geprüften tragbaren Gerät messen.',
	'Four analysers read four places. The other volumes explode as well.':
		'Vier Analysatoren messen vier Stellen. Die anderen Räume explodieren genauso.',
	'its own inert gas connection between the shut dampers':
		'eigener Inertgasanschluss zwischen den geschlossenen Klappen',
	'its own inert gas connection above the rotary valve': 'eigener Inertgasanschluss über der Zellenradschleuse',
	'Judgement on the purge': 'Urteil über das Spülen',
	'Run the purge adequacy and read every reason that it gives.':
		'Den Rechner für das Spülen ausführen und jeden Grund lesen, den er nennt.',
	'A timer that ran out proves a timer. Readings, coverage and flow without a gap prove a purge.':
		'Eine abgelaufene Uhr beweist eine Uhr. Messwerte, Abdeckung und Strom ohne Lücke beweisen ein Spülen.',
	'Stop the feed, inert gas on: the circuit has to be purged again.':
		'Aufgabe stoppen, Inertgas an: der Kreislauf muss neu gespült werden.',
	'Oxygen watch': 'Sauerstoff\u00adüberwachung',
	'Oxygen watch at all places': 'Sauerstoffüberwachung an allen Stellen',
	'Read all four places again and see that fan and inert gas flow never broke.':
		'Alle vier Stellen noch einmal ablesen und sehen, dass Ventilator- und Inertgasstrom nie abrissen.',
	'A purge is a statement about its time. The watch carries it to the feed release.':
		'Ein Spülen ist eine Aussage über seine Zeit. Die Überwachung trägt sie bis zur Freigabe der Aufgabe.',
	'In-leakage': 'Falschluft',
	'In-leakage at the suction of the purge': 'Falschluft beim Unterdruck des Spülens',
	'Take the in-leakage from the floor that the purge settled at, together with its suction.':
		'Die Falschluft aus dem Endwert nehmen, auf den sich das Spülen einstellte, zusammen mit seinem Unterdruck.',
	'The leak decides how much oxygen the running circuit will hold.':
		'Die Falschluft entscheidet, wie viel Sauerstoff der laufende Kreislauf halten wird.',
} as const;
