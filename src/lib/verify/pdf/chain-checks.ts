import { sameBytes } from '../../base';
import { checkChain, type ChainFinding, type Scope, type Times, type TrustList } from '../../identity';
import { failed, passed, type Check } from './check';

/** Asks identity whether the root vouches for the signer, and says each of its findings in a sentence. */
export async function chainChecks(
	field: string,
	question: {
		readonly certificate: Uint8Array<ArrayBuffer>;
		readonly others: readonly Uint8Array<ArrayBuffer>[];
		readonly root: Uint8Array<ArrayBuffer>;
		readonly times: Times;
		readonly trustList: TrustList | undefined;
		readonly scope: Scope | undefined;
	},
): Promise<readonly Check[]> {
	const { certificate, root, others, times, trustList, scope } = question;
	const { findings, path } = await checkChain({ certificate, root, issuers: others, times, trustList, scope });
	// Whether the certificate can be read was asked before there was a chain to ask about.
	const ofChain = findings
		.filter(({ rule }) => rule !== 'certificate')
		.map((finding) => ({ ...checkOfFinding(finding), field }));
	const strangers = others.filter((der) => !path.some((known) => sameBytes(known, der)));
	return [...ofChain, ...(path.length > 1 ? [checkStrangers(field, strangers.length, others.length + 1)] : [])];
}

/** What identity found, as a check with its sentence. */
export function checkOfFinding(finding: ChainFinding): Check {
	const { rule, outcome, sub, facts } = finding;
	return { name: NAMES[rule], outcome, because: say(finding), facts, ...(sub === undefined ? {} : { sub }) };
}

/** No signature covers the certificates that lie beside it, so nothing may lie there but the way to the root. */
function checkStrangers(field: string, strangers: number, certificates: number): Check {
	const name = 'certificates inside are those of the chain';
	const said = { field, facts: { strangers, certificates } };
	return strangers === 0
		? passed(name, `All ${certificates} of them.`, said)
		: failed(name, `${strangers} of ${certificates} do not lead to this root.`, said);
}

export const VOUCHED = 'site root vouches for the signer';

const NAMES: { readonly [rule in ChainFinding['rule']]: string } = {
	certificate: 'certificate can be read',
	path: VOUCHED,
	constraints: 'certificates keep to their purpose',
	algorithms: 'algorithms are allowed',
	'claimed time': 'claimed time has come',
	validity: 'certificate was in its time',
	revocation: 'certificate was not revoked',
	scope: 'signer had the role',
};

function say({ rule, outcome, sub, facts }: ChainFinding): string {
	const fact = (name: string): string => facts[name] ?? '?';
	switch (rule) {
		case 'certificate':
			return outcome === 'passed' ? `Serial number ${fact('serial')}.` : `It cannot be read: ${fact('because')}.`;
		case 'path':
			if (outcome === 'passed') return `The chain ends in the root ${fact('root').slice(0, 16)}.`;
			if (outcome === 'failed') return `The certificate names this root as its issuer, and this root did not sign it.`;
			return facts.issuer === undefined
				? `Not known: ${fact('because')}.`
				: `No chain leads from this certificate, issued by ${facts.issuer}, to the root that was given.`;
		case 'constraints':
			return outcome === 'passed' ? 'Who issued may issue, and who signed may sign.' : `Broken: ${fact('because')}.`;
		case 'algorithms':
			return outcome === 'passed'
				? `${fact('used')} throughout.`
				: `${fact('used')} is used; allowed is ${fact('allowed')}.`;
		case 'claimed time':
			return outcome === 'passed'
				? `${fact('claimed')} by the clock of the signer; nothing here proves that clock.`
				: `${fact('claimed')} lies after ${fact('now')}, which is now.`;
		case 'validity':
			return `Signed at ${fact('claimed')}, by the signer's clock; valid from ${fact('notBefore')} to ${fact('notAfter')}.`;
		case 'revocation':
			if (facts.revoked !== undefined) {
				const proof = facts.provenBy === undefined ? '' : `, and the signature is proven before, by ${facts.provenBy}`;
				return `Revoked at ${facts.revoked} (${fact('reason')})${proof}; the signature claims ${fact('claimed')}.`;
			}
			if (facts.issued === undefined) return `Not known: ${fact('because')}.`;
			return outcome === 'passed'
				? `Not in trust list ${fact('sequence')}, issued ${fact('issued')}. Later revocations are not known here.`
				: `Trust list ${fact('sequence')} had run out at ${fact('nextUpdate')}; a newer one can tell.`;
		case 'scope':
			return outcome === 'passed'
				? `Certified as ${fact('roles')}.`
				: `Certified: ${facts.roles ?? facts.person ?? fact('device')}; needed: ${fact('expected')} (${sub ?? ''}).`;
	}
}
