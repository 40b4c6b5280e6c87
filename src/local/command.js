import { spawn } from 'node:child_process';
import { endProcess, identify } from './processes.js';

/** @typedef {{ code: number, output: string }} Outcome */

/** Commands at work, so that a stop in mid-start ends them too. @type {Set<import('node:child_process').ChildProcess>} */
const atWork = new Set();

/**
 * Runs a command to its end and keeps what it prints.
 * @param {string} command
 * @param {string[]} args
 * @param {import('node:child_process').SpawnOptions & { patience?: number }} [options] patience:
 *   milliseconds after which it is ended
 * @returns {Promise<Outcome>} code 127 where the command is not there, 124 where it took too long
 */
export function runCommand(command, args, { patience, ...options } = {}) {
	return new Promise((resolve) => {
		const child = spawn(command, args, { ...options, stdio: ['ignore', 'pipe', 'pipe'] });
		atWork.add(child);
		let output = '';
		let late = false;
		/** @param {Buffer} data */
		const keep = (data) => (output += data);
		child.stdout?.on('data', keep);
		child.stderr?.on('data', keep);
		const timer = patience
			? setTimeout(() => {
					late = true;
					if (child.pid) void endProcess(identify(child.pid));
				}, patience)
			: undefined;
		/** @param {number} code */
		const end = (code) => {
			clearTimeout(timer);
			atWork.delete(child);
			resolve({ code, output });
		};
		child.on('error', (error) => {
			output += `${error.message}\n`;
			end(127);
		});
		child.on('close', (code) => {
			if (late) output += `\nEnded after ${(patience ?? 0) / 1000} s without a result.\n`;
			end(late ? 124 : (code ?? 1));
		});
	});
}

/** Ends every command that is still running. */
export async function endCommands() {
	await Promise.all(
		[...atWork].map((child) => (child.pid ? endProcess(identify(child.pid)) : undefined))
	);
}

/** @param {string} output @param {number} lines @returns {string} its last lines, indented */
export const tail = (output, lines) =>
	output
		.trimEnd()
		.split('\n')
		.slice(-lines)
		.map((line) => `  ${line}`)
		.join('\n');
