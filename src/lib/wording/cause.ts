import { unreachable } from '../base';
import type { Cause } from '../record';
import type { Moments } from './moment';
import type { Say } from './say';
import { sayWord } from './word';

/** What a sentence needs to know of the procedure and the plant, to name things as people do. */
export type Names = {
	readonly plantEvent: (what: string) => string;
	readonly permissive: (id: string) => string;
};

/** Why a proof did not stand, in words. */
export function sayCause(cause: Cause, say: Say, moments: Moments, names: Names): string {
	switch (cause.kind) {
		case 'plant event': {
			const { begin, end } = cause;
			const what = [names.plantEvent(cause.what), ...(cause.item === undefined ? [] : [cause.item])].join(' ');
			return end === null
				? say('cause.plant event goes on', { what, begin: moments.clock(begin) })
				: say('cause.plant event', { what, begin: moments.clock(begin), end: moments.clock(end) });
		}
		case 'age':
			return say('cause.age', { minutes: cause.minutes, since: moments.clock(cause.since) });
		case 'age counts again':
			return say('cause.age counts again', { minutes: cause.minutes, gate: cause.gate });
		case 'watch gap':
			return say('cause.watch gap', { minutes: cause.minutes, since: moments.clock(cause.since) });
		case 'flow not shown':
			return say('cause.flow not shown');
		case 'relies on':
			return say('cause.relies on', { step: cause.step });
		case 'instrument finding':
			return cause.lastGood === null
				? say('cause.instrument finding, never good', { instrument: cause.instrument })
				: say('cause.instrument finding', { instrument: cause.instrument, lastGood: moments.clock(cause.lastGood) });
		case 'measuring point changed':
			return say('cause.measuring point changed', { point: cause.point });
		case 'outcome':
			return say('cause.outcome', { outcome: sayWord(cause.outcome, say) });
		case 'rows missing':
			return say('cause.rows missing', { rows: cause.rows.join(', ') });
		case 'condition':
			return say('cause.condition', {
				condition: names.permissive(cause.permissive),
				value: sayWord(cause.value, say),
			});
		case 'not agreed':
			return say('cause.not agreed');
		case 'not proved':
			return say('cause.not proved');
		default:
			return unreachable(cause);
	}
}
