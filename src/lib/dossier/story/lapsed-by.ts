import { allOf, millis, type Standing } from '../../record';
import type { Story } from './story';

type PlantEvent = Standing['plantEvents'][number];

/** Proofs that a plant event took away because they name it and were seen before it was over, and when they came back. */
export function lapsedBy(
	event: PlantEvent,
	{ events, input, moments }: Story,
): readonly { readonly step: string; readonly again: string | undefined }[] {
	const over = event.end === null ? Infinity : millis(event.end);
	const entries = allOf(events, 'entry').filter(
		({ body }) => body.outcome === 'pass' || body.outcome === 'not applicable',
	);
	return input.procedure.steps
		.filter((step) =>
			step.lapsedBy.some((by) =>
				typeof by === 'string'
					? event.countsAs.includes(by)
					: event.countsAs.includes(by.event) && (by.item === undefined || by.item === event.item),
			),
		)
		.flatMap(({ id }) => {
			const own = entries.filter(({ body }) => body.step === id);
			if (!own.some(({ observedAt }) => observedAt < over && observedAt <= millis(event.entered))) return [];
			const again = own.filter(({ observedAt }) => observedAt >= over).sort((a, b) => a.observedAt - b.observedAt)[0];
			return [{ step: id, again: again === undefined ? undefined : moments.clock(again.observed ?? again.entered) }];
		});
}
