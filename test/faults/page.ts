import { makeGateKey, webRandom } from '../../src/lib/identity';
import { checkChains, nextEnvelope, unsignedEvent, type RecordEvent } from '../../src/lib/record';
import { openStore, type Store } from '../../src/lib/store';

/** A page with the real store and nothing else, for the tests beside it to be cruel to. */

const LOG = 'SU-0001';
const OWNER = { person: 'P-01', device: 'T-1' };
const NOW = '2026-05-04T12:00:00+02:00';

const durabilities = new Set<string>();
const begin = Object.getOwnPropertyDescriptor(IDBDatabase.prototype, 'transaction')
	?.value as IDBDatabase['transaction'];
// Before the store opens: Dexie keeps the method that it finds then.
IDBDatabase.prototype.transaction = function (...given) {
	const transaction = begin.apply(this, given);
	if (transaction.mode === 'readwrite') durabilities.add(transaction.durability);
	return transaction;
};

const opened = openStore('tablet', { now: NOW });
let closed = 0;

async function store(): Promise<Store> {
	const result = await opened;
	if (!result.ok) throw new Error(result.error.kind);
	return result.value;
}

const page = {
	open: async () => {
		const { onClosed, erased } = await store();
		onClosed(() => closed++);
		return { erased: erased?.made };
	},

	/** Writes notes one after another, each on top of what the tablet holds, and tells the server of each that was saved. */
	write: async (who: string, count: number, padding = 0) => {
		const { events, drafts } = await store();
		let known = await held();
		for (let i = 0; i < count;) {
			const text = `${who} ${i} ${'.'.repeat(padding)}`;
			const note = unsignedEvent(
				nextEnvelope({ log: LOG, kind: 'note', body: { text }, person: 'P-01', device: 'T-1', entered: NOW }, known),
			);
			const saved = await events.append(note);
			if (saved.ok) {
				await fetch(`/saved?${note.id}`);
				known = [...known, note];
				i++;
				await drafts.save({ startUp: LOG, step: who, person: 'P-01', typed: known.length, saved: NOW });
				await fetch(`/draft?${known.length}`);
			} else if (saved.error.kind === 'chain-moved-on') known = await held();
			else return saved.error;
		}
		return 'written';
	},

	look: async () => {
		const { events, drafts } = await store();
		const log = await events.readLog(LOG);
		const draft = await drafts.list();
		if (!log.ok || !draft.ok) throw new Error('the log cannot be read');
		return {
			ids: log.value.events.map(({ id }) => id),
			damaged: log.value.damaged,
			findings: checkChains(log.value.events),
			drafts: draft.value.map(({ typed }) => typed),
		};
	},

	photo: async (kilobytes: number) => {
		const bytes = new Uint8Array(kilobytes * 1024);
		for (let at = 0; at < bytes.length; at += 65_536) crypto.getRandomValues(bytes.subarray(at, at + 65_536));
		const saved = await (await store()).attachments.save(bytes, { name: 'door.jpg', mediaType: 'image/jpeg' });
		return saved.ok ? 'saved' : saved.error;
	},

	photos: async () => {
		const list = await (await store()).attachments.list();
		return list.ok ? list.value.length : list.error;
	},

	enrol: async () => {
		const gateKey = await makeGateKey({ ...OWNER, pin: '83920174', random: webRandom });
		if (!gateKey.ok) throw new Error(gateKey.error.kind);
		const row = { ...OWNER, gateKey: gateKey.value, certificate: new Uint8Array() };
		return (await store()).gateKeys.save(row);
	},

	/** Tells the server of the try as soon as it is counted, while the PIN is still being stretched. */
	guess: async () => {
		const { gateKeys } = await store();
		const before = await page.triesLeft();
		const answer = gateKeys.open({ ...OWNER, pin: '00000000', now: Date.parse(NOW) });
		while ((await page.triesLeft()) === before) await new Promise((resolve) => setTimeout(resolve, 1));
		await fetch('/saved?a try');
		return answer;
	},

	triesLeft: async () => {
		const may = await (await store()).gateKeys.mayTry(OWNER, Date.parse(NOW));
		return may.ok && may.value.kind === 'may-try' ? may.value.left : undefined;
	},

	health: async () => (await store()).health.look(),
	keepReserve: async () => (await store()).reserve.keep(),
	reserveIsSpent: async () => (await store()).reserve.isSpent(),
	askToPersist: async () => (await store()).health.askToPersist(),
	closed: () => closed,

	/** How durable the browser says that the transactions were that wrote. */
	durability: () => [...durabilities],
};

async function held(): Promise<readonly RecordEvent[]> {
	const log = await (await store()).events.readLog(LOG);
	if (!log.ok) throw new Error(log.error.kind);
	return log.value.events;
}

export type TestPage = typeof page;

(globalThis as { tablet?: TestPage }).tablet = page;
