import { eq } from 'drizzle-orm';
import type { GalaxyDocument } from '../../show/galaxy';
import { queryable, requireRole, type Context } from '../context';
import { users } from '../db/schema';
import { findGalaxy } from './findGalaxy';
import { measurementsOf, type MeasurementTable } from '../measurements/measurementsOf';
import { showsUsing } from './showsUsing';

export interface GalaxyRead {
	id: string;
	document: GalaxyDocument;
	revision: number;
	updatedAt: Date;
	updatedByName: string | null;
	archivedAt: Date | null;
	measurements: MeasurementTable[];
	/** Shows of the venue, not archived, that use it. */
	usedBy: { id: string; title: string }[];
}

/** A galaxy with its measured points. */
export async function readGalaxy(ctx: Context, id: string): Promise<GalaxyRead> {
	requireRole(ctx, 'galaxy.read');
	const db = queryable(ctx);
	const galaxy = await findGalaxy(db, ctx, id);
	const by = galaxy.updatedBy
		? await db.select({ name: users.name }).from(users).where(eq(users.id, galaxy.updatedBy))
		: [];
	return {
		id,
		document: galaxy.document,
		revision: galaxy.revision,
		updatedAt: galaxy.updatedAt,
		updatedByName: by[0]?.name ?? null,
		archivedAt: galaxy.archivedAt,
		measurements: await measurementsOf(db, id),
		usedBy: await showsUsing(db, ctx.venueId, id)
	};
}
