import type { Command } from '../command';
import { calc } from './calc';
import { checkProcedureCommand } from './check-procedure';
import { demo } from './demo';
import { standingCommand } from './standing';
import { trend } from './trend';
import { verify } from './verify';

/** Every command under its name; one file each in this folder. */
export const COMMANDS: { readonly [name: string]: Command } = {
	demo,
	verify,
	calc,
	'check-procedure': checkProcedureCommand,
	standing: standingCommand,
	trend,
};
