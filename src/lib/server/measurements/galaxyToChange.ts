import type { Context } from '../context';
import type { Queryable } from '../db/database';
import { AppError } from '../errors';
import { findGalaxy, type Galaxy } from '../galaxies/findGalaxy';

/**
 * The galaxy whose measurements somebody wants to change.
 * @throws AppError not-found; precondition where it is archived
 */
export async function galaxyToChange(
	tx: Queryable,
	ctx: Pick<Context, 'venueId'>,
	galaxyId: string
): Promise<Galaxy> {
	const galaxy = await findGalaxy(tx, ctx, galaxyId);
	if (galaxy.archivedAt === null) return galaxy;
	throw new AppError(
		'precondition',
		'The galaxy is archived, so nothing was saved. Restore it in the list of galaxies first.'
	);
}
