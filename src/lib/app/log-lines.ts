import { allOf, headCode, headsOf, MINUTE, type RecordEvent } from '../record';
import { duration, type Moments, type Say } from '../wording';
import { goneEntries } from './now/counted-entries';
import { sayEvent, sayValues } from './say-event';
import { nameOf, type OpenRecord } from './record-words';

type LogGroup = 'entries' | 'plant events' | 'gate acts' | 'deviations' | 'others';

/** The whole log in words, the newest entered first: also what was withdrawn, corrected or refused. Nothing is left out. */
export function logLines(told: OpenRecord, say: Say, moments: Moments) {
	const gone = goneEntries(told.events, told.standing);
	const late = new Map(told.standing.late.map(({ event, minutes }) => [event, minutes]));
	const idle = new Map(told.standing.withoutEffect.map(({ event, because }) => [event, because]));
	const notCounted = new Map(told.standing.acts.map((act) => [act.event, act]));
	const after = new Set(told.standing.afterSeal);
	const findings = allOf(told.siteLog, 'instrument finding').filter(
		({ enteredAt }) => enteredAt >= told.opened.enteredAt,
	);
	return [...told.events, ...findings]
		.sort((a, b) => b.enteredAt - a.enteredAt || b.clock - a.clock)
		.map((event) => {
			const value = event.kind === 'entry' ? sayValues(event.body, told, say) : undefined;
			const act = notCounted.get(event.id);
			const fate = [
				...saidGone(gone.get(event.id), say, moments),
				...(idle.has(event.id) ? [say('log.without effect', { because: idle.get(event.id) ?? '' })] : []),
				...(act?.counted === false ? [say('log.not counted', { because: act.notCountedBecause.join('; ') })] : []),
				...(after.has(event.id) ? [say('log.after seal')] : []),
			];
			const written = saidEntered(event, late.get(event.id), say, moments);
			return {
				event: event.id,
				group: groupOf(event),
				seen: moments.short(event.observed ?? event.entered),
				...(written === undefined ? {} : { late: written }),
				isLate: late.has(event.id),
				what: sayEvent(event, told, say),
				...whereOf(event),
				...(value === undefined ? {} : { value }),
				who: nameOf(told, event.person),
				tablet: event.device,
				...(fate.length === 0 ? {} : { gone: fate.join('. ') }),
				isGone: gone.has(event.id),
				...(event.kind === 'entry' && !gone.has(event.id) ? { canWithdraw: true as const } : {}),
			};
		});
}

/** Of every tablet how far its chain goes, and its head code, to be said by radio. */
export const logHeads = ({ events }: Pick<OpenRecord, 'events'>, say: Say): string =>
	[...headsOf(events)]
		.map(([device, head]) => say('log.head', { device, n: head.number, code: headCode(head) }))
		.join('. ');

/** When it was entered, where that was not when it was seen; and how late, where the site calls it late. */
function saidEntered(event: RecordEvent, minutes: number | undefined, say: Say, moments: Moments): string | undefined {
	const at = moments.clock(event.entered);
	if (minutes !== undefined) return say('log.entered late', { at, time: duration(minutes * MINUTE) });
	return event.enteredAt - event.observedAt < MINUTE ? undefined : say('log.entered', { at });
}

function saidGone(by: RecordEvent | undefined, say: Say, moments: Moments): readonly string[] {
	if (by === undefined) return [];
	const at = moments.clock(by.entered);
	return by.kind === 'entry withdrawn'
		? [say('log.withdrawn', { at, reason: by.body.reason })]
		: [say('log.superseded', { at })];
}

/** The step or the hold point that an event belongs to. */
function whereOf(event: RecordEvent): { readonly step?: string; readonly gate?: number } {
	const { body } = event as { readonly body: { readonly step?: unknown; readonly gate?: unknown } };
	if (typeof body.step === 'string') return { step: body.step };
	return typeof body.gate === 'number' ? { gate: body.gate } : {};
}

function groupOf({ kind }: RecordEvent): LogGroup {
	if (kind === 'entry' || kind === 'series attached' || kind === 'entry withdrawn' || kind === 'not applicable agreed')
		return 'entries';
	if (kind.startsWith('plant event') || kind === 'fact' || kind === 'instrument finding') return 'plant events';
	if (kind.startsWith('deviation')) return 'deviations';
	return GATE_ACTS.has(kind) ? 'gate acts' : 'others';
}

const GATE_ACTS: ReadonlySet<RecordEvent['kind']> = new Set([
	'gate released',
	'gate refused',
	'refusal answered',
	'gate released by voice',
	'gate released on paper',
	'refused act',
	'shift hand-over',
	'sealed',
]);
