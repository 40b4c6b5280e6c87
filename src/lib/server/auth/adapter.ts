import { DrizzleAdapter } from '@auth/drizzle-adapter';
import { database, type Queryable } from '../db/database';
import { accounts, sessions, users, verificationTokens } from '../db/schema';

/** Auth.js over our own tables. Both ways of signing in write their sessions through it. */
export const authAdapter = (db: Queryable = database()) =>
	DrizzleAdapter(db, {
		usersTable: users,
		accountsTable: accounts,
		sessionsTable: sessions,
		verificationTokensTable: verificationTokens
	});
