import { and, desc, eq, ne } from 'drizzle-orm';
import { database, type Queryable } from '../db/database';
import { sessions } from '../db/schema';
import { liveSession } from './liveSession';

/** A session as its person sees it: never the token. */
export interface SessionShown {
	id: string;
	createdAt: Date;
	lastSeenAt: Date;
	userAgent: string;
	address: string;
}

/** Sessions of a person that are not over, last used first. */
export const listSessions = (userId: string, db: Queryable = database()): Promise<SessionShown[]> =>
	db
		.select({
			id: sessions.id,
			createdAt: sessions.createdAt,
			lastSeenAt: sessions.lastSeenAt,
			userAgent: sessions.userAgent,
			address: sessions.address
		})
		.from(sessions)
		.where(and(eq(sessions.userId, userId), liveSession()))
		.orderBy(desc(sessions.lastSeenAt));

/** Signing out: the token is worth nothing from here on. */
export async function endSessionByToken(token: string, db: Queryable = database()): Promise<void> {
	await db.delete(sessions).where(eq(sessions.sessionToken, token));
}

/** Ends one session of a person. @returns whether there was one */
export async function endSession(
	userId: string,
	id: string,
	db: Queryable = database()
): Promise<boolean> {
	const gone = await db
		.delete(sessions)
		.where(and(eq(sessions.userId, userId), eq(sessions.id, id)))
		.returning({ id: sessions.id });
	return gone.length > 0;
}

/** Ends all sessions of a person, or all but one. @returns how many */
export async function endSessions(
	userId: string,
	{ except, db = database() }: { except?: string; db?: Queryable } = {}
): Promise<number> {
	const gone = await db
		.delete(sessions)
		.where(and(eq(sessions.userId, userId), except ? ne(sessions.id, except) : undefined))
		.returning({ id: sessions.id });
	return gone.length;
}
