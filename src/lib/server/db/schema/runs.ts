import { sql } from 'drizzle-orm';
import {
	doublePrecision,
	index,
	integer,
	jsonb,
	pgTable,
	primaryKey,
	text,
	uniqueIndex,
	uuid
} from 'drizzle-orm/pg-core';
import type { RunCommand } from '../../../show/playback/messages';
import { createdAt, id, moment } from '../columns';
import { domes } from './domes';
import { users, venues } from './people';
import { editions } from './shows';

/** One performance of an edition in a dome. Open until `endedAt`; a dome has one open run at most. */
export const runs = pgTable(
	'runs',
	{
		id: id(),
		venueId: uuid()
			.notNull()
			.references(() => venues.id, { onDelete: 'cascade' }),
		editionId: uuid()
			.notNull()
			.references(() => editions.id),
		domeId: uuid()
			.notNull()
			.references(() => domes.id),
		startedBy: uuid().references(() => users.id, { onDelete: 'set null' }),
		startedAt: createdAt(),
		endedAt: moment(),
		/** Number of the last event: raised under the row's lock, so that numbers have no gap. */
		lastEvent: integer().notNull().default(0),
		/** Head-count and remarks of the log afterwards. */
		headCount: integer(),
		remarks: text().notNull().default('')
	},
	(t) => [
		index('runs_venue').on(t.venueId, t.startedAt),
		uniqueIndex('runs_open_dome')
			.on(t.domeId)
			.where(sql`ended_at is null`)
	]
);

/** Numbered, append-only list of what happened in a run (trigger). The picture follows from it. */
export const runEvents = pgTable(
	'run_events',
	{
		runId: uuid()
			.notNull()
			.references(() => runs.id, { onDelete: 'cascade' }),
		number: integer().notNull(),
		/** Milliseconds since 1970 by the server's clock; never before the event in front of it. */
		at: doublePrecision().notNull(),
		command: jsonb().$type<RunCommand>().notNull(),
		actorId: uuid(),
		/** The sender's own key: the same command twice is stored once. */
		idempotencyKey: text().notNull()
	},
	(t) => [
		primaryKey({ columns: [t.runId, t.number] }),
		uniqueIndex('run_events_key').on(t.runId, t.idempotencyKey)
	]
);
