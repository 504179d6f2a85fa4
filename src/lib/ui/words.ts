import { getContext, setContext } from 'svelte';
import { speaker, type Say } from '../wording';

const WORDS = Symbol('words');

/** Called once by the frame of the app: every component below speaks the language chosen there. */
export const giveWords = (say: Say): Say => setContext(WORDS, say);

/** The words of the language chosen; English where nobody chose. */
export const words = (): Say => getContext<Say | undefined>(WORDS) ?? speaker('en');
