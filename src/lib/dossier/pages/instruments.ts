import { shownUnit } from '../../quantity';
import { allOf } from '../../record';
import { STYLES, type Flow } from '../layout/flow';
import { table } from '../layout/table';
import { printBounds } from '../story/print';
import { instrumentsUsed } from '../story/instruments-used';
import type { Story } from '../story/story';

/** With what it was measured, how good that was, and against which limits it was held, each with where it comes from. */
export function instruments(flow: Flow, story: Story): void {
	const { say, input, site, moments, names } = story;
	flow.newSheet(say('instruments.sheet'));
	flow.head(say('instruments.caption'), say('instruments.sheet'));
	flow.heading(say('instruments.title'), { with: 60 });
	table(
		flow,
		[
			{ head: say('instruments.tag'), width: 50, voice: 'strong' },
			{ head: say('instruments.what') },
			{ head: say('instruments.serial'), width: 84 },
			{ head: say('instruments.accuracy'), width: 92 },
			{ head: say('instruments.certificate'), width: 110 },
			{ head: say('instruments.values'), width: 42, align: 'end' },
		],
		instrumentsUsed(story).map(({ id, instrument, values, point }) => ({
			cells: [
				id,
				instrument?.title ?? (point === undefined ? '' : names.point(point)),
				instrument?.serial ?? say('instruments.not listed'),
				instrument?.accuracy ?? uncertaintyOf(point, story),
				instrument === undefined
					? '–'
					: say('instruments.due', { certificate: instrument.certificate, due: instrument.due }),
				String(values),
			],
		})),
	);
	const checks = allOf(site, 'instrument checked');
	const findings = allOf(site, 'instrument finding');
	if (checks.length + findings.length > 0) {
		flow.heading(say('findings.title'), { with: 60 });
		table(
			flow,
			[
				{ head: say('instruments.tag'), width: 50, voice: 'strong' },
				{ head: say('refused.when'), width: 70 },
				{ head: say('findings.what') },
				{ head: say('findings.by'), width: 130 },
			],
			[
				...checks.map((event) => ({
					event,
					what: [
						say(event.body.passes ? 'findings.good' : 'findings.bad'),
						event.body.asFound === undefined ? '' : say('findings.as found', { error: event.body.asFound }),
						event.body.asLeft === undefined ? '' : say('findings.as left', { error: event.body.asLeft }),
					],
				})),
				...findings.map((event) => ({
					event,
					what: [
						event.body.asFound === undefined
							? say('findings.found')
							: say('findings.error', {
									error: event.body.asFound.error,
									unit: shownUnit(event.body.asFound.unit),
									tolerance: event.body.asFound.tolerance ?? '–',
								}),
						event.body.lastGood === undefined
							? ''
							: say('findings.last good', { at: moments.short(event.body.lastGood) }),
						event.body.note ?? '',
					],
				})),
			]
				.sort((a, b) => a.event.observedAt - b.event.observedAt)
				.map(({ event, what }) => ({
					cells: [
						event.body.instrument,
						moments.short(event.observed ?? event.entered),
						what.filter((part) => part !== '').join('; '),
						`${names.person(event.person)}, ${event.device}`,
					],
				})),
		);
	}
	flow.heading(say('limits.title'), { with: 60 });
	table(
		flow,
		[
			{ head: say('limits.what') },
			{ head: say('limits.limit'), width: 150, voice: 'strong' },
			{ head: say('limits.source'), width: 190 },
		],
		input.plant.limits.map((limit) => ({
			cells: [
				limit.title,
				printBounds(limit, story),
				[say(`source.${limit.source.kind}`), limit.source.text, limit.source.edition ?? '']
					.filter((part) => part !== '')
					.join(', '),
			],
		})),
	);
	fuel(flow, story);
}

const uncertaintyOf = (tag: string | undefined, { input, say }: Story): string => {
	const uncertainty = input.plant.points.find((point) => point.tag === tag)?.uncertainty;
	return uncertainty === undefined
		? '–'
		: say('instruments.U', { value: String(uncertainty.value), unit: shownUnit(uncertainty.unit) });
};

function fuel(flow: Flow, { input, say }: Story): void {
	const { title, limitingOxygen } = input.plant.fuel;
	flow.heading(say('fuel.title'), { style: STYLES.subheading });
	flow.write(
		limitingOxygen === undefined
			? say('fuel.no report', { fuel: title })
			: say('fuel.report', {
					fuel: title,
					value: String(limitingOxygen.value.value),
					unit: shownUnit(limitingOxygen.value.unit),
					basis: say(`basis.${limitingOxygen.basis}`),
					gas: limitingOxygen.inertGas,
					size: limitingOxygen.particleSize,
					igniter: limitingOxygen.igniter,
					temperature: limitingOxygen.temperature,
					report: limitingOxygen.report,
					date: limitingOxygen.date,
				}),
		STYLES.body,
	);
}
