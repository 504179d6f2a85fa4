import type { TabletPerson } from '$lib/app';
import type { Signer } from '$lib/ui';
import { sayWords, type Say } from '$lib/wording';

/** A person of this tablet as the sheets name who signs. */
export const signerOf = ({ person, name, roles }: TabletPerson, say: Say): Signer => ({
	person,
	name,
	roles: sayWords(roles, say),
});
