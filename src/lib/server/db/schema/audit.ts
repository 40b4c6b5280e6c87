import { index, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id } from '../columns';

/**
 * Who did what, in the same transaction as the change. Append-only (a trigger refuses update and
 * delete); rows outlive their subjects, so there are no foreign keys here.
 */
export const auditLog = pgTable(
	'audit_log',
	{
		id: id(),
		at: createdAt(),
		/** Null for things that belong to a person and not to a venue, such as a sign-in. */
		venueId: uuid(),
		/** Null where the program itself or a screen acted. */
		actorId: uuid(),
		/** Such as "show.create". */
		action: text().notNull(),
		subjectKind: text().notNull(),
		subjectId: uuid(),
		/** Small facts; never passwords or tokens. */
		details: jsonb().$type<Record<string, unknown>>().notNull(),
		requestId: text().notNull()
	},
	(t) => [
		// Log of a venue by time.
		index('audit_log_venue_time').on(t.venueId, t.at),
		// History of one thing.
		index('audit_log_subject').on(t.subjectId, t.at)
	]
);
