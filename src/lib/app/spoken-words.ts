/**
 * Words that can be written on paper and read out, and that nobody can guess: a consonant of sixteen, a vowel of four, and
 * both again, which is 12 bits a word. Seven of them hold 84 bits.
 */
export function spokenWords(count: number, random: (length: number) => Uint8Array): string {
	const bits = random(count * 2);
	return Array.from({ length: count }, (_, i) => {
		const number = ((bits[2 * i] ?? 0) << 8) | (bits[2 * i + 1] ?? 0);
		return (
			pick(CONSONANTS, number >> 8) + pick(VOWELS, number >> 6) + pick(CONSONANTS, number >> 2) + pick(VOWELS, number)
		);
	}).join(' ');
}

const pick = (letters: string, at: number): string => letters.charAt(at & (letters.length - 1));

/** Sixteen and four, so that every choice is as likely; none that is mistaken for another when it is read out. */
const CONSONANTS = 'bdfghjklmnprstvz';
const VOWELS = 'aiou';
