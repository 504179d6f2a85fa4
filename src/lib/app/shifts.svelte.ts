import { fail, ok, type Result } from '../base';
import { isResumeCode } from '../identity';
import type { ShiftKeyRow, Store } from '../store';
import type { Clock } from './clock';
import type { Signer } from './logbook';
import type { Problem } from './problem';

/** record.md: the screen is covered after five minutes, and entering goes on with a short code for sixty. */
export const COVER_AFTER = 5 * 60_000;
const CODE_FOR = 60 * 60_000;
/** Wrong codes before it must be the PIN. */
const CODES = 3;
/** How often it is written down that somebody still has the tablet in hand. */
const NOTED_EVERY = 20_000;

/** Whether a person can enter now: there is no shift, it runs, or it is covered and asks for the code or the PIN. */
export type ShiftState = 'none' | 'runs' | 'asks for the code' | 'asks for the PIN';

/**
 * The shifts that were begun on this tablet. Their keys are kept, so that a browser that was killed goes on without a PIN;
 * who has not touched the tablet for a while says who they are before the next entry.
 */
export class Shifts {
	readonly #store: Store;
	readonly #clock: Clock;
	readonly #device: string;
	#rows = $state.raw<readonly ShiftKeyRow[]>([]);
	#noted = 0;

	private constructor(store: Store, clock: Clock, device: string) {
		this.#store = store;
		this.#clock = clock;
		this.#device = device;
	}

	static async open(store: Store, clock: Clock, device: string): Promise<Result<Shifts, Problem>> {
		const shifts = new Shifts(store, clock, device);
		const looked = await shifts.lookAgain();
		return looked.ok ? ok(shifts) : looked;
	}

	/** Another tab may have begun, gone on with or ended a shift. */
	async lookAgain(): Promise<Result<'read', Problem>> {
		const rows = await this.#store.shiftKeys.list(this.#device, this.#clock.now());
		if (!rows.ok) return rows;
		this.#rows = rows.value;
		return ok('read');
	}

	stateOf(person: string, log: string): ShiftState {
		const row = this.#row(person, log);
		if (row === undefined) return 'none';
		if (!this.#isCovered(row)) return 'runs';
		const { resume } = row;
		const isRecent = Math.abs(this.#clock.now() - row.touched) < CODE_FOR;
		return isRecent && resume !== undefined && resume.wrong < CODES ? 'asks for the code' : 'asks for the PIN';
	}

	/** With what entries are signed, while the shift runs and is not covered. */
	signerOf(person: string, log: string): Signer | undefined {
		const row = this.#row(person, log);
		return row === undefined || this.#isCovered(row) ? undefined : { key: row.key, shiftKey: row.shiftKey };
	}

	/** When a person's shift ends at the latest, in milliseconds; absent: none runs. */
	endsAt(person: string): number | undefined {
		const ends = this.#rows.filter((row) => row.person === person && this.#isRunning(row)).map((row) => row.notAfter);
		return ends.length === 0 ? undefined : Math.max(...ends);
	}

	/** A code that the person chose for another start-up holds here too. */
	resumeOf(person: string): ShiftKeyRow['resume'] {
		return this.#rows.find((row) => row.person === person && row.resume !== undefined)?.resume;
	}

	async begin(row: Omit<ShiftKeyRow, 'device' | 'touched'>): Promise<Result<'saved', Problem>> {
		const saved = await this.#store.shiftKeys.save({ ...row, device: this.#device, touched: this.#clock.now() });
		await this.lookAgain();
		return saved;
	}

	/** Somebody has the tablet in hand: the shifts that are not covered stay so. */
	async touched(): Promise<void> {
		const now = this.#clock.now();
		const inHand = this.#rows.filter((row) => !this.#isCovered(row)).map(({ person }) => person);
		const people = inHand.filter((person, i) => inHand.indexOf(person) === i);
		this.#rows = this.#rows.map((row) => (people.includes(row.person) ? { ...row, touched: now } : row));
		if (Math.abs(now - this.#noted) < NOTED_EVERY) return;
		this.#noted = now;
		for (const person of people) await this.#change(person, { touched: now });
	}

	/** The person has just shown who they are, by code or by PIN. */
	async resumed(person: string): Promise<void> {
		if (!this.#rows.some((row) => row.person === person)) return;
		await this.#change(person, { touched: this.#clock.now(), wrong: 0 });
		await this.lookAgain();
	}

	/** Counted before it is compared, so that pulling the plug wins no free try. */
	async goOn(person: string, code: string): Promise<Result<'runs', Problem>> {
		const looked = await this.lookAgain();
		if (!looked.ok) return looked;
		const resume = this.resumeOf(person);
		if (resume === undefined || resume.wrong >= CODES) return fail({ kind: 'code-used-up' });
		const counted = await this.#change(person, { wrong: resume.wrong + 1 });
		if (!counted.ok) return counted;
		if (await isResumeCode(resume, code)) {
			await this.resumed(person);
			return ok('runs');
		}
		await this.lookAgain();
		const left = CODES - resume.wrong - 1;
		return fail(left > 0 ? { kind: 'wrong-code', left } : { kind: 'code-used-up' });
	}

	/** The shift is over, in one start-up or in all: its key is gone from the tablet. */
	async end(person: string, log?: string): Promise<Result<'ended', Problem>> {
		const owner = { person, device: this.#device };
		const dropped = await this.#store.shiftKeys.drop(log === undefined ? owner : { ...owner, log });
		if (!dropped.ok) return dropped;
		await this.lookAgain();
		return ok('ended');
	}

	#row(person: string, log: string): ShiftKeyRow | undefined {
		const row = this.#rows.find((one) => one.person === person && one.log === log);
		return row !== undefined && this.#isRunning(row) ? row : undefined;
	}

	#isRunning = ({ notAfter }: ShiftKeyRow): boolean => this.#clock.now() < notAfter;

	/** A clock that was set back or far forward has not kept an eye on the tablet. */
	#isCovered = ({ touched }: ShiftKeyRow): boolean => Math.abs(this.#clock.now() - touched) >= COVER_AFTER;

	#change(person: string, changed: { readonly touched?: number; readonly wrong?: number }) {
		return this.#store.shiftKeys.change({ person, device: this.#device }, changed);
	}
}
