import type { CalcValue, OutputSpec } from '../calculator';
import type { Numbers } from '../uncertainty';

/** Everything `dew-point-clearance@1` answers. */
export const CLEARANCE_OUTPUTS: readonly OutputSpec[] = [
	{
		name: 'coldestTemperature',
		symbol: 'T_s',
		means: 'temperature of the coldest surface',
		quantity: 'temperature',
		unit: 'K',
	},
	{ name: 'waterVapour', symbol: 'x_w', means: 'moisture of the gas at present', quantity: 'water-vapour', unit: '1' },
	{
		name: 'predictedWaterVapour',
		symbol: 'x_w',
		means: 'moisture predicted with feed on',
		quantity: 'water-vapour',
		unit: '1',
	},
	{ name: 'dewPoint', symbol: 'T_dp', means: 'dew or frost point at present', quantity: 'temperature', unit: 'K' },
	{
		name: 'predictedDewPoint',
		symbol: 'T_dp',
		means: 'dew or frost point with feed on',
		quantity: 'temperature',
		unit: 'K',
	},
	{
		name: 'clearance',
		means: 'coldest surface above the dew point at present',
		quantity: 'temperature-difference',
		unit: 'K',
	},
	{
		name: 'predictedClearance',
		means: 'coldest surface above the dew point with feed on',
		quantity: 'temperature-difference',
		unit: 'K',
	},
	{
		name: 'leastClearance',
		means: 'the smaller of the two, which decides',
		quantity: 'temperature-difference',
		unit: 'K',
	},
	{
		name: 'acidDewPoint',
		means: 'acid dew point by Verhoff and Banchero, a remark',
		quantity: 'temperature',
		unit: 'K',
	},
	{ name: 'acidDewPointOkkes', means: 'acid dew point by Okkes, a remark', quantity: 'temperature', unit: 'K' },
];

/** Values in the order of the outputs; a dry gas has no dew point, and what nobody stated has no value. */
export const clearanceValues = (values: Numbers, U: Numbers): { readonly [name: string]: CalcValue } =>
	Object.fromEntries(
		CLEARANCE_OUTPUTS.map(({ name, unit }): [string, CalcValue] => {
			const value = values[name];
			if (value === undefined)
				return [name, { value: null, unit, because: BECAUSE[name] ?? 'not stated, or the gas is dry' }];
			return [name, { value, unit, ...(U[name] === undefined ? {} : { U: U[name] }) }];
		}),
	);

const BECAUSE: { readonly [name: string]: string } = {
	waterVapour: 'not stated',
	predictedWaterVapour: 'not stated',
	acidDewPoint: 'no SO3 stated',
	acidDewPointOkkes: 'no SO3 stated, or less than 1e-8 atm of it',
};
