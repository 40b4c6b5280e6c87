import { and, desc, eq, getTableColumns, isNull, sql } from 'drizzle-orm';
import { queryable, requireRole, type Context } from '../context';
import type { Queryable } from '../db/database';
import { domes, editions, runs, users } from '../db/schema';
import { isId } from '../domes/isId';
import { notFound } from '../errors';
import { editionOf, type RunEdition } from './editionOf';

export type Run = typeof runs.$inferSelect;

export interface RunListed extends Run {
	showTitle: string;
	editionNumber: number;
	domeName: string;
	apertureDegrees: number;
	tiltDegrees: number;
	startedByName: string | null;
}

const listed = {
	...getTableColumns(runs),
	showTitle: sql<string>`${editions.content}->'show'->>'title'`,
	editionNumber: editions.number,
	domeName: domes.name,
	apertureDegrees: domes.apertureDegrees,
	tiltDegrees: domes.tiltDegrees,
	startedByName: users.name
};

const joined = (db: Queryable) =>
	db
		.select(listed)
		.from(runs)
		.innerJoin(editions, eq(editions.id, runs.editionId))
		.innerJoin(domes, eq(domes.id, runs.domeId))
		.leftJoin(users, eq(users.id, runs.startedBy));

/** Runs of the venue, newest first. @param limit at most so many */
export async function listRuns(ctx: Context, { limit = 200 } = {}): Promise<RunListed[]> {
	requireRole(ctx, 'run.read');
	return joined(queryable(ctx))
		.where(eq(runs.venueId, ctx.venueId))
		.orderBy(desc(runs.startedAt), desc(runs.id))
		.limit(limit);
}

/** @throws AppError not-found also for a run of another venue */
export async function readRun(ctx: Context, id: string): Promise<RunListed> {
	requireRole(ctx, 'run.read');
	if (!isId(id)) throw notFound('run');
	const [run] = await joined(queryable(ctx)).where(
		and(eq(runs.id, id), eq(runs.venueId, ctx.venueId))
	);
	if (!run) throw notFound('run');
	return run;
}

/** The frozen edition a run plays. */
export async function readRunEdition(ctx: Context, run: Run): Promise<RunEdition> {
	requireRole(ctx, 'run.read');
	return editionOf(queryable(ctx), run.editionId);
}

/** The run that is open in a dome. Says nothing of rights: for screens, which belong to the dome. */
export async function openRunOf(
	db: Queryable,
	domeId: string
): Promise<{ id: string; editionId: string; hash: string } | null> {
	const [run] = await db
		.select({ id: runs.id, editionId: runs.editionId, hash: editions.hash })
		.from(runs)
		.innerJoin(editions, eq(editions.id, runs.editionId))
		.where(and(eq(runs.domeId, domeId), isNull(runs.endedAt)));
	return run ?? null;
}
