import { and, asc, desc, eq, ilike, or, sql } from 'drizzle-orm';
import { z } from 'zod';
import { writeMeasurements } from '../../measurements/writeMeasurements';
import { queryable, requireRole, type Context } from '../context';
import { galaxies, measurements, users } from '../db/schema';
import { findGalaxy } from '../galaxies/findGalaxy';
import { findMeasurements, type TableAddress } from './findMeasurements';
import { measurementsOf, type MeasurementTable } from './measurementsOf';

/** Tables of a galaxy with all their rows, the oldest first. */
export async function listMeasurements(
	ctx: Context,
	galaxyId: string
): Promise<MeasurementTable[]> {
	requireRole(ctx, 'galaxy.read');
	const db = queryable(ctx);
	await findGalaxy(db, ctx, galaxyId);
	return measurementsOf(db, galaxyId);
}

export const measurementSorts = ['added', 'name', 'galaxy', 'rows', 'source'] as const;

/** What the venue's list shows; it stands in the address. Odd values are left out. */
export const measurementFilterSchema = z.object({
	search: z.string().trim().max(120).catch(''),
	sort: z.enum(measurementSorts).catch('added'),
	order: z.enum(['up', 'down']).optional().catch(undefined)
});
export type MeasurementFilter = z.infer<typeof measurementFilterSchema>;

export interface MeasurementListed {
	id: string;
	name: string;
	source: string;
	galaxyId: string;
	galaxyName: string;
	rows: number;
	leftOut: number;
	createdAt: Date;
	createdByName: string | null;
}

const rowCount = sql<number>`jsonb_array_length(${measurements.rows})`;
const sortColumns = {
	added: measurements.createdAt,
	name: sql`lower(${measurements.name})`,
	galaxy: sql`lower(${galaxies.name})`,
	rows: rowCount,
	source: sql`lower(${measurements.source})`
};

/** What LIKE reads as a sign stands for itself. */
const literal = (search: string) => search.replace(/[\\%_]/g, (sign) => `\\${sign}`);

/** Every table of the venue, also those of archived galaxies, without its rows. */
export async function listVenueMeasurements(
	ctx: Context,
	{ search, sort, order }: MeasurementFilter
): Promise<MeasurementListed[]> {
	requireRole(ctx, 'galaxy.read');
	const like = `%${literal(search)}%`;
	const down = (order ?? (sort === 'added' || sort === 'rows' ? 'down' : 'up')) === 'down';
	return queryable(ctx)
		.select({
			id: measurements.id,
			name: measurements.name,
			source: measurements.source,
			galaxyId: measurements.galaxyId,
			galaxyName: galaxies.name,
			rows: rowCount,
			leftOut: sql<number>`jsonb_array_length(jsonb_path_query_array(${measurements.rows}, '$[*].leftOut'))`,
			createdAt: measurements.createdAt,
			createdByName: users.name
		})
		.from(measurements)
		.innerJoin(galaxies, eq(galaxies.id, measurements.galaxyId))
		.leftJoin(users, eq(users.id, measurements.createdBy))
		.where(
			and(
				eq(measurements.venueId, ctx.venueId),
				search
					? or(
							ilike(measurements.name, like),
							ilike(measurements.source, like),
							ilike(galaxies.name, like)
						)
					: undefined
			)
		)
		.orderBy((down ? desc : asc)(sortColumns[sort]), asc(measurements.id));
}

export interface MeasurementsRecord extends MeasurementTable {
	createdAt: Date;
	createdByName: string | null;
}

/** One table with all its rows, and who brought it. */
export async function readMeasurementTable(
	ctx: Context,
	address: TableAddress
): Promise<MeasurementsRecord> {
	requireRole(ctx, 'galaxy.read');
	const db = queryable(ctx);
	const {
		createdBy,
		venueId: _,
		galaxyId: __,
		...table
	} = await findMeasurements(db, ctx, address);
	const [by] = createdBy
		? await db.select({ name: users.name }).from(users).where(eq(users.id, createdBy))
		: [];
	return { ...table, createdByName: by?.name ?? null };
}

/** A table as CSV, and a name for the file. */
export async function exportMeasurements(
	ctx: Context,
	address: TableAddress
): Promise<{ fileName: string; csv: string }> {
	requireRole(ctx, 'galaxy.read');
	const table = await findMeasurements(queryable(ctx), ctx, address);
	const plain = table.name.normalize('NFKD').replace(/[^A-Za-z0-9]+/g, '-');
	const fileName = `${plain.replace(/^-+|-+$/g, '').slice(0, 60) || 'measured-speeds'}.csv`;
	return { fileName, csv: writeMeasurements(table) };
}
