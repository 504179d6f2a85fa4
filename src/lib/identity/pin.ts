import { fail, ok, type Result } from '../base';

export type PinError =
	| { readonly kind: 'pin-too-short'; readonly length: number; readonly atLeast: number }
	| { readonly kind: 'pin-too-long'; readonly length: number; readonly atMost: number }
	| {
			readonly kind: 'pin-too-easy';
			readonly because: 'one character' | 'a run' | 'a repeated block' | 'a date' | 'known' | 'common';
	  };

/** What opens a key beside the PIN. With a badge the PIN may be shorter, because a copied tablet alone is no use then. */
export type UnlockMode = 'pin only' | 'badge and pin';

/** Refuses a PIN that a colleague or a program would try first (NIST SP 800-63B, 5.1.1.2; the lists are common practice). */
export function checkPin(
	typed: string,
	how: { readonly mode: UnlockMode; readonly known: readonly string[] },
): Result<'acceptable', PinError> {
	const pin = typed.normalize('NFKC');
	const onlyDigits = /^\d*$/.test(pin);
	const atLeast = how.mode === 'pin only' || !onlyDigits ? 8 : 6;
	const atMost = onlyDigits ? 12 : 64;
	if (pin.length < atLeast) return fail({ kind: 'pin-too-short', length: pin.length, atLeast });
	if (pin.length > atMost) return fail({ kind: 'pin-too-long', length: pin.length, atMost });
	const because = whyEasy(pin.toLowerCase(), how.known);
	return because === undefined ? ok('acceptable') : fail({ kind: 'pin-too-easy', because });
}

type Weakness = Extract<PinError, { kind: 'pin-too-easy' }>['because'];

function whyEasy(pin: string, known: readonly string[]): Weakness | undefined {
	if (/^(.)\1*$/u.test(pin)) return 'one character';
	if (isRun(pin)) return 'a run';
	if (/^(.{1,6}?)\1+$/u.test(pin) || /^(?:(.)\1)+$/u.test(pin)) return 'a repeated block';
	if (isDate(pin)) return 'a date';
	if (known.some((text) => text !== '' && pin.includes(text.toLowerCase()))) return 'known';
	return COMMON.has(pin) ? 'common' : undefined;
}

/** 23456789, 87654321, 24681357 is not one: every step the same, modulo ten for digits. */
function isRun(pin: string): boolean {
	const steps = new Set<number>();
	for (let i = 1; i < pin.length; i++) {
		const step = pin.charCodeAt(i) - pin.charCodeAt(i - 1);
		steps.add(/^\d+$/.test(pin) ? (step + 10) % 10 : step);
	}
	return steps.size === 1;
}

/** Day, month and year in the orders that people write, with two or four digits of year. */
function isDate(pin: string): boolean {
	const match = /^(?:(\d\d)(\d\d)(?:19|20)?\d\d|(?:19|20)?\d\d(\d\d)(\d\d))$/.exec(pin);
	if (match === null) return false;
	const [a, b] = [Number(match[1] ?? match[3]), Number(match[2] ?? match[4])];
	const dayAndMonth = (day: number, month: number) => day >= 1 && day <= 31 && month >= 1 && month <= 12;
	return dayAndMonth(a, b) || dayAndMonth(b, a);
}

/** Walks over a keypad or keyboard, and words, that head every published list. Runs, repeats and dates are rules above. */
const COMMON: ReadonlySet<string> = new Set(
	`14725836 147258369 74108520 741852963 78945612 789456123 45612378 456123789 12369874 123698745 32147896 321478965 36925814
	 369258147 96385274 963852741 15935746 159357 159753 75315948 753951 25802580 258025 08520852 085208 14789632 147896325
	 96321478 963214785 13579246 135792468 24681357 246813579 13572468 24680135 12344321 43211234 12312312 12341234 11223344
	 44332211 11112222 22221111 12121212 10203040 102030 1020304050 50403020 10101010 01010101 20202020 00110011 12345679
	 123456780 01234567 31415926 314159 27182818 271828 16180339 161803 14142135 141421 00700700 007007 42424242 69696969
	 420420 696969 520520 131452 1314520 5201314 52013140 88888880 66666660 12345600 12345601 98765400 10000000 20000000
	 90000000 11111112 12345677 87654320 12348765 56781234 password passw0rd password1 password12 password123 passwort
	 passwort1 passwort123 kennwort kennwort1 qwertyui qwertyuiop qwerty123 qwerty12 qwertz123 qwertzui qwertzuiop asdfghjk
	 asdfghjkl asdf1234 asdfasdf zxcvbnm1 yxcvbnm1 1qaz2wsx 1q2w3e4r 1q2w3e4r5t q1w2e3r4 abcd1234 abc12345 1234abcd a1b2c3d4
	 aa123456 iloveyou sunshine princess football baseball superman starwars dragon12 monkey12 letmein1 letmein123 welcome1
	 welcome12 welcome123 changeme changeme1 administrator admin123 admin1234 adminadmin geheim123 hallo123 hallo1234
	 schalke04 sommer12 sommer2024 sommer2025 winter12 winter2024 winter2025 january1 trustno1 whatever computer internet
	 michelle jennifer security operator operator1 supervisor tablet123 grinding grindmill oxygen123 nitrogen purge123`.split(
		/\s+/,
	),
);
