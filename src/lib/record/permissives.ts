import { evaluatePermissive, readingFor, type Permissive, type Procedure, type UnknownBecause } from '../procedure';
import type { PermissiveStanding } from './answer';
import type { PointReading } from './entry-facts';
import { MINUTE, printInstant } from './instants';
import type { Played } from './play';

/** Every permissive, with the readings it used. Unknown is never TRUE. */
export const permissiveStandings = (
	procedure: Procedure,
	played: Played,
	offset: number,
): readonly PermissiveStanding[] =>
	(procedure.permissives ?? []).map((permissive) => permissiveStanding(permissive, played, offset));

function permissiveStanding(permissive: Permissive, played: Played, offset: number): PermissiveStanding {
	const { plant } = played.facts;
	const used = Object.entries(permissive.readings).map(([name, use]) => ({
		name,
		use,
		newest: newestAt(use.point, played),
	}));
	const readings = Object.fromEntries(
		used.map(({ name, use, newest }) => {
			const reading = newest && {
				typed: newest.reading.typed,
				unit: newest.reading.unit,
				...(newest.reading.basis === undefined ? {} : { basis: newest.reading.basis }),
				ageMinutes: (Math.min(played.now, played.facts.agesUntil) - newest.reading.observed) / MINUTE,
			};
			return [
				name,
				plant === undefined ? { unknown: 'measuring point unknown' as const } : readingFor(use, reading, plant),
			];
		}),
	);
	const { value, because } = evaluatePermissive(permissive, { readings, facts: factsFor(permissive, played) });
	return {
		permissive: permissive.id,
		value,
		because: because.map(sayShort),
		readings: used.map(({ name, use, newest }) => ({
			name,
			point: use.point,
			unit: newest?.reading.unit ?? use.unit,
			...(newest === undefined
				? {}
				: {
						typed: newest.reading.typed,
						observed: printInstant(newest.reading.observed, offset),
						entry: newest.entry,
					}),
		})),
	};
}

/** The newest value read at a point, up to now; at equal times the one with the greater entry id. */
function newestAt(
	point: string,
	played: Played,
): { readonly reading: PointReading; readonly entry: string } | undefined {
	return played.facts.entries
		.flatMap((entry) => entry.readings.map((reading) => ({ reading, entry: entry.id })))
		.filter(({ reading }) => reading.point === point && reading.observed <= played.now)
		.sort((a, b) => a.reading.observed - b.reading.observed || (a.entry < b.entry ? -1 : 1))
		.at(-1);
}

function factsFor(permissive: Permissive, played: Played): { readonly [name: string]: boolean | undefined } {
	return Object.fromEntries(
		Object.entries(permissive.facts ?? {}).map(([name, fact]) => {
			if ('stepStands' in fact) {
				const track = played.steps.get(fact.stepStands);
				return [name, track && (track.status.state === 'stands' || track.status.state === 'not applicable')];
			}
			const goingOn = played.facts.plantEvents.some(
				(event) => event.names.includes(fact.notGoingOn) && event.begin <= played.now && played.now < event.end,
			);
			return [name, !goingOn];
		}),
	);
}

function sayShort(because: UnknownBecause): string {
	switch (because.kind) {
		case 'reading':
			return `${because.name} (${because.point}): ${because.why}`;
		case 'fact':
			return `${because.name}: not known`;
		case 'condition':
			return `condition: ${because.finding.kind}`;
	}
}
