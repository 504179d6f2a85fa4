import { GATE_2 } from './gate-2';
import { GATES_0_AND_1 } from './gates-0-and-1';
import { GATES_3_TO_5 } from './gates-3-to-5';
import { GATES_6_AND_7 } from './gates-6-and-7';

/** The inert start-up as people read it in German. What is approved, recorded and signed stays the English text, word for word. */
export const GERMAN: { readonly [english: string]: string } = {
	...GATES_0_AND_1,
	...GATE_2,
	...GATES_3_TO_5,
	...GATES_6_AND_7,
};
