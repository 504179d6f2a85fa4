import type { Report } from '../lib/verify';

const WORDS = { passed: 'holds', failed: 'FAILED', undecided: 'undecided' } as const;

/** A report as lines that a person reads at a terminal: the two answers first, then every check, what failed first. */
export function tellReport(file: string, report: Report): string {
	const { process, checked, checks, counts } = report;
	const order = ['failed', 'undecided', 'passed'] as const;
	return [
		file,
		`  Integrity of this file: ${report.class}${report.sub === undefined ? '' : `, ${report.sub}`} (${checked.passed} checks hold, ${checked.failed} failed, ${checked.undecided} undecided)`,
		`  Rules of the procedure: ${process.result}${process.because.length === 0 ? '' : ` (${process.because.join('; ')})`}`,
		'  Not shown by this: that readings, clocks or people were right, that the plant is safe, or any permission.',
		`  Counts: ${Object.entries(counts)
			.map(([what, count]) => `${spaced(what)} ${count}`)
			.join(', ')}`,
		'',
		...order.flatMap((outcome) =>
			checks
				.filter((check) => check.outcome === outcome)
				.map(({ name, because, field, sub }) => {
					const where = field === undefined ? '' : ` [${field}]`;
					return `  ${WORDS[outcome].padEnd(9)}  ${name}${where}: ${because}${sub === undefined ? '' : ` ${sub}`}`;
				}),
		),
		'',
	].join('\n');
}

const spaced = (name: string): string =>
	name.replace(/([a-z])([A-Z])/g, (_, a: string, b: string) => `${a} ${b.toLowerCase()}`);
