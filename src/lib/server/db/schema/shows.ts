import { index, integer, jsonb, pgTable, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { ShowDocument } from '../../../show/document';
import type { EditionContent } from '../../../show/edition';
import { createdAt, id, moment, updatedAt } from '../columns';
import { users, venues } from './people';

/**
 * A show under work. `document` is the whole show document; `revision` rises by one with every save
 * and a save names the revision it began from, so that two people never overwrite each other.
 * Title and audience are copies of the document's for lists and are written by the save alone.
 */
export const shows = pgTable(
	'shows',
	{
		id: id(),
		venueId: uuid()
			.notNull()
			.references(() => venues.id, { onDelete: 'cascade' }),
		title: text().notNull(),
		audience: text().notNull(),
		/** Sum of the scenes' expected seconds; a cache written by the save. */
		lengthSeconds: integer().notNull(),
		document: jsonb().$type<ShowDocument>().notNull(),
		revision: integer().notNull().default(1),
		updatedAt: updatedAt(),
		updatedBy: uuid().references(() => users.id, { onDelete: 'set null' }),
		createdAt: createdAt(),
		archivedAt: moment()
	},
	(t) => [index('shows_venue').on(t.venueId)]
);

/** A frozen, numbered, hashed copy of a show with every galaxy it uses. Never changes (trigger). */
export const editions = pgTable(
	'editions',
	{
		id: id(),
		venueId: uuid()
			.notNull()
			.references(() => venues.id, { onDelete: 'cascade' }),
		showId: uuid()
			.notNull()
			.references(() => shows.id),
		/** 1, 2, 3 … within the show. */
		number: integer().notNull(),
		content: jsonb().$type<EditionContent>().notNull(),
		/** SHA-256 of the canonical JSON of `content`, hex. */
		hash: text().notNull(),
		note: text().notNull().default(''),
		frozenBy: uuid().references(() => users.id, { onDelete: 'set null' }),
		frozenAt: createdAt()
	},
	(t) => [
		uniqueIndex('editions_show_number').on(t.showId, t.number),
		index('editions_venue').on(t.venueId)
	]
);
