import * as v from 'valibot';
import {
	openTrustList,
	readCertificate,
	signedTrustList,
	type Instant,
	type SignedTrustList,
	type TrustList,
} from '../identity';
import { allOf, type RecordEvent } from '../record';
import type { Trust } from './check-certificates';
import { failed, passed, undecided, type Check } from './pdf/check';

type Bytes = Uint8Array<ArrayBuffer>;

/** What the judge brings, and what lies beside the record. Only the judge's own root anchors trust. */
export type TrustGiven = {
	/** DER of the site root, as the judge knows it. */
	readonly root?: Bytes | undefined;
	/** DER of the root that the file brings: it shows that the file agrees with itself, not whose it is. */
	readonly rootInFile?: Bytes | undefined;
	readonly certificates?: readonly Bytes[];
	/** A list that the judge opened under the root. */
	readonly trustList?: TrustList | undefined;
	/** Lists beside the record, not yet opened. */
	readonly trustLists?: readonly unknown[];
	readonly now: Instant;
	readonly provenBy?: Instant | undefined;
};

export async function trustOf(
	given: TrustGiven,
	events: readonly RecordEvent[],
): Promise<{ readonly checks: readonly Check[]; readonly trust: Trust }> {
	const root = given.root ?? given.rootInFile;
	const lists = [...(given.trustLists ?? []), ...allOf(events, 'trust list issued').map(({ body }) => body.list)];
	const opened = root === undefined ? { checks: [], newest: undefined } : await openLists(lists, root);
	return {
		checks: [checkAnchor(given), ...opened.checks],
		trust: {
			root,
			issuers: given.certificates ?? [],
			trustList: given.trustList ?? opened.newest,
			now: given.now,
			provenBy: given.provenBy,
		},
	};
}

function checkAnchor({ root, rootInFile }: TrustGiven): Check {
	const name = 'trust is anchored in a root that the judge knows';
	const read = root === undefined ? undefined : readCertificate(root);
	const sub = 'NO_CERTIFICATE_CHAIN_FOUND';
	if (read?.ok === true)
		return passed(name, `The site root given: ${read.value.fingerprint.slice(0, 16)}.`, {
			facts: { root: read.value.fingerprint },
		});
	if (read !== undefined) return undecided(name, 'The root that was given is no certificate.', { sub });
	const because =
		rootInFile === undefined
			? 'No root was given, and the file brings none.'
			: 'The root is the one that the file itself brings: anybody can make one. Compare its fingerprint, or give the root.';
	return undecided(name, because, { sub });
}

/** The newest list that the root signed; a list that another key signed is no list. */
async function openLists(
	lists: readonly unknown[],
	rootDer: Bytes,
): Promise<{ readonly checks: readonly Check[]; readonly newest: TrustList | undefined }> {
	const name = 'trust lists are signed by the root';
	const root = readCertificate(rootDer);
	if (!root.ok || lists.length === 0) return { checks: [], newest: undefined };
	const opened = await Promise.all(
		lists.map(async (list) => {
			const read = v.safeParse(signedTrustList, list);
			return read.success ? openTrustList(read.output satisfies SignedTrustList, root.value) : undefined;
		}),
	);
	const good = opened.flatMap((list) => (list?.ok === true ? [list.value] : []));
	const bad = opened.flatMap((list) => (list?.ok === true ? [] : [list?.error.kind ?? 'not a trust list']));
	const newest = good.reduce<TrustList | undefined>(
		(best, list) => (list.sequence > (best?.sequence ?? -1) ? list : best),
		undefined,
	);
	if (good.length === 0) {
		const because = `None of ${lists.length} is under this root (${bad.join(', ')}).`;
		return { checks: [undecided(name, because, { sub: 'NO_CERTIFICATE_CHAIN_FOUND' })], newest };
	}
	if (bad.length > 0) return { checks: [failed(name, `${bad.length} are not: ${bad.join(', ')}.`)], newest };
	const facts = { sequence: newest?.sequence ?? 0 };
	return {
		checks: [passed(name, `Number ${facts.sequence}, issued ${newest?.issued ?? ''}, is the newest.`, { facts })],
		newest,
	};
}
