/** Self-inert running, hand-over; conditions, plant events, start types. German beside the exact English words: a changed word shows its English until it is translated anew. */
export const GATES_6_AND_7 = {
	'First feed': 'Erste Aufgabe',
	'Nobody at mill, filter or vents': 'Niemand an Mühle, Filter oder Druckentlastungen',
	'Ask the signaller and give the warning tone before the drive starts.':
		'Den Posten fragen und den Warnton geben, bevor der Antrieb startet.',
	'Drive and first feed are the minutes in which it happens.':
		'Antrieb und erste Aufgabe sind die Minuten, in denen es geschieht.',
	'The signaller answered: nobody.': 'Der Posten antwortete: niemand.',
	'Drive on, elements lifted, and first feed': 'Antrieb ein, Mahlkörper angehoben, und erste Aufgabe',
	'Start classifier, then main drive, then feed inside the empty running time of the supplier, and read the feed.':
		'Sichter, dann Hauptantrieb, dann Aufgabe innerhalb der Leerlaufzeit des Lieferanten starten und die Aufgabe ablesen.',
	'An empty mill shakes itself; too much first feed chokes it.':
		'Eine leere Mühle schüttelt sich; zu viel erste Aufgabe verstopft sie.',
	'Fuel feed': 'Brennstoffaufgabe',
	'Time empty': 'Zeit im Leerlauf',
	'Elements lowered when the bed is seen': 'Mahlkörper abgesenkt, sobald das Mahlbett zu sehen ist',
	'Wait until the pressure difference of the mill shows a bed, then lower the elements.':
		'Warten, bis der Differenzdruck der Mühle ein Mahlbett zeigt, dann die Mahlkörper absenken.',
	'Elements on a bare table strike sparks.': 'Mahlkörper auf blankem Teller schlagen Funken.',
	'The pressure difference rose and held before the elements came down.':
		'Der Differenzdruck stieg und hielt, bevor die Mahlkörper herunterkamen.',
	'All elements are down.': 'Alle Mahlkörper sind unten.',
	'Mill running': 'Mühle läuft',
	'Working pressure and vibration': 'Arbeitsdruck und Schwingung',
	'Set the working pressure and read it with the vibration.':
		'Den Arbeitsdruck einstellen und mit der Schwingung ablesen.',
	'The two together say whether the bed carries.': 'Beide zusammen sagen, ob das Mahlbett trägt.',
	'Self-inert running': 'Selbstinerter Betrieb',
	'Inert gas to the circuit taken off': 'Inertgas vom Kreislauf genommen',
	'Shut HV-21 and HV-22 slowly and note the time; leave HV-23 to the storage open.':
		'HV-21 und HV-22 langsam schließen und die Zeit notieren; HV-23 zum Silo offen lassen.',
	'From here on flue gas and evaporated water hold the oxygen down, or they do not.':
		'Von hier an halten Rauchgas und verdampftes Wasser den Sauerstoff unten, oder sie tun es nicht.',
	'HV-21 and HV-22 are shut.': 'HV-21 und HV-22 sind zu.',
	'HV-23 is open, and the silo has its flow.': 'HV-23 ist offen, und das Silo hat seinen Strom.',
	'Oxygen in its band for 30 min without inert gas to the circuit':
		'Sauerstoff 30 min ohne Inertgas zum Kreislauf in seinem Band',
	'Read all places over 30 min and enter the highest value of each.':
		'Alle Stellen über 30 min ablesen und von jeder den höchsten Wert eintragen.',
	'Moist oxygen rises when evaporation falls: the band must hold by itself.':
		'Feuchter Sauerstoff steigt, wenn die Verdampfung sinkt: das Band muss von selbst halten.',
	'Inert gas to the circuit on, now.': 'Inertgas zum Kreislauf an, jetzt.',
	Balance: 'Bilanz',
	'Predicted and measured oxygen agree': 'Vorhergesagter und gemessener Sauerstoff stimmen überein',
	'Compare the oxygen of the flue gas balance with the highest place, and enter the difference without its sign.':
		'Den Sauerstoff der Rauchgasbilanz mit der höchsten Stelle vergleichen und die Differenz ohne Vorzeichen eintragen.',
	'A balance that does not close has a leak in it that nobody has found.':
		'Eine Bilanz, die nicht aufgeht, hat eine Undichtheit, die niemand gefunden hat.',
	'Predicted less measured oxygen, without its sign': 'Vorhergesagter minus gemessener Sauerstoff, ohne Vorzeichen',
	'Mill outlet': 'Mühlenaustritt',
	'False air across mill and filter': 'Falschluft über Mühle und Filter',
	'Work out the false air from the oxygen before and after, and enter it with the suction.':
		'Die Falschluft aus dem Sauerstoff davor und danach ausrechnen und mit dem Unterdruck eintragen.',
	'It is the leak at this suction; at another it is another.':
		'Es ist die Falschluft bei diesem Unterdruck; bei einem anderen ist es eine andere.',
	'False air, relative to the gas before': 'Falschluft, bezogen auf das Gas davor',
	'No rise of carbon monoxide found in 30 min': 'Kein Anstieg von Kohlenmonoxid in 30 min gefunden',
	'Read both places at the beginning and at the end of 30 min and enter the rise.':
		'Beide Stellen am Anfang und am Ende von 30 min ablesen und den Anstieg eintragen.',
	'It names what was found at two places in that time. It does not exclude a smouldering nest.':
		'Es nennt, was an zwei Stellen in dieser Zeit gefunden wurde. Es schließt ein Glutnest nicht aus.',
	'Pressure differences and vibration hold': 'Differenzdrücke und Schwingung halten',
	'Read them after 30 min of unchanged feed.': 'Sie nach 30 min unveränderter Aufgabe ablesen.',
	'A difference that creeps is a filter that blinds or a mill that fills.':
		'Ein Differenzdruck, der kriecht, ist ein Filter, der zusetzt, oder eine Mühle, die sich füllt.',
	'Pressure difference of the mill': 'Differenzdruck der Mühle',
	'Pressure difference of the bag filter': 'Differenzdruck des Schlauchfilters',
	Deviations: 'Abweichungen',
	'Deviations dispositioned': 'Abweichungen entschieden',
	'Go through the list of deviations and see an owner and a disposition on each.':
		'Die Liste der Abweichungen durchgehen und bei jeder Zuständigen und Entscheidung sehen.',
	'What is handed over without a word is found again in the next trip.':
		'Was wortlos übergeben wird, findet sich bei der nächsten Abschaltung wieder.',
	'Every deviation has a disposition, and none blocks the hand-over.':
		'Jede Abweichung hat eine Entscheidung, und keine sperrt die Übergabe.',
	Analysers: 'Analysatoren',
	'Oxygen analysers as found': 'Sauerstoffanalysatoren vor Justierung',
	'Give each analyser its check gas before anybody adjusts it, and enter the error without its sign.':
		'Jedem Analysator sein Prüfgas geben, bevor jemand ihn justiert, und die Messabweichung ohne Vorzeichen eintragen.',
	'Every proof of this night rests on what they were, not on what they are after adjustment.':
		'Jeder Nachweis dieser Nacht beruht auf dem, was sie waren, nicht auf dem, was sie nach der Justierung sind.',
	'AT-211, mill outlet: error as found': 'AT-211, Mühlenaustritt: Messabweichung vor Justierung',
	'AT-212, after the bag filter: error as found': 'AT-212, nach dem Schlauchfilter: Messabweichung vor Justierung',
	'AT-213, filter hopper: error as found': 'AT-213, Filtertrichter: Messabweichung vor Justierung',
	'AT-214, fine-fuel silo: error as found': 'AT-214, Feinkohlesilo: Messabweichung vor Justierung',
	'Emergency reserve restored': 'Notreserve wiederhergestellt',
	'Read vessel and bundles after refilling.': 'Behälter und Bündel nach dem Füllen ablesen.',
	'The next standstill begins with what is in them now.':
		'Der nächste Stillstand beginnt mit dem, was jetzt darin ist.',
	'Emergency inert gas, counted apart': 'Notinertgas, getrennt gezählt',
	Standstill: 'Stillstand',
	'Standstill instruction handed over': 'Stillstandsanweisung übergeben',
	'Read the standstill instruction aloud with the person who takes over.':
		'Die Stillstandsanweisung mit der Person, die übernimmt, laut lesen.',
	'A mill with fuel in it is watched for as long as it stands.':
		'Eine Mühle mit Brennstoff wird überwacht, solange sie steht.',
	'Carbon monoxide monitoring stays on whenever the unit stands with fuel in it.':
		'Die Überwachung des Kohlenmonoxids bleibt an, wann immer die Anlage mit Brennstoff steht.',
	'Storage keeps its inert gas until it is empty.': 'Das Silo behält sein Inertgas, bis es leer ist.',
	Witness: 'Zeuge',
	'Operation witnesses the running unit': 'Der Betrieb bezeugt die laufende Anlage',
	'Invite the head of operation, and record attendance or waiver.':
		'Den Betriebsleiter einladen und Anwesenheit oder Verzicht aufzeichnen.',
	'Who takes over has seen it run.': 'Wer übernimmt, hat sie laufen sehen.',
	'Head of operation of the lime works': 'Betriebsleiter des Kalkwerks',
	'Every place was read within 30 min, at most 7.7 % moist, and the fan has not stopped':
		'Jede Stelle binnen 30 min abgelesen, höchstens 7,7 % feucht, und der Ventilator stand nicht',
	'Every place was read within 10 min, at most 7.7 % moist, fan, inert gas and oxygen trip as proved':
		'Jede Stelle binnen 10 min abgelesen, höchstens 7,7 % feucht, Ventilator, Inertgas und Sauerstoffabschaltung wie nachgewiesen',
	'Process-gas fan stopped': 'Prozessgasventilator stand still',
	'Is there fuel inside?': 'Ist Brennstoff im Inneren?',
	'Is inert gas on?': 'Ist Inertgas an?',
	'Process-gas fan stopped, within the allowance': 'Prozessgasventilator stand still, innerhalb der Nachsicht',
	'Damper of the circuit moved': 'Klappe des Kreislaufs bewegt',
	'Gas flow raised': 'Gasstrom erhöht',
	'Burner air reached the loop, or nobody can say that it did not':
		'Brennerluft kam in den Kreislauf, oder niemand kann das Gegenteil sagen',
	'Stop the burner air.': 'Die Brennerluft stoppen.',
	'Is HV-11 shut? Look at the damper.': 'Ist HV-11 zu? Die Klappe ansehen.',
	'Burner chamber purged to the stack, HV-11 seen shut': 'Brennerkammer zum Kamin vorbelüftet, HV-11 am Ort zu gesehen',
	'Burner tripped': 'Brenner abgeschaltet',
	'Did burner air reach the loop?': 'Kam Brennerluft in den Kreislauf?',
	'Fuel feed stopped': 'Brennstoffaufgabe stand still',
	'Is inert gas back on?': 'Ist Inertgas wieder an?',
	'Fuel feed stopped for longer than 15 min': 'Brennstoffaufgabe länger als 15 min gestanden',
	'Mill tripped, no fuel inside': 'Mühle abgeschaltet, kein Brennstoff im Inneren',
	'Keep inert gas on.': 'Inertgas an lassen.',
	'Keep people away from mill, filter and vents.': 'Menschen von Mühle, Filter und Druckentlastungen fernhalten.',
	'Mill tripped with fuel inside': 'Mühle mit Brennstoff im Inneren abgeschaltet',
	'No fan, no burner air, no door.': 'Kein Ventilator, keine Brennerluft, keine Tür.',
	'Plant item opened up': 'Anlagenteil geöffnet',
	'Nitrogen and carbon dioxide asphyxiate without warning: gas test and permit before anyone comes near.':
		'Stickstoff und Kohlendioxid ersticken ohne Warnung: Gasmessung und Erlaubnisschein, bevor sich jemand nähert.',
	'Inert gas lost, at low pressure or off purity': 'Inertgas ausgefallen, mit zu wenig Druck oder Reinheit',
	'Stop before the purge is lost.': 'Anhalten, bevor das Spülen verloren ist.',
	'Emergency inerting operated, real or drill': 'Notinertisierung hat ausgelöst, echt oder Übung',
	'Evacuate.': 'Räumen.',
	'Explosion vent, isolation or suppression operated or disarmed':
		'Druckentlastung, Entkopplung oder Unterdrückung angesprochen oder unscharf',
	'Nobody near.': 'Niemand in der Nähe.',
	'Power or control-system dip, restart or forced signal':
		'Spannungseinbruch, Neustart des Leitsystems oder gesetztes Signal',
	'Instrument air lost': 'Instrumentenluft ausgefallen',
	'Seal gas lost': 'Sperrgas ausgefallen',
	'Dust discharge stopped': 'Staubaustrag stand still',
	'Filter hopper high': 'Filtertrichter hoch',
	'Filter bag broken': 'Filterschlauch gerissen',
	'Unburnt gas in the loop: failed ignition, or flame lost with gas on':
		'Brenngase im Kreislauf: Zündung misslungen oder Flamme bei offenem Gas verloren',
	'The limit of the gas applies, about 5 % oxygen: the dust limits no longer hold.':
		'Der Grenzwert des Gases gilt, etwa 5 % Sauerstoff: die Grenzwerte des Staubs gelten nicht mehr.',
	'Do not change the fan speed.': 'Die Ventilatordrehzahl nicht ändern.',
	'No second ignition before the burner has purged again.':
		'Keine zweite Zündung, bevor der Brenner neu vorbelüftet ist.',
	'High temperature, alarm or trip': 'Hohe Temperatur, Alarm oder Abschaltung',
	'Leave the area.': 'Den Bereich verlassen.',
	'Carbon monoxide, alarm or trip': 'Kohlenmonoxid, Alarm oder Abschaltung',
	'Oxygen in the circuit, alarm or trip': 'Sauerstoff im Kreislauf, Alarm oder Abschaltung',
	'Inert gas on.': 'Inertgas an.',
	'Personal gas monitor alarmed': 'Persönliches Gaswarngerät alarmierte',
	'Count the people.': 'Die Menschen zählen.',
	'Analyser fault': 'Analysator gestört',
	'Read the place with a checked portable at the same port.':
		'Die Stelle mit einem geprüften tragbaren Gerät am selben Stutzen messen.',
	'Fuel changed': 'Brennstoff gewechselt',
	'Protective function bypassed': 'Schutzfunktion überbrückt',
	'Shift handed over without confirming the temporary states':
		'Schicht übergeben, ohne die vorübergehenden Zustände zu bestätigen',
	'First start after erection': 'Erstes Anfahren nach der Montage',
	'After overhaul': 'Nach einer Überholung',
	'After an item was opened up': 'Nachdem ein Anlagenteil geöffnet war',
	'After a standstill with fuel inside, nothing opened':
		'Nach einem Stillstand mit Brennstoff im Inneren, nichts geöffnet',
	'After a trip, nothing opened': 'Nach einer Abschaltung, nichts geöffnet',
	'After a drill of emergency inerting, nothing opened': 'Nach einer Übung der Notinertisierung, nichts geöffnet',
} as const;
