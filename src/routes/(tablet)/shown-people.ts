import type { Tablet, TabletPerson } from '$lib/app';
import type { ShownPerson } from '$lib/ui';
import { counted, momentsAt, type Moments, type Say } from '$lib/wording';

/** The people of a tablet in words, those at work first; without a plant, times are those of the tablet's own clock. */
export function shownPeople(tablet: Tablet, say: Say, utcOffsetMinutes?: number): readonly ShownPerson[] {
	const offset = utcOffsetMinutes ?? -new Date(tablet.clock.now()).getTimezoneOffset();
	const moments = momentsAt(offset, say);
	const people = tablet.people.map((one): ShownPerson => {
		const { person, name, roles, hasKey, wrongPins } = one;
		const ends = tablet.shifts.endsAt(person);
		const runs = ends === undefined ? say('person.no shift') : say('person.runs', { at: moments.clock(iso(ends)) });
		return {
			person,
			name,
			roles,
			hasKey,
			isInShift: ends !== undefined,
			certificate: certificateOf(one, tablet.clock.now(), say, moments),
			said: hasKey ? runs : say('person.no key'),
			...(hasKey && wrongPins > 0 ? { warning: counted(say, 'person.wrong pin', 'person.wrong pins', wrongPins) } : {}),
		};
	});
	const rank = ({ person, isInShift }: ShownPerson): number =>
		person === tablet.person?.person ? 0 : isInShift ? 1 : 2;
	return people.sort((a, b) => rank(a) - rank(b));
}

function certificateOf({ certificate }: TabletPerson, now: number, say: Say, moments: Moments): string {
	const day = (instant: string): string => `${moments.day(instant)} ${instant.slice(0, 4)}`;
	const [from, until] = [day(certificate.notBefore), day(certificate.notAfter)];
	if (Date.parse(certificate.notAfter) < now) return say('person.certificate ended', { until });
	if (Date.parse(certificate.notBefore) > now) return say('person.certificate later', { from });
	return say('person.certificate', { from, until });
}

const iso = (at: number): string => new Date(at).toISOString();
