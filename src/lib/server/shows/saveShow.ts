import { and, eq, isNull, sql } from 'drizzle-orm';
import { z } from 'zod';
import { canonicalJson } from '../../show/hash';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { shows, users } from '../db/schema';
import { AppError, notFound } from '../errors';
import { listColumns } from './createShow';
import { findShow, isId } from './findShow';
import { parseDocument } from './parseDocument';

const revisionSchema = z.number().int().min(1);

export interface Saved {
	revision: number;
	/** When it was saved; ISO 8601, UTC. */
	at: string;
}

/**
 * Saves a whole document over the revision it began from. A save that comes again after its answer
 * was lost finds its own document stored and is answered as saved.
 * @throws AppError conflict where another save came between, with `theirs`, `revision`, `by`, `at`
 */
export async function saveShow(
	ctx: Context,
	input: { id: string; baseRevision: unknown; document: unknown }
): Promise<Saved> {
	requireRole(ctx, 'show.edit');
	const base = revisionSchema.safeParse(input.baseRevision);
	if (!base.success) {
		const message = 'baseRevision must be the whole number of the revision this save began from.';
		throw new AppError('invalid', message, { issues: [{ path: 'baseRevision', message }] });
	}
	const document = parseDocument(input.document);
	if (!isId(input.id)) throw notFound('show');
	return inTransaction(ctx, async (tx) => {
		const [saved] = await tx
			.update(shows)
			.set({
				...listColumns(document),
				document,
				revision: sql`${shows.revision} + 1`,
				updatedAt: new Date(),
				updatedBy: ctx.userId
			})
			.where(
				and(
					eq(shows.id, input.id),
					eq(shows.venueId, ctx.venueId),
					eq(shows.revision, base.data),
					isNull(shows.archivedAt)
				)
			)
			.returning({ revision: shows.revision, updatedAt: shows.updatedAt });
		if (saved) {
			await audit(tx, ctx, {
				action: 'show.save',
				subjectKind: 'show',
				subjectId: input.id,
				details: { revision: saved.revision }
			});
			return { revision: saved.revision, at: saved.updatedAt.toISOString() };
		}
		const stored = await findShow(tx, ctx, input.id);
		if (stored.archivedAt) {
			throw new AppError(
				'precondition',
				'The show is archived, so nothing was saved. Restore it in the list of shows first.'
			);
		}
		if (canonicalJson(stored.document) === canonicalJson(document)) {
			return { revision: stored.revision, at: stored.updatedAt.toISOString() };
		}
		const by = stored.updatedBy
			? await tx.select({ name: users.name }).from(users).where(eq(users.id, stored.updatedBy))
			: [];
		throw new AppError(
			'conflict',
			'Somebody saved this show while you were working on it. Both versions are kept; choose how to go on.',
			{
				theirs: stored.document,
				revision: stored.revision,
				by: by[0]?.name ?? null,
				at: stored.updatedAt.toISOString()
			}
		);
	});
}
