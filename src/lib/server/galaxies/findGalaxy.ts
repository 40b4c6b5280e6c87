import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Context } from '../context';
import type { Queryable } from '../db/database';
import { galaxies } from '../db/schema';
import { notFound } from '../errors';

export type Galaxy = typeof galaxies.$inferSelect;

/**
 * A galaxy of the venue.
 * @param lock takes the row's lock, so that two changes come one after the other
 * @throws AppError not-found also for a galaxy of another venue and for what is no id at all
 */
export async function findGalaxy(
	tx: Queryable,
	ctx: Pick<Context, 'venueId'>,
	id: string,
	{ lock = false }: { lock?: boolean } = {}
): Promise<Galaxy> {
	if (!z.uuid().safeParse(id).success) throw notFound('galaxy');
	const query = tx
		.select()
		.from(galaxies)
		.where(and(eq(galaxies.id, id), eq(galaxies.venueId, ctx.venueId)));
	const [galaxy] = await (lock ? query.for('update') : query);
	if (!galaxy) throw notFound('galaxy');
	return galaxy;
}
