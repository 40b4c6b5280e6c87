import { version } from '../../../../package.json';
import { chiSquaredOf } from '../../dynamics';
import { fitRecordSchema, type FitRecord } from '../../measurements/fitRecord';
import { measuredPoints } from '../../measurements/measuredPoints';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { fits } from '../db/schema';
import { AppError } from '../errors';
import { findGalaxy } from '../galaxies/findGalaxy';
import { measurementsOf, type MeasurementTable } from '../measurements/measurementsOf';
import { parseOrRefuse } from '../parseOrRefuse';

/** How far a record's χ² may be from what the kept points give: the last digits of two machines. */
const tolerance = 1e-6;

/** A record must be of the points that are kept, or it proves nothing. */
function checkAgainst(table: MeasurementTable, record: FitRecord): void {
	const points = measuredPoints(table).filter(
		({ error, leftOut }) => error > 0 && leftOut === undefined
	);
	const chiSquared = chiSquaredOf(record.result, points);
	const agrees =
		points.length === record.points.used &&
		Math.abs(chiSquared - record.chiSquared) <= tolerance * (1 + chiSquared);
	if (agrees) return;
	throw new AppError(
		'conflict',
		`These points have changed since the fit: with ${points.length} points the model has χ² ${chiSquared.toPrecision(5)} now. Reload the page and fit again.`
	);
}

const nameOf = ({ result, measurements }: FitRecord): string => {
	const halo = result.components.find(({ lit }) => !lit);
	const called = halo ? (halo.name ?? halo.id) : 'Lit matter alone';
	return `${called}, ${measurements.name}`.slice(0, 200);
};

/**
 * Keeps a fit with its galaxy. The χ² is computed again here from the points as they are kept.
 * @returns its id
 * @throws AppError invalid naming the field; conflict where the points are no longer those of the fit
 */
export async function keepFit(ctx: Context, galaxyId: string, input: unknown): Promise<string> {
	requireRole(ctx, 'galaxy.edit');
	const record = { ...parseOrRefuse(fitRecordSchema, input, 'fit record'), computedBy: version };
	return inTransaction(ctx, async (tx) => {
		await findGalaxy(tx, ctx, galaxyId);
		const tables = await measurementsOf(tx, galaxyId);
		const table = tables.find(({ id }) => id === record.measurements.id);
		if (!table) {
			const message = 'This table of measured speeds does not belong to the galaxy.';
			throw new AppError('invalid', message, {
				issues: [{ path: 'measurements.id', message }]
			});
		}
		checkAgainst(table, record);
		const [fit] = await tx
			.insert(fits)
			.values({
				venueId: ctx.venueId,
				galaxyId,
				measurementsId: table.id,
				name: nameOf(record),
				record,
				createdBy: ctx.userId
			})
			.returning({ id: fits.id });
		await audit(tx, ctx, {
			action: 'galaxy.fit.keep',
			subjectKind: 'galaxy',
			subjectId: galaxyId,
			details: { fit: fit.id, chiSquared: record.chiSquared }
		});
		return fit.id;
	});
}
