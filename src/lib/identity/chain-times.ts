import { fingerprintOf } from './certificate';
import type { ChainFinding } from './chain-finding';
import { millisecondsOf, utcInstant, type Instant } from './instant';
import type { SubIndication } from './result-class';
import { informsAbout, type TrustList } from './trust-list';
import type { x509 } from './x509';

/** When a signature was made: what its maker says, and what others can show. */
export type Times = {
	/** The signer's own clock. Believed against the signer, never alone for the signer. */
	readonly claimed: Instant;
	/** It existed not later than this: an archive receipt, a time stamp, another tablet's head. */
	readonly provenBy?: Instant | undefined;
	/** It was not made before this: it names something that was made then. */
	readonly provenAfter?: Instant | undefined;
	/** When it is being judged. */
	readonly now: Instant;
};

type Path = readonly x509.X509Certificate[];

/** A minute of clock error between two machines is nothing; a signature from tomorrow is something. */
const CLOCK_TOLERANCE = 10 * 60_000;

export function judgeClaimedTime(times: Times): ChainFinding {
	const ahead = millisecondsOf(times.claimed) - millisecondsOf(times.now) > CLOCK_TOLERANCE;
	const facts = { claimed: times.claimed, now: times.now };
	if (!ahead) return { rule: 'claimed time', outcome: 'passed', facts };
	const because = 'it claims a time that has not come yet';
	return { rule: 'claimed time', outcome: 'undecided', sub: 'SIG_CONSTRAINTS_FAILURE', facts: { ...facts, because } };
}

/** Every certificate of the path was in its time when the signature was made. */
export function judgeValidity(path: Path, times: Times, list: TrustList | undefined): ChainFinding {
	const found = path.map((certificate) => ({ certificate, sub: outOfTime(certificate, times, list) }));
	const bad = found.find(({ sub }) => sub !== undefined);
	const { certificate, sub } = bad ?? { certificate: path[0], sub: undefined };
	const facts = {
		claimed: times.claimed,
		...(certificate === undefined
			? {}
			: { notBefore: utcInstant(certificate.notBefore), notAfter: utcInstant(certificate.notAfter) }),
		...(times.provenBy === undefined ? {} : { provenBy: times.provenBy }),
	};
	if (sub === undefined) return { rule: 'validity', outcome: 'passed', facts };
	const outcome = sub === 'EXPIRED' || sub === 'NOT_YET_VALID' ? 'failed' : 'undecided';
	return { rule: 'validity', outcome, sub, facts };
}

function outOfTime(
	certificate: x509.X509Certificate,
	times: Times,
	list: TrustList | undefined,
): SubIndication | undefined {
	const [notBefore, notAfter] = [certificate.notBefore.getTime(), certificate.notAfter.getTime()];
	const claimed = millisecondsOf(times.claimed);
	const provenBy = times.provenBy === undefined ? undefined : millisecondsOf(times.provenBy);
	const provenAfter = times.provenAfter === undefined ? undefined : millisecondsOf(times.provenAfter);
	if (claimed < notBefore || (provenBy ?? Infinity) < notBefore) return 'NOT_YET_VALID';
	if (claimed > notAfter || (provenAfter ?? -Infinity) > notAfter) return 'EXPIRED';
	if ((provenBy ?? millisecondsOf(times.now)) <= notAfter) return undefined;
	return list !== undefined && informsAbout(list, times.claimed) ? 'OUT_OF_BOUNDS_NOT_REVOKED' : 'OUT_OF_BOUNDS_NO_POE';
}

/**
 * No certificate below the root was revoked when the signature was made. Freshness is asked at the claimed time: a site
 * without a network signs under the list it has, and an archive is read for decades after that list ran out.
 */
export function judgeRevocation(path: Path, times: Times, list: TrustList | undefined): ChainFinding {
	if (list === undefined) {
		return {
			rule: 'revocation',
			outcome: 'undecided',
			sub: 'TRY_LATER',
			facts: { because: 'no trust list was given' },
		};
	}
	const fingerprints = path
		.slice(0, Math.max(1, path.length - 1))
		.map(({ rawData }) => fingerprintOf(new Uint8Array(rawData)));
	const revocation = list.revocations.find(({ certificate }) =>
		(fingerprints as readonly string[]).includes(certificate),
	);
	const facts = {
		sequence: String(list.sequence),
		issued: list.issued,
		nextUpdate: list.nextUpdate,
		claimed: times.claimed,
	};
	if (revocation === undefined) {
		const informed = informsAbout(list, times.claimed);
		return informed
			? { rule: 'revocation', outcome: 'passed', facts }
			: {
					rule: 'revocation',
					outcome: 'undecided',
					sub: 'TRY_LATER',
					facts: { ...facts, because: 'the list had run out' },
				};
	}
	const because = { ...facts, revoked: revocation.at, reason: revocation.reason };
	const at = millisecondsOf(revocation.at);
	const isAfter = (moment: Instant | undefined) => moment !== undefined && millisecondsOf(moment) >= at;
	if (isAfter(times.claimed) || isAfter(times.provenAfter)) {
		return { rule: 'revocation', outcome: 'failed', sub: 'REVOKED', facts: because };
	}
	if (times.provenBy !== undefined && !isAfter(times.provenBy)) {
		return { rule: 'revocation', outcome: 'passed', facts: { ...because, provenBy: times.provenBy } };
	}
	return { rule: 'revocation', outcome: 'undecided', sub: 'REVOKED_NO_POE', facts: because };
}
