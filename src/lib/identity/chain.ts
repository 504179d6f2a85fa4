import { sameBytes } from '../base';
import { fingerprintOf, parseX509, readCertificate, type Certificate } from './certificate';
import type { ChainFinding } from './chain-finding';
import { judgeAlgorithms, judgeConstraints, judgeScope, type Scope } from './chain-rules';
import { judgeClaimedTime, judgeRevocation, judgeValidity, type Times } from './chain-times';
import { classOf, type ResultClass, type SubIndication } from './result-class';
import type { TrustList } from './trust-list';
import { x509 } from './x509';

export type ChainQuestion = {
	/** DER of the certificate of the key that signed. */
	readonly certificate: Uint8Array<ArrayBuffer>;
	/** The only anchor of trust: the site root as the judge knows it, never as the judged file brings it. */
	readonly root: Uint8Array<ArrayBuffer>;
	/** Certificates that may stand between the two. */
	readonly issuers?: readonly Uint8Array<ArrayBuffer>[];
	readonly times: Times;
	readonly trustList?: TrustList | undefined;
	/** What the act needed of its signer; nothing is said about it when nothing is asked. */
	readonly scope?: Scope | undefined;
};

export type ChainAnswer = {
	readonly class: ResultClass;
	readonly sub?: SubIndication;
	/** Every rule that could be asked, not the first that did not pass. */
	readonly findings: readonly ChainFinding[];
	readonly certificate?: Certificate;
	/** DER of the certificates that lead to the root, the signer's first; the signer's alone when none does. */
	readonly path: readonly Uint8Array<ArrayBuffer>[];
};

/**
 * Whether the site root vouches for the key that signed, at the time it signed.
 *
 * Source: the validation process of ETSI EN 319 102-1 (from memory, verify), path rules of RFC 5280 section 6.1.
 */
export async function checkChain(question: ChainQuestion): Promise<ChainAnswer> {
	const read = readCertificate(question.certificate);
	const leaf = parseX509(question.certificate);
	const root = parseX509(question.root);
	if (!read.ok || !leaf.ok) {
		const facts = { because: !read.ok ? read.error.kind : 'not-a-certificate' };
		const finding = { rule: 'certificate', outcome: 'undecided', sub: 'NO_SIGNING_CERTIFICATE_FOUND', facts } as const;
		return { ...verdictOf([finding]), findings: [finding], path: [] };
	}
	const certificate = read.value;
	const { path, finding } = root.ok
		? await findPath(leaf.value, root.value, question.issuers ?? [])
		: { path: [leaf.value], finding: NO_ROOT };
	const findings: readonly ChainFinding[] = [
		{
			rule: 'certificate',
			outcome: 'passed',
			facts: { fingerprint: certificate.fingerprint, serial: certificate.serial },
		},
		finding,
		judgeAlgorithms(path),
		judgeConstraints(path),
		judgeClaimedTime(question.times),
		judgeValidity(path, question.times, question.trustList),
		judgeRevocation(path, question.times, question.trustList),
		...(question.scope === undefined ? [] : [judgeScope(certificate, question.scope)]),
	];
	return { ...verdictOf(findings), findings, certificate, path: path.map(({ rawData }) => new Uint8Array(rawData)) };
}

const NO_ROOT: ChainFinding = {
	rule: 'path',
	outcome: 'undecided',
	sub: 'NO_CERTIFICATE_CHAIN_FOUND',
	facts: { because: 'the root that was given is not a certificate' },
};

function verdictOf(findings: readonly ChainFinding[]): Pick<ChainAnswer, 'class' | 'sub'> {
	const bad = findings.map(({ sub }) => sub).filter((sub) => sub !== undefined);
	const sub = bad.find((one) => classOf(one) === 'TOTAL-FAILED') ?? bad[0];
	return sub === undefined ? { class: 'TOTAL-PASSED' } : { class: classOf(sub), sub };
}

/** From the signer's certificate to the root, by names first and then by signatures; at most one issuer between. */
async function findPath(
	leaf: x509.X509Certificate,
	root: x509.X509Certificate,
	issuers: readonly Uint8Array<ArrayBuffer>[],
): Promise<{ readonly path: readonly x509.X509Certificate[]; readonly finding: ChainFinding }> {
	const facts = { issuer: leaf.issuer, root: fingerprintOf(new Uint8Array(root.rawData)) };
	const passed = { rule: 'path', outcome: 'passed', facts } as const;
	if (await issued(root, leaf)) return { path: [leaf, root], finding: passed };
	for (const der of issuers.slice(0, MAX_ISSUERS)) {
		const between = parseX509(der);
		if (!between.ok || !(await issued(between.value, leaf))) continue;
		if (await issued(root, between.value)) return { path: [leaf, between.value, root], finding: passed };
	}
	if (namesIssuer(leaf, root)) {
		// It names this very key as its issuer, and this key did not sign it.
		const forged = { ...facts, because: 'the root did not sign it' };
		return { path: [leaf], finding: { rule: 'path', outcome: 'failed', sub: 'SIG_CRYPTO_FAILURE', facts: forged } };
	}
	return { path: [leaf], finding: { rule: 'path', outcome: 'undecided', sub: 'NO_CERTIFICATE_CHAIN_FOUND', facts } };
}

async function issued(issuer: x509.X509Certificate, subject: x509.X509Certificate): Promise<boolean> {
	if (!sameName(issuer, subject)) return false;
	try {
		return await subject.verify({ publicKey: issuer, signatureOnly: true });
	} catch {
		return false;
	}
}

const sameName = (issuer: x509.X509Certificate, subject: x509.X509Certificate): boolean =>
	sameBytes(new Uint8Array(issuer.subjectName.toArrayBuffer()), new Uint8Array(subject.issuerName.toArrayBuffer()));

function namesIssuer(subject: x509.X509Certificate, issuer: x509.X509Certificate): boolean {
	const named = subject.getExtension(x509.AuthorityKeyIdentifierExtension)?.keyId;
	const own = issuer.getExtension(x509.SubjectKeyIdentifierExtension)?.keyId;
	return sameName(issuer, subject) && named !== undefined && named === own;
}

/** A file may bring many; more than this is not a chain but an attempt to keep us busy. */
const MAX_ISSUERS = 16;
