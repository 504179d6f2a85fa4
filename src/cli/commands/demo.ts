import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { toPem } from '../../lib/identity';
import { standing } from '../../lib/record';
import { closedDossier } from '../close-dossier';
import { DemoStopped } from '../../lib/demo';
import { playStartUp } from '../../lib/demo';
import type { Command, Outcome, Terminal } from '../command';

/** Beside the built program, and beside its source when a test runs it there. */
const DEMO = [fileURLToPath(new URL('../../static/demo/', import.meta.url)), join(process.cwd(), 'static/demo/')];

export const demo: Command = {
	usage: 'demo --out FILE [--from FOLDER]',
	does: 'Plays a complete start-up from data files and writes its signed dossier and FILE.root.pem.',
	run: async (args, terminal) => {
		const out = optionOf(args, '--out');
		if (out === undefined) {
			terminal.complain('demo needs --out FILE: where the signed dossier shall be written.');
			return 'unusable-input';
		}
		return play(out, optionOf(args, '--from'), terminal);
	},
};

async function play(out: string, from: string | undefined, terminal: Terminal): Promise<Outcome> {
	const folder = from ?? DEMO.find(holdsStartUp);
	if (folder === undefined || !holdsStartUp(folder)) {
		terminal.complain(`No start-up.json in ${folder ?? 'static/demo'}. Nothing was written.`);
		return 'unusable-input';
	}
	const read = (name: string): Uint8Array<ArrayBuffer> => new Uint8Array(readFileSync(join(folder, name)));
	try {
		const played = await playStartUp({ read });
		const pdf = await closedDossier(played);
		writeFileSync(out, pdf);
		writeFileSync(`${out}.root.pem`, toPem(played.site.root.certificate.der));
		const { tablets, procedure, closing, play: file } = played;
		const tablet = closing[0]?.on ?? file.tablets.at(-1) ?? '';
		const events = tablets.startUp(tablet);
		const last = events.map(({ entered }) => entered).at(-1) ?? '';
		const { gates } = standing(procedure, events, tablets.siteLog(tablet), last);
		terminal.print(
			`Demonstration, all invented: ${events.length} events of ${file.startUp}, ${gates.filter(({ state }) => state === 'released').length} of ${gates.length} gates released.`,
		);
		terminal.print(
			`Dossier with ${closing.length} signatures: ${out} (${pdf.length} bytes). Site root: ${out}.root.pem`,
		);
		return 'passed';
	} catch (error) {
		if (!(error instanceof DemoStopped)) throw error;
		terminal.complain(`The start-up in ${folder} cannot be played: ${error.message}. Nothing was written.`);
		return 'unusable-input';
	}
}

function holdsStartUp(folder: string): boolean {
	try {
		readFileSync(join(folder, 'start-up.json'));
		return true;
	} catch {
		return false;
	}
}

function optionOf(args: readonly string[], name: string): string | undefined {
	const at = args.indexOf(name);
	return at === -1 ? undefined : args[at + 1];
}
