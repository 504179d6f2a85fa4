import type { Measure, Voice } from '../../drawing';
import { Face } from './face';
import { LITERATA_500 } from './literata-500';
import { SOFIA_SANS_500 } from './sofia-sans-500';
import { SOFIA_SANS_700 } from './sofia-sans-700';
import { SOFIA_SANS_800 } from './sofia-sans-800';

/** The faces of the dossier by the name they have in the PDF's resources. */
export const FACES = {
	Text: new Face(SOFIA_SANS_500),
	Strong: new Face(SOFIA_SANS_700),
	Title: new Face(SOFIA_SANS_800),
	Signed: new Face(LITERATA_500),
} as const;

export type FaceName = keyof typeof FACES;

/** How each voice of the sheet is set; a code is spaced out, to be compared letter by letter. */
export const VOICES: { readonly [voice in Voice]: { readonly face: FaceName; readonly tracking: number } } = {
	text: { face: 'Text', tracking: 0 },
	strong: { face: 'Strong', tracking: 0 },
	title: { face: 'Title', tracking: -6 },
	signed: { face: 'Signed', tracking: 0 },
	code: { face: 'Strong', tracking: 60 },
};

export const measure: Measure = (text, voice, size) => {
	const { face, tracking } = VOICES[voice];
	return (FACES[face].measure(text, tracking) * size) / 1000;
};
