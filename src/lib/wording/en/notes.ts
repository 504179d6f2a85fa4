import { CALCULATOR_NOTES } from './calculator-notes';

/**
 * What calculators note, as sentences. A placeholder may say how its fact is shown: `{last:%}` a fraction as percent,
 * `{t:clock}` a moment of the series, `{held:time}` a duration, `{leak:flow}` m3(n)/h, `{gas:m3n}` m3(n), `{T:degC}`, `{p:mbar}`.
 * A note without a sentence here is said as its name and facts.
 */
export const NOTES = {
	...CALCULATOR_NOTES,
	'note.not-covered': '{volume} {title} is not covered.',
	'note.covered-by-unknown-place': '{volume} {title} is said to be covered by {place}, which is not among the places.',
	'note.place-reads-another-volume': '{place} reads {reads}, not {volume} {title}.',
	'note.place-at-inert-inlet': '{place} reads {volume} {title} where the inert gas enters.',
	'note.outlet-not-read': 'The outlet of {volume} {title} was not read.',
	'note.outlet-read-outside-purge': 'The outlet of {volume} {title} was read outside the purge.',
	'note.outlet-above-line': 'The outlet of {volume} {title} was at {oxygen:%}, accepted is {accept:%}.',
	'note.not-said-what-inerts-it': 'Nobody said what keeps oxygen out of {volume} {title}.',
	'note.shut-off-above-line': '{volume} {title} was at {oxygen:%}, accepted is {accept:%}.',
	'note.above-line':
		'{place}: {count} readings of the hold above {accept:%}, the worst {oxygen:%} at {t:clock}, the last {last:%}.',
	'note.too-few-readings': '{place}: {count} readings in the hold, at least {least} are asked for.',
	'note.gap-in-readings': '{place}: no reading from {from:clock} to {to:clock}; at most {longest:time} is allowed.',
	'note.rising': '{place}: the readings of the hold rise.',
	'note.hold-too-short': 'Held for {held:time}, {needed:time} are needed (rule: {rule}).',
	'note.fan-below-next-gate': '{tag}: fan flow below what the next gate needs.',
	'note.cleaning-not-running': 'The filter cleaning did not run.',
	'note.damper-not-stroked': 'Damper {tag} was not moved through its way.',
	'note.too-little-inert-gas':
		'{admitted:m3n} of inert gas admitted, U {U:m3n}; {needed:m3n} are needed for {volumeChanges} volume changes.',
	'note.fan-broken': 'Fan flow not shown from {from:clock} to {to:clock} ({record}: {why}).',
	'note.inert-flow-broken': 'Inert flow not shown from {from:clock} to {to:clock} ({record}: {why}).',
	'note.outlet-broken': 'Outlet not shown open from {from:clock} to {to:clock} ({record}: {why}).',
	'note.check-does-not-stand': '{place}: its function check does not stand ({state}).',
	'note.not-measuring': '{place}: its analyser was not measuring ({mode}).',
	'note.air-not-read': '{place}: did not read air before the purge.',
	'note.has-not-moved': '{place}: its reading moved by {moved:%}, at least {least:%} is asked for.',
	'note.no-valid-samples': '{place}: no valid reading.',
	'note.unburnt-gas-not-known': '{place}: unburnt gas is not known where a zirconia cell measures.',
	'note.unburnt-gas': '{place}: unburnt gas {fraction:%}, at most {most:%} is allowed.',
	'note.floor-above-limit': '{place}: the fitted floor {floor:%} is not below the limit {limit:%}.',
	'note.slowest-place': 'Slowest: {place}.',
	'note.forecast': '{place}: about {seconds:time} more to its line.',
	'note.residuals-in-runs':
		'{place}: the residuals of the fit come in runs (z = {z}); its curve does not describe all of it.',
	'note.fit-refused': '{place}: no fit ({because}).',
	'note.fit-window':
		'{place}: fitted to {samples} samples from {from:clock} to {to:clock}, {exchanges} exchanges, dead time {deadTime:time} taken off.',
	'note.basis-differs':
		'{place} reads {basis:basis}, the limit is {limitBasis:basis}; water vapour credited {credited:%}, charged {charged:%}.',
	'note.above-allowed-oxygen':
		'The target {target:%} is above the {allowed:%} that a limiting oxygen of {limitingOxygen:%} allows.',
	'note.limit-not-from-a-test-of-this-fuel': 'The limit does not come from a test of this fuel ({source}).',
	'note.unburnt-gas-limit-applies': 'Unburnt gas {fraction:%}: the limit of the gas applies, not that of the dust.',
	'note.mixing-assumed-good': 'A mixing factor of {mixing} is assumed, not measured.',
	'note.carbon-dioxide-discharge':
		'Carbon dioxide: no discharge from a snow horn into a dust cloud; it charges itself. Content is told by weight.',
	'note.floor-close-to-line': 'The floor {floor:%} is close to the line {accept:%}.',
	'note.unreachable': 'The target {target:%} cannot be reached: the gas settles at {floor:%}.',
	'note.least-volume-changes-decide': 'The least volume changes decide ({least}); mixing alone would need {byMixing}.',
	'note.leak-without-suction': 'The leak is stated without the suction at which it was found.',
	'note.leak-scaled-with-suction': 'The leak is scaled with the root of the suction, as a lower bound: {leak:flow}.',
	'note.leak-asks-for-sensor-check':
		'{place}: a leak of {leak:flow} asks for a check of the analyser; it does not say that nothing leaks.',
	'note.stock-too-small': 'The stock is smaller than this purge needs.',
	'note.stock-without-repeat': 'The stock is enough for this purge, not for one repeat.',
	'note.flow-broken-before-hold': 'A flow was broken before the hold began; the hold counts from after it.',
	'note.inert-flow-varied': 'The inert gas flow varied from {least:flow} to {most:flow}.',
	'note.meter-gap-not-counted': '{meter}: nothing is counted from {from:clock} to {to:clock}, where it has a gap.',
	'note.samples-excluded': '{place}: {count} samples left out ({why}).',
	'note.no-dead-leg-named': 'No dead leg is named among the volumes.',
	'note.covered-without-analyser': 'Without analyser, {answer}: {volumes}.',
	'note.in-leakage': 'In-leakage from the floor at {place}: about {leak:flow}, at the suction at which it was found.',
	'note.mixing-above-one': '{place}: mixing factor {mixing} above one.',
	'note.floor-above-readings': '{place}: the fitted floor {floor:%} lies above the last reading {last:%}.',
	'note.floor-may-exceed-line': '{place}: floor {floor:%}, at most {high:%}; the line is {accept:%}.',
	'note.seen-not-recorded': '{record}: seen by {by} from {from:clock} to {to:clock}, not recorded.',
	'note.coldest-surface': 'Coldest of {of} surfaces: {name}.',
	'note.uncertainty-not-stated': 'Uncertainty not stated for: {inputs}.',
	'note.uncertainty-by-default': 'Uncertainty by default for: {inputs}.',
	'note.low-flow-cut-off': 'Below its cut-off the transmitter shows no flow.',
	'note.mean-of-roots': 'Mean of the roots of {readings} readings.',
	'note.ideal-gas-dew-point': 'Dew point of an ideal gas; a real gas has it lower by at most {realGasIsLowerBy:K}.',
	'purge.adequate':
		'Readings adequate since {since}: at all {places} measured places at or below {accept} {basis} (limit {limit}, guard {guard}) for {held}, fan and inert flow unbroken.',
	'purge.swept': '{n} volumes without analyser: {list}.',
	'purge.slowest': 'Slowest: {place}.',
	'purge.no permission': 'Not a permission.',
} as const;
