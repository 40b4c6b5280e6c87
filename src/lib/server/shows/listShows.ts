import { and, asc, desc, eq, ilike, isNotNull, isNull, sql, type SQL } from 'drizzle-orm';
import { z } from 'zod';
import { audiences } from '../../show/document';
import { queryable, requireRole, type Context } from '../context';
import { editions, shows, users } from '../db/schema';

export const showStates = ['draft', 'edition', 'archived'] as const;
export const showSorts = ['title', 'audience', 'length', 'changed'] as const;

/** What the list shows; it stands in the address, so that it can be shared. Odd values are left out. */
export const showFilterSchema = z.object({
	search: z.string().trim().max(120).catch(''),
	audience: z.enum(audiences).optional().catch(undefined),
	state: z.enum(showStates).optional().catch(undefined),
	sort: z.enum(showSorts).catch('changed'),
	order: z.enum(['up', 'down']).optional().catch(undefined)
});
export type ShowFilter = z.infer<typeof showFilterSchema>;

export interface ShowListed {
	id: string;
	title: string;
	audience: string;
	lengthSeconds: number;
	sceneCount: number;
	updatedAt: Date;
	updatedByName: string | null;
	archivedAt: Date | null;
	/** Number of the newest edition; null where there is none. */
	edition: number | null;
	/** Whether the show has changed since that edition. */
	changedSince: boolean;
}

const columns = {
	title: sql`lower(${shows.title})`,
	audience: shows.audience,
	length: shows.lengthSeconds,
	changed: shows.updatedAt
} as const;

/** What LIKE reads as a sign stands for itself. */
const literal = (search: string) => search.replace(/[\\%_]/g, (sign) => `\\${sign}`);

/** Shows of the venue. Archived ones only where the filter asks for them. */
export async function listShows(ctx: Context, filter: ShowFilter): Promise<ShowListed[]> {
	requireRole(ctx, 'show.read');
	const newest = sql<
		number | null
	>`(select max(e.number) from ${editions} e where e.show_id = ${shows.id})`;
	const conditions: (SQL | undefined)[] = [
		eq(shows.venueId, ctx.venueId),
		filter.state === 'archived' ? isNotNull(shows.archivedAt) : isNull(shows.archivedAt),
		filter.state === 'draft' ? sql`${newest} is null` : undefined,
		filter.state === 'edition' ? sql`${newest} is not null` : undefined,
		filter.audience ? eq(shows.audience, filter.audience) : undefined,
		filter.search ? ilike(shows.title, `%${literal(filter.search)}%`) : undefined
	];
	const down = (filter.order ?? (filter.sort === 'changed' ? 'down' : 'up')) === 'down';
	const column = columns[filter.sort];
	return queryable(ctx)
		.select({
			id: shows.id,
			title: shows.title,
			audience: shows.audience,
			lengthSeconds: shows.lengthSeconds,
			sceneCount: sql<number>`jsonb_array_length(${shows.document} -> 'scenes')`,
			updatedAt: shows.updatedAt,
			updatedByName: users.name,
			archivedAt: shows.archivedAt,
			edition: newest,
			changedSince: sql<boolean>`coalesce((select e.content -> 'show' <> ${shows.document} from ${editions} e where e.show_id = ${shows.id} order by e.number desc limit 1), false)`
		})
		.from(shows)
		.leftJoin(users, eq(users.id, shows.updatedBy))
		.where(and(...conditions))
		.orderBy(down ? desc(column) : asc(column), asc(shows.id));
}
