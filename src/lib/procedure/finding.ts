import type { ConditionFinding } from './condition';

/** One mistake in a procedure. `path` names the place in the document: `steps[12].redo[1]`. */
export type ProcedureFinding = { readonly path: string; readonly step?: string } & (
	| Unknown
	| { readonly kind: 'duplicate-id'; readonly id: string; readonly first: string }
	// Order of gates and steps.
	| { readonly kind: 'gate-out-of-order'; readonly number: number; readonly expected: number }
	| { readonly kind: 'gate-without-steps'; readonly gate: number }
	/** `through` lists the steps of the circle in the order of relying, the first one again at the end. */
	| { readonly kind: 'circle'; readonly through: readonly string[] }
	| { readonly kind: 'relies-on-higher-gate'; readonly on: string; readonly gate: number; readonly higher: number }
	// Validity.
	| { readonly kind: 'until-below-own-gate'; readonly until: number; readonly gate: number }
	| { readonly kind: 'age-without-until'; readonly ageMinutes: number }
	| { readonly kind: 'until-without-age'; readonly until: number }
	| { readonly kind: 'watch-on-another-kind'; readonly stepKind: string }
	| { readonly kind: 'watch-step-without-watch'; readonly validity: string }
	// Fields and limits.
	| { readonly kind: 'unknown-quantity'; readonly quantity: string }
	| {
			readonly kind: 'unknown-unit';
			readonly unit: string;
			readonly quantity: string;
			readonly known: readonly string[];
	  }
	| { readonly kind: 'basis-disagrees'; readonly quantity: string; readonly basis: 'wet' | 'dry' | 'none' }
	| {
			readonly kind: 'field-disagrees-with-point';
			readonly point: string;
			readonly what: 'quantity' | 'basis';
			readonly field: string;
			readonly ofPoint: string;
	  }
	| {
			readonly kind: 'limit-of-another-quantity';
			readonly limit: string;
			readonly quantity: string;
			readonly ofLimit: string;
	  }
	| { readonly kind: 'limit-without-source' }
	| { readonly kind: 'limit-without-side' }
	| { readonly kind: 'bad-value'; readonly value: string; readonly quantity: string; readonly because: string }
	| { readonly kind: 'reads-nothing' }
	| { readonly kind: 'required-not-a-choice'; readonly required: string; readonly choices: readonly string[] }
	| { readonly kind: 'no-option-passes' }
	| { readonly kind: 'volume-without-row'; readonly volume: string }
	// Calculations.
	| {
			readonly kind: 'unknown-input';
			readonly calculator: string;
			readonly input: string;
			readonly known: readonly string[];
	  }
	| { readonly kind: 'input-not-bound'; readonly calculator: string; readonly input: string }
	| {
			readonly kind: 'unknown-output';
			readonly calculator: string;
			readonly output: string;
			readonly known: readonly string[];
	  }
	| {
			readonly kind: 'output-of-another-quantity';
			readonly output: string;
			readonly quantity: string;
			readonly ofOutput: string;
	  }
	| { readonly kind: 'binding-to-another-kind'; readonly from: string; readonly stepKind: string }
	| { readonly kind: 'unknown-plant-path'; readonly plantPath: string; readonly stopsAt: string }
	| { readonly kind: 'limit-lacks-side'; readonly limit: string; readonly side: string }
	/** The calculation would run before what it is bound to has been done. */
	| { readonly kind: 'bound-to-higher-gate'; readonly to: string; readonly gate: number; readonly higher: number }
	// Permissives.
	| {
			readonly kind: 'reading-disagrees-with-point';
			readonly name: string;
			readonly point: string;
			readonly ofPoint: string;
	  }
	| { readonly kind: 'condition'; readonly finding: ConditionFinding }
	// Limits of the unit that the procedure rests on.
	| {
			readonly kind: 'oxygen-limit-above-allowed';
			readonly limit: string;
			readonly allowed: string;
			readonly limitingOxygen: string;
	  }
);

/** A name that nothing in the procedure, the plant description, the roles or the catalogue answers to. */
type Unknown = {
	readonly kind: `unknown-${UnknownThing}`;
	readonly name: string;
	readonly known?: readonly string[];
};

export type UnknownThing =
	| 'step'
	| 'field'
	| 'gate'
	| 'permissive'
	| 'plant-event'
	| 'role'
	| 'calculator'
	| 'point'
	| 'limit'
	| 'instrument'
	| 'place'
	| 'element'
	| 'volume';
