import { and, eq, isNull } from 'drizzle-orm';
import { links } from '../../links';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { domes, editions, runs } from '../db/schema';
import { isId } from '../domes/isId';
import { AppError, notFound } from '../errors';
import { runChanged } from './channels';

/**
 * Opens a run of an edition in a dome. Its screens load the edition at once; the first scene comes
 * with the command `begin`.
 * @throws AppError conflict while another run is open in the dome, with `runId` and `href` of it
 */
export async function startRun(
	ctx: Context,
	{ editionId, domeId }: { editionId: string; domeId: string }
): Promise<{ runId: string }> {
	requireRole(ctx, 'run.start');
	if (!isId(editionId)) throw notFound('edition');
	if (!isId(domeId)) throw notFound('dome');
	return inTransaction(ctx, async (tx) => {
		const [edition] = await tx
			.select({ id: editions.id })
			.from(editions)
			.where(and(eq(editions.id, editionId), eq(editions.venueId, ctx.venueId)));
		if (!edition) throw notFound('edition');
		const [dome] = await tx
			.select({ name: domes.name, archivedAt: domes.archivedAt })
			.from(domes)
			.where(and(eq(domes.id, domeId), eq(domes.venueId, ctx.venueId)));
		if (!dome || dome.archivedAt) throw notFound('dome');
		// The partial unique index on open runs settles the race of two starts.
		const [run] = await tx
			.insert(runs)
			.values({ venueId: ctx.venueId, editionId, domeId, startedBy: ctx.userId })
			.onConflictDoNothing()
			.returning({ id: runs.id });
		if (!run) {
			const [open] = await tx
				.select({ id: runs.id })
				.from(runs)
				.where(and(eq(runs.domeId, domeId), isNull(runs.endedAt)));
			throw new AppError(
				'conflict',
				`A run is open in ${dome.name}. Go to its console and end it first.`,
				open ? { runId: open.id, href: links.console(open.id) } : {}
			);
		}
		await audit(tx, ctx, {
			action: 'run.start',
			subjectKind: 'run',
			subjectId: run.id,
			details: { editionId, domeId }
		});
		await tx.execute(runChanged(run.id));
		return { runId: run.id };
	});
}
