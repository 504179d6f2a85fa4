import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fromUtf8 } from '../../../src/lib/base';
import type { CalcResult } from '../../../src/lib/calc';
import { playStartUp } from '../../../src/lib/demo';
import type { Plant } from '../../../src/lib/plant';
import type { Procedure } from '../../../src/lib/procedure';
import {
	allOf,
	gateSheet,
	parseTrend,
	tableOf,
	standing,
	type GateSheet,
	type Standing,
	type Trend,
	type TrendTable,
} from '../../../src/lib/record';

const FOLDER = join(import.meta.dirname, '../../../static/demo');

/** What the screens of the gallery show: the demonstration, stopped at moments where there is something to see. */
export type GalleryData = {
	readonly procedure: Procedure;
	readonly plant: Plant;
	readonly standings: { readonly [moment in keyof typeof MOMENTS]: Standing };
	readonly sheet: GateSheet;
	readonly notReady: GateSheet;
	readonly purge: CalcResult;
	readonly tried: CalcResult;
	readonly venturi: CalcResult;
	readonly zero: string;
	readonly trend: Trend;
	readonly table: TrendTable | undefined;
};

export const MOMENTS = {
	opened: '2026-03-14T16:30:00+01:00',
	lineUp: '2026-03-14T18:36:00+01:00',
	purging: '2026-03-14T21:22:00+01:00',
	ready: '2026-03-14T21:42:00+01:00',
	refused: '2026-03-15T02:10:00+01:00',
	stopped: '2026-03-15T02:30:00+01:00',
	found: '2026-03-15T02:56:00+01:00',
	end: '2026-03-15T11:10:00+01:00',
} as const;

export async function galleryData(): Promise<GalleryData> {
	const { procedure, plant, tablets, play } = await playStartUp({
		read: (name) => new Uint8Array(readFileSync(join(FOLDER, name))),
	});
	const held = play.tablets.flatMap((tablet) => tablets.held(tablet));
	const events = [...new Map(held.map((event) => [event.id, event])).values()];
	const startUp = events.filter(({ log }) => log === play.startUp);
	const site = events.filter(({ log }) => log !== play.startUp);
	const at = (moment: string): Standing => standing(procedure, startUp, site, moment);
	const standings = Object.fromEntries(Object.entries(MOMENTS).map(([name, moment]) => [name, at(moment)])) as {
		[moment in keyof typeof MOMENTS]: Standing;
	};
	const known = (moment: string) => events.filter(({ enteredAt }) => enteredAt <= Date.parse(moment));
	const results = allOf(startUp, 'entry').flatMap(({ body }) =>
		body.calculation === undefined ? [] : [body.calculation as unknown as CalcResult],
	);
	const judged = (calc: string, word?: string): CalcResult =>
		results.find((result) => result.calc.startsWith(calc) && (word === undefined || result.verdict?.word === word))!;
	const purge = judged('purge-adequacy', 'adequate');
	const text = fromUtf8(new Uint8Array(readFileSync(join(FOLDER, 'trends/purge-1-decimal-comma.csv'))));
	const trend = parseTrend(text, 60);
	return {
		procedure,
		plant,
		standings,
		sheet: gateSheet(procedure, standings.ready, known(MOMENTS.ready), { gate: 2, device: 'T-1' }),
		notReady: gateSheet(procedure, standings.stopped, known(MOMENTS.stopped), { gate: 2, device: 'T-1' }),
		purge,
		tried: judged('purge-adequacy', 'not yet'),
		venturi: judged('venturi-flow'),
		zero: String((purge.inputs as { zero?: string }).zero),
		trend: trend.ok ? trend.value : (undefined as never),
		table: tableOf(text),
	};
}
