import { desc, eq } from 'drizzle-orm';
import type { ShowDocument } from '../../show/document';
import { readDocument } from '../../show/readDocument';
import { queryable, requireRole, type Context } from '../context';
import { editions, shows, users } from '../db/schema';
import { findShow } from './findShow';
import { galaxyIdsOf, resolveGalaxies, type ResolvedGalaxies } from './resolveGalaxies';

export interface ShowRead extends ResolvedGalaxies {
	id: string;
	document: ShowDocument;
	revision: number;
	updatedAt: Date;
	updatedByName: string | null;
	archivedAt: Date | null;
	/** The newest edition, if any. */
	edition: { id: string; number: number } | null;
}

/** A show with every galaxy its scenes use or could use. */
export async function readShow(ctx: Context, id: string): Promise<ShowRead> {
	requireRole(ctx, 'show.read');
	const db = queryable(ctx);
	const show = await findShow(db, ctx, id);
	const document = readDocument(show.document);
	const [resolved, [by], [edition]] = await Promise.all([
		resolveGalaxies(db, ctx.venueId, { used: galaxyIdsOf(document) }),
		db
			.select({ name: users.name })
			.from(shows)
			.innerJoin(users, eq(users.id, shows.updatedBy))
			.where(eq(shows.id, id)),
		db
			.select({ id: editions.id, number: editions.number })
			.from(editions)
			.where(eq(editions.showId, id))
			.orderBy(desc(editions.number))
			.limit(1)
	]);
	return {
		id,
		document,
		revision: show.revision,
		updatedAt: show.updatedAt,
		updatedByName: by?.name ?? null,
		archivedAt: show.archivedAt,
		edition: edition ?? null,
		...resolved
	};
}
