import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import { queryable, requireRole, type Context } from '../context';
import { editions, shows } from '../db/schema';

export interface EditionToRun {
	id: string;
	title: string;
	number: number;
	lengthSeconds: number;
	note: string;
}

/** Editions that a run may be made of: shows that are not archived, each show's newest first. */
export async function editionsToRun(ctx: Context): Promise<EditionToRun[]> {
	requireRole(ctx, 'run.read');
	return queryable(ctx)
		.select({
			id: editions.id,
			title: sql<string>`${editions.content}->'show'->>'title'`,
			number: editions.number,
			lengthSeconds: sql<number>`(
				select coalesce(sum(coalesce(s->'pace'->'seconds', s->'pace'->'expectedSeconds')::float), 0)
				from jsonb_array_elements(${editions.content}->'show'->'scenes') s)`,
			note: editions.note
		})
		.from(editions)
		.innerJoin(shows, eq(shows.id, editions.showId))
		.where(and(eq(editions.venueId, ctx.venueId), isNull(shows.archivedAt)))
		.orderBy(shows.title, shows.id, desc(editions.number));
}
