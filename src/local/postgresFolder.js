import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import {
	chmodSync,
	chownSync,
	existsSync,
	lstatSync,
	mkdirSync,
	readFileSync,
	rmSync,
	writeFileSync
} from 'node:fs';
import { join } from 'node:path';
import { readJson } from './folders.js';
import { Refusal } from './refusal.js';

/**
 * The account PostgreSQL runs as; null for our own. PostgreSQL refuses to run as root.
 * @typedef {{ uid: number, gid: number } | null} Account
 */

/** Where the cluster of a root start lives when the postgres account cannot enter the data folder. */
const elsewhere = '/var/lib/farwheel';

/** @param {string} option */
function postgresId(option) {
	const { status, stdout } = spawnSync('id', [option, 'postgres'], { encoding: 'utf8' });
	if (status !== 0) {
		throw new Refusal(
			'PostgreSQL does not run as root, and this machine has no account named postgres. ' +
				'Start as an ordinary user, or make the account: adduser --system --group postgres'
		);
	}
	return Number(stdout);
}

/** @param {string} folder of the cluster @returns {Account} */
export function accountFor(folder) {
	if (process.getuid?.() !== 0) return null;
	// A cluster that an ordinary user made before stays that user's.
	const owner = existsSync(folder) ? lstatSync(folder) : null;
	if (owner && owner.uid !== 0) return { uid: owner.uid, gid: owner.gid };
	return { uid: postgresId('-u'), gid: postgresId('-g') };
}

/** @param {string} folder @param {NonNullable<Account>} account */
const canEnter = (folder, account) =>
	spawnSync('test', ['-w', folder], { ...account, cwd: '/' }).status === 0;

/** @param {string} folder @param {Account} account */
function makeOwned(folder, account) {
	if (!existsSync(folder)) mkdirSync(folder, { mode: 0o700 });
	if (!lstatSync(folder).isDirectory()) throw new Refusal(`${folder} is not a folder.`);
	if (account) chownSync(folder, account.uid, account.gid);
	chmodSync(folder, 0o700);
}

/** @param {string} dataFolder @returns {string} the same folder for the same data, start after start */
const folderElsewhere = (dataFolder) =>
	join(elsewhere, createHash('sha256').update(dataFolder).digest('hex').slice(0, 12));

/** @param {string} dataFolder @returns {{ folder?: string, port?: number }} what the last start chose */
export function rememberedPlace(dataFolder) {
	const kept = readJson(join(dataFolder, 'postgres.json'));
	return typeof kept === 'object' && kept !== null ? kept : {};
}

/**
 * Whether a folder elsewhere is the cluster of this data folder, and not that of another checkout
 * this one was copied from. A checkout that was moved takes its cluster along.
 * @param {string} folder
 * @param {string} dataFolder
 */
function isOurs(folder, dataFolder) {
	const note = join(folder, 'data-folder');
	if (!existsSync(note)) return false;
	const noted = readFileSync(note, 'utf8');
	return noted === dataFolder || !existsSync(noted);
}

/**
 * @param {string} dataFolder absolute
 * @returns {string | null} where the cluster of this data folder already is
 */
export function knownFolder(dataFolder) {
	const inside = join(dataFolder, 'postgres');
	if (existsSync(inside)) return inside;
	const { folder } = rememberedPlace(dataFolder);
	return folder && existsSync(folder) && isOurs(folder, dataFolder) ? folder : null;
}

/**
 * The folder of the private cluster: in the data folder, or, where the postgres account cannot
 * enter that, under /var/lib/farwheel. Once chosen it stays, since the data is there.
 * @param {string} dataFolder absolute
 * @returns {{ folder: string, account: Account }}
 */
export function clusterFolder(dataFolder) {
	const inside = join(dataFolder, 'postgres');
	const known = knownFolder(dataFolder);
	if (known && known !== inside) {
		writeFileSync(join(known, 'data-folder'), dataFolder);
		return { folder: known, account: accountFor(known) };
	}
	const account = accountFor(inside);
	makeOwned(inside, account);
	if (!account || canEnter(inside, account)) return { folder: inside, account };
	if (existsSync(join(inside, 'cluster'))) {
		throw new Refusal(
			`The account that owns the database in ${inside} can no longer enter that folder. ` +
				'Let it through (chmod o+x on the folders above), then start again.'
		);
	}
	rmSync(inside, { recursive: true });

	mkdirSync(elsewhere, { recursive: true, mode: 0o755 });
	const outside = folderElsewhere(dataFolder);
	makeOwned(outside, account);
	if (!canEnter(outside, account)) {
		throw new Refusal(
			`The account postgres can enter neither ${dataFolder} nor ${outside}, so the database has no place. ` +
				'Start from a folder that it can enter, or start as an ordinary user.'
		);
	}
	writeFileSync(join(outside, 'data-folder'), dataFolder);
	return { folder: outside, account };
}
