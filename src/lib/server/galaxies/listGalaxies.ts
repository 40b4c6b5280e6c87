import { and, asc, eq, ilike, isNotNull, isNull, sql } from 'drizzle-orm';
import { z } from 'zod';
import { queryable, requireRole, type Context } from '../context';
import { galaxies, shows, users } from '../db/schema';
import { speedSummary, type SpeedSummary } from './speedSummary';

export const galaxySorts = ['name', 'peak', 'outer', 'changed', 'shows'] as const;

/** What the list shows; it stands in the address, so that it can be shared. Odd values are left out. */
export const galaxyFilterSchema = z.object({
	search: z.string().trim().max(120).catch(''),
	state: z.literal('archived').optional().catch(undefined),
	sort: z.enum(galaxySorts).catch('name'),
	order: z.enum(['up', 'down']).optional().catch(undefined)
});
export type GalaxyFilter = z.infer<typeof galaxyFilterSchema>;

export interface GalaxyListed extends SpeedSummary {
	id: string;
	name: string;
	updatedAt: Date;
	updatedByName: string | null;
	archivedAt: Date | null;
	/** Titles of the shows of the venue, not archived, that use it. */
	usedBy: string[];
}

const keys = {
	name: (row: GalaxyListed) => row.name.toLowerCase(),
	peak: (row: GalaxyListed) => row.peakSpeed,
	outer: (row: GalaxyListed) => row.outerSpeed,
	changed: (row: GalaxyListed) => row.updatedAt.getTime(),
	shows: (row: GalaxyListed) => row.usedBy.length
};

/** What LIKE reads as a sign stands for itself. */
const literal = (search: string) => search.replace(/[\\%_]/g, (sign) => `\\${sign}`);

/** Galaxies of the venue with their speeds. Archived ones only where the filter asks for them. */
export async function listGalaxies(ctx: Context, filter: GalaxyFilter): Promise<GalaxyListed[]> {
	requireRole(ctx, 'galaxy.read');
	const rows = await queryable(ctx)
		.select({
			id: galaxies.id,
			name: galaxies.name,
			document: galaxies.document,
			updatedAt: galaxies.updatedAt,
			updatedByName: users.name,
			archivedAt: galaxies.archivedAt,
			usedBy: sql<
				string[]
			>`array(select s.title from ${shows} s where s.venue_id = ${galaxies.venueId} and s.archived_at is null and s.document -> 'scenes' @> jsonb_build_array(jsonb_build_object('subject', jsonb_build_object('kind', 'galaxy', 'galaxyId', ${galaxies.id}::text))) order by s.title)`
		})
		.from(galaxies)
		.leftJoin(users, eq(users.id, galaxies.updatedBy))
		.where(
			and(
				eq(galaxies.venueId, ctx.venueId),
				filter.state === 'archived' ? isNotNull(galaxies.archivedAt) : isNull(galaxies.archivedAt),
				filter.search ? ilike(galaxies.name, `%${literal(filter.search)}%`) : undefined
			)
		)
		.orderBy(asc(sql`lower(${galaxies.name})`), asc(galaxies.id));
	// Speeds are computed and not stored, so the order by them is made here.
	const listed = rows.map(({ document, ...row }) => ({ ...row, ...speedSummary(document) }));
	const key = keys[filter.sort];
	const down = (filter.order ?? (filter.sort === 'name' ? 'up' : 'down')) === 'down';
	return listed.sort((a, b) => {
		const [left, right] = [key(a), key(b)];
		const order = left < right ? -1 : left > right ? 1 : 0;
		return down ? -order : order;
	});
}
