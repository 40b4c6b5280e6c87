import { createHash } from 'node:crypto';
import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { runCommand, tail } from './command.js';
import { withProgress } from './progress.js';
import { Refusal } from './refusal.js';

/** @param {string} root */
const stampFile = (root) => join(root, 'node_modules', '.farwheel-lock');
/** @param {string} root */
const lockHash = (root) =>
	createHash('sha256')
		.update(readFileSync(join(root, 'package-lock.json')))
		.digest('hex');

/**
 * @param {string} root
 * @returns {boolean} whether node_modules is missing, half-made, or older than the lock
 */
export function packagesAreStale(root) {
	// npm writes this file last: without it an install was cut off.
	const installed = join(root, 'node_modules', '.package-lock.json');
	if (!existsSync(installed)) return true;
	if (statSync(installed).mtimeMs >= statSync(join(root, 'package-lock.json')).mtimeMs)
		return false;
	// A checkout touches the lock without changing it: then its hash settles the matter.
	return !existsSync(stampFile(root)) || readFileSync(stampFile(root), 'utf8') !== lockHash(root);
}

/** @param {string} version such as "20.19.0" @returns {boolean} whether the packages run on it */
export function nodeIsNewEnough(version) {
	const [major, minor] = version.split('.').map(Number);
	return major > 20 || (major === 20 && minor >= 19);
}

/**
 * Runs `npm ci` where it is needed.
 * @param {string} root
 * @throws {Refusal} where npm fails, with the end of its output, or Node is too old
 */
export async function installPackages(root) {
	if (!nodeIsNewEnough(process.versions.node)) {
		throw new Refusal(`Farwheel needs Node 20.19 or later; this is ${process.versions.node}.`);
	}
	if (!packagesAreStale(root)) return;
	// The npm that runs us, or the one on the path.
	const npm = process.env.npm_execpath;
	const [command, args] = npm?.endsWith('.js') ? [process.execPath, [npm]] : ['npm', []];
	const { code, output } = await withProgress('Installing packages (npm ci)', () =>
		runCommand(command, [...args, 'ci', '--include=dev'], { cwd: root })
	);
	if (code !== 0) {
		throw new Refusal(
			`npm ci failed, so the packages are not complete:\n${tail(output, 20)}\n` +
				'Check that the package registry can be reached, then start again.'
		);
	}
	writeFileSync(stampFile(root), lockHash(root));
}
