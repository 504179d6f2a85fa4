import { fromPem } from '../../lib/identity';
import { verifyDossier, verifyRecord, type Report } from '../../lib/verify';
import { unusable, type Command, type Outcome, type Terminal } from '../command';
import { readBytes } from '../files';
import { readOptions } from '../options';
import { restate } from '../../lib/wording';
import { REBUILD } from '../rebuild';
import { tellReport } from '../tell-report';

type Bytes = Uint8Array<ArrayBuffer>;

export const verify: Command = {
	usage: 'verify FILE... [--root PEM] [--json]',
	does: 'reads dossiers or record files back and says, check by check, what holds',
	run: async (args, terminal) => {
		const given = readOptions(args, { switches: ['json'], values: ['root'] });
		if (!given.ok || given.value.files.length === 0)
			return unusable(terminal, given.ok ? 'A dossier or a record file is asked for.' : given.error);
		const root = await readRoot(given.value.value('root'));
		if (typeof root === 'string') return unusable(terminal, root);
		const outcomes: Outcome[] = [];
		const reports: object[] = [];
		for (const file of given.value.files) {
			const judged = await judge(file, root, terminal);
			outcomes.push(judged.outcome);
			if (judged.report !== undefined && !given.value.has('json')) terminal.print(tellReport(file, judged.report));
			reports.push({ file, outcome: judged.outcome, ...judged.report });
		}
		if (given.value.has('json')) terminal.print(JSON.stringify(reports, null, '\t'));
		return worstOf(outcomes);
	},
};

/** The worst of several files, so that nothing bad hides behind something good. */
const worstOf = (outcomes: readonly Outcome[]): Outcome =>
	(['failed', 'unusable-input', 'indeterminate'] as const).find((outcome) => outcomes.includes(outcome)) ?? 'passed';

/** @returns a sentence when it is no certificate; undefined when none was given */
async function readRoot(file: string | undefined): Promise<Bytes | undefined | string> {
	if (file === undefined) return undefined;
	const bytes = await readBytes(file);
	if (!bytes.ok) return bytes.error;
	const root = fromPem(bytes.value);
	return root.ok ? root.value : `${file} is no certificate: ${root.error.kind}.`;
}

async function judge(
	file: string,
	root: Bytes | undefined,
	terminal: Terminal,
): Promise<{ readonly outcome: Outcome; readonly report?: Report }> {
	const bytes = await readBytes(file);
	if (!bytes.ok) return { outcome: unusable(terminal, bytes.error) };
	const now = new Date().toISOString();
	if (startsAsPdf(bytes.value)) {
		const { signatures: _, ...report } = await verifyDossier(bytes.value, { root, now, rebuild: REBUILD, restate });
		return { outcome: OUTCOMES[report.outcome], report };
	}
	const report = await verifyRecord({ lines: [{ name: file, bytes: bytes.value }], root, now, restate });
	if (report.counts.events === 0 && report.counts.siteEvents === 0) {
		const because = report.checks.find(({ outcome }) => outcome === 'failed')?.because ?? 'It is empty.';
		const todo = 'Nothing was judged. Give a dossier (PDF), or a record with one event a line.';
		return { outcome: unusable(terminal, `${file} is neither a dossier nor a record. ${because} ${todo}`) };
	}
	return { outcome: OUTCOMES[report.outcome], report };
}

const OUTCOMES = { passed: 'passed', failed: 'failed', undecided: 'indeterminate' } as const;

const startsAsPdf = (bytes: Bytes): boolean => new TextDecoder('latin1').decode(bytes.subarray(0, 5)) === '%PDF-';
