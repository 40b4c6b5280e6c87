import { spawn } from 'node:child_process';
import { createInterface } from 'node:readline';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { endProcess, identify } from './processes.js';
import { Refusal } from './refusal.js';

/**
 * @typedef {object} App
 * @property {import('./processes.js').ProcessIdentity} identity
 * @property {Promise<string>} ended says how it ended
 * @property {() => Promise<void>} stop
 */

/** @param {string} line of the app's log @returns {string} for reading, where the line is JSON */
export function readable(line) {
	if (!line.startsWith('{')) return line;
	try {
		const { level, time, msg, err } = JSON.parse(line);
		const word = level >= 50 ? 'error ' : level >= 40 ? 'warning ' : '';
		const clock = new Date(time).toLocaleTimeString('en-GB');
		return `${clock} ${word}${msg ?? ''}${err?.message ? `: ${err.message}` : ''}`;
	} catch {
		return line;
	}
}

/**
 * Starts the built app, or Vite's server, as a process of its own and shows its log.
 * @param {{ root: string, dev: boolean, env: NodeJS.ProcessEnv, port: number, host: string, plainLog: boolean }} options
 *   plainLog: lines as the app writes them, for a log collector
 * @returns {App}
 */
export function launchApp({ root, dev, env, port, host, plainLog }) {
	const vite = join(root, 'node_modules', 'vite', 'bin', 'vite.js');
	const args = dev
		? [vite, 'dev', '--host', host, '--port', String(port), '--strictPort']
		: [join(root, 'build', 'index.js')];
	// Detached: a Ctrl-C in the terminal reaches us alone, and we stop things in their order.
	const child = spawn(process.execPath, args, {
		cwd: root,
		// Above the limits of the app's own pages, so that they can answer 413 in their own words.
		env: { BODY_SIZE_LIMIT: '6M', ...env },
		detached: true,
		stdio: ['ignore', 'pipe', 'pipe']
	});
	for (const stream of [child.stdout, child.stderr]) {
		createInterface({ input: stream }).on('line', (line) =>
			process.stdout.write(`${plainLog ? line : readable(line)}\n`)
		);
	}
	const identity = identify(child.pid ?? 0);
	return {
		identity,
		ended: new Promise((resolve) => {
			child.on('error', (error) => resolve(error.message));
			child.on('exit', (code, signal) =>
				resolve(signal ? `ended by ${signal}` : `ended with code ${code}`)
			);
		}),
		stop: () => endProcess(identity)
	};
}

/**
 * Waits until the app answers that it and its database are well.
 * @param {App} app
 * @param {string} address of the app on this machine
 * @param {number} [patience] milliseconds
 * @throws {Refusal} where it ends before or takes too long
 */
export async function untilHealthy(app, address, patience = 180_000) {
	let ended = '';
	void app.ended.then((how) => (ended = how));
	const end = Date.now() + patience;
	let last = 'nothing';
	while (Date.now() < end) {
		try {
			const answer = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(5000) });
			if (answer.ok) return;
			last = `status ${answer.status}`;
		} catch (error) {
			last = error instanceof Error ? error.message : String(error);
		}
		if (ended) throw new Refusal(`The app did not start: it ${ended}. Its last lines are above.`);
		await sleep(100);
	}
	throw new Refusal(
		`The app did not answer at ${address}/api/health within ${patience / 1000} s (last: ${last}).`
	);
}
