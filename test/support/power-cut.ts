import { readFileSync, statSync, truncateSync } from 'node:fs';
import { which } from './install.mjs';

/** strace sees what a browser hands to the system, and what it makes the system put onto the medium. */
export const canWatchTheMedium = which('strace') !== undefined;

export const watcher = (trace: string): readonly string[] => [
	...['strace', '-f', '-qq', '-y', '-s', '0', '-o', trace],
	...['-e', 'trace=write,pwrite64,fdatasync,fsync'],
];

/**
 * Cuts the power after the fact: what IndexedDB's log holds beyond its last flush to the medium is cut off, as it would be
 * lost where the system had not written it by itself.
 */
export function cutPower(trace: string): void {
	for (const [file, synced] of syncedLengths(readFileSync(trace, 'utf8')))
		truncateSync(file, Math.min(statSync(file).size, synced));
}

/** A call that another thread interrupts stands on two lines: "write(5</log>, ... <unfinished ...>", "<... write resumed>) = 9". */
function syncedLengths(trace: string): ReadonlyMap<string, number> {
	const written = new Map<string, number>();
	const synced = new Map<string, number>();
	const unfinished = new Map<string, { readonly call: string; readonly file: string }>();
	const done = (call: string, file: string, answer: number): void => {
		if (call.includes('write')) written.set(file, (written.get(file) ?? 0) + answer);
		else synced.set(file, written.get(file) ?? 0);
	};
	for (const line of trace.split('\n')) {
		const answer = / = (\d+)$/.exec(line)?.[1];
		const [, thread = '', call = '', file = ''] = BEGUN.exec(line) ?? RESUMED.exec(line) ?? [];
		const begun = file === '' ? unfinished.get(thread) : { call, file };
		if (begun?.call !== call || !INDEXED_DB_LOG.test(begun.file)) continue;
		if (line.endsWith('<unfinished ...>')) unfinished.set(thread, begun);
		else {
			unfinished.delete(thread);
			if (answer !== undefined) done(call, begun.file, Number(answer));
		}
	}
	return new Map([...written.keys()].map((file) => [file, synced.get(file) ?? 0]));
}

const BEGUN = /^(\d+)\s+(write|pwrite64|fdatasync|fsync)\(\d+<([^>]+)>/;
const RESUMED = /^(\d+)\s+<\.\.\. (\w+) resumed>/;
const INDEXED_DB_LOG = /indexeddb\.leveldb\/\d+\.log$/;
