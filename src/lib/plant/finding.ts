import type { QuantityError } from '../quantity';

/** One contradiction in a plant description. `path` names the place in the document: `points[3].at`. */
export type PlantFinding = { readonly path: string } & (
	| { readonly kind: 'duplicate-id'; readonly id: string; readonly first: string }
	| { readonly kind: 'unknown-place'; readonly id: string }
	| { readonly kind: 'unknown-point'; readonly tag: string }
	| { readonly kind: 'unknown-duct'; readonly id: string }
	| { readonly kind: 'unknown-instrument'; readonly id: string }
	| { readonly kind: 'instrument-of-another-point'; readonly instrument: string; readonly point: string }
	| { readonly kind: 'not-an-inert-gas-meter'; readonly tag: string; readonly medium: string }
	| { readonly kind: 'unconnected-volume'; readonly id: string }
	| { readonly kind: 'unknown-quantity'; readonly quantity: string }
	| {
			readonly kind: 'unknown-unit';
			readonly unit: string;
			readonly quantity: string;
			readonly known: readonly string[];
	  }
	| { readonly kind: 'bad-value'; readonly error: QuantityError }
	| { readonly kind: 'basis-disagrees'; readonly quantity: string; readonly basis: 'wet' | 'dry' | 'none' }
	| { readonly kind: 'range-reversed'; readonly from: number; readonly to: number }
	| { readonly kind: 'throat-not-smaller'; readonly throat: string; readonly pipe: string }
	| { readonly kind: 'no-such-day'; readonly day: string }
	| { readonly kind: 'limit-without-side'; readonly limit: string }
	| { readonly kind: 'guard-leaves-nothing'; readonly limit: string }
	/** The largest minimum of a point is not below its smallest maximum: nothing could ever pass. */
	| { readonly kind: 'limits-cross'; readonly point: string; readonly atLeast: string; readonly atMost: string }
	/** Without a tested limiting oxygen concentration of this fuel there is no oxygen limit, and Gate 2 has no basis. */
	| { readonly kind: 'no-fuel-report' }
);
