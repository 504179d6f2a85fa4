import { roughly } from '../../drawing';
import { noteText, type LeaderNote } from './leader-notes';
import type { Row } from './row';

export type PlacedNote = {
	readonly note: LeaderNote;
	/** What is said after its word, cut where there is no more room. */
	readonly text: string;
	/** Baseline of its text. */
	readonly y: number;
	/** Of the contact that it leads to, and where the leader begins under it. */
	readonly x: number;
	readonly foot: number;
	readonly textX: number;
	readonly anchor: 'start' | 'end';
	/** Where the leader meets the text. */
	readonly edge: number;
};

type Room = { readonly top: number; readonly left: number; readonly right: number };
type Found = { readonly note: LeaderNote; readonly x: number; readonly foot: number; readonly length: number };
type Line = Found & { readonly from: number; readonly to: number; readonly side: Side };
type Side = 'margin' | 'left' | 'right';

/**
 * One line per note under the rung, each text at the margin or beside its leader, in the order in which the fewest texts
 * lie across a leader of another: with four notes at most, all orders are tried.
 */
export function placeNotes(rows: readonly Row[], notes: readonly LeaderNote[], room: Room): readonly PlacedNote[] {
	const found = notes.slice(0, MOST).flatMap((note): readonly Found[] => {
		const row = rows.find(({ contacts }) => contacts.some(({ contact }) => contact.id === note.contact));
		const at = row?.contacts.find(({ contact }) => contact.id === note.contact);
		const length = roughly(`${note.word} ${noteText(note)}`, 'strong', 18) + 4;
		return row === undefined || at === undefined ? [] : [{ note, x: at.x, foot: row.y + 52, length }];
	});
	const tried = orders(found).flatMap((order) => choices(order.map((each) => sidesOf(each, room))));
	const best = tried.reduce<readonly Line[] | undefined>(
		(least, lines) => (least === undefined || cost(lines) < cost(least) ? lines : least),
		undefined,
	);
	return (best ?? []).map(({ note, x, foot, from, to, side }, k) => ({
		...{ note, x, foot, y: room.top + k * PITCH + 24, text: cut(note, to - from) },
		textX: side === 'left' ? to : from,
		anchor: side === 'left' ? 'end' : 'start',
		edge: side === 'right' ? from - 6 : to + 6,
	}));
}

/** Where a text may stand. One that has no room anywhere begins at the margin and is cut by nobody. */
function sidesOf(each: Found, { left, right }: Room): readonly Line[] {
	const { x, length } = each;
	const sides: readonly Line[] = [
		{ ...each, side: 'margin', from: left, to: left + length },
		{ ...each, side: 'left', from: x - 18 - length, to: x - 18 },
		{ ...each, side: 'right', from: x + 20, to: x + 20 + length },
	];
	const fitting = sides.filter(({ side, from, to }) => from >= left && to <= (side === 'right' ? right : x - 16));
	return fitting.length > 0
		? fitting
		: [
				{
					...each,
					...(x - left > right - x
						? { side: 'margin', from: left, to: x - 18 }
						: { side: 'right', from: x + 20, to: right - 6 }),
				},
			];
}

function cut(note: LeaderNote, width: number): string {
	let text = noteText(note);
	const isTooLong = (): boolean => roughly(`${note.word} ${text}`, 'strong', 18) > width;
	if (!isTooLong()) return text;
	while (text.length > 8 && isTooLong()) text = text.slice(0, -1);
	return `${text.slice(0, -1).trimEnd()}…`;
}

/** Texts across leaders count most; then those beside their leader instead of at the margin. */
const cost = (lines: readonly Line[]): number =>
	lines.reduce((sum, { from, to, side }, k) => {
		const crossed = lines.slice(k + 1).filter(({ x }) => x > from - 6 && x < to + 6).length;
		const own = lines[k]?.x ?? 0;
		const led = lines.slice(k + 1).filter(({ x }) => x > to && x < own).length;
		return sum + crossed * 10 + led * 4 + (side === 'margin' ? 0 : 1);
	}, 0);

const orders = <T>(of: readonly T[]): readonly (readonly T[])[] =>
	of.length <= 1
		? [of]
		: of.flatMap((first, i) => orders(of.filter((_, k) => k !== i)).map((rest) => [first, ...rest]));

const choices = <T>(of: readonly (readonly T[])[]): readonly (readonly T[])[] =>
	of.reduce<readonly (readonly T[])[]>(
		(all, each) => all.flatMap((before) => each.map((one) => [...before, one])),
		[[]],
	);

const PITCH = 48;
const MOST = 4;
