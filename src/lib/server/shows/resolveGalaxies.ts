import { and, asc, eq, inArray, isNull, or } from 'drizzle-orm';
import type { ShowDocument } from '../../show/document';
import type { EditionGalaxy } from '../../show/edition';
import { measuredPoints } from '../../measurements/measuredPoints';
import type { MeasuredPoint, MeasuredRows } from '../../measurements/types';
import type { Queryable } from '../db/database';
import { galaxies, measurements } from '../db/schema';

export interface ResolvedGalaxies {
	/** Those that can be used, with their measured points. */
	galaxies: Record<string, EditionGalaxy>;
	/** Names of those that are archived, by id. */
	archived: Record<string, string>;
}

/** Ids of the galaxies a show's scenes use, each once. */
export const galaxyIdsOf = (document: ShowDocument): string[] => [
	...new Set(
		document.scenes.flatMap(({ subject }) => (subject.kind === 'galaxy' ? [subject.galaxyId] : []))
	)
];

/** What an edition needs of a table: kpc and km/s, without what was left out. */
const pointsThatCount = (table: MeasuredRows): MeasuredPoint[] =>
	measuredPoints(table)
		.filter(({ leftOut }) => leftOut === undefined)
		.map(({ radius, speed, error }) => ({ radius, speed, error }));

/**
 * Galaxies of one venue as an edition holds them. Where a galaxy has several tables of measured
 * speeds, the first one made is drawn: points of two surveys are not mixed on one chart.
 * @param ids which ones; all that are not archived where missing
 * @param used further ones to look up, archived or not, besides all
 */
export async function resolveGalaxies(
	tx: Queryable,
	venueId: string,
	{ ids, used = [] }: { ids?: readonly string[]; used?: readonly string[] }
): Promise<ResolvedGalaxies> {
	const resolved: ResolvedGalaxies = { galaxies: {}, archived: {} };
	if (ids?.length === 0) return resolved;
	const wanted = ids
		? inArray(galaxies.id, [...ids])
		: or(isNull(galaxies.archivedAt), inArray(galaxies.id, [...used]));
	const rows = await tx
		.select()
		.from(galaxies)
		.where(and(eq(galaxies.venueId, venueId), wanted))
		.orderBy(asc(galaxies.name), asc(galaxies.id));
	const found = rows.map((row) => row.id);
	const tables =
		found.length === 0
			? []
			: await tx
					.select()
					.from(measurements)
					.where(inArray(measurements.galaxyId, found))
					.orderBy(asc(measurements.createdAt), asc(measurements.id));
	for (const row of rows) {
		if (row.archivedAt) {
			resolved.archived[row.id] = row.name;
			continue;
		}
		const table = tables.find((t) => t.galaxyId === row.id);
		resolved.galaxies[row.id] = {
			document: row.document,
			measured: table ? pointsThatCount(table) : [],
			measuredSource: table?.source ?? ''
		};
	}
	return resolved;
}
