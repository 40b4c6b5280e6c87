import { sql } from 'drizzle-orm';

/** PostgreSQL channels. A notice carries an id and nothing else; who hears it reads the rows. */
export const channels = { runs: 'farwheel_runs', screens: 'farwheel_screens' } as const;

/** To run in the transaction of the change: PostgreSQL delivers it at commit. */
export const runChanged = (runId: string) => sql`select pg_notify(${channels.runs}, ${runId})`;
export const screenRevoked = (screenId: string) =>
	sql`select pg_notify(${channels.screens}, ${screenId})`;
