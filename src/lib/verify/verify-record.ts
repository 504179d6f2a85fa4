import type { TrustList } from '../identity';
import { allOf, inOrder, standing, type RecordEvent } from '../record';
import { checkAttachments } from './check-attachments';
import { checkBindings } from './check-bindings';
import { checkCalcs } from './check-calcs';
import { checkCertificates } from './check-certificates';
import { checkChain } from './check-chain';
import { checkDocuments } from './check-documents';
import { checkGates, type Replayed } from './check-gates';
import { checkOutcomes } from './check-outcomes';
import { checkPerformers, checkRoles } from './check-performers';
import { checkSeal } from './check-seal';
import { checkSignatures } from './check-signatures';
import { checkSiteHeads } from './check-site-heads';
import { checkStatements, type Restate } from './check-statements';
import { undecided, type Check } from './pdf/check';
import { countsOf, processResult } from './process-result';
import { makeReport, type Report } from './report';
import { certificatesOf } from './signer';
import { readStoredRecord } from './stored-record';
import { trustOf, type TrustGiven } from './trust';

type Bytes = Uint8Array<ArrayBuffer>;
type Named = { readonly name: string; readonly bytes: Bytes };

/** A record as it was stored, with what lies beside it, and what the judge knows. */
export type RecordQuestion = TrustGiven & {
	/** Stored lines (NDJSON) of the start-up's log and of the site's log, in one file or in two. */
	readonly lines: readonly Named[];
	/** Photos and trends. */
	readonly attachments?: readonly Named[];
	readonly restate?: Restate | undefined;
};

/** Reads a record back and says, check by check, what holds. Takes any bytes, stops at nothing, and always answers. */
export async function verifyRecord(question: RecordQuestion): Promise<Report> {
	const { checks, about } = await judgeRecord(question);
	return makeReport(checks, about);
}

export type JudgedRecord = {
	readonly checks: readonly Check[];
	readonly about: About;
	/** The newest list that was given or found, signed by the root. */
	readonly trustList: TrustList | undefined;
};

type About = Parameters<typeof makeReport>[1] & { readonly events: readonly RecordEvent[] };

export async function judgeRecord(question: RecordQuestion): Promise<JudgedRecord> {
	const stored = readStoredRecord(question.lines);
	const { events, startUp, site } = stored;
	const certificates = certificatesOf(question.certificates ?? [], events);
	const { checks: anchor, trust } = await trustOf(question, events);
	const { checks: signatures, signed } = await checkSignatures(events, certificates);
	const [opened] = allOf(startUp, 'start-up opened');
	const { checks: pinned, documents } = checkDocuments(opened);
	const replayed = documents.procedure === undefined ? undefined : replay(documents.procedure, startUp, site);
	return {
		checks: [
			...stored.checks,
			...checkChain(events),
			...checkSiteHeads(opened, site),
			...signatures,
			...anchor,
			...(await checkCertificates(signed, trust)),
			...checkRoles(events, signed),
			...checkPerformers(documents.procedure, signed),
			...pinned,
			...checkAttachments(startUp, question.attachments ?? []),
			...checkOutcomes(startUp, documents),
			...checkCalcs(startUp),
			...(replayed === undefined
				? [undecided('acts were allowed by the rules', 'The record holds no procedure that can be read.')]
				: [
						...checkGates(replayed),
						...checkStatements(replayed, question.restate),
						...checkBindings(replayed, documents.plant, question.attachments ?? []),
					]),
			...checkSeal(startUp),
		],
		about: {
			process: processResult(replayed),
			counts: countsOf(startUp, site, replayed?.end),
			startUp: startUp[0]?.log,
			events,
		},
		trustList: trust.trustList,
	};
}

/** The record played again to its seal, or to its newest event. */
function replay(
	procedure: Replayed['procedure'],
	startUp: readonly RecordEvent[],
	site: readonly RecordEvent[],
): Replayed {
	const seal = [...allOf(startUp, 'sealed')].sort(inOrder)[0];
	const newest = [...startUp].sort((a, b) => a.enteredAt - b.enteredAt).at(-1);
	const at = (seal ?? newest)?.entered ?? '1970-01-01T00:00:00Z';
	return { procedure, startUp, site, end: standing(procedure, startUp, site, at) };
}
