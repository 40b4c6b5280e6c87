import { and, gt, or, sql, type SQL } from 'drizzle-orm';
import { runs, sessions } from '../db/schema';
import { idleHours } from './sessionRules';

/** The rules of sessionRules.ts as a condition on a row of `sessions`, whoever reads it. */
export function liveSession(now = new Date()): SQL | undefined {
	const idleSince = new Date(now.getTime() - idleHours * 3_600_000);
	const inOpenRun = sql`exists (select 1 from ${runs} where ${runs.startedBy} = ${sessions.userId} and ${runs.endedAt} is null)`;
	return and(gt(sessions.expires, now), or(gt(sessions.lastSeenAt, idleSince), inOpenRun));
}
