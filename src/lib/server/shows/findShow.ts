import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Context } from '../context';
import type { Queryable } from '../db/database';
import { shows } from '../db/schema';
import { notFound } from '../errors';

export type Show = typeof shows.$inferSelect;

/** Whether a text is an id at all; PostgreSQL would refuse another with an error of its own. */
export const isId = (text: string): boolean => z.uuid().safeParse(text).success;

/**
 * A show of the venue.
 * @param lock takes the row's lock, so that two changes come one after the other
 * @throws AppError not-found also for a show of another venue
 */
export async function findShow(
	tx: Queryable,
	ctx: Pick<Context, 'venueId'>,
	id: string,
	{ lock = false }: { lock?: boolean } = {}
): Promise<Show> {
	if (!isId(id)) throw notFound('show');
	const query = tx
		.select()
		.from(shows)
		.where(and(eq(shows.id, id), eq(shows.venueId, ctx.venueId)));
	const [show] = await (lock ? query.for('update') : query);
	if (!show) throw notFound('show');
	return show;
}
