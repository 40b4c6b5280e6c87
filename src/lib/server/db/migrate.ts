import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import pg from 'pg';

/** Any number will do, as long as every process takes the same one. */
const migrationLock = 20_180;

/**
 * Brings the schema up to date. Processes that start together take turns under an advisory lock;
 * the second finds nothing left to do.
 * @param folder of the migrations, named by MIGRATIONS_FOLDER
 * @throws the database's error, with nothing half applied: each migration is one transaction
 */
export async function runMigrations(url: string, folder: string): Promise<void> {
	const client = new pg.Client({ connectionString: url, connectionTimeoutMillis: 5000 });
	await client.connect();
	try {
		await client.query('select pg_advisory_lock($1)', [migrationLock]);
		await migrate(drizzle(client), { migrationsFolder: folder });
	} finally {
		// The lock goes with the connection.
		await client.end();
	}
}
