import { capitalised } from '../../wording';
import { shownState } from '../story/state-words';
import { entriesUnder, type Found, type ToldEntry, type ToldStep } from '../story/entries';
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
	{ head: say('entries.value'), width: 76, align: 'end', voice: 'strong' },
	{ head: say('entries.limit'), width: 100 },
	{ head: say('entries.seen'), width: 63 },
	{ head: say('entries.with'), width: 46 },
	{ head: say('entries.state'), width: 62 },
];

function rowsOf({ step, standing, entries }: ToldStep, story: Story): readonly Row[] {
	const counting = entries.find(({ place }) => place === 'counts');
	const earlier = entries
		.filter((entry) => entry !== counting)
		.map((entry) => story.say('entries.before', { what: inOneLine(entry, story) }));
	const found = counting?.found ?? [];
	const [only] = found.length === 1 ? found : [];
	const inTitle = only !== undefined && (only.what === '' || only.what === step.title) ? only : undefined;
	const seen = counting === undefined ? '' : story.moments.short(counting.event.observed ?? counting.event.entered);
	const notes = [...(counting === undefined ? [] : [aboutEntry(counting, story)]), ...earlier];
	const title: Row = {
		cells: [
			step.id,
			{ text: capitalised(step.title), voice: 'strong', span: inTitle === undefined ? 3 : 1 },
			inTitle?.value ?? '',
			inTitle?.limit ?? '',
			seen,
			inTitle?.instrument ?? '',
			shownState(standing, story),
		],
	};
	const rows: readonly Row[] = [title, ...(inTitle === undefined ? found.map(foundRow) : [])];
	return rows.map((row, i) => (i === rows.length - 1 && notes.length > 0 ? { ...row, notes } : row));
}

function foundRow({ what, value, limit, instrument, fails }: Found): Row {
	const shown: Cell = fails === true ? { text: value, voice: 'strong', tone: 'bad' } : value;
	const wide = value === '' && limit === '' ? { text: what, span: 4 } : what;
	return { joined: true, cells: ['', wide, shown, limit, '', instrument, ''] };
}

/** Who, on which tablet, when it was typed in, and everything said with it. */
function aboutEntry({ event, found, lateMinutes }: ToldEntry, { say, names, moments }: Story): string {
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
		...(body.limit === undefined || found.some(({ limit }) => limit !== '') ? [] : [body.limit]),
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
