import { randomBytes } from 'node:crypto';
import { and, eq, or, sql } from 'drizzle-orm';
import { database, type Queryable } from '../db/database';
import { sessions } from '../db/schema';
import { authAdapter } from './adapter';
import { liveSession } from './liveSession';
import { absoluteDays } from './sessionRules';

/** The browser that asks, as far as the sessions page shows it. */
export interface Visitor {
	address: string;
	userAgent: string;
}

export interface StartedSession {
	token: string;
	expires: Date;
}

/**
 * A new session for a person, under a new token at every sign-in: a token that somebody planted or
 * saw before is worth nothing afterwards.
 * @param replaces the token this browser had, which ends
 */
export async function startSession(
	userId: string,
	visitor: Visitor,
	{ replaces, db = database() }: { replaces?: string; db?: Queryable } = {}
): Promise<StartedSession> {
	// Sessions that are over are cleared away when their person comes back.
	await db
		.delete(sessions)
		.where(
			or(
				replaces ? eq(sessions.sessionToken, replaces) : undefined,
				and(eq(sessions.userId, userId), sql`not (${liveSession()})`)
			)
		);
	const session = {
		sessionToken: randomBytes(32).toString('base64url'),
		userId,
		expires: new Date(Date.now() + absoluteDays * 86_400_000),
		userAgent: visitor.userAgent.slice(0, 400),
		address: visitor.address
	};
	const adapter = authAdapter(db);
	if (!adapter.createSession) throw new Error('The adapter keeps no sessions.');
	await adapter.createSession(session);
	return { token: session.sessionToken, expires: session.expires };
}
