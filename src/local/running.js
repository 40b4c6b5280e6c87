import { linkSync, rmSync, writeFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { join } from 'node:path';
import { readJson, writePrivateJson } from './folders.js';
import { identify, stillRuns } from './processes.js';

/**
 * What a start writes about itself, for a second start, the first-venue command and the tests.
 * @typedef {object} RunningRecord
 * @property {import('./processes.js').ProcessIdentity} starter
 * @property {import('./processes.js').ProcessIdentity} [app]
 * @property {boolean} [dev] it is Vite's server, not the build
 * @property {string} [address] set once the app answers
 * @property {string} [mailPage]
 * @property {string} [databaseUrl] of the stand-in
 * @property {string} [smtpUrl] of the stand-in
 */

/** @param {string} dataFolder */
const recordFile = (dataFolder) => join(dataFolder, 'running.json');

/** @param {string} dataFolder @returns {RunningRecord | null} of a start that still runs or of one that was cut off */
export function readRecord(dataFolder) {
	const kept = readJson(recordFile(dataFolder));
	if (typeof kept !== 'object' || kept === null || !('starter' in kept)) return null;
	return /** @type {RunningRecord} */ (kept);
}

/** @param {string} dataFolder @returns {RunningRecord | null} of the start that runs now */
export function runningNow(dataFolder) {
	const record = readRecord(dataFolder);
	return record && stillRuns(record.starter) ? record : null;
}

/**
 * Takes the data folder for this process.
 * @param {string} dataFolder
 * @returns {Promise<{ taken: true, leftover: RunningRecord | null } | { taken: false, record: RunningRecord }>}
 *   leftover: the record of a start that was cut off by kill -9 or by the power
 */
export async function claim(dataFolder) {
	const file = recordFile(dataFolder);
	const own = { starter: identify(process.pid) };
	const fresh = `${file}.${process.pid}.claim`;
	/** @type {RunningRecord | null} */
	let leftover = null;
	try {
		writeFileSync(fresh, JSON.stringify(own), { mode: 0o600 });
		while (!linked(fresh, file)) {
			const record = readRecord(dataFolder);
			if (record && stillRuns(record.starter)) return { taken: false, record };
			leftover = record ?? leftover;
			rmSync(file, { force: true });
		}
	} finally {
		rmSync(fresh, { force: true });
	}
	// Two starts that both found a dead record may both have replaced it: the last one has it.
	await sleep(50);
	const now = readRecord(dataFolder);
	if (now && now.starter.pid !== process.pid) return { taken: false, record: now };
	return { taken: true, leftover };
}

/** @param {string} from @param {string} to @returns {boolean} false where `to` is there already */
function linked(from, to) {
	try {
		linkSync(from, to);
		return true;
	} catch (error) {
		if (error instanceof Error && 'code' in error && error.code === 'EEXIST') return false;
		throw error;
	}
}

/** @param {string} dataFolder @param {Omit<RunningRecord, 'starter'>} facts */
export function record(dataFolder, facts) {
	writePrivateJson(recordFile(dataFolder), { starter: identify(process.pid), ...facts });
}

/** Gives the data folder back, if it is this process that has it. @param {string} dataFolder */
export function release(dataFolder) {
	if (readRecord(dataFolder)?.starter.pid === process.pid) {
		rmSync(recordFile(dataFolder), { force: true });
	}
}
