import type { Certificate } from './certificate';
import type { ChainFinding } from './chain-finding';
import type { Role } from './roles';
import { x509 } from './x509';

/** What the certificate must say for the act in question; what is left out is not asked. */
export type Scope = {
	/** One of these roles. */
	readonly roles?: readonly Role[];
	readonly person?: string;
	readonly device?: string;
};

type Path = readonly x509.X509Certificate[];

/** Nothing in the path may rest on another algorithm than ours: ECDSA on P-256 with SHA-256. */
export function judgeAlgorithms(path: Path): ChainFinding {
	const weak = path.map(algorithmsOf).find((used) => used !== ALLOWED);
	if (weak === undefined) return { rule: 'algorithms', outcome: 'passed', facts: { used: ALLOWED } };
	const facts = { used: weak, allowed: ALLOWED };
	return { rule: 'algorithms', outcome: 'failed', sub: 'CRYPTO_CONSTRAINTS_FAILURE', facts };
}

const ALLOWED = 'ECDSA P-256 SHA-256';

function algorithmsOf(certificate: x509.X509Certificate): string {
	const { name: signed, hash } = certificate.signatureAlgorithm as { name: string; hash?: { name: string } };
	const key = certificate.publicKey.algorithm as { name: string; namedCurve?: string; modulusLength?: number };
	const size = key.namedCurve ?? (key.modulusLength === undefined ? '' : String(key.modulusLength));
	return signed === key.name
		? `${key.name} ${size} ${hash?.name ?? '?'}`
		: `${key.name} ${size}, ${signed} ${hash?.name ?? '?'}`;
}

/** RFC 5280 sections 4.2.1.3, 4.2.1.9 and 6.1.4: who may issue, who may only sign, and no critical extension unread. */
export function judgeConstraints(path: Path): ChainFinding {
	const because = path
		.map((certificate, depth) => brokenRule(certificate, depth))
		.find((broken) => broken !== undefined);
	if (because === undefined) return { rule: 'constraints', outcome: 'passed', facts: {} };
	return { rule: 'constraints', outcome: 'failed', sub: 'CHAIN_CONSTRAINTS_FAILURE', facts: { because } };
}

function brokenRule(certificate: x509.X509Certificate, depth: number): string | undefined {
	const unread = certificate.extensions.find(({ critical, type }) => critical && !READ.includes(type));
	if (unread !== undefined) return `critical extension ${unread.type} is not known`;
	const usages = certificate.getExtension(x509.KeyUsagesExtension)?.usages ?? 0;
	const basic = certificate.getExtension(x509.BasicConstraintsExtension);
	if (depth === 0) {
		if (basic?.ca === true) return 'an issuing certificate signed, which may only issue';
		return (usages & SIGNS) === SIGNS ? undefined : 'its key usage is not digital signature and non-repudiation';
	}
	if (basic?.ca !== true || (usages & x509.KeyUsageFlags.keyCertSign) === 0)
		return `${certificate.subject} may not issue`;
	const below = depth - 1;
	return below > (basic.pathLength ?? Infinity)
		? `${certificate.subject} may not stand ${below} levels above`
		: undefined;
}

const SIGNS = x509.KeyUsageFlags.digitalSignature | x509.KeyUsageFlags.nonRepudiation;

/** Basic constraints, key usage, extended key usage. */
const READ = ['2.5.29.19', '2.5.29.15', '2.5.29.37'];

export function judgeScope(certificate: Certificate, scope: Scope): ChainFinding {
	const { subject } = certificate;
	const broken = (facts: ChainFinding['facts']): ChainFinding => ({
		rule: 'scope',
		outcome: 'failed',
		sub: 'SIG_CONSTRAINTS_FAILURE',
		facts,
	});
	const named = subject.kind === 'person' ? subject.person : '';
	const device = subject.kind === 'authority' ? '' : subject.device;
	const roles = subject.kind === 'person' ? subject.roles : [];
	if (scope.person !== undefined && scope.person !== named) return broken({ person: named, expected: scope.person });
	if (scope.device !== undefined && scope.device !== device) return broken({ device, expected: scope.device });
	if (scope.roles !== undefined && !scope.roles.some((role) => roles.includes(role))) {
		return broken({ roles: roles.join(', '), expected: scope.roles.join(' or ') });
	}
	return { rule: 'scope', outcome: 'passed', facts: { person: named, roles: roles.join(', '), device } };
}
