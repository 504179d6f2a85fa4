import type { Command } from '../command';

/** Every command under its name; one file each in this folder. */
export const COMMANDS: { readonly [name: string]: Command } = {};
