import { millisecondsOf, type Certificate, type Instant } from '../../identity';
import { failed, passed, undecided, type Check } from './check';
import type { SignatureDictionary } from './signature-field';

/** What a reader shows beside the signature is what the certificate says. */
export function checkName(field: string, { name: shown }: SignatureDictionary, certificate: Certificate): Check {
	const name = 'name shown is the name certified';
	const certified = certificate.subject.kind === 'person' ? certificate.subject.printedName : '';
	const facts = { shown: shown ?? '', certified };
	if (shown === certified && certified !== '') return passed(name, `Both say ${certified}`, { field, facts });
	const because = `The file says ${shown ?? 'nothing'}; the certificate says ${certified === '' ? 'no person' : certified}.`;
	return failed(name, because, { field, facts, sub: 'SIG_CONSTRAINTS_FAILURE' });
}

/** What the page shows, in ink that the signature covers, is who the certificate names and when the signature says. */
export function checkShown(
	field: string,
	texts: readonly string[] | undefined,
	{ claimed }: SignatureDictionary,
	certificate: Certificate,
): Check {
	const name = 'page shows who signed and when';
	const sub = 'SIG_CONSTRAINTS_FAILURE';
	const certified = certificate.subject.kind === 'person' ? certificate.subject.printedName : '';
	if (texts === undefined) return undecided(name, 'What the page shows cannot be read.', { field });
	if (!texts.includes(certified)) {
		const facts = { certified, shown: texts.join(' | ') };
		return failed(name, `It does not show the name ${certified}.`, { field, facts, sub });
	}
	const seconds = (instant: string) => Math.floor(Date.parse(instant) / 1000);
	const times = texts.flatMap((text) => {
		const [, day, time, offset] = /^(\d{4}-\d\d-\d\d) (\d\d:\d\d[\d:.]*) (Z|[+-]\d\d:\d\d)$/.exec(text) ?? [];
		return day === undefined ? [] : [`${day}T${time}${offset}`];
	});
	const facts = { certified, shown: times.join(', '), claimed: claimed ?? '' };
	if (times.length > 0 && times.every((time) => seconds(time) === seconds(claimed ?? ''))) {
		return passed(name, `It shows ${certified} at ${times.join(', ')}`, { field, facts });
	}
	return failed(name, `It shows the time ${times.length === 0 ? 'nowhere' : times.join(', ')}.`, { field, facts, sub });
}

/** When it says it was made, and whether that fits the signature that it covers. */
export function checkWhen(
	field: string,
	{ claimed }: SignatureDictionary,
	earlier: Instant | undefined,
): readonly Check[] {
	const name = 'signature says when';
	if (claimed === undefined)
		return [failed(name, '/M holds no time with its offset.', { field, sub: 'FORMAT_FAILURE' })];
	return [
		passed(name, `${claimed}, by the clock of the signer.`, { field, facts: { claimed } }),
		checkOrder(field, claimed, earlier),
	];
}

/** A signature that covers another one was made after it; its clock should say so too. */
function checkOrder(field: string, claimed: Instant, earlier: Instant | undefined): Check {
	const name = 'clocks agree with the order of signing';
	if (earlier === undefined) return passed(name, 'The first signature.', { field });
	const facts = { claimed, earlier };
	if (millisecondsOf(claimed) + CLOCK_TOLERANCE >= millisecondsOf(earlier)) {
		return passed(name, 'It claims a time after the signature that it covers.', { field, facts });
	}
	return undecided(name, `It claims ${claimed}, and covers a signature that claims ${earlier}.`, { field, facts });
}

/** What two tablets may differ by, in milliseconds. */
const CLOCK_TOLERANCE = 10 * 60_000;
