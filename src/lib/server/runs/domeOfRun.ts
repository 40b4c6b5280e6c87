import { eq } from 'drizzle-orm';
import type { Queryable } from '../db/database';
import { runs } from '../db/schema';

/** A run never changes its dome, so one read a process is enough for fifty screens. */
const kept = new Map<string, string>();
const mostKept = 500;

/** The dome of a run, or null where there is no such run. Says nothing of rights. */
export async function domeOfRun(db: Queryable, runId: string): Promise<string | null> {
	const known = kept.get(runId);
	if (known) return known;
	const [run] = await db.select({ domeId: runs.domeId }).from(runs).where(eq(runs.id, runId));
	if (!run) return null;
	if (kept.size >= mostKept) kept.clear();
	kept.set(runId, run.domeId);
	return run.domeId;
}
