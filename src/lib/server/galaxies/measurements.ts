import { asc, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { MeasuredRows } from '../../measurements/types';
import { audit, inTransaction, queryable, requireRole, type Context } from '../context';
import type { Queryable } from '../db/database';
import { measurements } from '../db/schema';
import { AppError } from '../errors';
import { findGalaxy } from './findGalaxy';

export interface MeasurementTable extends MeasuredRows {
	id: string;
	name: string;
	/** Citation, or a plain statement that the points are invented. */
	source: string;
}

const tableSchema = z.strictObject({
	name: z.string().trim().min(1, 'Give the table a name.').max(120),
	source: z.string().trim().min(1, 'Say where the points come from.').max(1000),
	rows: z
		.array(
			z.strictObject({
				/** kpc. */
				radius: z.number().gt(0).max(1000),
				/** km/s. */
				speed: z.number().min(-2000).max(2000),
				/** One standard error, km/s. */
				error: z.number().gt(0).max(1000)
			})
		)
		.min(1, 'A table needs at least one point.')
		.max(5000)
});

/** Tables of a galaxy, the oldest first: that is the one shows draw. */
export const measurementsOf = (tx: Queryable, galaxyId: string): Promise<MeasurementTable[]> =>
	tx
		.select({
			id: measurements.id,
			name: measurements.name,
			source: measurements.source,
			rows: measurements.rows,
			radiusUnit: measurements.radiusUnit,
			speedUnit: measurements.speedUnit,
			distance: measurements.distance,
			inclination: measurements.inclination
		})
		.from(measurements)
		.where(eq(measurements.galaxyId, galaxyId))
		.orderBy(asc(measurements.createdAt), asc(measurements.id));

export async function listMeasurements(
	ctx: Context,
	galaxyId: string
): Promise<MeasurementTable[]> {
	requireRole(ctx, 'galaxy.read');
	const db = queryable(ctx);
	await findGalaxy(db, ctx, galaxyId);
	return measurementsOf(db, galaxyId);
}

/**
 * Adds a table of observed speeds to a galaxy; kpc and km/s.
 * @returns its id
 * @throws AppError invalid with `issues` naming each field by its path
 */
export async function addMeasurements(
	ctx: Context,
	galaxyId: string,
	input: unknown
): Promise<string> {
	requireRole(ctx, 'galaxy.edit');
	const parsed = tableSchema.safeParse(input);
	if (!parsed.success) {
		const issues = parsed.error.issues.map(({ path, message }) => ({
			path: path.join('.'),
			message
		}));
		throw new AppError('invalid', `The table was refused: ${issues[0].message}`, { issues });
	}
	return inTransaction(ctx, async (tx) => {
		await findGalaxy(tx, ctx, galaxyId);
		const [table] = await tx
			.insert(measurements)
			.values({ ...parsed.data, venueId: ctx.venueId, galaxyId, createdBy: ctx.userId })
			.returning({ id: measurements.id });
		await audit(tx, ctx, {
			action: 'galaxy.measurements.add',
			subjectKind: 'galaxy',
			subjectId: galaxyId,
			details: { table: table.id, points: parsed.data.rows.length }
		});
		return table.id;
	});
}
