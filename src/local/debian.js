import { runCommand, tail } from './command.js';
import { withProgress } from './progress.js';
import { Refusal } from './refusal.js';

/**
 * Installs Debian packages as root, or through sudo where that asks for no password.
 * @param {string[]} packages
 * @param {string} purpose what they are for, such as "the database"
 * @throws {Refusal} with the one command to run, where this account may not or apt fails
 */
export async function installDebianPackages(packages, purpose) {
	const names = packages.join(' ');
	const isRoot = process.getuid?.() === 0;
	const sudo = isRoot ? [] : ['sudo', '-n'];
	const word = isRoot ? '' : 'sudo ';
	const byHand = `${word}apt-get update && ${word}apt-get install -y ${names}`;
	const lacking = `Missing for ${purpose}: ${names}.`;
	if (!isRoot && (await runCommand('sudo', ['-n', 'true'])).code !== 0) {
		throw new Refusal(
			`${lacking} This account may not install packages. Run this, then start again:\n\n  ${byHand}\n`
		);
	}
	const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
	await withProgress(`Installing ${names} (apt-get)`, async () => {
		for (const args of [['update'], ['install', '-y', '--no-install-recommends', ...packages]]) {
			const [command, ...rest] = [...sudo, 'apt-get', '-q', ...args];
			const { code, output } = await runCommand(command, rest, { env });
			if (code !== 0) {
				throw new Refusal(
					`${lacking} apt-get ${args[0]} failed:\n${tail(output, 15)}\nPut that right, or run this, then start again:\n\n  ${byHand}\n`
				);
			}
		}
	});
}
