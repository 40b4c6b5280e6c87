import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import pg from 'pg';
import { environment } from '../env';
import { log } from '../log';
import * as schema from './schema';

export type Database = NodePgDatabase<typeof schema>;
/** A transaction or the database itself: verbs take either. */
export type Queryable = Database | Parameters<Parameters<Database['transaction']>[0]>[0];

let pool: pg.Pool | undefined;
let db: Database | undefined;

/** Makes a database over a pool of its own; tests use it with their own address. */
export function connect(url: string): { db: Database; pool: pg.Pool } {
	const made = new pg.Pool({ connectionString: url, max: 20, connectionTimeoutMillis: 3000 });
	// An idle connection dies when the server stops; the next query makes a new one.
	made.on('error', (error) => log.warn({ err: error }, 'a database connection was lost'));
	return { db: drizzle(made, { schema, casing: 'snake_case' }), pool: made };
}

/** The app's one database, connected on first use. */
export function database(): Database {
	if (!db) {
		const made = connect(environment().DATABASE_URL);
		pool = made.pool;
		db = made.db;
	}
	return db;
}

/** Closes the app's pool at shutdown. */
export async function closeDatabase(): Promise<void> {
	await pool?.end();
	pool = undefined;
	db = undefined;
}
