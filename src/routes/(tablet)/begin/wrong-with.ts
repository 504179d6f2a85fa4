import type { BeginSite, SiteObjection } from '$lib/app';
import { may, type PinError } from '$lib/identity';
import type { Say } from '$lib/wording';

type PersonWrong = { readonly name?: string; readonly roles?: string; readonly pin?: string; readonly again?: string };

export type Wrong = {
	readonly site?: string;
	readonly unit?: string;
	readonly device?: string;
	readonly people: readonly PersonWrong[];
	/** Only what is wrong with what was typed, not what is still missing. */
	readonly whileTyping: readonly PersonWrong[];
	readonly everybody: readonly string[];
};

/** What is wrong with what was typed, as a sentence beside each field: what it must be. */
export function wrongWith(begin: BeginSite, say: Say): Wrong {
	const { objections } = begin;
	const people = begin.people.map((_, i) => personWrong(begin, i, objections, say));
	return {
		...(objections.some(({ kind, ...of }) => kind === 'not-a-name' && 'at' in of && of.at === 'site')
			? { site: say('begin.wrong.name') }
			: {}),
		...tagWrong('unit', objections, say),
		...tagWrong('device', objections, say),
		people,
		whileTyping: people.map((wrong, i) => {
			const person = begin.people[i];
			return {
				...(wrong.pin !== undefined && (person?.pin.length ?? 0) >= 8 ? { pin: wrong.pin } : {}),
				...(wrong.again !== undefined &&
				(person?.again.length ?? 0) >= (person?.pin.length ?? 0) &&
				person?.again !== ''
					? { again: wrong.again }
					: {}),
			};
		}),
		everybody: [
			...(objections.some(({ kind }) => kind === 'nobody-enrols') ? [say('begin.wrong.nobody-enrols')] : []),
			...(objections.some(({ kind }) => kind === 'nobody-describes') ? [say('begin.wrong.nobody-describes')] : []),
		],
	};
}

const tagWrong = (at: 'unit' | 'device', objections: readonly SiteObjection[], say: Say) =>
	objections.some((each) => each.kind === 'not-a-tag' && each.at === at) ? { [at]: say('begin.wrong.tag') } : {};

function personWrong(begin: BeginSite, at: number, objections: readonly SiteObjection[], say: Say): PersonWrong {
	const own = objections.filter((each) => 'at' in each && each.at === at);
	const pin = own.find((each) => each.kind === 'bad-pin');
	return {
		...(own.some(({ kind }) => kind === 'not-a-name') ? { name: say('begin.wrong.name') } : {}),
		...(own.some(({ kind }) => kind === 'same-name') ? { name: say('begin.wrong.same-name') } : {}),
		...(own.some(({ kind }) => kind === 'no-role') ? { roles: say('begin.wrong.no-role') } : {}),
		...(pin?.kind === 'bad-pin' ? { pin: sayPin(pin.error, say) } : {}),
		...(begin.differs(at) ? { again: say('begin.wrong.differs') } : {}),
	};
}

function sayPin(error: PinError, say: Say): string {
	if (error.kind === 'pin-too-short') return say('begin.wrong.pin-too-short', { n: error.atLeast });
	if (error.kind === 'pin-too-long') return say('begin.wrong.pin-too-long', { n: error.atMost });
	return say('begin.wrong.pin-too-easy', { because: say(`begin.easy.${error.because}`) });
}

/** What the site will miss soon, without stopping anybody now: the missing are enrolled later under People. */
export function warningsOf({ people }: BeginSite, say: Say): readonly string[] {
	const roles = people.flatMap((person) => person.roles);
	return [
		...(roles.includes('shift supervisor') ? [] : [say('begin.later.no-supervisor')]),
		...(roles.includes('commissioning lead') ? [] : [say('begin.later.no-lead')]),
		...(people.filter((person) => may(person.roles, 'release')).length < 2 || people.length < 2
			? [say('begin.later.alone')]
			: []),
	];
}
