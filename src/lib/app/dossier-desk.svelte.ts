import { fail, ok, readableCode, toBase64, toHex, type Result } from '../base';
import { CLOSING, type RequiredSignature } from '../dossier';
import { sayWord, speaker, type Language } from '../wording';
import { Archive, type Checked } from './archive.svelte';
import { draftOf, readDossierDraft, withUpdates, type DossierDraft, type SignedUpdate } from './dossier-draft';
import { dossierInputOf, sealOf } from './dossier-input';
import { besideThePage, type DossierProgress, type RunDossierJob } from './dossier-job';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';
import type { TabletPerson } from './tablet.svelte';

type Bytes = Uint8Array<ArrayBuffer>;
type Done = Promise<Result<'done' | 'cancelled', Problem>>;

/** A place for a signature in the dossier, and who signed it. */
export type ClosingPlace = { readonly required: RequiredSignature; readonly signed: SignedUpdate | undefined };

/** The dossier of one sealed start-up on its way to the closed file: made, signed by one after the other, verified, kept. */
export class DossierDesk {
	readonly #startUp: OpenStartUp;
	readonly #run: RunDossierJob;
	readonly #archive: Archive;
	#draft = $state.raw<DossierDraft>();
	#pdf = $state.raw<Bytes>();
	#code = $state.raw<string>();
	#progress = $state.raw<DossierProgress | 'signing'>();
	#cancel: (() => void) | undefined;

	private constructor(startUp: OpenStartUp, run: RunDossierJob) {
		this.#startUp = startUp;
		this.#run = run;
		this.#archive = new Archive(startUp.tablet.store, startUp.tablet.clock);
	}

	/** Takes up what was begun before; a document of another seal is none of this record. */
	static async open(startUp: OpenStartUp, run: RunDossierJob = besideThePage): Promise<Result<DossierDesk, Problem>> {
		const desk = new DossierDesk(startUp, run);
		const { store, device } = startUp.tablet;
		const kept = await store.drafts.read(draftOf(startUp.id, device));
		if (!kept.ok) return kept;
		const draft = kept.value === undefined ? undefined : readDossierDraft(kept.value.typed);
		if (draft === undefined || draft.sealed !== sealOf(startUp)?.id) return ok(desk);
		const base = await store.attachments.read(draft.base);
		if (!base.ok) return base;
		if (base.value === undefined) return ok(desk);
		desk.#draft = draft;
		await desk.#show(withUpdates(new Uint8Array(await base.value.blob.arrayBuffer()), draft.updates));
		return ok(desk);
	}

	/** The document as it is now, with the signatures that it has. */
	get pdf(): Bytes | undefined {
		return this.#pdf;
	}

	/** Readable code of the document as it is now: what the next signer signs. */
	get code(): string | undefined {
		return this.#code;
	}

	/** Photos and trends that events name and that are not inside, because this tablet does not hold them. */
	get notHere(): readonly string[] {
		return this.#draft?.notHere ?? [];
	}

	get progress(): DossierProgress | 'signing' | undefined {
		return this.#progress;
	}

	get places(): readonly ClosingPlace[] {
		return CLOSING.map((required) => ({
			required,
			signed: this.#draft?.updates.find(({ field }) => field === required.field),
		}));
	}

	get next(): RequiredSignature | undefined {
		return this.#draft === undefined ? undefined : this.places.find(({ signed }) => signed === undefined)?.required;
	}

	get isClosed(): boolean {
		return this.#draft?.closed !== undefined;
	}

	get name(): string {
		return `${this.#startUp.id.replaceAll(/[^A-Za-z0-9.-]/g, '-')}.pdf`;
	}

	/** How the verification of the closed file goes, and what it said. */
	get verifying(): Archive['progress'] {
		return this.#archive.progress;
	}

	get verified(): Checked | undefined {
		return this.#archive.checked[0];
	}

	/** Who may give the next signature: holds a role that is asked for, and gave none of the others. */
	mayGive(required: RequiredSignature): readonly TabletPerson[] {
		const gave = this.#draft?.updates.map(({ person }) => person) ?? [];
		return this.#startUp.tablet.people.filter(
			({ person, roles, hasKey }) =>
				hasKey && !gave.includes(person) && roles.some((role) => required.roles.includes(role)),
		);
	}

	/** In the language of whoever makes it; who signs later signs in the same. */
	async build(language: Language): Done {
		const sealed = sealOf(this.#startUp);
		if (sealed === undefined) return fail({ kind: 'not-sealed-yet', startUp: this.#startUp.id });
		const made = await dossierInputOf(this.#startUp, language);
		if (!made.ok) return made;
		const { input, notHere } = made.value;
		const told = await this.#work({ does: 'build', input });
		if ('cancelled' in told) return ok('cancelled');
		if ('stopped' in told || !('built' in told)) return fail({ kind: 'work-stopped', because: reasonOf(told) });
		if (!told.built.ok) return fail({ kind: 'dossier-refused', error: told.built.error });
		const { store } = this.#startUp.tablet;
		const base = await store.attachments.save(told.built.value, { name: this.name, mediaType: PDF });
		if (!base.ok) return base;
		const draft: DossierDraft = {
			v: 1,
			sealed: sealed.id,
			made: this.#instant(),
			language,
			base: base.value.hash,
			notHere: [...notHere],
			updates: [],
		};
		return this.#keep(draft, told.built.value);
	}

	/** The next signature, by a person who types the PIN of their own key. */
	async sign(person: TabletPerson, pin: string): Done {
		const [pdf, required, draft, code] = [this.#pdf, this.next, this.#draft, this.#code];
		if (pdf === undefined || required === undefined || draft === undefined || code === undefined) return ok('done');
		const role = person.roles.find((each) => required.roles.includes(each));
		if (role === undefined || !this.mayGive(required).includes(person))
			return fail({ kind: 'not-this-signature', person: person.name, meaning: required.meaning });
		const { tablet } = this.#startUp;
		const key = await tablet.openKey(person.person, pin);
		if (!key.ok) return key;
		const root = await tablet.store.site.read('root certificate');
		if (!root.ok) return root;
		const chain = [person.certificate.der, ...(root.value === undefined ? [] : [root.value])];
		const at = this.#instant();
		const { field } = required;
		const say = speaker(draft.language);
		const meaning = say(`meaning.of.${required.meaning}`);
		const labels = {
			role: say('sign.label.role'),
			meaning: say('sign.label.meaning'),
			time: say('sign.label.time'),
			certificate: say('sign.label.certificate'),
			code: say('sign.label.code'),
		};
		const told = await this.#work({
			does: 'sign',
			pdf,
			key: key.value,
			signature: { field, role: sayWord(role, say), meaning, at, code, chain, labels },
		});
		if ('cancelled' in told) return ok('cancelled');
		if ('stopped' in told || !('signed' in told)) return fail({ kind: 'work-stopped', because: reasonOf(told) });
		if (!told.signed.ok) return fail({ kind: 'signing-refused', because: told.signed.error.kind });
		const signed = told.signed.value;
		const bytes = toBase64(signed.subarray(pdf.length));
		const update = { field, person: person.person, name: person.name, role, at, bytes };
		const kept = await this.#keep({ ...draft, updates: [...draft.updates, update] }, signed);
		return kept.ok && this.next === undefined ? this.#close(signed) : kept;
	}

	/** Reads the closed file back, check by check, and remembers what came of it. */
	async verify(): Promise<void> {
		const [pdf, draft] = [this.#pdf, this.#draft];
		if (pdf === undefined || draft?.closed === undefined) return;
		await this.#archive.check([{ name: this.name, arrayBuffer: () => Promise.resolve(pdf.slice().buffer) }]);
		const outcome = this.verified?.report.outcome;
		if (outcome !== undefined) await this.#keep({ ...draft, verified: { outcome, at: this.#instant() } }, pdf);
	}

	cancel(): void {
		this.#cancel?.();
		this.#archive.cancel();
	}

	async #close(pdf: Bytes): Done {
		const closed = await this.#startUp.tablet.store.attachments.save(pdf, { name: this.name, mediaType: PDF });
		if (!closed.ok) return closed;
		return this.#draft === undefined ? ok('done') : this.#keep({ ...this.#draft, closed: closed.value.hash }, pdf);
	}

	async #keep(draft: DossierDraft, pdf: Bytes): Done {
		const { store, device } = this.#startUp.tablet;
		const key = draftOf(this.#startUp.id, device);
		const saved = await store.drafts.save({ ...key, typed: draft, saved: this.#instant() });
		if (!saved.ok) return saved;
		this.#draft = draft;
		await this.#show(pdf);
		return ok('done');
	}

	async #show(pdf: Bytes): Promise<void> {
		const digest = await crypto.subtle.digest('SHA-256', pdf);
		this.#code = readableCode(toHex(new Uint8Array(digest)), 16);
		this.#pdf = pdf;
	}

	async #work(job: Parameters<RunDossierJob>[0]) {
		this.#cancel?.();
		this.#progress = job.does === 'sign' ? 'signing' : { part: 'chapter', done: 0, of: 1 };
		const { answer, cancel } = this.#run(job, (told) => (this.#progress = told));
		this.#cancel = cancel;
		const told = await answer;
		this.#progress = undefined;
		this.#cancel = undefined;
		return told;
	}

	#instant(): string {
		return this.#startUp.instant(this.#startUp.tablet.clock.now());
	}
}

const PDF = 'application/pdf';

const reasonOf = (told: object): string => ('stopped' in told ? String(told.stopped) : 'no answer');
