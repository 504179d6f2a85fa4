import type { Outcome, Report } from '../../verify';

type Check = Report['checks'][number];

export const GROUPS = [
	'file',
	'updates',
	'signatures',
	'certificates',
	'revocation',
	'contents',
	'record',
	'event signatures',
	'gates',
	'calculations',
	'pages',
] as const;
export type GroupId = (typeof GROUPS)[number];

export type CheckGroup = {
	readonly id: GroupId;
	readonly outcome: Outcome;
	readonly passed: number;
	readonly checks: readonly Check[];
	/** Failed first, then undecided. */
	readonly notPassed: readonly Check[];
};

/** Some two hundred checks as a dozen contacts of one line, in the order in which a judge asks; none is left out. */
export const checkGroups = (checks: readonly Check[]): readonly CheckGroup[] =>
	GROUPS.flatMap((id) => {
		const own = checks.filter((check) => groupOf(check) === id);
		if (own.length === 0) return [];
		const failed = own.filter(({ outcome }) => outcome === 'failed');
		const undecided = own.filter(({ outcome }) => outcome === 'undecided');
		return [
			{
				id,
				outcome: failed.length > 0 ? 'failed' : undecided.length > 0 ? 'undecided' : 'passed',
				passed: own.length - failed.length - undecided.length,
				checks: own,
				notPassed: [...failed, ...undecided],
			},
		];
	});

/** By the words of its name; what no pattern knows is about the record. */
export const groupOf = ({ name }: Pick<Check, 'name'>): GroupId =>
	PATTERNS.find(([, pattern]) => pattern.test(name))?.[0] ?? 'record';

const PATTERNS: readonly (readonly [GroupId, RegExp])[] = [
	['revocation', /not revoked|trust lists/],
	[
		'certificates',
		/vouches for the signer|algorithms are|keep to their purpose|claimed time|in its time|roles in the record/,
	],
	['certificates', /^certificates inside|^trust is anchored/],
	['updates', /^update /],
	['event signatures', /^events are signed|^signers (are|had)|^chain heads are/],
	['gates', /^acts |^statements say|^steps were|^passes follow/],
	['calculations', /^calculations /],
	['pages', /^pages are/],
	['contents', /^attachments are|table of contents|^record is the one|^documents beside|^plant is|^procedure is/],
	[
		'file',
		/^file |^nothing in it acts|^form holds|^nothing follows|^covers the whole file|^nothing is hidden|^attachments$/,
	],
	[
		'signatures',
		/^field |signature (can|says|is)|^bytes are those|^certificate of|^key of|^name shown|^page shows|^clocks agree|had the role/,
	],
	['signatures', /^one root/],
];
