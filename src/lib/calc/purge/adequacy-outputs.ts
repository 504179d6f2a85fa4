import { output } from './shared-inputs';

/** Values of the whole purge. */
export const purgeOutputs = [
	output(
		'adequateSince',
		'time',
		'since when every measured place is at or below its line and nothing stirred the gas',
	),
	output('held', 'time', 'how long that has held'),
	output('holdNeeded', 'time', 'how long it has to hold'),
	output('connectedVolume', 'volume', 'all volume that is not shut off'),
	output('normalVolume', 'volume-normal', 'gas in it', 'V'),
	output('admitted', 'volume-normal', 'inert gas admitted by its own meters since the purge began'),
	output('admittedNeeded', 'volume-normal', 'inert gas that the least volume changes ask for'),
	output('volumeChanges', 'number', 'volume changes admitted', 'N'),
	output('inertFlow', 'volume-flow-normal-wet', 'inert flow at the end', 'Q_I'),
	output('forecast', 'time', 'time until the slowest place is at its line'),
	output('forecastGas', 'volume-normal', 'inert gas until then at the present flow'),
	output('inLeakage', 'volume-flow-normal-wet', 'air that leaks in, from the highest floor', 'Q_L'),
	output('inLeakageLow', 'volume-flow-normal-wet', 'the same, lower bound'),
	output('inLeakageHigh', 'volume-flow-normal-wet', 'the same, upper bound'),
] as const;

/** Values of one place; their names in a result begin with its tag: "AT-211.floor". */
export const placeOutputs = [
	output('last', 'fraction', 'last valid reading on the basis of the limit, with the guard as its U'),
	output('margin', 'fraction', 'limit less guard less last reading: negative above the line'),
	output('adequateSince', 'time', 'since when its readings lie at or below the line'),
	output('slopeLow', 'rate', 'lower bound of the slope in the hold window: above zero it rises'),
	output('floor', 'fraction', 'fitted floor', 'Cf'),
	output('floorLow', 'fraction', 'the same, lower bound'),
	output('floorHigh', 'fraction', 'the same, upper bound'),
	output('rate', 'rate', 'fitted exchange rate', 'λ'),
	output('rateLow', 'rate', 'the same, lower bound'),
	output('rateHigh', 'rate', 'the same, upper bound'),
	output('exchanges', 'number', 'exchanges that the fitted samples span', 'λt'),
	output('mixing', 'fraction', 'mixing factor', 'K'),
	output('forecast', 'time', 'time until it is at its line'),
	output('forecastLatest', 'time', 'the same with the slowest rate and the highest floor that the samples allow'),
] as const;

export const adequacyOutputs = [
	...purgeOutputs,
	...placeOutputs.map((each) => ({ ...each, name: `{place}.${each.name}` })),
];
