import { desc, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { EditionContent } from '../../show/edition';
import { findFaults } from '../../show/freeze';
import { canonicalJson, sha256Hex } from '../../show/hash';
import { readDocument } from '../../show/readDocument';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { editions } from '../db/schema';
import { AppError } from '../errors';
import { findShow } from './findShow';
import { galaxyIdsOf, resolveGalaxies } from './resolveGalaxies';

const noteSchema = z.string().trim().max(1000, 'A note has 1,000 letters at most.');

export interface Frozen {
	id: string;
	number: number;
	hash: string;
	/** False where nothing had changed since the newest edition, which then is the answer. */
	isNew: boolean;
}

/**
 * Freezes what is stored: the show and every galaxy it uses, numbered and hashed. Numbers are given
 * under the show's lock, so that two freezes at once give one edition and not two.
 * @param revision what the person saw; refused where the show has moved on since
 * @throws AppError precondition with `reasons`, one `Fault` each, where a scene is broken
 */
export async function freezeEdition(
	ctx: Context,
	{ showId, note = '', revision }: { showId: string; note?: string; revision?: number }
): Promise<Frozen> {
	requireRole(ctx, 'edition.freeze');
	const parsed = noteSchema.safeParse(note);
	if (!parsed.success) throw new AppError('invalid', parsed.error.issues[0].message);
	return inTransaction(ctx, async (tx) => {
		const show = await findShow(tx, ctx, showId, { lock: true });
		if (revision !== undefined && revision !== show.revision) {
			throw new AppError(
				'conflict',
				'The show has been saved again since this page was read. Look at it once more, then freeze.',
				{ revision: show.revision }
			);
		}
		const document = readDocument(show.document);
		const { galaxies, archived } = await resolveGalaxies(tx, ctx.venueId, {
			ids: galaxyIdsOf(document)
		});
		const content: EditionContent = { format: 1, show: document, galaxies };
		const reasons = findFaults(content, archived);
		if (show.archivedAt) {
			throw new AppError(
				'precondition',
				'The show is archived. Restore it in the list of shows, then freeze.'
			);
		}
		if (reasons.length > 0) {
			throw new AppError(
				'precondition',
				`The show cannot be frozen yet: ${reasons.length === 1 ? 'one thing is' : `${reasons.length} things are`} to be put right first.`,
				{ reasons }
			);
		}
		const hash = await sha256Hex(canonicalJson(content));
		const [newest] = await tx
			.select({ id: editions.id, number: editions.number, hash: editions.hash })
			.from(editions)
			.where(eq(editions.showId, showId))
			.orderBy(desc(editions.number))
			.limit(1);
		if (newest?.hash === hash) return { ...newest, isNew: false };
		const [edition] = await tx
			.insert(editions)
			.values({
				venueId: ctx.venueId,
				showId,
				number: (newest?.number ?? 0) + 1,
				content,
				hash,
				note: parsed.data,
				frozenBy: ctx.userId
			})
			.returning({ id: editions.id, number: editions.number });
		await audit(tx, ctx, {
			action: 'edition.freeze',
			subjectKind: 'edition',
			subjectId: edition.id,
			details: { showId, number: edition.number, hash }
		});
		return { ...edition, hash, isNew: true };
	});
}
