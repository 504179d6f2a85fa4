/** Mill ready, warm and dry, feed release. German beside the exact English words: a changed word shows its English until it is translated anew. */
export const GATES_3_TO_5 = {
	'Grinding elements': 'Mahlkörper',
	'Hydraulic pressure with the elements lifted': 'Hydraulikdruck bei angehobenen Mahlkörpern',
	'Lift the grinding elements and read the pressure.': 'Die Mahlkörper anheben und den Druck ablesen.',
	'Elements that lie on the table grind steel on steel.':
		'Mahlkörper, die auf dem Teller liegen, mahlen Stahl auf Stahl.',
	'Hydraulic pressure': 'Hydraulikdruck',
	'Lift seen at the mill, drive locked out': 'Anheben an der Mühle gesehen, Antrieb gesichert',
	'Lock out the main drive, then look at the position marks of every grinding element.':
		'Den Hauptantrieb gegen Einschalten sichern, dann die Stellungsmarken jedes Mahlkörpers ansehen.',
	'The screen shows a pressure; the mark shows the lift.':
		'Der Bildschirm zeigt einen Druck; die Marke zeigt das Anheben.',
	'The drive was locked out while I stood at the mill.': 'Der Antrieb war gesichert, während ich an der Mühle stand.',
	'Every element stands at its upper mark.': 'Jeder Mahlkörper steht an seiner oberen Marke.',
	'Short turn': 'Kurzes Drehen',
	'Lubrication while the drive turns': 'Schmierung bei drehendem Antrieb',
	'Start the auxiliary drive and read oil pressure and temperature.':
		'Den Hilfsantrieb starten und Öldruck und Öltemperatur ablesen.',
	'The first turn shows whether oil reaches what it must reach.':
		'Die erste Umdrehung zeigt, ob Öl erreicht, was es erreichen muss.',
	'Short turn of table and classifier': 'Kurzes Drehen von Teller und Sichter',
	'Turn the table with the auxiliary drive and run the classifier through its speeds.':
		'Den Teller mit dem Hilfsantrieb drehen und den Sichter durch seine Drehzahlen fahren.',
	'A rubbing classifier is warm steel in the dust.': 'Ein streifender Sichter ist warmer Stahl im Staub.',
	'The table turned without touching.': 'Der Teller drehte, ohne zu berühren.',
	'The classifier followed its set point up and down.': 'Der Sichter folgte seinem Sollwert hinauf und hinunter.',
	'Vibration of the short turn': 'Schwingung beim kurzen Drehen',
	'Read the vibration while table and classifier turn.': 'Die Schwingung ablesen, während Teller und Sichter drehen.',
	'What shakes empty breaks loaded.': 'Was leer rüttelt, bricht unter Last.',
	'Vibration of the mill gearbox': 'Schwingung des Mühlengetriebes',
	'Carbon monoxide': 'Kohlenmonoxid',
	'No rise of carbon monoxide found with gas moving': 'Kein Anstieg von Kohlenmonoxid bei bewegtem Gas gefunden',
	'Read both places at the beginning and at the end of 10 min with gas moving and enter the rise.':
		'Beide Stellen am Anfang und am Ende von 10 min mit bewegtem Gas ablesen und den Anstieg eintragen.',
	'Dilution hides a rise while the purge runs, so this makes no statement about the time before. It does not exclude a smouldering nest.':
		'Verdünnung verdeckt einen Anstieg, solange gespült wird; über die Zeit davor sagt dies nichts. Es schließt ein Glutnest nicht aus.',
	'Carbon monoxide after the bag filter, at the end': 'Kohlenmonoxid nach dem Schlauchfilter, am Ende',
	'Rise at AT-231': 'Anstieg an AT-231',
	'Carbon monoxide in the fine-fuel silo, at the end': 'Kohlenmonoxid im Feinkohlesilo, am Ende',
	'Rise at AT-232': 'Anstieg an AT-232',
	Burner: 'Brenner',
	'Burner purge kept out of the loop': 'Vorbelüftung des Brenners aus dem Kreislauf gehalten',
	'See the hot-gas damper shut at the damper and on its limit switch, then let the burner management purge to the stack.':
		'An der Klappe und an ihrem Endschalter sehen, dass die Heißgasklappe zu ist, dann die Brennersteuerung zum Kamin vorbelüften lassen.',
	'The burner purges with air. Air in the loop undoes the purge of Gate 2.':
		'Der Brenner belüftet mit Luft. Luft im Kreislauf macht das Spülen der Stufe 2 zunichte.',
	'I saw HV-11 shut at the damper.': 'Ich sah HV-11 an der Klappe zu.',
	'Its limit switch said so too.': 'Ihr Endschalter sagte es auch.',
	'The way to the stack was open.': 'Der Weg zum Kamin war offen.',
	'Purge and burner checks of the burner management are complete.':
		'Vorbelüftung und Brennerprüfungen der Brennersteuerung sind vollständig.',
	'Stop the feed; was air let into the loop?': 'Aufgabe stoppen; kam Luft in den Kreislauf?',
	'Ignition burner lit': 'Zündbrenner gezündet',
	'Light the ignition burner and see its flame through the port.':
		'Den Zündbrenner zünden und seine Flamme durch das Schauglas sehen.',
	'A flame signal can be daylight; a flame cannot.': 'Ein Flammensignal kann Tageslicht sein; eine Flamme nicht.',
	'I saw the flame, and the flame signal holds.': 'Ich sah die Flamme, und das Flammensignal hält.',
	'It lit at the first try, or the burner purged again before the second.':
		'Er zündete beim ersten Versuch, oder vor dem zweiten wurde der Brenner neu vorbelüftet.',
	'Warm-up': 'Aufwärmen',
	'Chamber and circuit warm enough for the main burner': 'Heißgaskammer und Kreislauf warm genug für den Hauptbrenner',
	'Read chamber and filter outlet before the main burner is enabled.':
		'Heißgaskammer und Filteraustritt ablesen, bevor der Hauptbrenner freigegeben wird.',
	'A main flame in a cold chamber goes out and leaves its gas unburnt.':
		'Eine Hauptflamme in kalter Kammer erlischt und lässt ihr Gas unverbrannt zurück.',
	'Hot gas chamber': 'Heißgaskammer',
	'After the bag filter': 'Nach dem Schlauchfilter',
	'Main flame proved, no unburnt gas found': 'Hauptflamme nachgewiesen, keine Brenngase gefunden',
	'Light the main burner, see its flame, and read carbon monoxide at the first place after it.':
		'Den Hauptbrenner zünden, seine Flamme sehen und an der ersten Stelle danach Kohlenmonoxid ablesen.',
	'With unburnt gas in the loop the limit is that of the gas, about 5 % oxygen, not that of the dust.':
		'Mit Brenngasen im Kreislauf gilt der Grenzwert des Gases, etwa 5 % Sauerstoff, nicht der des Staubs.',
	'Gas flow for warm-up': 'Gasstrom zum Aufwärmen',
	'Raise the fan slowly to about 70 % of the largest flow and read it.':
		'Den Ventilator langsam auf etwa 70 % des größten Stroms fahren und ablesen.',
	'Heat without flow is a hot spot.': 'Wärme ohne Strom ist eine heiße Stelle.',
	'Process gas flow': 'Prozessgasstrom',
	Oxygen: 'Sauerstoff',
	'Oxygen again at this flow and suction': 'Sauerstoff noch einmal bei diesem Strom und Unterdruck',
	'Read all places and the suction after the flow has been raised.':
		'Alle Stellen und den Unterdruck ablesen, nachdem der Strom erhöht wurde.',
	'More flow means more suction, and more suction draws in more air.':
		'Mehr Strom heißt mehr Unterdruck, und mehr Unterdruck zieht mehr Luft herein.',
	'Mill outlet held at its warm-up temperature': 'Mühlenaustritt auf Aufwärmtemperatur gehalten',
	'Hold the outlet temperature for 15 min by the controller and enter the lowest value.':
		'Die Austrittstemperatur 15 min mit dem Regler halten und den niedrigsten Wert eintragen.',
	'The first cold fuel takes the circuit down; it must start from above.':
		'Der erste kalte Brennstoff zieht den Kreislauf hinunter; er muss von oben beginnen.',
	'Mill outlet, lowest in the hold': 'Mühlenaustritt, niedrigster Wert der Haltezeit',
	'Dew point': 'Taupunkt',
	'Coldest walls, and the moisture that feed will bring':
		'Kälteste Wände, und die Feuchte, die die Aufgabe bringen wird',
	'Read the three named walls, and take the present and the predicted moisture from the heat balance.':
		'Die drei genannten Wände ablesen und die jetzige und die vorhergesagte Feuchte aus der Wärmebilanz nehmen.',
	'Not the gas but the coldest steel decides where water drips, and wet fuel cakes there and glows.':
		'Nicht das Gas, sondern der kälteste Stahl entscheidet, wo Wasser tropft; nasser Brennstoff backt dort an und glimmt.',
	'Hopper cone': 'Filtertrichter',
	'Silo cone': 'Silotrichter',
	'Filter roof': 'Filterdach',
	'Water vapour now': 'Wasserdampf jetzt',
	'Water vapour predicted with feed on': 'Wasserdampf mit Aufgabe vorhergesagt',
	'Pressure at the filter outlet': 'Druck am Filteraustritt',
	'Dew-point clearance of the coldest wall for the predicted state':
		'Taupunktabstand der kältesten Wand für den vorhergesagten Zustand',
	'Run the clearance with the walls just read and the moisture that feed will bring.':
		'Den Taupunktabstand mit den eben abgelesenen Wänden und der Feuchte rechnen, die die Aufgabe bringen wird.',
	'The wall must be above the dew point that comes, not above the one that is.':
		'Die Wand muss über dem Taupunkt liegen, der kommt, nicht über dem, der ist.',
	'the hold at warm-up temperature stands': 'die Haltezeit auf Aufwärmtemperatur gilt',
	'Drains dry': 'Entwässerungen trocken',
	'Open the drain of every low point for a moment.': 'Die Entwässerung jedes Tiefpunkts einen Moment öffnen.',
	'Water that is there now is steam in the filter in ten minutes.':
		'Wasser, das jetzt dort steht, ist in zehn Minuten Dampf im Filter.',
	'Nothing came, and every drain is shut again.': 'Es kam nichts, und jede Entwässerung ist wieder zu.',
	'Carbon monoxide baseline with the burner': 'Grundlinie des Kohlenmonoxids mit Brenner',
	'Read both places over 10 min of steady firing and enter the mean.':
		'Beide Stellen über 10 min gleichmäßiger Feuerung ablesen und das Mittel eintragen.',
	'With the burner on the baseline is another one; the alarms of the running mill start from here.':
		'Mit Brenner ist die Grundlinie eine andere; die Alarme der laufenden Mühle beginnen hier.',
	'Exclusion area': 'Sperrbereich',
	'Exclusion area cleared, people counted': 'Sperrbereich geräumt, Menschen gezählt',
	'Walk the area that the vents point at, shut its barriers behind you, and count everybody of the unit by radio.':
		'Den Bereich abgehen, auf den die Druckentlastungen zeigen, seine Absperrungen hinter sich schließen und alle der Anlage über Funk zählen.',
	'A vent that opens is a flame of many metres, and the one who does not answer is the one who stands there.':
		'Eine öffnende Druckentlastung ist eine Flamme von vielen Metern, und wer nicht antwortet, steht dort.',
	'Nobody is in the area, and its barriers are shut.': 'Niemand ist im Bereich, und seine Absperrungen sind zu.',
	'Everybody on the list of the shift answered and said where they stand.':
		'Alle auf der Liste der Schicht antworteten und sagten, wo sie stehen.',
	'The signaller is named and stands at the barrier.': 'Der Posten ist benannt und steht an der Absperrung.',
	'Oxygen at every place, just before the feed': 'Sauerstoff an jeder Stelle, unmittelbar vor der Aufgabe',
	'Read all four places within 10 min before the release.': 'Alle vier Stellen binnen 10 min vor der Freigabe ablesen.',
	'The feed makes the dust; oxygen must be below its limit when the first of it flies.':
		'Die Aufgabe macht den Staub; Sauerstoff muss unter seinem Grenzwert sein, wenn der erste fliegt.',
	'Walls and moisture, just before the feed': 'Wände und Feuchte, unmittelbar vor der Aufgabe',
	'Read the three named walls again, with the moisture predicted for the feed of today.':
		'Die drei genannten Wände noch einmal ablesen, mit der Feuchte, die für die Aufgabe von heute vorhergesagt ist.',
	'Walls cool while people wait.': 'Wände kühlen ab, während Menschen warten.',
	'Walls above the predicted dew point with margin': 'Wände mit Abstand über dem vorhergesagten Taupunkt',
	'Run the clearance with the walls just read.': 'Den Taupunktabstand mit den eben abgelesenen Wänden rechnen.',
	'Wet fuel cakes, and caked fuel glows.': 'Nasser Brennstoff backt an, und Anbackungen glimmen.',
	Controllers: 'Regler',
	'Loop controllers in automatic and holding': 'Regler in Automatik und haltend',
	'Watch each controller hold its set point for five minutes.':
		'Jeden Regler fünf Minuten lang seinen Sollwert halten sehen.',
	'By hand nobody follows five loops when the first fuel comes.':
		'Von Hand folgt niemand fünf Kreisen, wenn der erste Brennstoff kommt.',
	'Mill outlet temperature.': 'Temperatur am Mühlenaustritt.',
	'Mill inlet suction.': 'Unterdruck am Mühleneintritt.',
	'Gas flow.': 'Gasstrom.',
	'Pressure difference of the mill.': 'Differenzdruck der Mühle.',
	'Oxygen.': 'Sauerstoff.',
} as const;
