import { isLanguage, type Language } from '../wording';

/** What a person chose for this tablet's screens. It lies beside the database, so that it is known before that opens. */
export class Preferences {
	readonly #memory: Pick<Storage, 'getItem' | 'setItem'>;
	readonly #asked: Language;
	#chosen = $state.raw<{ readonly [name: string]: string }>({});

	/** @param languages what the browser asks for, best first: the language as long as nobody chose */
	constructor(memory: Pick<Storage, 'getItem' | 'setItem'>, languages: readonly string[] = []) {
		this.#memory = memory;
		this.#asked = languages.map((each) => each.slice(0, 2).toLowerCase()).find(isLanguage) ?? 'en';
		this.#chosen = Object.fromEntries(NAMES.map((name) => [name, memory.getItem(name) ?? '']));
	}

	/** One of the looks of the screens; empty where nobody chose. */
	get look(): string {
		return this.#chosen.look ?? '';
	}

	set look(look: string) {
		this.#keep('look', look);
	}

	get language(): Language {
		const { language = '' } = this.#chosen;
		return isLanguage(language) ? language : this.#asked;
	}

	set language(language: Language) {
		this.#keep('language', language);
	}

	/** Whether the timer of readings is heard. */
	get sound(): 'on' | 'off' {
		return this.#chosen.sound === 'off' ? 'off' : 'on';
	}

	set sound(sound: 'on' | 'off') {
		this.#keep('sound', sound);
	}

	#keep(name: (typeof NAMES)[number], value: string): void {
		this.#chosen = { ...this.#chosen, [name]: value };
		this.#memory.setItem(name, value);
	}
}

/** Their names in local storage. */
const NAMES = ['look', 'language', 'sound'] as const;
