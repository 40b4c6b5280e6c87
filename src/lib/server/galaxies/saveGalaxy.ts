import { and, eq, isNull, sql } from 'drizzle-orm';
import { z } from 'zod';
import { canonicalJson } from '../../show/hash';
import type { GalaxyDocument } from '../../show/galaxy';
import { audit, inTransaction, requireRole, type Context } from '../context';
import type { Queryable } from '../db/database';
import { galaxies, users } from '../db/schema';
import { AppError } from '../errors';
import { findGalaxy, type Galaxy } from './findGalaxy';
import { parseGalaxy } from './parseGalaxy';

const revisionSchema = z.number().int().min(1);

export interface Saved {
	revision: number;
	/** When it was saved; ISO 8601, UTC. */
	at: string;
}

const archivedError = () =>
	new AppError(
		'precondition',
		'The galaxy is archived, so nothing was saved. Restore it in the list of galaxies first.'
	);

/** Writes over a revision. @returns null where the stored one is another, or archived */
async function write(
	tx: Queryable,
	ctx: Context,
	id: string,
	base: number,
	document: GalaxyDocument
): Promise<Saved | null> {
	const [saved] = await tx
		.update(galaxies)
		.set({
			name: document.name,
			document,
			revision: sql`${galaxies.revision} + 1`,
			updatedAt: new Date(),
			updatedBy: ctx.userId
		})
		.where(
			and(
				eq(galaxies.id, id),
				eq(galaxies.venueId, ctx.venueId),
				eq(galaxies.revision, base),
				isNull(galaxies.archivedAt)
			)
		)
		.returning({ revision: galaxies.revision, updatedAt: galaxies.updatedAt });
	return saved ? { revision: saved.revision, at: saved.updatedAt.toISOString() } : null;
}

async function conflict(tx: Queryable, stored: Galaxy): Promise<AppError> {
	const by = stored.updatedBy
		? await tx.select({ name: users.name }).from(users).where(eq(users.id, stored.updatedBy))
		: [];
	return new AppError(
		'conflict',
		'Somebody saved this galaxy while you were working on it. Both versions are kept; choose how to go on.',
		{
			theirs: stored.document,
			revision: stored.revision,
			by: by[0]?.name ?? null,
			at: stored.updatedAt.toISOString()
		}
	);
}

/**
 * Saves a whole document over the revision it began from. A save that comes again after its answer
 * was lost finds its own document stored and is answered as saved.
 * @throws AppError conflict where another save came between, with `theirs`, `revision`, `by`, `at`
 */
export async function saveGalaxy(
	ctx: Context,
	input: { id: string; baseRevision: unknown; document: unknown }
): Promise<Saved> {
	requireRole(ctx, 'galaxy.edit');
	const base = revisionSchema.safeParse(input.baseRevision);
	if (!base.success) {
		const message = 'baseRevision must be the whole number of the revision this save began from.';
		throw new AppError('invalid', message, { issues: [{ path: 'baseRevision', message }] });
	}
	return inTransaction(ctx, async (tx) => {
		const { id } = await findGalaxy(tx, ctx, input.id);
		const document = parseGalaxy(input.document);
		const saved = await write(tx, ctx, id, base.data, document);
		if (saved) {
			await audit(tx, ctx, {
				action: 'galaxy.save',
				subjectKind: 'galaxy',
				subjectId: id,
				details: { revision: saved.revision }
			});
			return saved;
		}
		const stored = await findGalaxy(tx, ctx, id);
		if (stored.archivedAt) throw archivedError();
		if (canonicalJson(stored.document) !== canonicalJson(document)) {
			throw await conflict(tx, stored);
		}
		return { revision: stored.revision, at: stored.updatedAt.toISOString() };
	});
}

/** Gives a galaxy another name, whatever its revision. */
export async function renameGalaxy(ctx: Context, id: string, name: string): Promise<Saved> {
	requireRole(ctx, 'galaxy.edit');
	return inTransaction(ctx, async (tx) => {
		const stored = await findGalaxy(tx, ctx, id, { lock: true });
		const document = parseGalaxy({ ...stored.document, name: name.trim() });
		if (stored.archivedAt) throw archivedError();
		const saved = await write(tx, ctx, id, stored.revision, document);
		if (!saved) throw await conflict(tx, await findGalaxy(tx, ctx, id));
		await audit(tx, ctx, {
			action: 'galaxy.rename',
			subjectKind: 'galaxy',
			subjectId: id,
			details: { from: stored.name, to: document.name }
		});
		return saved;
	});
}
