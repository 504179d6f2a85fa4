import type { Procedure } from '../procedure';
import type { Millis } from './instants';
import type { Played } from './play';

/** A time longer than allowed without a reading at every place, while the watch was needed. It prints (ST6). */
export type WatchGap = { readonly step: string; readonly from: Millis; readonly to: Millis | undefined };

export function watchGaps(procedure: Procedure, played: Played): readonly WatchGap[] {
	return procedure.steps.flatMap((step) => {
		const track = played.steps.get(step.id);
		if (track === undefined || !track.isWatch || !track.required) return [];
		const readings = played.facts.entries
			.filter((entry) => entry.step === step.id && entry.outcome === 'pass' && entry.observed <= played.now)
			.map(({ observed }) => observed)
			.sort((a, b) => a - b);
		const notNeededFrom = played.gates.find(({ gate }) => gate.number === track.until)?.release?.at ?? Infinity;
		return readings.flatMap((reading, i) => {
			const from = reading + track.life;
			const to = readings[i + 1];
			const ends = Math.min(to ?? played.now, notNeededFrom);
			return from < ends ? [{ step: step.id, from, to: to === undefined || to > notNeededFrom ? undefined : to }] : [];
		});
	});
}
