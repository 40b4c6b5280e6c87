import { join } from 'node:path';
import { demoPassword, demoPeople, demoVenues } from './demoPeople.js';

/**
 * What a start says once the app answers.
 * @param {object} facts
 * @param {string} facts.address
 * @param {import('./settings.js').Settings} facts.settings
 * @param {number} facts.port the app's
 * @param {string} [facts.mailPage] of the catcher
 * @param {string} [facts.databaseFolder] of the stand-in
 * @param {string} facts.dataFolder
 * @returns {string}
 */
export function banner({ address, settings, port, mailPage, databaseFolder, dataFolder }) {
	const lines = ['', `Farwheel is running at ${address}`];
	if (port !== settings.port) lines.push(`  Port ${settings.port} was taken, so it uses ${port}.`);
	if (settings.demo) {
		lines.push('', `Demo sign-ins, password "${demoPassword}":`);
		for (const venue of demoVenues) {
			lines.push(`  ${venue.name}`);
			for (const person of demoPeople.filter((one) => one.venue === venue.name)) {
				lines.push(`    ${person.email.padEnd(38)} ${person.roles.join(', ')}`);
			}
		}
	}
	lines.push('');
	if (mailPage) lines.push(`Mail is caught, not delivered. Read it at ${mailPage}`);
	if (databaseFolder && databaseFolder !== join(dataFolder, 'postgres')) {
		lines.push(
			`The postgres account cannot enter ${dataFolder}, so the database lives in ${databaseFolder}`
		);
	}
	if (settings.demo && !['127.0.0.1', 'localhost', '::1'].includes(settings.host)) {
		lines.push(
			`Others can reach ${settings.host}, and the demo passwords are public: for a trial only.`
		);
	}
	lines.push('Stop it with Ctrl-C.', '');
	return lines.join('\n');
}
