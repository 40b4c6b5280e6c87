import { chmodSync } from 'node:fs';
import { randomBytes } from 'node:crypto';
import { join } from 'node:path';
import { readJson, writePrivateJson } from './folders.js';

/** @returns {string} 256 bits, safe in a URL */
export const newSecret = () => randomBytes(32).toString('base64url');

/**
 * The secrets of this machine: made once, kept in the data folder, readable by their owner only.
 * @param {string} dataFolder
 * @returns {{ authSecret: string }}
 */
export function secrets(dataFolder) {
	const file = join(dataFolder, 'secrets.json');
	const kept = readJson(file);
	if (
		typeof kept === 'object' &&
		kept !== null &&
		'authSecret' in kept &&
		typeof kept.authSecret === 'string' &&
		kept.authSecret.length >= 32
	) {
		chmodSync(file, 0o600);
		return { authSecret: kept.authSecret };
	}
	const made = { authSecret: newSecret() };
	writePrivateJson(file, made);
	return made;
}
