import { isOf, type Millis, type RecordEvent } from '../record';

/** What is known of a log without reading it. It follows from the events and is kept in one transaction with them. */
export type LogRow = {
	readonly log: string;
	/** How many events the tablet holds; grows with every change, so that a watcher sees each. */
	readonly events: number;
	/** Of the event that was entered last. */
	readonly lastEntered: string;
	readonly lastEnteredAt: Millis;
	readonly sealed: boolean;
	/** Absent for the site's log, and for a start-up whose opening has not arrived yet. */
	readonly opened?: Opened;
};

type Opened = {
	readonly entered: string;
	readonly enteredAt: Millis;
	readonly title: string;
	readonly demonstration: boolean;
};

export type StartUp = {
	readonly id: string;
	readonly title: string;
	/** When it was opened. */
	readonly opened: string;
	readonly lastEntered: string;
	readonly events: number;
	readonly sealed: boolean;
	readonly demonstration: boolean;
};

/** The row after one more event; the same whatever order the events came in. */
export function withEvent(row: LogRow | undefined, event: RecordEvent): LogRow {
	const { log, entered: lastEntered, enteredAt: lastEnteredAt } = event;
	const before = row ?? { log, events: 0, lastEntered, lastEnteredAt, sealed: false };
	const opened = earlier(before.opened, openedBy(event));
	return {
		...before,
		events: before.events + 1,
		...(lastEnteredAt > before.lastEnteredAt ? { lastEntered, lastEnteredAt } : {}),
		sealed: before.sealed || isOf(event, 'sealed'),
		...(opened === undefined ? {} : { opened }),
	};
}

export function startUpOf(row: LogRow): readonly StartUp[] {
	if (row.opened === undefined) return [];
	const { log: id, lastEntered, events, sealed, opened } = row;
	const { title, demonstration } = opened;
	return [{ id, title, opened: opened.entered, lastEntered, events, sealed, demonstration }];
}

function openedBy(event: RecordEvent): Opened | undefined {
	if (!isOf(event, 'start-up opened')) return undefined;
	const { entered, enteredAt, log, body } = event;
	return { entered, enteredAt, title: body.title ?? log, demonstration: body.demonstration ?? false };
}

function earlier(a: Opened | undefined, b: Opened | undefined): Opened | undefined {
	if (a === undefined || b === undefined) return a ?? b;
	return b.enteredAt < a.enteredAt ? b : a;
}
