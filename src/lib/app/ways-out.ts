import type { OpenStartUp } from './open-start-up.svelte';

/** How a gate can be released although who holds the tablet may not: somebody repeats, or somebody else releases (ST9). */
export type WaysOut = {
	/** By repeating these steps the people named take the performance off who would release. */
	readonly repeat: { readonly steps: readonly string[]; readonly people: readonly string[] } | undefined;
	/** Who may release it as things stand. */
	readonly release: readonly string[];
};

export function waysOut({ procedure, standing, tablet }: OpenStartUp, gate: number): WaysOut {
	const me = tablet.person;
	const missing = (standing.gates.find((one) => one.gate === gate)?.missing ?? []).flat();
	const proofs = standing.steps.filter((one) => one.gate === gate && one.state === 'stands');
	const performedBy = (person: string): readonly string[] =>
		proofs.filter((one) => one.performedBy?.includes(person) === true).map(({ step }) => step);
	const others = tablet.people.filter(({ person, hasKey }) => hasKey && person !== me?.person);
	const mayRelease = (roles: readonly string[]): boolean => roles.some((role) => missing.includes(role));
	const steps = me === undefined ? [] : performedBy(me.person);
	const rolesFor = (id: string): readonly string[] | undefined => procedure.steps.find((step) => step.id === id)?.roles;
	const mayRepeat = (roles: readonly string[]): boolean =>
		steps.every((id) => rolesFor(id)?.some((role) => roles.includes(role)) ?? true);
	const people = others.filter(({ roles }) => mayRepeat(roles) && !mayRelease(roles)).map(({ name }) => name);
	const canHelp = me !== undefined && mayRelease(me.roles) && steps.length > 0 && people.length > 0;
	return {
		repeat: canHelp ? { steps, people } : undefined,
		release: others
			.filter(({ person, roles }) => mayRelease(roles) && performedBy(person).length === 0)
			.map(({ name }) => name),
	};
}
