import { existsSync, readFileSync, realpathSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { identify, isTaken, processesIn, waitUntil } from './processes.js';
import { Refusal } from './refusal.js';

/**
 * A server that runs on a cluster. `port` is the one it was started with.
 * @typedef {{ identity: import('./processes.js').ProcessIdentity, port: number }} LiveServer
 */

/** @param {string} cluster @returns {{ pid: number, port: number, ready: boolean } | null} what postmaster.pid says */
export function postmaster(cluster) {
	const file = join(cluster, 'postmaster.pid');
	if (!existsSync(file)) return null;
	const lines = readFileSync(file, 'utf8').split('\n');
	return {
		pid: Number(lines[0]),
		port: Number(lines[3]),
		ready: lines[7]?.trim() === 'ready'
	};
}

/** @param {string} cluster @returns {LiveServer | null} the server that runs on it */
export function liveServer(cluster) {
	const lock = postmaster(cluster);
	// PostgreSQL works inside its cluster: that tells it from another process with its number.
	if (!lock || !processesIn(realpathSync(cluster)).includes(lock.pid)) return null;
	return { identity: identify(lock.pid), port: lock.port };
}

/**
 * Finds the server of a cluster that an earlier start left running (it was killed itself), and
 * clears away what a killed server or a power cut left behind.
 *
 * PostgreSQL itself copes with a lock file whose process is gone. It refuses when the number now
 * belongs to some other process of the same account, which is likely after a power cut, or to a
 * dead one that nobody has cleared away. Only then, and only when no process works in the cluster
 * any more, is the lock file removed.
 * @param {string} cluster
 * @returns {Promise<LiveServer | null>}
 * @throws {Refusal} where processes of a dead server will not leave
 */
export async function recoverCluster(cluster) {
	const live = liveServer(cluster);
	if (live) return live;
	const folder = realpathSync(cluster);
	// Children of a killed server notice its death and leave by themselves.
	if (!(await waitUntil(() => processesIn(folder).length === 0, 15_000))) {
		throw new Refusal(
			`Processes of an earlier database server still work in ${cluster}: ` +
				`${processesIn(folder).join(', ')}. End them, then start again.`
		);
	}
	const lock = postmaster(cluster);
	if (lock && isTaken(lock.pid)) rmSync(join(cluster, 'postmaster.pid'));
	return null;
}
