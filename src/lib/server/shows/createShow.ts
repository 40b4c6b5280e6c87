import { newDocument } from '../../show/editing';
import type { ShowDocument } from '../../show/document';
import { totalSeconds } from '../../show/timing';
import { audit, inTransaction, requireRole, type Context } from '../context';
import type { Queryable } from '../db/database';
import { shows } from '../db/schema';
import { findShow } from './findShow';
import { parseDocument } from './parseDocument';

/** What lists show; written with every save and nowhere else. */
export const listColumns = (document: ShowDocument) => ({
	title: document.title,
	audience: document.audience,
	lengthSeconds: Math.round(totalSeconds(document))
});

async function insertShow(
	tx: Queryable,
	ctx: Context,
	document: ShowDocument,
	action: string,
	details: Record<string, unknown> = {}
): Promise<string> {
	const [show] = await tx
		.insert(shows)
		.values({ ...listColumns(document), venueId: ctx.venueId, document, updatedBy: ctx.userId })
		.returning({ id: shows.id });
	await audit(tx, ctx, {
		action,
		subjectKind: 'show',
		subjectId: show.id,
		details: { title: document.title, ...details }
	});
	return show.id;
}

const randomSeed = () => 1 + (crypto.getRandomValues(new Uint32Array(1))[0] % 2147483646);

/** A show without scenes. @returns its id */
export async function createShow(ctx: Context, { title }: { title: string }): Promise<string> {
	requireRole(ctx, 'show.edit');
	const document = parseDocument(newDocument(title.trim(), randomSeed()));
	return inTransaction(ctx, (tx) => insertShow(tx, ctx, document, 'show.create'));
}

/**
 * A show of its own from another. @returns its id
 * @param document what the copy holds where it is not what is stored: a version kept from a conflict
 */
export async function copyShow(
	ctx: Context,
	{ id, document }: { id: string; document?: unknown }
): Promise<string> {
	requireRole(ctx, 'show.edit');
	const given = document === undefined ? undefined : parseDocument(document);
	return inTransaction(ctx, async (tx) => {
		const from = await findShow(tx, ctx, id);
		const copy = given ?? {
			...from.document,
			title: `${from.document.title.slice(0, 113)} (copy)`
		};
		return insertShow(tx, ctx, copy, 'show.copy', { from: id });
	});
}
