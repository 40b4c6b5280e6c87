import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { Queryable } from '../db/database';
import { shows } from '../db/schema';

/** Shows of the venue, not archived, with a scene about the galaxy. */
export function showsUsing(
	tx: Queryable,
	venueId: string,
	galaxyId: string
): Promise<{ id: string; title: string }[]> {
	const scene = JSON.stringify([{ subject: { kind: 'galaxy', galaxyId } }]);
	return tx
		.select({ id: shows.id, title: shows.title })
		.from(shows)
		.where(
			and(
				eq(shows.venueId, venueId),
				isNull(shows.archivedAt),
				sql`${shows.document} -> 'scenes' @> ${scene}::jsonb`
			)
		)
		.orderBy(asc(shows.title), asc(shows.id));
}
