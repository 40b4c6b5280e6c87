import { and, asc, eq, gt } from 'drizzle-orm';
import type { RunEvent } from '../../show/playback/messages';
import type { Queryable } from '../db/database';
import { runEvents, users } from '../db/schema';

/** Events of a run behind a number, in order, with the names of who acted. Says nothing of rights. */
export async function eventsAfter(
	db: Queryable,
	runId: string,
	number: number
): Promise<RunEvent[]> {
	return db
		.select({
			number: runEvents.number,
			at: runEvents.at,
			command: runEvents.command,
			actor: users.name
		})
		.from(runEvents)
		.leftJoin(users, eq(users.id, runEvents.actorId))
		.where(and(eq(runEvents.runId, runId), gt(runEvents.number, number)))
		.orderBy(asc(runEvents.number));
}

/**
 * Committed events of runs that are being commanded, so that a slider's thousandth value reads one
 * row and not a thousand. Rows are append-only and numbered, hence what is kept stays true.
 */
const kept = new Map<string, RunEvent[]>();
const mostKept = 20;

/** All events of a run; to be called under the lock of its row. Callers do not change the list. */
export async function allEvents(db: Queryable, runId: string): Promise<readonly RunEvent[]> {
	const known = kept.get(runId) ?? [];
	const fresh = await eventsAfter(db, runId, known.at(-1)?.number ?? 0);
	const all = fresh.length > 0 ? [...known, ...fresh] : known;
	kept.delete(runId);
	if (kept.size >= mostKept) {
		const oldest = kept.keys().next();
		if (!oldest.done) kept.delete(oldest.value);
	}
	kept.set(runId, all);
	return all;
}
