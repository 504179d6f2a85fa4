/**
 * demo: a start-up told as data, played through the rooms as on a tablet: people enrolled, everything signed.
 * Makes keys of its own for each run, so that nobody can mistake its signatures for real ones.
 * May import: base, quantity, identity, calc, plant, procedure, record, drawing, wording.
 */
export { BUILD, playStartUp, standsOn, type PlayedStartUp } from './play';
export { DemoStopped, must } from './must';
export { PlayFileSchema, type Act, type PlayFile } from './play-file';
export { DemoSite, type Person, type PersonKey } from './demo-site';
export { Tablets, type Said } from './tablets';
export { attachment, calculatedBody, enteredBody, type Around, type Files } from './entry-body';
