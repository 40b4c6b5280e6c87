import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import pg from 'pg';
import { expect, onTestFinished, test } from 'vitest';
import { destroyCluster, startCluster, stopCluster } from '../../../src/local/postgres.js';
import { identify, stillRuns, waitUntil } from '../../../src/local/processes.js';
import { temporaryFolder } from '../../local/temporaryFolder';

function dataFolder(): string {
	const folder = join(temporaryFolder(), 'data');
	onTestFinished(() => destroyCluster(folder));
	return folder;
}

async function ask(url: string, sql: string): Promise<unknown[]> {
	const client = new pg.Client({ connectionString: url });
	await client.connect();
	try {
		return (await client.query(sql)).rows;
	} finally {
		await client.end();
	}
}

test('a cluster is made in a path with a space, keeps its port, and stops', async () => {
	const folder = dataFolder();
	const first = await startCluster({ dataFolder: folder });
	expect(first.folder).toContain(' ');
	await first.ensureDatabase('farwheel');
	await first.ensureDatabase('farwheel');
	await ask(first.url('farwheel'), 'CREATE TABLE kept AS SELECT 42 AS answer');
	await stopCluster(folder);
	expect(stillRuns(first.server)).toBe(false);

	const second = await startCluster({ dataFolder: folder });
	expect(second.port).toBe(first.port);
	expect(await ask(second.url('farwheel'), 'SELECT answer FROM kept')).toEqual([{ answer: 42 }]);
});

test('a cluster asks for its password', async () => {
	const { url } = await startCluster({ dataFolder: dataFolder() });
	const wrong = new URL(url('postgres'));
	wrong.password = 'guess';
	await expect(ask(wrong.href, 'SELECT 1')).rejects.toThrow(/password authentication failed/);
});

test('a cluster whose server was killed comes back with what was committed', async () => {
	const folder = dataFolder();
	const first = await startCluster({ dataFolder: folder });
	await ask(first.url('postgres'), 'CREATE TABLE kept AS SELECT 7 AS answer');
	process.kill(first.server.pid, 'SIGKILL');
	await waitUntil(() => !stillRuns(first.server), 5000);

	const second = await startCluster({ dataFolder: folder });
	expect(second.server.pid).not.toBe(first.server.pid);
	expect(await ask(second.url('postgres'), 'SELECT answer FROM kept')).toEqual([{ answer: 7 }]);
});

test('a lock file whose number now belongs to another process does not stop a start', async () => {
	// After a power cut the number is often taken again, and PostgreSQL then refuses by itself.
	const folder = dataFolder();
	const first = await startCluster({ dataFolder: folder });
	const lock = join(first.folder, 'cluster', 'postmaster.pid');
	const lines = readFileSync(lock, 'utf8').split('\n');
	await stopCluster(folder);
	writeFileSync(lock, [process.pid, ...lines.slice(1)].join('\n'));

	const second = await startCluster({ dataFolder: folder });
	expect(await ask(second.url('postgres'), 'SELECT 1 AS one')).toEqual([{ one: 1 }]);
	expect(stillRuns(identify(process.pid))).toBe(true);
});

test('a server that an earlier start left running is taken over', async () => {
	const folder = dataFolder();
	const first = await startCluster({ dataFolder: folder });
	const second = await startCluster({ dataFolder: folder });
	expect(second.server).toEqual(first.server);
	expect(second.port).toBe(first.port);
});
