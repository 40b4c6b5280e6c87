import { sql } from 'drizzle-orm';
import {
	boolean,
	index,
	integer,
	pgTable,
	primaryKey,
	text,
	uniqueIndex,
	uuid
} from 'drizzle-orm/pg-core';
import { createdAt, id, moment } from '../columns';
import type { Role } from '../../../roles';

/**
 * A person who can sign in, in any number of venues. Column names `emailVerified` and `image` are
 * those the Auth.js adapter reads. `disabledAt` puts the person out at once, everywhere.
 */
export const users = pgTable(
	'users',
	{
		id: id(),
		name: text().notNull(),
		/** Kept in lower case. */
		email: text().notNull(),
		emailVerified: moment(),
		image: text(),
		disabledAt: moment(),
		createdAt: createdAt()
	},
	(t) => [uniqueIndex('users_email').on(t.email)]
);

/** One argon2id hash a person; written by joining and by resets. */
export const passwords = pgTable('passwords', {
	userId: uuid()
		.primaryKey()
		.references(() => users.id, { onDelete: 'cascade' }),
	hash: text().notNull(),
	changedAt: createdAt()
});

/** Accounts of other sign-in providers; Auth.js needs the table, none is configured yet. */
export const accounts = pgTable(
	'accounts',
	{
		userId: uuid()
			.notNull()
			.references(() => users.id, { onDelete: 'cascade' }),
		type: text().notNull(),
		provider: text().notNull(),
		providerAccountId: text().notNull(),
		refresh_token: text(),
		access_token: text(),
		expires_at: integer(),
		token_type: text(),
		scope: text(),
		id_token: text(),
		session_state: text()
	},
	(t) => [primaryKey({ columns: [t.provider, t.providerAccountId] })]
);

/**
 * A signed-in browser. The Auth.js adapter reads sessionToken, userId and expires; the rest is ours:
 * which venue the person is working in, and what the sessions page shows.
 */
export const sessions = pgTable(
	'sessions',
	{
		/** Random, at least 128 bits; the cookie's value. */
		sessionToken: text().primaryKey(),
		/** Public name of the session for lists and for ending it. */
		id: uuid()
			.notNull()
			.default(sql`gen_random_uuid()`),
		userId: uuid()
			.notNull()
			.references(() => users.id, { onDelete: 'cascade' }),
		expires: moment().notNull(),
		venueId: uuid().references(() => venues.id, { onDelete: 'set null' }),
		createdAt: createdAt(),
		lastSeenAt: createdAt(),
		userAgent: text().notNull().default(''),
		address: text().notNull().default('')
	},
	(t) => [index('sessions_user').on(t.userId), uniqueIndex('sessions_id').on(t.id)]
);

/** Single-use tokens of the Auth.js e-mail provider (SHA-256 of the token). */
export const verificationTokens = pgTable(
	'verification_tokens',
	{
		identifier: text().notNull(),
		token: text().notNull(),
		expires: moment().notNull()
	},
	(t) => [primaryKey({ columns: [t.identifier, t.token] })]
);

/** A science centre. Everything below belongs to one venue and is seen by its members only. */
export const venues = pgTable('venues', {
	id: id(),
	name: text().notNull(),
	/** IANA name; all times on pages are in it. */
	timeZone: text().notNull(),
	createdAt: createdAt()
});

/** What a person may do in a venue. `roles` is never empty; leaving deletes the row. */
export const memberships = pgTable(
	'memberships',
	{
		userId: uuid()
			.notNull()
			.references(() => users.id, { onDelete: 'cascade' }),
		venueId: uuid()
			.notNull()
			.references(() => venues.id, { onDelete: 'cascade' }),
		roles: text().array().$type<Role[]>().notNull(),
		createdAt: createdAt()
	},
	(t) => [
		primaryKey({ columns: [t.userId, t.venueId] }),
		// People page of a venue.
		index('memberships_venue').on(t.venueId)
	]
);

/** An invitation by e-mail to join a venue: single-use, seven days. */
export const invitations = pgTable(
	'invitations',
	{
		id: id(),
		venueId: uuid()
			.notNull()
			.references(() => venues.id, { onDelete: 'cascade' }),
		email: text().notNull(),
		roles: text().array().$type<Role[]>().notNull(),
		/** SHA-256 of the token in the mail, hex. */
		tokenHash: text().notNull(),
		/** Null for the very first manager of an installation. */
		invitedBy: uuid().references(() => users.id, { onDelete: 'set null' }),
		expiresAt: moment().notNull(),
		usedAt: moment(),
		withdrawnAt: moment(),
		createdAt: createdAt()
	},
	(t) => [
		uniqueIndex('invitations_token').on(t.tokenHash),
		index('invitations_venue').on(t.venueId)
	]
);

/** A password reset by mail: single-use, one hour. */
export const passwordResets = pgTable(
	'password_resets',
	{
		id: id(),
		userId: uuid()
			.notNull()
			.references(() => users.id, { onDelete: 'cascade' }),
		tokenHash: text().notNull(),
		expiresAt: moment().notNull(),
		usedAt: moment(),
		createdAt: createdAt()
	},
	(t) => [uniqueIndex('password_resets_token').on(t.tokenHash)]
);

/** Personal settings of the office: the reader may turn single-key shortcuts off. */
export const preferences = pgTable('preferences', {
	userId: uuid()
		.primaryKey()
		.references(() => users.id, { onDelete: 'cascade' }),
	singleKeyShortcuts: boolean().notNull().default(true)
});
