/**
 * identity: people, roles and rights, the site root and the certificates it issues, keys, signatures, trust lists.
 * Uses WebCrypto and nothing else of the platform: moments and random bytes are arguments.
 * May import: base.
 */
export { may, RIGHTS, ROLES, rolesWith, isRole, type Right, type Role } from './roles';
export { printedName, type NameError } from './printed-name';
export { isInstant, millisecondsOf, type Instant } from './instant';
export { webRandom, type Random } from './webcrypto';
export { fromJwk, makeEntryKey, toJwk, type Jwk, type PublicKey, type SigningKey } from './keys';
export { checkSignature, sign, type SignatureError } from './sign';
export { MIN_ITERATIONS, wrappedKey, type UnwrapError, type WrappedKey } from './wrap';
export { checkPin, type PinError, type UnlockMode } from './pin';
export { beginTry, mayTry, NO_TRIES, succeeded, type MayTry, type Tries } from './lockout';
export { makeGateKey, openGateKey, type GateKey, type OpenGateKeyError } from './gate-key';
export { isResumeCode, makeResumeCode, type ResumeCode, type ResumeCodeError } from './resume-code';
export { checkShiftKey, coveredBy, type OutsideShiftKey, type ShiftKey, type ShiftKeyError } from './shift-key';
export {
	fingerprintOf,
	fromPem,
	readCertificate,
	toPem,
	type Certificate,
	type CertificateError,
	type DeviceId,
	type Fingerprint,
	type PersonId,
	type Subject,
} from './certificate';
export {
	makeSiteRoot,
	openSiteRoot,
	readSiteRootFile,
	rootCertificate,
	writeSiteRootFile,
	type OpenSiteRoot,
	type SiteRootError,
	type SiteRootFile,
} from './site-root';
export { enrolDevice, enrolPerson, type EnrolError, type Validity } from './enrol';
export {
	informsAbout,
	openTrustList,
	replaceTrustList,
	signedTrustList,
	signTrustList,
	trustList,
	type Revocation,
	type SignedTrustList,
	type TrustList,
	type TrustListError,
} from './trust-list';
export { classOf, type ResultClass, type SubIndication } from './result-class';
export { checkChain, type ChainAnswer, type ChainQuestion } from './chain';
export type { ChainFinding } from './chain-finding';
export type { Scope } from './chain-rules';
export type { Times } from './chain-times';
