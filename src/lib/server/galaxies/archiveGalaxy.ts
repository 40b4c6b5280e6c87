import { eq } from 'drizzle-orm';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { galaxies } from '../db/schema';
import { findGalaxy } from './findGalaxy';
import { showsUsing } from './showsUsing';

export interface Archived {
	name: string;
	/** Shows whose scenes show it and cannot be frozen while it is away. */
	usedBy: { id: string; title: string }[];
}

async function setArchived(ctx: Context, id: string, archived: boolean): Promise<Archived> {
	requireRole(ctx, 'galaxy.edit');
	return inTransaction(ctx, async (tx) => {
		const galaxy = await findGalaxy(tx, ctx, id, { lock: true });
		const usedBy = await showsUsing(tx, ctx.venueId, id);
		if ((galaxy.archivedAt !== null) !== archived) {
			await tx
				.update(galaxies)
				.set({ archivedAt: archived ? new Date() : null })
				.where(eq(galaxies.id, id));
			await audit(tx, ctx, {
				action: archived ? 'galaxy.archive' : 'galaxy.restore',
				subjectKind: 'galaxy',
				subjectId: id,
				details: { name: galaxy.name, usedBy: usedBy.map((show) => show.id) }
			});
		}
		return { name: galaxy.name, usedBy };
	});
}

/** Puts a galaxy away and says which shows use it. Editions hold copies and are not touched. */
export const archiveGalaxy = (ctx: Context, id: string) => setArchived(ctx, id, true);

/** Brings an archived galaxy back. */
export const restoreGalaxy = (ctx: Context, id: string) => setArchived(ctx, id, false);
