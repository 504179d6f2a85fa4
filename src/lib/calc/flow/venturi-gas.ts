import { fail, ok, type Result } from '../../base';
import type { CalcNote, Refusal } from '../calculator';
import { R, type Gas } from '../constants';
import { fractionsOf, GASES, moistened, normalised, type Composition } from '../gas/composition';
import { gasDensity } from '../gas/gas-density';
import { gasViscosity } from '../gas/gas-viscosity';
import { isentropicExponent } from '../gas/isentropic-exponent';
import { molarMass } from '../gas/molar-mass';
import { pressureOf } from '../gas/static-pressure';
import { dewPoint } from '../moisture/dew-point';
import type { Numbers, Uncertain } from '../uncertainty';
import type { VenturiGiven } from './venturi-inputs';

/** The gas at the upstream tapping, and how it follows its inputs. */
export type VenturiGas = {
	readonly kappa: number;
	readonly viscosity: number;
	/** Inputs of the model that describe the gas, apart from its pressure. */
	readonly inputs: readonly Uncertain[];
	readonly at: (values: Numbers) => GasAt;
	readonly notes: readonly CalcNote[];
};
export type GasAt = {
	readonly pressure: number;
	readonly temperature: number;
	readonly compressibility: number;
	readonly density: number;
	/** Absent where neither composition nor a plausible density tells it. */
	readonly molarMass?: number;
	/** Absent where nobody stated the moisture. */
	readonly waterVapour?: number;
};

/** Density, viscosity and isentropic exponent: as given, else from the composition; refused where liquid is present. */
export function venturiGas(
	given: VenturiGiven,
	pressure: readonly Uncertain[],
): Result<VenturiGas, readonly Refusal[]> {
	const { composition, waterVapour, density, temperature } = given;
	if (composition?.H2O !== undefined && waterVapour !== undefined) {
		return fail([{ kind: 'moisture-given-twice', inputs: ['composition.H2O', 'waterVapour'] }]);
	}
	const base = composition === undefined ? undefined : normalised(fractionsOf(composition));
	const wet = base && waterVapour !== undefined ? moistened(base.x, waterVapour.value) : base?.x;
	const refusals: Refusal[] = [];
	if (density === undefined && wet === undefined) refusals.push(missing('density'));
	const property = (
		name: 'viscosity' | 'isentropicExponent',
		from: (x: Composition, T: number) => Result<number, Refusal>,
	): number => {
		const stated = given[name]?.value;
		if (stated !== undefined) return stated;
		const found = wet === undefined ? fail(missing(name)) : from(wet, temperature.value);
		if (found.ok) return found.value;
		refusals.push(found.error.kind === 'out-of-range' ? { ...found.error, orGive: name } : found.error);
		return Number.NaN;
	};
	const viscosity = property('viscosity', gasViscosity);
	const kappa = property('isentropicExponent', isentropicExponent);
	if (refusals.length > 0) return fail(refusals);

	const inputs = gasInputs(given, base?.x);
	const at = (values: Numbers): GasAt => gasOf(values, base?.x);
	const now = at(Object.fromEntries([...pressure, ...inputs].map((input) => [input.name, input.value])));
	const liquid = liquidPresent(now);
	if (liquid !== undefined) return fail([liquid]);
	return ok({ kappa, viscosity, inputs, at, notes: [...(base?.notes ?? []), ...gasNotes(given, now, wet)] });
}

/** The inputs of the model that describe the gas. The most abundant gas is left out: it makes up the balance. */
function gasInputs(given: VenturiGiven, base: Composition | undefined): readonly Uncertain[] {
	const { temperature, compressibility, density, composition, waterVapour } = given;
	const fractions = gasesBesideBalance(base ?? {}).map(([gas, value]): Uncertain => {
		const U = composition?.[gas]?.U;
		return { name: `x_${gas}`, symbol: `x_${gas}`, value, unit: '1', ...(U === undefined ? {} : { U }) };
	});
	return [
		{ ...temperature, name: 'temperature', symbol: 'T', unit: 'K' },
		// An ideal gas near atmospheric pressure is good to 0.1 % (CoolProp 8.0.0, circuit gas and air).
		{ U: Z_UNCERTAINTY, ...compressibility, name: 'compressibility', symbol: 'Z', unit: '1' },
		...(density === undefined ? [] : [{ ...density, name: 'density', symbol: 'rho1', unit: 'kg/m3' }]),
		...fractions,
		...(waterVapour === undefined ? [] : [{ ...waterVapour, name: 'waterVapour', symbol: 'x_w', unit: '1' }]),
	];
}

function gasOf(values: Numbers, base: Composition | undefined): GasAt {
	const pressure = pressureOf(values);
	const { temperature = NaN, compressibility = NaN, waterVapour } = values;
	const wet = base === undefined ? undefined : wetGas(values, base);
	const ofComposition = wet === undefined ? undefined : molarMass(wet);
	const density =
		values.density ?? gasDensity({ pressure, temperature, compressibility, molarMass: ofComposition ?? NaN });
	const implied = (density * compressibility * R * temperature) / pressure;
	const mass = ofComposition ?? (implied >= LIGHTEST && implied <= HEAVIEST ? implied : undefined);
	const vapour = wet === undefined ? waterVapour : (wet.H2O ?? 0);
	return {
		pressure,
		temperature,
		compressibility,
		density,
		...(mass === undefined ? {} : { molarMass: mass }),
		...(vapour === undefined ? {} : { waterVapour: vapour }),
	};
}

/** The composition that a set of values describes, its sum kept at one by the balance gas. */
function wetGas(values: Numbers, base: Composition): Composition {
	const others = gasesBesideBalance(base).map(([gas, x]) => [gas, values[`x_${gas}`] ?? x] as const);
	const rest = 1 - others.reduce((sum, [, x]) => sum + x, 0);
	const x: Composition = { ...Object.fromEntries(others), [balanceOf(base)]: rest };
	return values.waterVapour === undefined ? x : moistened(x, values.waterVapour);
}

const balanceOf = (x: Composition): Gas =>
	GASES.reduce((most, gas) => ((x[gas] ?? 0) > (x[most] ?? 0) ? gas : most), 'N2');

const gasesBesideBalance = (x: Composition): readonly (readonly [Gas, number])[] =>
	GASES.flatMap((gas) => (gas === balanceOf(x) || x[gas] === undefined ? [] : [[gas, x[gas]] as const]));

function liquidPresent({ waterVapour = 0, pressure, temperature }: GasAt): Refusal | undefined {
	const dew = dewPoint(waterVapour, pressure);
	if (!dew.ok) return dew.error;
	if (dew.value.kind === 'none' || dew.value.temperature <= temperature) return undefined;
	return { kind: 'liquid-present', input: 'waterVapour', waterVapour, temperature, dewPoint: dew.value.temperature };
}

function gasNotes(given: VenturiGiven, now: GasAt, wet: Composition | undefined): readonly CalcNote[] {
	const notes: CalcNote[] = [];
	if (wet !== undefined && wet.H2O === undefined) notes.push({ kind: 'moisture-not-stated', level: 'warning' });
	if (wet !== undefined && given.density !== undefined) {
		const calculated = gasDensity({ ...now, molarMass: molarMass(wet) });
		if (Math.abs(calculated / now.density - 1) > DENSITY_GAP) {
			notes.push({ kind: 'density-and-composition-disagree', level: 'warning', given: now.density, calculated });
		}
	}
	return notes;
}

const missing = (name: string): Refusal => ({ kind: 'missing-input', input: name, or: 'composition' });
const Z_UNCERTAINTY = 1e-3;
const DENSITY_GAP = 0.01;
// Hydrogen, and heavier than any gas of a circuit [kg/mol]: beyond, the density is not that of a gas at this state.
const LIGHTEST = 2e-3;
const HEAVIEST = 0.15;
