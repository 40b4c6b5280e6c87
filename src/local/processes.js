import { readFileSync, readdirSync, readlinkSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';

/**
 * A process that cannot be mistaken for a later one with the same number: the boot it belongs to
 * and the clock tick it began at. After a power cut neither matches.
 * @typedef {{ pid: number, boot: string, tick: string }} ProcessIdentity
 */

/** @param {() => string} read @returns {string} empty where the process or /proc is not there */
function readOrEmpty(read) {
	try {
		return read();
	} catch {
		return '';
	}
}

/** @param {number} pid @returns {string[]} the fields of /proc/<pid>/stat after the name */
function statFields(pid) {
	const text = readOrEmpty(() => readFileSync(`/proc/${pid}/stat`, 'utf8'));
	// The name stands in brackets and may itself hold spaces and brackets.
	return text ? text.slice(text.lastIndexOf(')') + 2).split(' ') : [];
}

/** @param {number} pid @returns {ProcessIdentity} */
export function identify(pid) {
	return {
		pid,
		boot: readOrEmpty(() => readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim()),
		tick: statFields(pid)[19] ?? ''
	};
}

/** @param {number} pid @returns {boolean} whether a process has this number, be it a dead one not yet cleared away */
export function isTaken(pid) {
	try {
		process.kill(pid, 0);
		return true;
	} catch (error) {
		// EPERM: it is there and belongs to someone else.
		return error instanceof Error && 'code' in error && error.code === 'EPERM';
	}
}

/** @param {ProcessIdentity} identity @returns {boolean} whether that very process still runs */
export function stillRuns(identity) {
	if (!isTaken(identity.pid) || statFields(identity.pid)[0] === 'Z') return false;
	const now = identify(identity.pid);
	return now.boot === identity.boot && now.tick === identity.tick;
}

/** @returns {number[]} */
const allProcesses = () =>
	readdirSync('/proc')
		.filter((name) => /^\d+$/.test(name))
		.map(Number);

/** @param {string} folder a real path @returns {number[]} processes whose working folder it is */
export const processesIn = (folder) =>
	allProcesses().filter((pid) => readOrEmpty(() => readlinkSync(`/proc/${pid}/cwd`)) === folder);

/** @param {number} pid @returns {ProcessIdentity[]} children, their children, and so on */
export function descendants(pid) {
	const parents = new Map(allProcesses().map((p) => [p, Number(statFields(p)[1])]));
	/** @type {number[]} */
	const found = [];
	for (let front = [pid]; front.length > 0;) {
		front = [...parents].filter(([, parent]) => front.includes(parent)).map(([child]) => child);
		found.push(...front);
	}
	return found.map(identify);
}

/** @param {number} pid @param {NodeJS.Signals} signal */
export function signalIfAlive(pid, signal) {
	try {
		process.kill(pid, signal);
	} catch (error) {
		if (!(error instanceof Error && 'code' in error && error.code === 'ESRCH')) throw error;
	}
}

/**
 * @param {() => boolean} condition
 * @param {number} milliseconds
 * @returns {Promise<boolean>} whether it came true in time
 */
export async function waitUntil(condition, milliseconds) {
	const end = Date.now() + milliseconds;
	while (!condition()) {
		if (Date.now() > end) return false;
		await sleep(50);
	}
	return true;
}

/**
 * Asks a process to end, then ends it, together with everything it started.
 * @param {ProcessIdentity} identity
 * @param {{ signal?: NodeJS.Signals, patience?: number }} [options] patience in milliseconds
 */
export async function endProcess(identity, { signal = 'SIGTERM', patience = 8000 } = {}) {
	if (!stillRuns(identity)) return;
	const family = [identity, ...descendants(identity.pid)];
	signalIfAlive(identity.pid, signal);
	await waitUntil(() => !family.some(stillRuns), patience);
	for (const one of family) if (stillRuns(one)) signalIfAlive(one.pid, 'SIGKILL');
	await waitUntil(() => !family.some(stillRuns), 2000);
}
