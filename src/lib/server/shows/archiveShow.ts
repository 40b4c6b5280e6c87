import { eq } from 'drizzle-orm';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { shows } from '../db/schema';
import { findShow } from './findShow';

async function setArchived(ctx: Context, id: string, archived: boolean): Promise<string> {
	requireRole(ctx, 'show.edit');
	return inTransaction(ctx, async (tx) => {
		const show = await findShow(tx, ctx, id, { lock: true });
		if ((show.archivedAt !== null) === archived) return show.title;
		await tx
			.update(shows)
			.set({ archivedAt: archived ? new Date() : null })
			.where(eq(shows.id, id));
		await audit(tx, ctx, {
			action: archived ? 'show.archive' : 'show.restore',
			subjectKind: 'show',
			subjectId: id,
			details: { title: show.title }
		});
		return show.title;
	});
}

/** Puts a show away; its editions stay and can be run. @returns its title */
export const archiveShow = (ctx: Context, id: string) => setArchived(ctx, id, true);

/** Brings an archived show back. @returns its title */
export const restoreShow = (ctx: Context, id: string) => setArchived(ctx, id, false);
