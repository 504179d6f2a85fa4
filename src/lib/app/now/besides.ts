import { allOf, headCode, headsOf, millis, otherTablets } from '../../record';
import { shownText, type Moments, type Say } from '../../wording';
import { nameOf, type OpenRecord } from '../record-words';

/** Temporary states, people, refusals and deviations, other tablets: a line each, and "not recorded" where nobody said. */
export function besides(
	told: OpenRecord & { readonly device?: string },
	say: Say,
	moments: Moments,
): readonly { readonly name: string; readonly said: string }[] {
	return [
		{ name: say('now.temporary'), said: temporary(told, say, moments) },
		{ name: say('now.people'), said: onShift(told, say, moments) },
		{ name: say('now.open'), said: open(told, say) },
		{ name: say('now.tablets'), said: tablets(told, say, moments) },
	];
}

function temporary({ siteLog, standing, procedure }: OpenRecord, say: Say, moments: Moments): string {
	const said = allOf(siteLog, 'temporary state');
	const ended = new Set(said.filter(({ body }) => body.ended === true).map(({ body }) => body.state));
	const states = said
		.filter(({ body }) => body.ended !== true && !ended.has(body.state))
		.map(({ body }) =>
			body.until === undefined ? body.state : `${body.state}, ${say('now.until', { at: moments.short(body.until) })}`,
		);
	const going = standing.plantEvents
		.filter(({ end, withdrawn }) => end === null && withdrawn !== true)
		.map(({ what, begin }) => {
			const title = shownText(procedure.plantEvents.find(({ id }) => id === what)?.title ?? what, say);
			return say('cause.plant event goes on', { what: title, begin: moments.clock(begin) });
		});
	const all = [...states, ...going];
	return all.length === 0 ? say('now.no temporary') : all.join('; ');
}

/** Whose shift key is good now, and on which tablet they began. Where they are nobody records. */
function onShift(told: OpenRecord, say: Say, moments: Moments): string {
	const now = millis(told.standing.at);
	const began = new Map(
		allOf(told.events, 'shift key')
			.filter(({ body }) => millis(body.notBefore) <= now && now < millis(body.notAfter))
			.map((event) => [event.person, event] as const),
	);
	for (const { body, observedAt } of allOf(told.events, 'shift hand-over'))
		for (const person of body.from) if ((began.get(person)?.observedAt ?? Infinity) < observedAt) began.delete(person);
	if (began.size === 0) return say('now.nobody on shift');
	const people = [...began.values()].map(({ person, device, entered }) =>
		say('now.on shift', { person: nameOf(told, person), device, at: moments.clock(entered) }),
	);
	return `${people.join('; ')}. ${say('now.places not recorded')}`;
}

function open({ standing }: OpenRecord, say: Say): string {
	const refusals = standing.gates
		.filter(({ state }) => state === 'refused')
		.map(({ gate }) => say('ui.refused', { gate }));
	const deviations = standing.deviations
		.filter(({ state }) => state === 'open')
		.map(({ deviation, blocks }) =>
			typeof blocks === 'number'
				? say('now.blocks gate', { deviation, gate: blocks })
				: say(blocks === 'hand-over' ? 'now.blocks hand-over' : 'now.blocks nothing', { deviation }),
		);
	const all = [...refusals, ...deviations];
	return all.length === 0 ? say('now.none open') : all.join('; ');
}

function tablets({ events, device }: OpenRecord & { readonly device?: string }, say: Say, moments: Moments): string {
	const own = device === undefined ? undefined : headsOf(events).get(device);
	const others = otherTablets(events, device ?? '').map((each) =>
		say('now.tablet', {
			device: each.device,
			at: each.lastHeard === null ? '' : moments.clock(each.lastHeard),
			code: each.head ?? '',
		}),
	);
	return [
		...(own === undefined ? [] : [say('now.this tablet', { device: own.device, code: headCode(own) })]),
		...(others.length === 0 ? [say('ui.sign.no tablets')] : others),
	].join('; ');
}
