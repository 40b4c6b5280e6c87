import { existsSync, readdirSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { runCommand } from './command.js';
import { installDebianPackages } from './debian.js';
import { Refusal } from './refusal.js';

const debianFolder = '/usr/lib/postgresql';
const needed = ['initdb', 'postgres', 'psql'];

/** @param {string} folder */
const hasAll = (folder) => needed.every((name) => existsSync(join(folder, name)));

/**
 * Folders with PostgreSQL's programs, newest version first, Debian's own place before the path.
 * @returns {string[]}
 */
export function postgresFolders() {
	const versions = existsSync(debianFolder) ? readdirSync(debianFolder) : [];
	const debian = versions
		.sort((a, b) => Number(b) - Number(a))
		.map((version) => join(debianFolder, version, 'bin'));
	const path = (process.env.PATH ?? '').split(delimiter).filter(Boolean);
	return [...debian, ...path].filter(hasAll);
}

/** @param {string} folder @returns {Promise<string>} the major version, such as "15" */
async function majorVersion(folder) {
	const { output } = await runCommand(join(folder, 'postgres'), ['--version']);
	return /\b(\d+)[.\w]*\s*(?:\(|$)/m.exec(output)?.[1] ?? '';
}

/**
 * The folder of PostgreSQL's programs, after installing Debian's package where there is none.
 * @param {string | null} version the major version an existing cluster was made by
 * @returns {Promise<string>}
 * @throws {Refusal} where they cannot be had
 */
export async function postgresPrograms(version) {
	if (postgresFolders().length === 0) await installDebianPackages(['postgresql'], 'the database');
	const found = postgresFolders();
	if (found.length === 0) {
		throw new Refusal('The package postgresql is installed, but its programs are not to be found.');
	}
	if (version === null) return found[0];
	for (const folder of found) if ((await majorVersion(folder)) === version) return folder;
	throw new Refusal(
		`The database was made by PostgreSQL ${version}, and only another version is installed. ` +
			`Install postgresql-${version}, then start again.`
	);
}
