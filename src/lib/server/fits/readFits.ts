import { and, desc, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { FitRecord } from '../../measurements/fitRecord';
import { queryable, requireRole, type Context } from '../context';
import { fits, users } from '../db/schema';
import { notFound } from '../errors';
import { findGalaxy } from '../galaxies/findGalaxy';

export interface FitRead {
	id: string;
	name: string;
	record: FitRecord;
	createdAt: Date;
	createdByName: string | null;
}

const columns = {
	id: fits.id,
	name: fits.name,
	record: fits.record,
	createdAt: fits.createdAt,
	createdByName: users.name
};

/** Fits kept with a galaxy, the newest first. */
export async function listFits(ctx: Context, galaxyId: string): Promise<FitRead[]> {
	requireRole(ctx, 'galaxy.read');
	const db = queryable(ctx);
	await findGalaxy(db, ctx, galaxyId);
	return db
		.select(columns)
		.from(fits)
		.leftJoin(users, eq(users.id, fits.createdBy))
		.where(and(eq(fits.galaxyId, galaxyId), eq(fits.venueId, ctx.venueId)))
		.orderBy(desc(fits.createdAt), desc(fits.id));
}

/** One kept fit. @throws AppError not-found also for one of another venue or galaxy */
export async function readFit(ctx: Context, galaxyId: string, id: string): Promise<FitRead> {
	requireRole(ctx, 'galaxy.read');
	const db = queryable(ctx);
	await findGalaxy(db, ctx, galaxyId);
	if (!z.uuid().safeParse(id).success) throw notFound('fit');
	const [fit] = await db
		.select(columns)
		.from(fits)
		.leftJoin(users, eq(users.id, fits.createdBy))
		.where(and(eq(fits.id, id), eq(fits.galaxyId, galaxyId), eq(fits.venueId, ctx.venueId)));
	if (!fit) throw notFound('fit');
	return fit;
}
