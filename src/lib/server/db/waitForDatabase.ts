import { setTimeout as sleep } from 'node:timers/promises';
import pg from 'pg';
import { isDatabaseAway } from './databaseAway';
import { log } from '../log';

const longestWaitMs = 5000;

/**
 * Returns once the database answers, however long that takes; says in the log what it waits for. An
 * app that gave up would stay away after the database is back.
 * @throws at once where the database is there and refuses us: a wrong name or password does not mend
 * itself
 */
export async function waitForDatabase(url: string): Promise<void> {
	const { host } = new URL(url);
	for (let waitMs = 250; ; waitMs = Math.min(longestWaitMs, waitMs * 2)) {
		const client = new pg.Client({ connectionString: url, connectionTimeoutMillis: 3000 });
		try {
			await client.connect();
			await client.query('select 1');
			return;
		} catch (error) {
			if (!isDatabaseAway(error)) throw error;
			log.warn({ err: error }, `the database at ${host} does not answer; trying again`);
		} finally {
			await client.end().catch(() => log.debug('the connection was closed already'));
		}
		await sleep(waitMs);
	}
}
