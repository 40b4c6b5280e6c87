import { eq } from 'drizzle-orm';
import type { EditionContent } from '../../show/edition';
import type { Queryable } from '../db/database';
import { editions } from '../db/schema';
import { notFound } from '../errors';

export interface RunEdition {
	id: string;
	venueId: string;
	number: number;
	hash: string;
	content: EditionContent;
}

/** Editions never change, so a process may keep the ones it reads. Oldest out first. */
const kept = new Map<string, RunEdition>();
const mostKept = 20;

/** The edition of a run. Says nothing of rights: callers have the run of their venue in hand. */
export async function editionOf(db: Queryable, id: string): Promise<RunEdition> {
	const known = kept.get(id);
	if (known) return known;
	const [row] = await db
		.select({
			id: editions.id,
			venueId: editions.venueId,
			number: editions.number,
			hash: editions.hash,
			content: editions.content
		})
		.from(editions)
		.where(eq(editions.id, id));
	if (!row) throw notFound('edition');
	if (kept.size >= mostKept) {
		const oldest = kept.keys().next();
		if (!oldest.done) kept.delete(oldest.value);
	}
	kept.set(id, row);
	return row;
}
