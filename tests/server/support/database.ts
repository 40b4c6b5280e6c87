import { createHash, randomUUID } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import pg from 'pg';

const migrationsFolder = 'drizzle';

/** Address of a throw-away cluster's `postgres` database; the test command sets it. */
function clusterUrl(): string {
	const url = process.env.TEST_DATABASE_URL;
	if (!url) {
		throw new Error('TEST_DATABASE_URL is not set: run `npm test -- --only server [file]`.');
	}
	return url;
}

function urlOf(name: string): string {
	const url = new URL(clusterUrl());
	url.pathname = `/${name}`;
	return url.href;
}

async function withClient<T>(url: string, work: (client: pg.Client) => Promise<T>): Promise<T> {
	const client = new pg.Client({ connectionString: url });
	await client.connect();
	try {
		return await work(client);
	} finally {
		await client.end();
	}
}

/** Named by the migrations' contents, so that a changed migration makes a new template. */
function templateName(): string {
	const hash = createHash('sha256');
	for (const name of readdirSync(migrationsFolder).sort()) {
		if (name.endsWith('.sql'))
			hash.update(name).update(readFileSync(`${migrationsFolder}/${name}`));
	}
	return `template_${hash.digest('hex').slice(0, 12)}`;
}

/** Makes the migrated template once for all test files, which run in processes of their own. */
async function ensureTemplate(client: pg.Client): Promise<string> {
	const template = templateName();
	await client.query('SELECT pg_advisory_lock(2018)');
	try {
		const { rowCount } = await client.query('SELECT 1 FROM pg_database WHERE datname = $1', [
			template
		]);
		if (rowCount) return template;
		const unfinished = `${template}_unfinished`;
		await client.query(`DROP DATABASE IF EXISTS ${unfinished}`);
		await client.query(`CREATE DATABASE ${unfinished}`);
		await withClient(urlOf(unfinished), (inside) => migrate(drizzle(inside), { migrationsFolder }));
		await client.query(`ALTER DATABASE ${unfinished} RENAME TO ${template}`);
		return template;
	} finally {
		await client.query('SELECT pg_advisory_unlock(2018)');
	}
}

/**
 * A database of one's own with the real migrations applied and nothing in it.
 * @returns its address, and `close`, which drops it together with any connection still open
 * @throws Error where no cluster is given
 */
export async function freshDatabase(): Promise<{ url: string; close: () => Promise<void> }> {
	const name = `test_${randomUUID().replaceAll('-', '')}`;
	await withClient(clusterUrl(), async (client) => {
		const template = await ensureTemplate(client);
		await client.query(`CREATE DATABASE ${name} TEMPLATE ${template}`);
	});
	return {
		url: urlOf(name),
		close: () =>
			withClient(clusterUrl(), async (client) => {
				await client.query(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
			})
	};
}
