import { shownState } from '../story/state-words';
import { entriesUnder, type ToldEntry, type ToldStep } from '../story/entries';
import type { Story } from '../story/story';
import { STYLES, type Flow } from '../layout/flow';
import { table, type Cell, type Column, type Row } from '../layout/table';

/** Every entry under a gate: value as typed, limit and guard, when, with what, by whom; what was overruled stays, in grey. */
export function entriesOfGate(flow: Flow, story: Story, gate: number): void {
	const { say } = story;
	const steps = entriesUnder(gate, story);
	flow.heading(say('entries.title'), { with: 70 });
	table(
		flow,
		columnsOf(story),
		steps.flatMap((step) => rowsOf(step, story)),
	);
	flow.write(say('entries.note', { offset: story.moments.full(story.sealed.entered).slice(-6) }), STYLES.note);
}

const columnsOf = ({ say }: Story): readonly Column[] => [
	{ head: say('entries.step'), width: 36, voice: 'strong' },
	{ head: say('entries.what') },
	{ head: say('entries.value'), width: 82, align: 'end', voice: 'strong' },
	{ head: say('entries.limit'), width: 88 },
	{ head: say('entries.seen'), width: 57 },
	{ head: say('entries.with'), width: 44 },
	{ head: say('entries.state'), width: 64 },
];

function rowsOf({ step, standing, entries }: ToldStep, story: Story): readonly Row[] {
	const [newest, ...others] = entries;
	const state = shownState(standing, story);
	if (newest === undefined) return [{ cells: [step.id, step.title, '', '', '', '', state] }];
	const earlier = (newest.place === 'counts' ? others : entries).map((entry) => ({
		text: story.say('entries.before', { what: inOneLine(entry, story) }),
	}));
	const [first, ...more] = newest.place === 'counts' ? newest.found : [];
	const seen = newest.place === 'counts' ? story.moments.short(newest.event.observed ?? newest.event.entered) : '';
	const only = first !== undefined && more.length === 0 && (first.what === '' || first.what === step.title);
	const titleRow: Row = {
		cells: [
			step.id,
			{ text: step.title, voice: 'strong' },
			only ? first.value : '',
			only ? first.limit : '',
			seen,
			only ? first.instrument : '',
			state,
		],
		...(newest.place === 'counts' && (only || first === undefined)
			? { notes: [aboutEntry(newest, story), ...earlier] }
			: newest.place === 'counts'
				? {}
				: { notes: earlier }),
	};
	if (newest.place !== 'counts' || only || first === undefined) return [titleRow];
	return [
		titleRow,
		...newest.found.map(({ what, value, limit, instrument, fails }, i): Row => {
			const shown: Cell = fails === true ? { text: value, voice: 'strong', tone: 'bad' } : value;
			const last = i === newest.found.length - 1;
			return {
				cells: ['', what, shown, limit, '', instrument, ''],
				...(last ? { notes: [aboutEntry(newest, story), ...earlier] } : {}),
			};
		}),
	];
}

/** Who, on which tablet, when it was typed in, and everything said with it. */
function aboutEntry({ event, lateMinutes }: ToldEntry, { say, names, moments }: Story): string {
	const { body, person, device, entered } = event;
	const readBy = [
		...new Set(
			(body.values ?? []).flatMap(({ readBy: reader }) =>
				reader === undefined || reader === person ? [] : [names.person(reader)],
			),
		),
	];
	return [
		say('entries.by', { person: names.person(person), device, entered: moments.short(entered) }),
		...(lateMinutes === undefined ? [] : [say('entries.late', { minutes: Math.round(lateMinutes) })]),
		...(readBy.length === 0 ? [] : [say('entries.read by', { people: readBy.join(', ') })]),
		...(body.from === undefined ? [] : [say('entries.from', { from: moments.short(body.from) })]),
		...(body.flow === undefined ? [] : [say('entries.flow', { flow: body.flow })]),
		...(body.limit === undefined ? [] : [body.limit]),
		...(body.reason === undefined ? [] : [say('entries.reason', { reason: body.reason })]),
		...(body.note === undefined ? [] : [say('entries.remark', { note: body.note })]),
	].join('; ');
}

function inOneLine(entry: ToldEntry, story: Story): string {
	const { event, found, place } = entry;
	const { say, moments } = story;
	const values = found.map(({ what, value, instrument }) =>
		[instrument === '' ? what : instrument, value].filter((part) => part !== '').join(' '),
	);
	const outcome =
		place === 'earlier' || place === 'counts' ? say(`outcome.${event.body.outcome}`) : say(`place.${place}`);
	return [
		say('entries.earlier', { outcome, seen: moments.short(event.observed ?? event.entered) }),
		...(values.length === 0 ? [] : [values.join(', ')]),
		aboutEntry(entry, story),
	].join('; ');
}
