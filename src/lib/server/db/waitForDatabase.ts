import { setTimeout as sleep } from 'node:timers/promises';
import pg from 'pg';
import { isDatabaseAway } from './databaseAway';
import { log } from '../log';

const longestWaitMs = 5000;

/**
 * Returns once the database answers; says in the log what it waits for.
 * @param patienceMs how long to try
 * @throws the last error where the database did not come, or at once where it refuses us (a wrong
 * password does not mend itself)
 */
export async function waitForDatabase(url: string, patienceMs = 120_000): Promise<void> {
	const { host } = new URL(url);
	const end = Date.now() + patienceMs;
	for (let waitMs = 250; ; waitMs = Math.min(longestWaitMs, waitMs * 2)) {
		const client = new pg.Client({ connectionString: url, connectionTimeoutMillis: 3000 });
		try {
			await client.connect();
			await client.query('select 1');
			return;
		} catch (error) {
			if (!isDatabaseAway(error) || Date.now() + waitMs > end) throw error;
			log.warn({ err: error }, `the database at ${host} does not answer; trying again`);
		} finally {
			await client.end().catch(() => log.debug('the connection was closed already'));
		}
		await sleep(waitMs);
	}
}
