import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { runCommand, tail } from './command.js';
import { defaultDataFolder } from './folders.js';
import { withProgress } from './progress.js';
import { Refusal } from './refusal.js';
import { runningNow } from './running.js';

/** What a build is made from. */
const sources = ['src', 'static', 'svelte.config.js', 'vite.config.ts', 'package-lock.json'];

/**
 * A hash of names and contents, so that a checkout which only touches files builds nothing.
 * @param {string} root
 * @returns {string}
 */
export function sourceHash(root) {
	const hash = createHash('sha256');
	/** @param {string} path relative to root */
	function add(path) {
		const full = join(root, path);
		hash.update(`${path}\0`).update(readFileSync(full)).update('\0');
	}
	for (const source of sources) {
		const full = join(root, source);
		if (!existsSync(full)) continue;
		if (/\.[a-z]+$/.test(source)) {
			add(source);
			continue;
		}
		readdirSync(full, { recursive: true, withFileTypes: true })
			.filter((entry) => entry.isFile())
			.map((entry) => join(entry.parentPath, entry.name).slice(root.length + 1))
			.sort()
			.forEach(add);
	}
	return hash.digest('hex');
}

/** @param {string} root */
const stampFile = (root) => join(root, 'build', 'source.sha256');

/** @param {string} root @returns {boolean} whether there is no whole build of the present sources */
export function buildIsStale(root) {
	if (!existsSync(join(root, 'build', 'index.js')) || !existsSync(stampFile(root))) return true;
	return readFileSync(stampFile(root), 'utf8') !== sourceHash(root);
}

/**
 * Builds where the build is stale.
 * @param {string} root
 * @returns {Promise<boolean>} whether it built
 * @throws {Refusal} with the end of the build's output, or where an app runs from the old build
 */
export async function buildApp(root) {
	if (!buildIsStale(root)) return false;
	const running = runningNow(defaultDataFolder);
	if (running?.app && !running.dev && running.starter.pid !== process.pid) {
		throw new Refusal(
			'The sources changed since the last build, and Farwheel runs from that build ' +
				`(process ${running.starter.pid}). Stop it with Ctrl-C first: a new build would break it.`
		);
	}
	// Taken before the build: a file changed meanwhile makes the next start build again.
	const hash = sourceHash(root);
	await withProgress('Building the app', async () => {
		const vite = join(root, 'node_modules', 'vite', 'bin', 'vite.js');
		const { code, output } = await runCommand(process.execPath, [vite, 'build'], {
			cwd: root,
			env: { ...process.env, NO_COLOR: '1', FORCE_COLOR: '0' }
		});
		if (code !== 0) throw new Refusal(`The build failed:\n${tail(output, 30)}`);
	});
	writeFileSync(stampFile(root), hash);
	return true;
}
