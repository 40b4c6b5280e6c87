import { and, desc, eq } from 'drizzle-orm';
import type { EditionContent } from '../../show/edition';
import { queryable, requireRole, type Context } from '../context';
import { editions, users } from '../db/schema';
import { notFound } from '../errors';
import { findShow, isId } from './findShow';

export interface EditionListed {
	id: string;
	number: number;
	hash: string;
	note: string;
	frozenAt: Date;
	frozenByName: string | null;
}

export interface EditionRead extends EditionListed {
	showId: string;
	content: EditionContent;
}

const listed = {
	id: editions.id,
	number: editions.number,
	hash: editions.hash,
	note: editions.note,
	frozenAt: editions.frozenAt,
	frozenByName: users.name
};

/** Editions of a show, the newest first. */
export async function listEditions(
	ctx: Context,
	showId: string
): Promise<{ show: { id: string; title: string; archived: boolean }; editions: EditionListed[] }> {
	requireRole(ctx, 'show.read');
	const db = queryable(ctx);
	const show = await findShow(db, ctx, showId);
	const rows = await db
		.select(listed)
		.from(editions)
		.leftJoin(users, eq(users.id, editions.frozenBy))
		.where(eq(editions.showId, showId))
		.orderBy(desc(editions.number));
	return {
		show: { id: showId, title: show.title, archived: show.archivedAt !== null },
		editions: rows
	};
}

/** @throws AppError not-found also for an edition of another venue */
export async function readEdition(ctx: Context, id: string): Promise<EditionRead> {
	requireRole(ctx, 'show.read');
	if (!isId(id)) throw notFound('edition');
	const [edition] = await queryable(ctx)
		.select({ ...listed, showId: editions.showId, content: editions.content })
		.from(editions)
		.leftJoin(users, eq(users.id, editions.frozenBy))
		.where(and(eq(editions.id, id), eq(editions.venueId, ctx.venueId)));
	if (!edition) throw notFound('edition');
	return edition;
}
