/**
 * ui: components and the tokens of the look (tokens.css). They get data and callbacks, and keep nothing.
 * Screens only: imports types from the rooms, never store, sync, app or server.
 * May import: ranks 0 to 5, verify (types to show).
 */
export { isLook, LOOKS, type Look } from './look';
export { default as LookSwitch } from './parts/LookSwitch.svelte';
export { default as UprightContact } from './parts/UprightContact.svelte';
