import * as v from 'valibot';
import { fail, ok, type Result } from '../../base';
import type { InSi } from '../../quantity';
import type { Refusal } from '../calculator';
import { pressureInputs } from '../gas/static-pressure';
import {
	all,
	choice,
	measured,
	optional,
	readMeasure,
	shaped,
	typedMeasure,
	withDefault,
	type Given,
} from '../read-inputs';

/** A named place of the plant whose metal may be colder than the gas, and how old its reading is. */
export type Surface = {
	readonly name: string;
	readonly temperature: InSi<'temperature'>;
	readonly age?: number;
};

const surfaceSchema = v.strictObject({
	name: v.pipe(v.string(), v.regex(/\S/)),
	temperature: typedMeasure,
	age: v.optional(typedMeasure),
});

function readSurfaces(
	typed: readonly v.InferOutput<typeof surfaceSchema>[],
	at: string,
): Result<readonly Surface[], readonly Refusal[]> {
	const names = typed.map((surface) => surface.name);
	const twice = names.filter((name, i) => names.indexOf(name) !== i);
	if (twice.length > 0) return fail([{ kind: 'surface-named-twice', input: at, names: twice }]);
	return all(
		typed.map((surface, i): Result<Surface, readonly Refusal[]> => {
			const where = `${at}[${i}]`;
			const temperature = readMeasure(surface.temperature, WALL, `${where}.temperature`);
			const age = surface.age === undefined ? undefined : readMeasure(surface.age, AGE, `${where}.age`);
			const refusals = [temperature, age].flatMap((read) => (read === undefined || read.ok ? [] : read.error));
			if (!temperature.ok || refusals.length > 0) return fail(refusals);
			const seconds = age?.ok === true ? { age: age.value.value } : {};
			return ok({ name: surface.name, temperature: temperature.value, ...seconds });
		}),
	);
}

const WALL = { quantity: 'temperature', min: 150, max: 900 } as const;
const AGE = { quantity: 'time', min: 0 } as const;

const moisture = (state: string, when: string) => ({
	wet: optional(
		measured({
			symbol: 'x_w',
			label: `Moisture ${when}, wet`,
			means: `moisture of the gas ${state}, as mole of water per mole of wet gas`,
			quantity: 'water-vapour',
			min: 0,
			max: 1,
			from: 'reading',
		}),
	),
	dry: optional(
		measured({
			symbol: 'w',
			label: `Moisture ${when}, dry`,
			means: `moisture ${state}, as mole of water per mole of dry gas`,
			quantity: 'water-vapour-dry',
			min: 0,
			from: 'reading',
		}),
	),
	byMass: optional(
		measured({
			symbol: 'Y',
			label: `Moisture ${when}, by mass`,
			means: `moisture ${state}, as kilogram of water per kilogram of dry gas; needs dryMolarMass`,
			quantity: 'humidity-ratio',
			min: 0,
			from: 'reading',
		}),
	),
});
const present = moisture('at present', 'now');
const predicted = moisture('predicted with feed on', 'with feed');

/** Everything `dew-point-clearance@1` can be told. Each moisture is given in one of three ways. */
export const CLEARANCE_INPUTS = {
	surfaces: shaped(
		v.pipe(v.array(surfaceSchema), v.minLength(1), v.maxLength(200)),
		{
			symbol: 'T_s',
			label: 'Surfaces',
			means:
				'named surfaces the gas touches, each with its temperature and the age of that reading: hopper cone, unlagged duct, filter roof, cleaning-air header',
			quantity: 'table of {name, temperature, age}',
			repeats: true,
			parts: [
				{ name: 'name', label: 'Surface', means: 'what the surface is called on the plant', quantity: 'text' },
				{ name: 'temperature', label: 'Temperature', means: 'its temperature', unit: 'K', ...WALL },
				{
					name: 'age',
					label: 'Age of the reading',
					means: 'how old the reading is',
					unit: 's',
					optional: true,
					...AGE,
				},
			],
			from: 'reading',
		},
		readSurfaces,
	),
	waterVapour: present.wet,
	waterVapourDry: present.dry,
	humidityRatio: present.byMass,
	predictedWaterVapour: predicted.wet,
	predictedWaterVapourDry: predicted.dry,
	predictedHumidityRatio: predicted.byMass,
	dryMolarMass: optional(
		measured({
			symbol: 'M_dry',
			label: 'Molar mass of the dry gas',
			means: 'molar mass of the dry gas; for air 0.02896, with much carbon dioxide more',
			quantity: 'molar-mass',
			min: 2e-3,
			max: 0.1,
			from: 'plant',
		}),
	),
	...pressureInputs('of the gas where the surfaces are'),
	gasTemperature: optional(
		measured({
			symbol: 'T',
			label: 'Gas temperature',
			means: 'temperature of the gas: shows whether the moisture stated can be vapour at all',
			quantity: 'temperature',
			min: 150,
			max: 1500,
			from: 'reading',
		}),
	),
	margin: measured({
		label: 'Clearance asked for',
		means: 'clearance the site asks for above the dew point',
		quantity: 'temperature-difference',
		min: 0,
		max: 200,
		from: 'site',
	}),
	oldest: withDefault(
		measured({
			label: 'Oldest reading',
			means: 'age from which a surface temperature is too old',
			quantity: 'time',
			min: 1,
			from: 'procedure',
		}),
		300,
	),
	filter: optional(
		choice(['preheated', 'cold'], {
			label: 'Filter',
			means: 'whether the filter was warmed up before moist gas comes',
			from: 'reading',
		}),
	),
	sulphurTrioxide: optional(
		measured({
			symbol: 'SO3',
			label: 'SO3 in the wet gas',
			typedIn: 'ppm',
			means: 'SO3 and H2SO4 together, as mole fraction of the wet gas; its acid dew point is a remark, never a proof',
			quantity: 'fraction',
			min: 0,
			max: 0.01,
			from: 'typed',
		}),
	),
	sulphurTrioxideFrom: withDefault(
		choice(['measured', 'estimated'], { label: 'SO3 is', means: 'where the SO3 is known from', from: 'typed' }),
		'estimated',
	),
};

export type ClearanceGiven = Given<typeof CLEARANCE_INPUTS>;
