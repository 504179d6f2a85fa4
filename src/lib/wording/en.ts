import { CHAPTERS } from './en/chapters';
import { CLOSING } from './en/closing';
import { COVER } from './en/cover';
import { ERRORS } from './en/errors';
import { FINDINGS } from './en/findings';
import { GATES } from './en/gates';
import { NOTES } from './en/notes';
import { STATES } from './en/states';

/** English. Every message under a key that says where it stands; another language has the same keys. */
export const EN = { ...STATES, ...COVER, ...GATES, ...CHAPTERS, ...CLOSING, ...ERRORS, ...FINDINGS, ...NOTES } as const;
