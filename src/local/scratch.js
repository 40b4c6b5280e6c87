import { chmodSync, existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readJson, writePrivateJson } from './folders.js';
import { destroyCluster } from './postgres.js';
import { identify, stillRuns } from './processes.js';

const prefix = 'farwheel-test-';
/** Data folders inside a scratch folder. */
const dataFolders = ['server', 'e2e'];

/** @returns {string} a throw-away folder that knows whose it is */
export function makeScratch() {
	const folder = mkdtempSync(join(tmpdir(), prefix));
	chmodSync(folder, 0o711);
	writePrivateJson(join(folder, 'owner.json'), identify(process.pid));
	return folder;
}

/** Stops what still runs in it and removes it. @param {string} folder */
export async function removeScratch(folder) {
	for (const name of dataFolders) await destroyCluster(join(folder, name));
	rmSync(folder, { recursive: true, force: true });
}

/** Removes what test runs that were killed left behind. */
export async function sweepScratch() {
	for (const name of readdirSync(tmpdir())) {
		const folder = join(tmpdir(), name);
		const file = join(folder, 'owner.json');
		if (!name.startsWith(prefix) || !existsSync(file)) continue;
		const owner = /** @type {import('./processes.js').ProcessIdentity | undefined} */ (
			readJson(file)
		);
		if (owner && !stillRuns(owner)) await removeScratch(folder);
	}
}
