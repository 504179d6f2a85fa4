import { spawn, type ChildProcess } from 'node:child_process';
import { createServer, type AddressInfo } from 'node:net';
import { join } from 'node:path';

const HOUSE = join(import.meta.dirname, '../..');

export type Started = { readonly said: string; readonly exitCode: number | null };

/** Runs the real start script on a free port, as `npm start` does, for as long as `use` takes. */
export async function served<T>(
	use: (address: string) => Promise<T>,
	env: Readonly<Record<string, string>> = {},
): Promise<T> {
	const port = await freePort();
	const child = start({ PORT: String(port), ...env });
	try {
		const { said, exitCode } = await untilItSpeaks(child);
		const address = /Gatehold is at (\S+)/.exec(said)?.[1];
		if (address === undefined) throw new Error(`npm start said "${said}" and ended with ${exitCode}`);
		return await use(address);
	} finally {
		child.kill();
	}
}

/** Runs the start script where it is expected to refuse. */
export async function refusedStart(env: Readonly<Record<string, string>>): Promise<Started> {
	const child = start(env);
	try {
		return await untilItSpeaks(child);
	} finally {
		child.kill();
	}
}

export const freePort = (): Promise<number> =>
	new Promise((resolve) => {
		const server = createServer().listen(0, '127.0.0.1', () => {
			const { port } = server.address() as AddressInfo;
			server.close(() => resolve(port));
		});
	});

function start(env: Readonly<Record<string, string>>): ChildProcess {
	const { PORT: _port, HOST: _host, TLS_CERT: _cert, TLS_KEY: _key, ...rest } = process.env;
	return spawn(process.execPath, ['src/start.mjs'], { cwd: HOUSE, env: { ...rest, ...env } });
}

/** Until the address is printed, or the program has ended. */
const untilItSpeaks = (child: ChildProcess): Promise<Started> =>
	new Promise((resolve) => {
		let said = '';
		const hear = (data: Buffer): void => {
			said += data.toString();
			if (said.includes('Gatehold is at')) resolve({ said, exitCode: null });
		};
		child.stdout?.on('data', hear);
		child.stderr?.on('data', hear);
		child.on('close', (exitCode) => resolve({ said: said.trim(), exitCode }));
	});
