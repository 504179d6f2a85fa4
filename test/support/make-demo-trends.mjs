/**
 * Makes the invented trends of the demonstration (static/demo/trends): two purges as a recorder would have written them.
 * `npm run demo-data` writes them; the same seeds write the same bytes.
 */
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const OUT = join(import.meta.dirname, '../../static/demo/trends');
const HEADING = '# demonstration data, invented';
const OFFSET = '+01:00';
const EVERY = 10;

/**
 * Dead time and T90 of each analyser in seconds (as in plant.json), exchange time of the gas that it reads, standard
 * deviation and persistence of its noise in per cent of oxygen. The filter hopper mixes badly: its gas is exchanged at
 * two thirds of the rate, and a slow swirl brings richer and poorer gas past the probe.
 */
const PLACES = [
	{ tag: 'AT-211', lag: 5, t90: 8, exchange: 936, sd: 0.05, persists: 0.3, swirl: 0 },
	{ tag: 'AT-212', lag: 5, t90: 8, exchange: 996, sd: 0.05, persists: 0.3, swirl: 0 },
	{ tag: 'AT-213', lag: 45, t90: 25, exchange: 1620, sd: 0.06, persists: 0.6, swirl: 0.35 },
	{ tag: 'AT-214', lag: 40, t90: 25, exchange: 1104, sd: 0.05, persists: 0.5, swirl: 0 },
];

/**
 * @typedef {{ begins: string, minutes: number, seed: number, start: number[], floor: number[], inertFlow: number,
 *   fanFlow: number, stroked: [number, number] }} Purge `stroked`: when the dampers were moved over their way [s]
 */

/** @type {Purge} */
const FIRST = {
	begins: '2026-03-14T20:40:00',
	minutes: 52,
	seed: 20265314,
	start: [20.9, 20.9, 20.9, 20.9],
	floor: [2.3, 2.4, 3.7, 2.6],
	inertFlow: 888,
	fanFlow: 14_950,
	stroked: [240, 360],
};

/** After the trip: from what five minutes without the fan had left, with AT-213 adjusted by 0.6 %. @type {Purge} */
const SECOND = {
	begins: '2026-03-15T03:20:00',
	minutes: 44,
	seed: 20265315,
	start: [6.1, 6.3, 8.3, 5.9],
	floor: [2.3, 2.4, 4.3, 2.6],
	inertFlow: 892,
	fanFlow: 15_100,
	stroked: [240, 360],
};

/** @typedef {{ at: number, cells: string[] }} Row `at` in milliseconds of local time, read as if it were UTC */

/**
 * @param {Purge} purge
 * @returns {Row[]}
 */
function rowsOf(purge) {
	const times = Array.from({ length: (purge.minutes * 60) / EVERY + 1 }, (_, i) => i * EVERY);
	const columns = [
		...PLACES.map((place, i) => oxygenAt(place, purge, i, times).map((value) => value.toFixed(2))),
		noisy(times, purge.seed + 11, { sd: 6, persists: 0.4 }).map((e) => (purge.inertFlow + e).toFixed(1)),
		noisy(times, purge.seed + 12, { sd: 70, persists: 0.6 }).map((e, k) =>
			((purge.fanFlow + e) * strokeAt(times[k] ?? 0, purge.stroked)).toFixed(0),
		),
	];
	const begins = Date.parse(`${purge.begins}Z`);
	return times.map((t, k) => ({ at: begins + t * 1000, cells: columns.map((column) => column[k] ?? '') }));
}

/**
 * What the analyser shows: the gas at its place one dead time ago, through its own first-order answer, with noise.
 *
 * @param {(typeof PLACES)[number]} place
 * @param {Purge} purge
 * @param {number} i
 * @param {number[]} times
 */
function oxygenAt(place, purge, i, times) {
	const [start = 0, floor = 0] = [purge.start[i], purge.floor[i]];
	const height = start - floor;
	/** @param {number} t */
	const gas = (t) => {
		if (t <= 0) return start;
		const swirl = place.swirl * (height / 17) * Math.sin((2 * Math.PI * t) / 700) * Math.exp(-t / 1800);
		return floor + height * Math.exp(-t / place.exchange) + swirl;
	};
	const noise = noisy(times, purge.seed + i, place);
	const answer = place.t90 / Math.LN10;
	let shown = start;
	let second = 0;
	return times.map((t, k) => {
		for (; second < t; second++) shown += (gas(second - place.lag) - shown) / answer;
		return shown + (noise[k] ?? 0);
	});
}

/**
 * Noise whose neighbours resemble each other, as that of an analyser does.
 *
 * @param {number[]} times
 * @param {number} seed
 * @param {{ sd: number, persists: number }} kind
 */
function noisy(times, seed, { sd, persists }) {
	const gauss = gaussFrom(seed);
	let e = sd * gauss();
	return times.map(() => (e = persists * e + Math.sqrt(1 - persists ** 2) * sd * gauss()));
}

/** The flow gives way while the dampers go over their way, one after the other. @param {number} t @param {[number, number]} stroked */
const strokeAt = (t, [from, to]) =>
	t < from || t > to ? 1 : 1 - 0.25 * Math.abs(Math.sin((3 * Math.PI * (t - from)) / (to - from)));

/** Normal numbers by Box and Muller from the mulberry32 generator. @param {number} seed */
function gaussFrom(seed) {
	let s = seed | 0;
	const uniform = () => {
		s = (s + 0x6d2b79f5) | 0;
		let t = Math.imul(s ^ (s >>> 15), 1 | s);
		t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
		return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32;
	};
	return () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform());
}

const COLUMNS = [...PLACES.map(({ tag }) => `${tag} [% wet]`), 'FT-241 [m3(n)/h]', 'FT-201 [m3/h]'];

/** @param {Row[]} rows */
const plain = (rows) =>
	[HEADING, ['time', ...COLUMNS].join(), ...rows.map(({ at, cells }) => [iso(at) + OFFSET, ...cells].join())].join(
		'\n',
	) + '\n';

/**
 * The same as another recorder exports it: semicolons, decimal commas, local time without an offset, some cells blank, and
 * a hundred seconds missing.
 *
 * @param {Row[]} rows
 */
function decimalComma(rows) {
	const lines = rows.flatMap(({ at, cells }, k) => {
		if (k >= 111 && k <= 120) return [];
		const shown = cells.map((cell, column) => (BLANK.has(`${k} ${column}`) ? '' : cell.replace('.', ',')));
		return [[dotted(at), ...shown].join(';')];
	});
	return [HEADING, ['time', ...COLUMNS].join(';'), ...lines].join('\r\n') + '\r\n';
}

/** Row and column of the cells that the recorder left out. */
const BLANK = new Set(['64 2', '65 2', '66 2', '180 5', '240 3']);

/** @param {number} at */
const iso = (at) => new Date(at).toISOString().slice(0, 19);

/** @param {number} at */
function dotted(at) {
	const [year, month, day] = iso(at).slice(0, 10).split('-');
	return `${day}.${month}.${year} ${iso(at).slice(11)}`;
}

/** Every trend by its file name. @returns {Record<string, string>} */
export function demoTrends() {
	const first = rowsOf(FIRST);
	return {
		// Cut off at 21:19, when somebody hoped that it was enough.
		'purge-1-not-yet.csv': plain(first.slice(0, (39 * 60) / EVERY + 1)),
		'purge-1.csv': plain(first),
		'purge-1-decimal-comma.csv': decimalComma(first),
		'purge-2.csv': plain(rowsOf(SECOND)),
	};
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
	mkdirSync(OUT, { recursive: true });
	for (const [name, text] of Object.entries(demoTrends())) writeFileSync(join(OUT, name), text);
}
