import type { CalcNote, Verdict } from '../calculator';

/** Clearance of one state, and the expanded uncertainty kept between it and the margin [K]. */
export type Clearance = { readonly clearance: number; readonly guard: number };

export type ClearanceFacts = {
	readonly surface: string;
	readonly margin: number;
	/** Per state: undefined where nobody stated it, 'dry' where nothing can condense. */
	readonly present: Clearance | 'dry' | undefined;
	readonly predicted: Clearance | 'dry' | undefined;
};

/**
 * Adequate when the coldest surface keeps the margin and the guard above the dew point, now and with feed on. The state
 * that comes with the feed decides: without it nothing is shown.
 */
export function clearanceVerdict({ present, predicted, ...facts }: ClearanceFacts): Verdict {
	if (predicted === undefined || predicted === 'dry') {
		const kind = predicted === undefined ? 'predicted-state-not-stated' : 'predicted-state-dry';
		return { word: 'cannot be shown', reasons: [{ kind, level: 'reason' }] };
	}
	const reasons = [
		...(present === undefined || present === 'dry' ? [] : [judged({ state: 'present', ...present, ...facts })]),
		judged({ state: 'predicted', ...predicted, ...facts }),
	];
	const isAdequate = reasons.every((reason) => reason.kind === 'clearance-kept');
	return { word: isAdequate ? 'adequate' : 'not yet', reasons };
}

type Judged = Clearance & { readonly state: string; readonly surface: string; readonly margin: number };

function judged(facts: Judged): CalcNote {
	const { clearance, guard, margin } = facts;
	const kind = (): string => {
		if (clearance - guard >= margin) return 'clearance-kept';
		if (clearance >= margin) return 'inside-guard-band';
		return clearance > 0 ? 'below-margin' : 'surface-below-dew-point';
	};
	return { kind: kind(), level: 'reason', ...facts };
}
