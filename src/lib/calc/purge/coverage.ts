import { unreachable } from '../../base';
import type { AdequacyInputs } from './adequacy-inputs';
import type { CoverageRow, GasReading } from './coverage-input';
import type { PurgeNote, PurgeReason } from './notes';
import type { Place } from './place-input';
import type { Volume } from './shared-inputs';

type Judging = {
	readonly places: readonly Place[];
	readonly begins: number;
	readonly judgedAt: number;
	/** Limit less guard [1]; a reading beside the analysers is compared on the same basis. */
	readonly accept: number;
	readonly compared: (reading: GasReading) => number;
};

/** (a) Every enclosed volume is measured, or swept with its outlet read, or shut off and inerted by itself. */
export function coverageReasons(given: AdequacyInputs, judging: Judging): readonly PurgeReason[] {
	return given.volumes.flatMap((volume) => {
		const row = given.coverage.find((each) => each.volume === volume.id);
		const of = { level: 'reason', criterion: 'a', volume: volume.id, title: volume.title } as const;
		return row === undefined || row.answer === ''
			? [{ ...of, kind: 'not-covered', deadLeg: volume.deadLeg } as const]
			: reasonsOfRow(row, volume, judging);
	});
}

/** One volume change is enough where the outlet of every volume is read; else three. Site data overrides both. */
export function leastVolumeChanges(given: AdequacyInputs): number {
	if (given.minimumVolumeChanges !== undefined) return given.minimumVolumeChanges.value;
	const isRead = (row: CoverageRow): boolean =>
		(row.answer === 'measured' && row.atOutlet) ||
		(row.answer === 'swept, outlet read' && row.outlet !== undefined) ||
		row.answer === 'shut off, inerted by itself';
	return given.volumes.every(({ id }) => given.coverage.some((row) => row.volume === id && isRead(row))) ? 1 : 3;
}

export function coverageNotes(given: AdequacyInputs): readonly PurgeNote[] {
	const answered = (answer: CoverageRow['answer']): PurgeNote[] => {
		const volumes = given.coverage.filter((row) => row.answer === answer).map(({ volume }) => volume);
		return volumes.length > 0 ? [{ level: 'remark', kind: 'covered-without-analyser', answer, volumes }] : [];
	};
	return [
		...answered('swept, outlet read'),
		...answered('shut off, inerted by itself'),
		...(given.volumes.some(({ deadLeg }) => deadLeg) ? [] : [{ level: 'warning', kind: 'no-dead-leg-named' } as const]),
	];
}

function reasonsOfRow(
	row: Exclude<CoverageRow, { answer: '' }>,
	volume: Volume,
	judging: Judging,
): readonly PurgeReason[] {
	const of = { level: 'reason', criterion: 'a', volume: volume.id, title: volume.title } as const;
	switch (row.answer) {
		case 'measured': {
			const place = judging.places.find(({ tag }) => tag === row.place);
			if (place === undefined) return [{ ...of, kind: 'covered-by-unknown-place', place: row.place }];
			if (place.volume !== volume.id) {
				return [{ ...of, kind: 'place-reads-another-volume', place: row.place, reads: place.volume }];
			}
			// What the inert gas itself reads says nothing about the gas that it has to replace.
			return place.atInertInlet ? [{ ...of, kind: 'place-at-inert-inlet', place: row.place }] : [];
		}
		case 'swept, outlet read': {
			const { outlet } = row;
			if (outlet === undefined) return [{ ...of, kind: 'outlet-not-read' }];
			if (!(outlet.t >= judging.begins && outlet.t <= judging.judgedAt)) {
				return [{ ...of, kind: 'outlet-read-outside-purge', t: outlet.t }];
			}
			const oxygen = judging.compared(outlet);
			return oxygen <= judging.accept ? [] : [{ ...of, kind: 'outlet-above-line', oxygen, accept: judging.accept }];
		}
		case 'shut off, inerted by itself': {
			if (row.inertedBy.trim() === '') return [{ ...of, kind: 'not-said-what-inerts-it' }];
			if (row.reading === undefined) return [];
			const oxygen = judging.compared(row.reading);
			return oxygen <= judging.accept ? [] : [{ ...of, kind: 'shut-off-above-line', oxygen, accept: judging.accept }];
		}
		default:
			return unreachable(row);
	}
}
