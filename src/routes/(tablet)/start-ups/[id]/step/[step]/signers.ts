import type { TabletPerson } from '$lib/app';
import type { Signer } from '$lib/ui';

/** A person of this tablet as the sheets name who signs. */
export const signerOf = ({ person, name, roles }: TabletPerson): Signer => ({ person, name, roles: roles.join(', ') });
