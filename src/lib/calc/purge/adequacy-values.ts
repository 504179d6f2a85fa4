import type { CalcValue } from '../calculator';
import { placeOutputs, purgeOutputs } from './adequacy-outputs';
import type { Bounds } from './decay-fit';
import type { JudgedPlace, PurgeJudgement } from './judge-purge';
import { riseInHold } from './place-judgement';

/** A number with its U, or why there is none. */
type Said = { readonly value: number; readonly U?: number } | { readonly because: string };
type Values<Names extends readonly { readonly name: string }[]> = { readonly [N in Names[number]['name']]: Said };

export function adequacyValues(judgement: PurgeJudgement): { readonly [name: string]: CalcValue } {
	const whole = valuesOfPurge(judgement);
	const values = purgeOutputs.map(({ name, unit }) => [name, valueOf(whole[name], unit)] as const);
	const ofPlaces = judgement.places.flatMap((place) => {
		const said = valuesOfPlace(place, judgement);
		return placeOutputs.map(({ name, unit }) => [`${place.place.tag}.${name}`, valueOf(said[name], unit)] as const);
	});
	return Object.fromEntries([...values, ...ofPlaces]);
}

function valuesOfPurge({
	hold,
	circuit,
	admitted,
	needed,
	inertFlow,
	leak,
	slowest,
}: PurgeJudgement): Values<typeof purgeOutputs> {
	const { seconds = null } = slowest?.forecast ?? {};
	return {
		adequateSince: orElse(hold.start?.t, 'above-line'),
		held: { value: hold.held },
		holdNeeded: { value: hold.needed },
		connectedVolume: { value: circuit.size },
		normalVolume: { value: circuit.gas, ...(circuit.gasU > 0 ? { U: circuit.gasU } : {}) },
		admitted: { value: admitted.value, ...(admitted.U > 0 ? { U: admitted.U } : {}) },
		admittedNeeded: { value: needed.gas },
		volumeChanges: { value: admitted.value / circuit.gas },
		inertFlow: orElse(inertFlow, 'not-metered'),
		forecast: orElse(seconds, 'unreachable'),
		forecastGas:
			seconds === null ? { because: 'unreachable' } : orElse(inertFlow && seconds * inertFlow, 'not-metered'),
		inLeakage: bounded(leak?.leak, leak?.bounds) ?? { because: 'no-floor' },
		inLeakageLow: leak === undefined ? { because: 'no-floor' } : orElse(leak.bounds.low, 'open'),
		inLeakageHigh: leak === undefined ? { because: 'no-floor' } : orElse(leak.bounds.high, 'open'),
	};
}

function valuesOfPlace(
	{ place, last, accept, guard, valid, adequateSince, fitted, byFit, forecast }: JudgedPlace,
	{ hold }: PurgeJudgement,
): Values<typeof placeOutputs> {
	const slope = riseInHold(
		place,
		valid.filter(({ t }) => t >= hold.window.from),
	);
	const refused = fitted.ok ? undefined : { because: fitted.error.kind };
	const fit = fitted.ok ? fitted.value : undefined;
	const { bounds, Cf, lambda } = fit?.fit ?? {};
	const ofFit = (value: number | null | undefined): Said => refused ?? orElse(value, 'open');
	return {
		last: last === undefined ? { because: 'no-valid-samples' } : { value: last.C, U: guard },
		margin: last === undefined ? { because: 'no-valid-samples' } : { value: accept - last.C },
		adequateSince: orElse(adequateSince, 'above-line'),
		slopeLow: orElse(slope?.low, 'too-few-readings'),
		floor: refused ?? bounded(Cf, bounds?.Cf) ?? { because: 'open' },
		floorLow: ofFit(bounds?.Cf.low),
		floorHigh: ofFit(bounds?.Cf.high),
		rate: refused ?? bounded(lambda, bounds?.lambda) ?? { because: 'open' },
		rateLow: ofFit(bounds?.lambda.low),
		rateHigh: ofFit(bounds?.lambda.high),
		exchanges: ofFit(fit?.exchanges),
		mixing: refused ?? mixingOf(byFit?.mixing),
		forecast: forecast === undefined ? { because: 'no-valid-samples' } : orElse(forecast.seconds, 'unreachable'),
		forecastLatest: forecast === undefined ? { because: 'no-valid-samples' } : orElse(forecast.latest, 'not-bounded'),
	};
}

/** More than all of the gas cannot mix: then a volume or a flow is wrong, or the fit is noise, and no number is given. */
function mixingOf(mixing: number | undefined): Said {
	if (mixing === undefined) return { because: 'not-metered' };
	return mixing > 1 ? { because: 'above-one' } : { value: mixing };
}

/** With the farther of its bounds as U; without U where a bound is open. */
function bounded(value: number | undefined, bounds: Bounds | undefined): Said | undefined {
	if (value === undefined) return undefined;
	const { low = null, high = null } = bounds ?? {};
	return low === null || high === null ? { value } : { value, U: Math.max(high - value, value - low) };
}

const orElse = (value: number | null | undefined, because: string): Said =>
	value === null || value === undefined ? { because } : { value };

const valueOf = (said: Said, unit: string): CalcValue =>
	'because' in said ? { value: null, unit, because: said.because } : { ...said, unit };
