import { fail, fromUtf8, ok, utf8, type Result } from '../base';
import { DemoStopped, playStartUp, PlayFileSchema, type PlayedStartUp } from '../demo';
import * as v from 'valibot';
import { millis, parseTrend } from '../record';
import type { Store } from '../store';
import type { Clock } from './clock';
import type { TrendFile } from './entries';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';
import { shiftTimes } from './shift-times';
import { settingsOf, writeSettings } from './tablet.svelte';

type Bytes = Uint8Array<ArrayBuffer>;

/** Reads a file beside the demonstration's `start-up.json`, from where the app itself came. */
export type ReadFile = (name: string) => Promise<Bytes>;

export type Step = { readonly done: number; readonly of: number };

/**
 * Everybody's PIN on a demonstration, and said so wherever people are shown: the keys are made anew on every tablet, so that
 * nobody can mistake a signature made with it for a real one.
 */
export const DEMONSTRATION_PIN = '73905284';

/** The story stops here, in the middle of the purge of Gate 2: what comes next is the user's. */
const LAST_ACT = '2026-03-14T21:20:30';
/** When the story reached this moment, the tablet is taken up. */
const TAKEN_UP = '2026-03-14T21:33:00+01:00';
const MINUTE = 60_000;

/** Plays the demonstration up to the middle of its purge, moved in time so that it is now, and keeps it on this tablet. */
export async function playDemonstration(
	store: Store,
	clock: Clock,
	read: ReadFile,
	progress: (step: Step) => void,
): Promise<Result<string, Problem>> {
	const shift = Math.floor((clock.now() - Date.parse(TAKEN_UP)) / MINUTE) * MINUTE;
	try {
		const files = await storyFiles(read, shift);
		const played = await playStartUp(files, {
			pin: DEMONSTRATION_PIN,
			progress: (done, of) => progress({ done, of }),
		});
		const kept = await keepPlayed(store, played);
		if (!kept.ok) return kept;
		const said = { person: 'TechA', demonstrationPin: DEMONSTRATION_PIN, demonstrationShift: shift };
		const settings = await writeSettings(store, said);
		return settings.ok ? ok(played.play.startUp) : settings;
	} catch (thrown) {
		if (thrown instanceof DemoStopped || thrown instanceof FileMissing)
			return fail({ kind: 'demonstration-stopped', because: thrown.message });
		throw thrown;
	}
}

/** A trend of the demonstration, moved in time as everything else of it was. */
export async function suppliedTrend(store: Store, read: ReadFile, name: string): Promise<Result<TrendFile, Problem>> {
	const settings = await settingsOf(store);
	if (!settings.ok) return settings;
	const text = fromUtf8(await read(`trends/${name}`));
	return ok({ name, bytes: utf8(shiftTimes(text, settings.value.demonstrationShift ?? 0)) });
}

/** A trend that is offered, and the time that it is of. */
export type SuppliedTrend = { readonly file: TrendFile; readonly from: string; readonly to: string };

/**
 * The trends of the demonstration that can be used now, the newest first: the first purge where the story had it, and a
 * second one, for after a fan stop, moved so that it has just ended.
 */
export async function suppliedTrends(startUp: OpenStartUp, read: ReadFile): Promise<readonly SuppliedTrend[]> {
	const { plant, tablet } = startUp;
	const offered: SuppliedTrend[] = [];
	for (const name of SUPPLIED) {
		const supplied = await suppliedTrend(tablet.store, read, name);
		const file = supplied.ok && name === AFTER_A_STOP ? justEnded(supplied.value, startUp) : supplied;
		const trend = file.ok ? parseTrend(fromUtf8(file.value.bytes), plant.utcOffsetMinutes) : undefined;
		const [from, to] = trend?.ok === true ? [trend.value.times[0], trend.value.times.at(-1)] : [];
		if (!file.ok || from === undefined || to === undefined || to > tablet.clock.now()) continue;
		offered.push({ file: file.value, from: startUp.instant(from), to: startUp.instant(to) });
	}
	return offered.sort((a, b) => millis(b.to) - millis(a.to));
}

function justEnded({ name, bytes }: TrendFile, { plant, tablet }: OpenStartUp): Result<TrendFile, Problem> {
	const text = fromUtf8(bytes);
	const trend = parseTrend(text, plant.utcOffsetMinutes);
	if (!trend.ok) return trend;
	const late = tablet.clock.now() - (trend.value.times.at(-1) ?? 0);
	return ok({ name, bytes: utf8(shiftTimes(text, Math.floor(late / MINUTE) * MINUTE)) });
}

const AFTER_A_STOP = 'purge-2.csv';
const SUPPLIED = ['purge-1.csv', 'purge-1-decimal-comma.csv', 'purge-1-not-yet.csv', AFTER_A_STOP] as const;

export class FileMissing extends Error {}

/** The story up to where it stops, on one tablet, with every file that it names, all moved in time. */
async function storyFiles(read: ReadFile, shift: number): Promise<{ readonly read: (name: string) => Bytes }> {
	const whole = v.parse(PlayFileSchema, JSON.parse(fromUtf8(await read('start-up.json'))));
	const acts = whole.acts.filter(({ at }) => at <= LAST_ACT);
	const named = acts.flatMap((act) => [...('photo' in act ? [act.photo] : []), ...('file' in act ? [act.file] : [])]);
	const [tablet = 'T-1'] = whole.tablets;
	const play = JSON.stringify({ ...whole, tablets: [tablet], acts });
	const held = new Map([['start-up.json', utf8(shiftTimes(play, shift))]]);
	for (const name of new Set([whole.plant, whole.people, ...named])) {
		const bytes = await read(name);
		held.set(name, /\.(json|csv)$/.test(name) ? utf8(shiftTimes(fromUtf8(bytes), shift)) : bytes);
	}
	return {
		read: (name) => {
			const bytes = held.get(name);
			if (bytes === undefined) throw new FileMissing(name);
			return bytes;
		},
	};
}

/**
 * What one tablet of a played start-up holds becomes what this tablet holds. Its own row goes last: whoever is interrupted
 * before it has no site yet and begins again.
 */
export async function keepPlayed(
	store: Store,
	{ site, tablets, play, attachedFiles }: PlayedStartUp,
	device = play.tablets[0] ?? 'T-1',
): Promise<Result<'saved', Problem>> {
	const certificate = site.tabletCertificate(device);
	if (certificate === undefined) throw new DemoStopped(`tablet ${device} is not enrolled`);
	for (const { certificate, gateKey } of site.keysOn(device)) {
		if (certificate.subject.kind !== 'person') continue;
		const { person } = certificate.subject;
		const saved = await store.gateKeys.save({ person, device, gateKey, certificate: certificate.der });
		if (!saved.ok) return saved;
	}
	for (const { bytes, ...as } of attachedFiles) {
		const saved = await store.attachments.save(bytes, as);
		if (!saved.ok) return saved;
	}
	const root = await store.site.write('root certificate', site.root.certificate.der);
	if (!root.ok) return root;
	const events = await store.events.importEvents(tablets.held(device));
	if (!events.ok) return events;
	const label = `Tablet ${device}`;
	return store.site.write('tablet', { device, label, certificate: certificate.der, key: site.tabletKey(device) });
}
