import { allOf, Knowledge, type EventOf, type RecordEvent } from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import { failed, passed, undecided, type Check } from './pdf/check';

/** The seal is the last event but for addenda; it names the head of every tablet's chain. */
export function checkSeal(startUp: readonly RecordEvent[]): readonly Check[] {
	const [seal, ...more] = allOf(startUp, 'sealed');
	if (seal === undefined) {
		const because = 'It is not sealed: whether its end was cut off cannot be told from what is here.';
		return [undecided('record is sealed', because)];
	}
	if (more.length > 0)
		return [
			failed('record is sealed', `It is sealed ${more.length + 1} times: ${[seal, ...more].map(nameOf).join(', ')}.`),
		];
	const past = new Knowledge(startUp).past(seal);
	return [
		passed('record is sealed', `By ${seal.person} at ${seal.entered}: ${nameOf(seal)}.`, { facts: aboutEvent(seal) }),
		...checkCover(
			seal,
			startUp.filter(({ id }) => past.has(id)),
		),
		...checkAfter(startUp.filter(({ id }) => id !== seal.id && !past.has(id))),
	];
}

/** Every tablet of which the seal's tablet had events is named with its last one. */
function checkCover(seal: EventOf<'sealed'>, inside: readonly RecordEvent[]): readonly Check[] {
	const name = 'seal covers every chain';
	const last = new Map<string, RecordEvent>();
	for (const event of inside) if (event.number > (last.get(event.device)?.number ?? 0)) last.set(event.device, event);
	const bad = [...last].flatMap(([device, head]) => {
		const named = seal.body.heads[device];
		if (named?.number === head.number && named.id === head.id) return [];
		const because =
			named === undefined
				? `The seal does not name tablet ${device}, whose last event is ${nameOf(head)}.`
				: `The seal names ${device} number ${named.number}; what its tablet had ends at ${nameOf(head)}.`;
		return [failed(name, because, { facts: { device, number: head.number } })];
	});
	return offences(name, bad, `${last.size} tablets, each with its last number and event.`);
}

const MAY_FOLLOW: readonly RecordEvent['kind'][] = [
	'addendum',
	'chain head',
	'copy made',
	'copy received',
	'shift key',
];

function checkAfter(after: readonly RecordEvent[]): readonly Check[] {
	const name = 'nothing but addenda follows the seal';
	const bad = after
		.filter(({ kind }) => !MAY_FOLLOW.includes(kind))
		.map((event) => {
			const because = `${nameOf(event)} is not inside the seal: it needs an addendum.`;
			return undecided(name, because, { facts: aboutEvent(event) });
		});
	return offences(
		name,
		bad,
		after.length === 0 ? 'Nothing does.' : `${after.length} events, none of which changes what stood.`,
	);
}
