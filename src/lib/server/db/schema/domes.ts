import { sql } from 'drizzle-orm';
import {
	doublePrecision,
	index,
	integer,
	pgTable,
	text,
	uniqueIndex,
	uuid
} from 'drizzle-orm/pg-core';
import { createdAt, id, moment, updatedAt } from '../columns';
import { users, venues } from './people';

/** A dome of a venue: geometry belongs here and never to a show. */
export const domes = pgTable(
	'domes',
	{
		id: id(),
		venueId: uuid()
			.notNull()
			.references(() => venues.id, { onDelete: 'cascade' }),
		name: text().notNull(),
		diameterMetres: doublePrecision().notNull(),
		seats: integer().notNull(),
		apertureDegrees: doublePrecision().notNull().default(180),
		tiltDegrees: doublePrecision().notNull().default(0),
		/** Pixels across the film. */
		filmSize: integer().notNull().default(2048),
		/** Pinned painter, or 'auto' to let the screen measure. */
		painter: text().$type<'auto' | 'plain' | 'webgl'>().notNull().default('auto'),
		createdAt: createdAt(),
		updatedAt: updatedAt(),
		archivedAt: moment()
	},
	(t) => [index('domes_venue').on(t.venueId)]
);

/**
 * A short code shown by an unpaired dome page. Ten minutes, five wrong tries a technician; the
 * browser that asked holds `claimHash`'s secret and fetches its token once the code is used.
 */
export const pairings = pgTable(
	'pairings',
	{
		id: id(),
		/** Six characters, without look-alikes. */
		code: text().notNull(),
		/** SHA-256 of the secret the asking browser keeps, hex. */
		claimHash: text().notNull(),
		expiresAt: moment().notNull(),
		/** Set when a technician has typed the code. */
		screenId: uuid().references(() => screens.id, { onDelete: 'cascade' }),
		claimedAt: moment(),
		createdAt: createdAt()
	},
	(t) => [
		// Typing a code: only open pairings count.
		uniqueIndex('pairings_open_code')
			.on(t.code)
			.where(sql`screen_id is null`)
	]
);

/** A paired browser that shows the dome picture. Its token can be revoked at any time. */
export const screens = pgTable(
	'screens',
	{
		id: id(),
		venueId: uuid()
			.notNull()
			.references(() => venues.id, { onDelete: 'cascade' }),
		domeId: uuid()
			.notNull()
			.references(() => domes.id, { onDelete: 'cascade' }),
		name: text().notNull(),
		/** SHA-256 of the token, hex; null until the browser has fetched it. */
		tokenHash: text(),
		pairedBy: uuid().references(() => users.id, { onDelete: 'set null' }),
		pairedAt: createdAt(),
		lastSeenAt: moment(),
		/** Which painter it last said it uses. */
		painter: text(),
		revokedAt: moment()
	},
	(t) => [uniqueIndex('screens_token').on(t.tokenHash), index('screens_dome').on(t.domeId)]
);
