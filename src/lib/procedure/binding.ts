import * as v from 'valibot';

const Id = v.pipe(v.string(), v.regex(/^[A-Za-z0-9][A-Za-z0-9._-]{0,63}$/));
const Text = v.pipe(v.string(), v.minLength(1), v.maxLength(2000));

/**
 * Where an input of a calculator comes from, so that nobody types what is known and everybody sees its origin. Bindings
 * nest: a table of places is a `list` of `group`s whose cells come from plant, readings and proofs.
 */
export type Binding =
	/** A reading of a step, as typed. */
	| { readonly from: 'field'; readonly step: string; readonly field: string }
	/** How old that reading is when the calculation runs. */
	| { readonly from: 'age'; readonly step: string; readonly field: string }
	/** What the analyser was said to be doing when that reading was taken: measuring, hold, back-purge ... */
	| { readonly from: 'mode'; readonly step: string; readonly field: string }
	/** The samples of a series step, by tag. */
	| { readonly from: 'series'; readonly step: string }
	/** The instant from which the series counts its seconds. */
	| { readonly from: 'zero'; readonly step: string }
	/** When a step was observed, in seconds since the zero of a series. `otherwise` stands in while it was not. */
	| { readonly from: 'observed'; readonly step: string; readonly zero: string; readonly otherwise?: unknown }
	/** Who performed a step. */
	| { readonly from: 'person'; readonly step: string }
	/** Whether the proof of a step stands; `says` gives the calculator's own two words for it. */
	| { readonly from: 'standing'; readonly step: string; readonly says?: Says }
	/** The rows of a coverage step, with the readings taken at outlets. */
	| { readonly from: 'coverage'; readonly step: string; readonly zero: string }
	/** One output of another calculation step. */
	| { readonly from: 'result'; readonly step: string; readonly output: string }
	/** A slash path through the plant description, lists by id or tag: `venturis/FT-201/pipeDiameter`. */
	| { readonly from: 'plant'; readonly path: string }
	| { readonly from: 'limit'; readonly limit: string; readonly side: 'atMost' | 'atLeast' | 'guard' }
	/** `valid` or `none`: whether an instrument is in calibration when the calculation runs. */
	| { readonly from: 'calibration'; readonly instrument: string }
	/** Said by the procedure itself; `why` is shown beside it. */
	| { readonly from: 'procedure'; readonly value: unknown; readonly why?: string }
	| { readonly from: 'typed'; readonly title: string }
	/** An object. `optional`: left out as a whole while a part of it is missing. */
	| { readonly from: 'group'; readonly of: { readonly [name: string]: Binding }; readonly optional?: true }
	| { readonly from: 'list'; readonly of: readonly Binding[] };

type Says = { readonly stands: string; readonly otherwise: string };

const nested: v.GenericSchema<unknown, Binding> = v.lazy(() => BindingSchema);

export const BindingSchema: v.GenericSchema<unknown, Binding> = v.variant('from', [
	v.strictObject({ from: v.literal('field'), step: Id, field: Id }),
	v.strictObject({ from: v.literal('age'), step: Id, field: Id }),
	v.strictObject({ from: v.literal('mode'), step: Id, field: Id }),
	v.strictObject({ from: v.literal('series'), step: Id }),
	v.strictObject({ from: v.literal('zero'), step: Id }),
	v.strictObject({ from: v.literal('observed'), step: Id, zero: Id, otherwise: v.exactOptional(v.unknown()) }),
	v.strictObject({ from: v.literal('person'), step: Id }),
	v.strictObject({
		from: v.literal('standing'),
		step: Id,
		says: v.exactOptional(v.strictObject({ stands: v.string(), otherwise: v.string() })),
	}),
	v.strictObject({ from: v.literal('coverage'), step: Id, zero: Id }),
	v.strictObject({ from: v.literal('result'), step: Id, output: Id }),
	v.strictObject({ from: v.literal('plant'), path: v.string() }),
	v.strictObject({ from: v.literal('limit'), limit: Id, side: v.picklist(['atMost', 'atLeast', 'guard']) }),
	v.strictObject({ from: v.literal('calibration'), instrument: Id }),
	v.strictObject({ from: v.literal('procedure'), value: v.unknown(), why: v.exactOptional(Text) }),
	v.strictObject({ from: v.literal('typed'), title: Text }),
	v.strictObject({
		from: v.literal('group'),
		of: v.record(v.string(), nested),
		optional: v.exactOptional(v.literal(true)),
	}),
	v.strictObject({ from: v.literal('list'), of: v.array(nested) }),
]);
