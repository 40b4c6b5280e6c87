import { chmodSync, existsSync, mkdirSync, writeFileSync, renameSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder of the checkout. */
export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/** Where the stand-ins keep what they hold, unless `--data` names another folder. */
export const defaultDataFolder = join(root, '.data');

/** @param {string} folder */
export function makeDataFolder(folder) {
	if (existsSync(folder)) return;
	mkdirSync(folder, { recursive: true });
	// The postgres account must pass through it to its own folder; every file in it is closed itself.
	chmodSync(folder, 0o711);
}

/**
 * Writes JSON so that a power cut leaves the old file or the new one, readable by its owner only.
 * @param {string} file
 * @param {unknown} value
 */
export function writePrivateJson(file, value) {
	const fresh = `${file}.${process.pid}.new`;
	writeFileSync(fresh, JSON.stringify(value, null, '\t') + '\n', { mode: 0o600, flush: true });
	renameSync(fresh, file);
}

/**
 * @param {string} file
 * @returns {unknown} undefined where the file is missing or holds no JSON (a cut-off write)
 */
export function readJson(file) {
	try {
		return JSON.parse(readFileSync(file, 'utf8'));
	} catch (error) {
		if (error instanceof SyntaxError) return undefined;
		if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return undefined;
		throw error;
	}
}
