/** What the calculators of flow, moisture and the planned purge note and refuse, as sentences; forms as in notes.ts. */
export const CALCULATOR_NOTES = {
	'note.outside-limit': '{limit} = {value} is outside {min} to {max} ({edition}).',
	'note.coefficient-not-of-the-standard':
		'Discharge coefficient {C} from {from}: below the Reynolds numbers of the standard, where its {constant} does not hold.',
	'note.dp-low-in-span':
		'Difference pressure {dp:Pa} is below {least:%} of the span of {span:Pa}: the root makes too much of the error of the transmitter.',
	'note.zero-shifted': 'With the manifold equalised it reads {dpZero:Pa}: an error of {flowError:%} of the flow.',
	'note.temperature-from-downstream':
		'The temperature is read after the tube, where the gas is colder by at most {colderByAtMost:K}.',
	'note.diameters-taken-as-hot':
		'Diameters taken as they are at work; if they are those of the drawing, the flow is off by {flowErrorIfFromDrawing:%}.',
	'note.no-calibration-certificate': 'The transmitter has no calibration certificate.',
	'note.dust-laden': 'The gas carries dust, and the tube was not calibrated with it.',
	'note.throat-changed': 'The throat is worn or built up: its diameter is not known.',
	'note.installation-not-stated': 'Not stated, and not judged: {inputs}.',
	'note.straight-length-short': 'Too little straight pipe before the tube.',
	'note.straight-length-reduced': 'Straight pipe is shorter than asked for: 0.5 % is added to the uncertainty of C.',
	'note.moisture-not-stated': 'No moisture is stated: the gas is taken as dry.',
	'note.density-and-composition-disagree':
		'The density given is {given} kg/m³, the composition gives {calculated} kg/m³; the one given is used.',
	'note.composition-normalised': 'The parts add up to {sum}; they were scaled to 1.',
	'note.pulsating-flow':
		'The difference pressure pulsates by {pulsation:%} about its mean; beyond {limit:%} the standard does not hold.',
	'note.below-low-flow-cut-off': 'Difference pressure {dp:Pa} is below the cut-off {cutOff:Pa}: shown as no flow.',
	'note.root-taken-twice': 'Transmitter and control system both take the root: the flow shown is wrong.',
	'note.characteristic-seen': 'Signal and reading together look like: {seen}; it is set to: {setTo}.',
	'note.uncertainty-over-limit': 'The uncertainty of the flow is not shown to be within {limit:%}.',
	'note.rectangular-duct': 'A rectangular duct is no case of the standard; use a {use}.',
	'note.throat-not-smaller': 'The throat of {d} m has to be smaller than the pipe of {D} m.',
	'note.difference-above-pressure':
		'A difference of {dp:Pa} is more than the pressure of {pressure:Pa}: is the pressure a gauge pressure?',
	'note.pressure-ratio-too-low': 'Throat to upstream pressure is {tau}; below {min} the formula does not hold.',
	'note.above-span': 'Difference pressure {value:Pa} is beyond the span of {span:Pa}: the sensor is out of its range.',
	'note.signal-fault': '{value:mA} is a fault, not a measurement (live is {min:mA} to {max:mA}).',
	'note.negative-difference-pressure':
		'{value:Pa} is below zero: the impulse lines are exchanged, the zero has moved, or the gas flows backwards.',
	'note.liquid-present':
		'At {temperature:degC} a moisture of {waterVapour:%} would be below its dew point of {dewPoint:degC}: liquid is present.',
	'note.acid-dew-point': 'Acid dew point {temperature:degC} with SO₃ {from}: a remark, no proof.',
	'note.acid-dew-point-above-wall':
		'The acid dew point {temperature:degC} lies above the coldest surface {wall:degC}: acid condenses there.',
	'note.sulphur-trioxide-estimated': 'SO₃ is estimated, not measured: the acid dew point is as uncertain as that.',
	'note.acid-without-water': 'An acid dew point needs water in the gas.',
	'note.surface-named-twice': 'Surfaces named twice: {names}.',
	'note.already-condensing':
		'The gas of {gasTemperature:degC} is below its own dew point of {dewPoint:degC}: the moisture or the temperature is wrong.',
	'note.surface-reading-old': 'Read longer ago than {limit:time}: {surfaces}.',
	'note.surface-reading-without-age': 'Nobody said how old the reading is: {surfaces}.',
	'note.filter-cold': 'The filter was not warmed up: moist gas condenses on it before it is warm.',
	'note.present-state-not-stated': 'The moisture at present is not stated; only the state with feed is judged.',
	'note.predicted-drier-than-present':
		'Predicted with feed {predictedWaterVapour:%}, now {waterVapour:%}: with feed on the gas takes up water, it does not lose it.',
	'note.frost-point': 'At {temperature:degC} ({state}) the gas makes rime, not drops.',
	'note.gas-below-predicted-dew-point':
		'With feed on the dew point {dewPoint:degC} lies above the gas of {gasTemperature:degC}: it would rain in the circuit.',
	'note.predicted-state-not-stated': 'The moisture with feed on is not stated; it decides.',
	'note.predicted-state-dry': 'A gas without water with feed on is no statement about this fuel.',
	'note.clearance-kept':
		'{surface}, {state}: {clearance:K} above the dew point, less {guard:K} for uncertainty; {margin:K} are asked for.',
	'note.inside-guard-band':
		'{surface}, {state}: {clearance:K} above the dew point keep {margin:K}, but not with the uncertainty of {guard:K}.',
	'note.below-margin': '{surface}, {state}: only {clearance:K} above the dew point; {margin:K} are asked for.',
	'note.surface-below-dew-point': '{surface}, {state}: {clearance:K} against the dew point: water condenses there.',
	'note.guard-leaves-nothing': 'A guard of {guard:%} leaves nothing of the limit {limit:%}.',
	'note.target-not-below-start': 'The line of {target:%} is not below the {start:%} at the start: nothing to purge.',
	'note.not-an-inert-gas-meter': '{tag} meters {medium}, not inert gas: what circulates is many times what enters.',
	'note.no-outlet': 'Nobody said where the gas leaves: without an outlet a sweep is no purge.',
	'note.named-twice': '{name} is named twice.',
	'note.limit-without-source': 'A limit needs its source.',
	'note.bounds-crossed': 'The lower bound {low:%} is above the upper one {high:%}.',
	'note.judged-before-it-began': 'It is judged before the purge began.',
	'note.totaliser-ran-backwards': 'The totaliser went back from {before} to {value}.',
	'note.basis-needs-moisture': '{tag} reads {basis:basis}, the limit is {limitBasis:basis}: proved moisture is needed.',
	'note.oxygen-not-below-air':
		'Oxygen of {oxygen:%} is not below that of the air, {air:%}: nothing can be told from it.',
	'note.oxygen-falls-along':
		'The oxygen falls along the way: the analysers or the moments disagree. That is no leak of zero.',
	'note.leak-not-told-from-zero':
		'False air {r:%} with an uncertainty of {U:%} cannot be told from zero; that is not tightness.',
	'note.temperature-swing':
		'The temperature changed by {swing:K}; more than {most:K} makes the test void: one thermometer is not all the gas.',
	'note.pressure-rose':
		'With the temperature taken out the pressure rose by more than its uncertainty: the temperature is not that of the gas. The test is void.',
	'note.walls-flexible': 'Walls that give way change the volume: the pressure tells no leak.',
	'note.pressure-changed-much':
		'The pressure changed by {part:%}; beyond {most:%} the leak is no longer that of the test pressure.',
	'note.temperature-moved': 'The temperature moved by {swing:K}: wait until it rests, or shade the duct.',
	'note.drop-inside-uncertainty':
		'The drop of {drop:Pa} with an uncertainty of {U:Pa} is hardly told from zero: test longer.',
	'note.leak-without-uncertainty': 'A leak of {leak:flow} without an uncertainty shows nothing against {allowed:flow}.',
	'note.leak-within': 'Leak {leak:flow} and its uncertainty {U:flow} are within the allowed {allowed:flow}.',
	'note.leak-inside-guard':
		'Leak {leak:flow} is below the allowed {allowed:flow}, but not with its uncertainty of {U:flow}.',
	'note.leak-beyond': 'Leak {leak:flow}, U {U:flow}, is more than the allowed {allowed:flow}.',
	'note.no-swing': 'The upper pressure has to be above the lower one.',
	'note.inert-gas-above-target': 'The inert gas itself holds {inert:%} of oxygen; {target:%} is never reached with it.',
	'note.swing-held': 'm = 1 holds only where each swing is held and topped up until its temperature has settled.',
	'note.branches-not-swept':
		'A dead-ended branch takes its own gas back at every swing: read the oxygen at its end, or sweep it.',
	'note.one-swing-more':
		'After these swings {after:%} with an uncertainty of {U:%} is not surely below {line:%}: plan one swing more.',
	'note.swings-rounded-up': 'The formula gives {needed}; {swings} whole swings are needed.',
	'note.too-few-points': '{count} points are too few: at least {least} are asked for.',
	'note.no-points-downwards': 'No point was taken both upwards and downwards: hysteresis is not shown.',
	'note.error-over-half': 'The largest error {error:%} of span is more than half of what is allowed.',
	'note.display-seen': 'What is shown looks like: {seen}, of what was applied.',
	'note.loop-error-within': 'Largest error {error:%} of span at {applied:%}, U {U:%}: within the allowed {allowed:%}.',
	'note.loop-error-beyond':
		'Largest error {error:%} of span at {applied:%}, U {U:%}: not within the allowed {allowed:%}.',
	'note.acid-dew-point-no-proof': 'An acid dew point is a reason to look at the metal, and no proof.',
	'note.correlations-apart': 'The two correlations are {apart:K} apart.',
	'note.carbon-dioxide-by-weight':
		'Carbon dioxide is liquid in the bottle: its pressure tells nothing. Weigh it, and give the net weight.',
	'note.stop-above-pressure': 'The pressure to stop at is above the one that is there: nothing is usable.',
	'note.bottles-at-rest':
		'Holds for bottles at rest: drawn from just now they are cold and read low, in the sun they read high.',
} as const;
