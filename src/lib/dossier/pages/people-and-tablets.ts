import { allOf, headCode, headsOf } from '../../record';
import { STYLES, type Flow } from '../layout/flow';
import { sayWords } from '../../wording';
import { table } from '../layout/table';
import type { Story } from '../story/story';

/** Who took part, how shifts were handed over, what was only temporary, and how far the log of each tablet got. */
export function peopleAndTablets(flow: Flow, story: Story): void {
	const { say } = story;
	flow.newSheet(say('people.sheet'));
	flow.head(say('people.caption'), say('people.sheet'));
	people(flow, story);
	handOvers(flow, story);
	temporaryStates(flow, story);
	copies(flow, story);
	tablets(flow, story);
}

function people(flow: Flow, { say, names, opened, events }: Story): void {
	flow.heading(say('people.title'), { with: 50 });
	table(
		flow,
		[
			{ head: say('people.name'), width: 150, voice: 'strong' },
			{ head: say('people.id'), width: 70 },
			{ head: say('people.roles') },
			{ head: say('people.events'), width: 60, align: 'end' },
		],
		opened.body.people.map(({ person, roles }) => ({
			cells: [
				names.person(person),
				person,
				sayWords(roles, say),
				String(events.filter((event) => event.person === person).length),
			],
		})),
	);
}

function handOvers(flow: Flow, { say, names, moments, events }: Story): void {
	flow.heading(say('hand-over.title'), { with: 50 });
	const told = allOf(events, 'shift hand-over');
	if (told.length === 0) return flow.write(say('hand-over.none'), STYLES.body);
	table(
		flow,
		[
			{ head: say('refused.when'), width: 70 },
			{ head: say('hand-over.from'), width: 120 },
			{ head: say('hand-over.to'), width: 140 },
			{ head: say('hand-over.states') },
		],
		told.map(({ body, observed, entered }) => ({
			cells: [
				moments.short(observed ?? entered),
				body.from.map(names.person).join(', '),
				body.to.map(names.person).join(', '),
				say(body.temporaryStatesConfirmed ? 'hand-over.confirmed' : 'hand-over.not confirmed'),
			],
			...(body.summary === undefined ? {} : { notes: [body.summary] }),
		})),
	);
}

function temporaryStates(flow: Flow, { say, names, moments, site }: Story): void {
	flow.heading(say('temporary.title'), { with: 50 });
	const told = allOf(site, 'temporary state');
	if (told.length === 0) return flow.write(say('temporary.none'), STYLES.body);
	table(
		flow,
		[
			{ head: say('temporary.state') },
			{ head: say('temporary.owner'), width: 130 },
			{ head: say('temporary.until'), width: 90 },
			{ head: say('temporary.noted'), width: 80 },
		],
		told.map(({ body, entered }) => ({
			cells: [
				body.ended === true ? say('temporary.ended', { state: body.state }) : body.state,
				body.owner === undefined ? '–' : names.person(body.owner),
				body.until === undefined ? '–' : moments.short(body.until),
				moments.short(entered),
			],
		})),
	);
}

function copies(flow: Flow, { say, names, moments, events }: Story): void {
	flow.heading(say('copies.title'), { with: 50 });
	const told = allOf(events, 'copy made');
	if (told.length === 0) return flow.write(say('copies.none'), STYLES.body);
	table(
		flow,
		[
			{ head: say('refused.when'), width: 70 },
			{ head: say('copies.from'), width: 60 },
			{ head: say('copies.to'), width: 100 },
			{ head: say('copies.way'), width: 50 },
			{ head: say('copies.by') },
		],
		told.map(({ body, device, person, entered }) => ({
			cells: [
				moments.short(entered),
				device,
				body.to,
				body.way,
				[names.person(person), ...(body.compared === true ? [say('copies.compared')] : [])].join(', '),
			],
		})),
	);
}

/** The last number and head code of every tablet's log inside the seal: what a cut tail would no longer match. */
function tablets(flow: Flow, { say, moments, events, sealed }: Story): void {
	flow.heading(say('tablets.title'), { with: 50 });
	table(
		flow,
		[
			{ head: say('tablets.tablet'), width: 70, voice: 'strong' },
			{ head: say('tablets.number'), width: 80, align: 'end' },
			{ head: say('tablets.head'), width: 90, voice: 'code' },
			{ head: say('tablets.last'), width: 80 },
			{ head: say('tablets.sealed') },
		],
		[...headsOf(events)].map(([device, head]) => {
			const inSeal = sealed.body.heads[device];
			return {
				cells: [
					device,
					String(head.number),
					headCode(head),
					moments.short(head.entered),
					inSeal === undefined ? '' : say('tablets.in seal', { number: inSeal.number }),
				],
			};
		}),
	);
	const lost = sealed.body.lost ?? [];
	for (const { device, number, head, note } of lost)
		flow.write(say('tablets.lost', { device, number, head, note }), { ...STYLES.body, tone: 'bad' });
	if (lost.length === 0) flow.write(say('tablets.none lost'), STYLES.note);
}
