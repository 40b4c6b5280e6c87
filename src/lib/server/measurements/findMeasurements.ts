import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Context } from '../context';
import type { Queryable } from '../db/database';
import { measurements } from '../db/schema';
import { notFound } from '../errors';

/** Which table: its own id and that of its galaxy, as they stand in the address. */
export interface TableAddress {
	galaxyId: string;
	id: string;
}

/**
 * A table of the venue. @param lock takes the row's lock, so that two changes come one after the other
 * @throws AppError not-found also for one of another venue or galaxy, and for what is no id
 */
export async function findMeasurements(
	tx: Queryable,
	ctx: Pick<Context, 'venueId'>,
	{ galaxyId, id }: TableAddress,
	{ lock = false }: { lock?: boolean } = {}
): Promise<typeof measurements.$inferSelect> {
	const uuid = z.uuid();
	if (!uuid.safeParse(id).success || !uuid.safeParse(galaxyId).success) {
		throw notFound('table of measured speeds');
	}
	const query = tx
		.select()
		.from(measurements)
		.where(
			and(
				eq(measurements.id, id),
				eq(measurements.galaxyId, galaxyId),
				eq(measurements.venueId, ctx.venueId)
			)
		);
	const [table] = await (lock ? query.for('update') : query);
	if (!table) throw notFound('table of measured speeds');
	return table;
}
