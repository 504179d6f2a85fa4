import type { ERRORS as EN } from '../en/errors';

/** Was an etwas falsch ist, das von außen kam: wo es steht, was erwartet wurde, was dort stand. */
export const ERRORS: { readonly [key in keyof typeof EN]: string } = {
	'json.not-json': 'bei Zeichen {at} wurde {expected} erwartet',
	'json.too-deep': 'bei Zeichen {at} ist es tiefer als {limit} Ebenen verschachtelt',
	'json.duplicate-name': 'bei Zeichen {at} steht der Name „{name}“ zweimal in einem Objekt',
	'json.forbidden-name': 'bei Zeichen {at} ist der Name „{name}“ nicht erlaubt',
	'json.number-too-large': 'bei Zeichen {at} ist {number} größer als jede Zahl, die behalten werden kann',
	'json.lone-surrogate': 'bei Zeichen {at} steht ein halbes Schriftzeichen allein',
	'shape.wrong-shape': '{path}: erwartet wurde {expected}, dort steht {found}',

	'event.not-json': 'Zeile {line} ist kein JSON, bei Zeichen {at} ({because})',
	'event.not-an-event': 'Zeile {line}, {path}: erwartet wurde {expected}, dort steht {found}',
	'event.unknown-version': 'Zeile {line}: Version {version} eines Ereignisses ist hier nicht bekannt',
	'event.unknown-kind': 'Zeile {line}: eine Ereignisart „{found}“ gibt es nicht',
	'event.not-canonical':
		'Zeile {line}: ihr Text steht nicht in der kanonischen Form, über die Hash und Unterschrift gebildet werden',

	'trend.no-table':
		'Es wurde keine Tabelle gefunden: eine Kopfzeile, dann in jeder Zeile eine Zeit und Zahlen ({lines} Zeilen gelesen)',
	'trend.ragged-line': 'Zeile {line} hat {found} Zellen; die Kopfzeile hat {expected}',
	'trend.not-a-time': 'Zeile {line}: „{found}“ ist keine Zeit; eine Zeit lautet {expected}',
	'trend.time-runs-back': 'Zeile {line}: {found} kommt nicht nach {before}',
	'trend.not-a-number': 'Zeile {line}, Spalte {column}: „{found}“ statt {expected}',
	'trend.no-time-column': 'Es gibt keine Spalte „{column}“ für die Zeiten',
	'trend.column-twice': 'Die Spalte „{column}“ steht zweimal da',

	'quantity.empty-number': 'es steht keine Zahl da',
	'quantity.not-a-number': '„{text}“: bei Zeichen {at} wurde {expected} erwartet',
	'quantity.ambiguous-number':
		'„{text}“ kann als {readings} gelesen werden: so schreiben, dass es eine einzige Zahl bedeutet',
	'quantity.number-too-large': '{text} ist größer als jede Zahl, die behalten werden kann',
	'quantity.number-too-small': '{text} ist zu klein, um es von null zu unterscheiden',
	'quantity.negative-uncertainty': 'eine Unsicherheit von {U} liegt unter null',
	'quantity.unknown-unit': '„{unit}“ ist keine Einheit von {quantity}; bekannt sind {known}',
	'quantity.wrong-quantity': '{unit} ist eine Einheit von {isFor}; gefragt ist {quantity}',
	'quantity.below-absolute-zero': '{value} {unit} liegt nicht über dem absoluten Nullpunkt',
	'quantity.below-vacuum': '{value} {unit} liegt unter dem vollkommenen Vakuum',

	'refusal.out-of-range': '{value} {unit} liegt außerhalb von {range}',
	'refusal.unknown-input': 'eine solche Eingabe gibt es nicht',
	'refusal.missing-input': 'sie fehlt',
	'refusal.bad-input': 'erwartet wurde {expected}, dort steht {found}',
	'refusal.one-of': 'gefragt ist genau eine von {inputs}',
	'refusal.unknown-calculator': 'einen Rechner {calc} gibt es nicht; bekannt sind {known}',
	'refusal.gauge-without-barometer': 'zu einem Überdruck gehört der Barometerstand',
	'refusal.moisture-given-twice': 'die Feuchte ist zweimal angegeben, als {inputs}',
	'refusal.percent-for-fraction': 'die Anteile ergeben zusammen {sum}: sind es Prozent statt Anteile?',
	'refusal.fractions-do-not-add-up': 'die Anteile ergeben zusammen {sum} statt 1',
	'refusal.not-positive': 'es muss über null liegen',
	'refusal.unequal-lengths': '{times} Zeiten stehen neben {values} Werten',
};
