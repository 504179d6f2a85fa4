import { MINUTE, millis } from '../../record';
import { duration, shownText, type Moments, type Say } from '../../wording';
import type { OpenRecord } from '../record-words';

/** Proofs that run out by their age, the next one first. */
export function nextToLapse(
	{ procedure, standing }: Pick<OpenRecord, 'procedure' | 'standing'>,
	say: Say,
	moments: Moments,
) {
	const now = millis(standing.at);
	return standing.steps
		.flatMap(({ step, state, until, observed }) => {
			const title = procedure.steps.find(({ id }) => id === step)?.title ?? '';
			if (state !== 'stands' || until === undefined || until === 'unknown' || observed === undefined) return [];
			const [begin, end] = [millis(observed), millis(until)];
			return end <= now ? [] : [{ step, title, begin, end, until }];
		})
		.sort((a, b) => a.end - b.end)
		.map(({ step, title, begin, end, until }) => ({
			step,
			title: `${step} ${shownText(title, say)}`,
			said: say('now.stands for', { time: duration(end - begin) }),
			when:
				end - now < 2 * 60 * MINUTE
					? say('now.in', { time: duration(Math.ceil((end - now) / MINUTE) * MINUTE) })
					: moments.day(until) === moments.day(standing.at)
						? say('now.at', { at: moments.clock(until) })
						: moments.short(until),
			left: (end - now) / (end - begin),
			end,
		}));
}
