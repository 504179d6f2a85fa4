import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { nowFacts } from '../../src/lib/app';
import { playStartUp } from '../../src/lib/demo';
import { allOf, millis, parseTrend, printInstant, standing } from '../../src/lib/record';
import { value } from './test-site';

const FOLDER = join(import.meta.dirname, '../../static/demo');

/** The start-up of the demonstration as it stood, and as it was known, at a moment of its story. */
export type At = (moment: string) => Parameters<typeof nowFacts>[0];

export async function toldNight(): Promise<At> {
	const { procedure, plant, tablets, play } = await playStartUp({
		read: (name) => new Uint8Array(readFileSync(join(FOLDER, name))),
	});
	const held = play.tablets.flatMap((tablet) => tablets.held(tablet));
	const all = [...new Map(held.map((event) => [event.id, event])).values()];
	const trendOf = (file: string) => value(parseTrend(readFileSync(join(FOLDER, 'trends', file), 'utf8'), 60));
	const trends = new Map(
		allOf(all, 'series attached').map(({ body }) => [body.attachment.hash, trendOf(body.attachment.name)]),
	);
	return (moment) => {
		const until = millis(moment);
		const events = all.filter(({ log, enteredAt }) => log === play.startUp && enteredAt <= until);
		const siteLog = all.filter(({ log, enteredAt }) => log !== play.startUp && enteredAt <= until);
		const opened = allOf(events, 'start-up opened')[0];
		if (opened === undefined) throw new Error('the start-up was not opened by then');
		return {
			...{ procedure, plant, opened, events, siteLog, trends, device: 'T-1' },
			standing: standing(procedure, events, siteLog, moment),
			instant: (when = until) => printInstant(when, 60),
		};
	};
}
