import { asc, eq } from 'drizzle-orm';
import type { MeasurementsInput } from '../../measurements/types';
import type { Queryable } from '../db/database';
import { measurements } from '../db/schema';

export interface MeasurementTable extends MeasurementsInput {
	id: string;
}

/** What a table of observed speeds is read with. */
export const tableColumns = {
	id: measurements.id,
	name: measurements.name,
	source: measurements.source,
	rows: measurements.rows,
	radiusUnit: measurements.radiusUnit,
	speedUnit: measurements.speedUnit,
	distance: measurements.distance,
	inclination: measurements.inclination
};

/** Tables of a galaxy, the oldest first: that is the one shows draw. */
export const measurementsOf = (tx: Queryable, galaxyId: string): Promise<MeasurementTable[]> =>
	tx
		.select(tableColumns)
		.from(measurements)
		.where(eq(measurements.galaxyId, galaxyId))
		.orderBy(asc(measurements.createdAt), asc(measurements.id));
