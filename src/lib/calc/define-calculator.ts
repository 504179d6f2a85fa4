import { ok, type Result } from '../base';
import type { CalcResult, Calculator, Refusal } from './calculator';
import { CONSTANTS } from './constants';
import { inputSchema, inputSpecs, readInputs, type Fields, type Given } from './read-inputs';

/** What a calculator says about itself, and the calculation proper: SI values in, values, notes and plots out. */
type Definition<F extends Fields> = Pick<
	Calculator,
	'id' | 'version' | 'title' | 'answers' | 'sources' | 'outputs' | 'page'
> & {
	readonly fields: F;
	readonly compute: (given: Given<F>) => Result<Omit<CalcResult, 'calc' | 'constants' | 'inputs'>, readonly Refusal[]>;
};

/** Puts reading before computing, and stamps the result with calculator, constants and inputs as typed. */
export const defineCalculator = <F extends Fields>({ fields, compute, ...about }: Definition<F>): Calculator => ({
	...about,
	inputs: inputSpecs(fields),
	schema: inputSchema(fields),
	run: (raw) => {
		const read = readInputs(fields, raw);
		if (!read.ok) return read;
		const computed = compute(read.value.given);
		if (!computed.ok) return computed;
		return ok({
			calc: `${about.id}@${about.version}`,
			constants: CONSTANTS,
			inputs: read.value.typed,
			...computed.value,
		});
	},
});
