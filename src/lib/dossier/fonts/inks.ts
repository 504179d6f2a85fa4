import { ok } from '../../base';
import type { Ink, Inks } from '../sign/ink';
import { FACES, type FaceName } from './faces';

/** How a signature field is written with the fonts that the base revision embeds. */
const ink = (resource: FaceName): Ink => ({
	resource,
	encode: (text) => {
		const set = FACES[resource].set(text);
		if (!set.ok) return set;
		const hex = set.value.glyphs.map(({ id }) => id.toString(16).toUpperCase().padStart(4, '0')).join('');
		// Written without kerning, so its width is that of the letters alone.
		const kerned = set.value.glyphs.reduce((sum, { after }) => sum + after, 0);
		return ok({ hex, width: set.value.width - kerned });
	},
});

/** The faces of a signature's appearance. */
export const INKS: Inks = { regular: ink('Text'), strong: ink('Strong') };
