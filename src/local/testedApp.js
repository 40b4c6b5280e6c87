import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { root } from './folders.js';
import { freePort } from './ports.js';
import { endProcess, identify, waitUntil } from './processes.js';
import { readRecord } from './running.js';

/** Variables of a person's own installation, which a test must not touch. */
const own = ['DATABASE_URL', 'SMTP_URL', 'ORIGIN', 'AUTH_SECRET', 'HOST', 'FARWHEEL_DEMO'];

/**
 * Starts the production build as `npm start` does, on ports and with a data folder of its own.
 * @param {string} dataFolder
 * @returns {Promise<{ env: Record<string, string> | null, output: () => string, stop: () => Promise<void> }>}
 *   env: what the end-to-end tests read; null where the start failed
 */
export async function startTestedApp(dataFolder) {
	const env = { ...process.env, PORT: String(await freePort(null)), LOG_LEVEL: 'warn' };
	for (const name of own) Reflect.deleteProperty(env, name);
	const child = spawn(
		process.execPath,
		[join(root, 'src', 'local', 'start.js'), '--data', dataFolder, '--no-env-file'],
		// The channel tells the start to stop when this process is gone.
		{ cwd: root, env, stdio: ['ignore', 'pipe', 'pipe', 'ipc'] }
	);
	let output = '';
	let ended = false;
	for (const stream of [child.stdout, child.stderr]) {
		stream?.on('data', (data) => (output += data));
	}
	child.on('exit', () => (ended = true));
	child.on('error', () => (ended = true));
	await waitUntil(() => ended || readRecord(dataFolder)?.address !== undefined, 300_000);
	const record = ended ? null : readRecord(dataFolder);
	return {
		env: record?.address
			? {
					FARWHEEL_TEST_ADDRESS: record.address,
					FARWHEEL_TEST_MAIL_PAGE: record.mailPage ?? '',
					FARWHEEL_TEST_DATABASE_URL: record.databaseUrl ?? ''
				}
			: null,
		output: () => output,
		async stop() {
			if (child.pid && !ended) await endProcess(identify(child.pid), { patience: 45_000 });
		}
	};
}
