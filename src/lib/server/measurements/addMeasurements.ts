import { tableSchema } from '../../measurements/tableSchema';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { measurements } from '../db/schema';
import { parseOrRefuse } from '../parseOrRefuse';
import { galaxyToChange } from './galaxyToChange';

/**
 * Adds a table of observed speeds to a galaxy, in the units it came in.
 * @returns its id
 * @throws AppError invalid with `issues` naming each field by its path
 */
export async function addMeasurements(
	ctx: Context,
	galaxyId: string,
	input: unknown
): Promise<string> {
	requireRole(ctx, 'galaxy.edit');
	const table = parseOrRefuse(tableSchema, input, 'table');
	return inTransaction(ctx, async (tx) => {
		await galaxyToChange(tx, ctx, galaxyId);
		const [added] = await tx
			.insert(measurements)
			.values({ ...table, venueId: ctx.venueId, galaxyId, createdBy: ctx.userId })
			.returning({ id: measurements.id });
		await audit(tx, ctx, {
			action: 'galaxy.measurements.add',
			subjectKind: 'galaxy',
			subjectId: galaxyId,
			details: { table: added.id, name: table.name, points: table.rows.length }
		});
		return added.id;
	});
}
