import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Role } from '../../roles';
import { database, type Queryable } from '../db/database';
import { memberships, sessions, users, venues } from '../db/schema';
import { liveSession } from './liveSession';
import { seenEverySeconds } from './sessionRules';

export interface SignedIn {
	person: { id: string; name: string; email: string; sessionId: string };
	/** Venues in which the person holds a role, by name. */
	memberships: { venueId: string; venueName: string; timeZone: string; roles: Role[] }[];
	/** The one the person works in; null without any membership. */
	current: SignedIn['memberships'][number] | null;
}

/**
 * Who a session token stands for; null where it is unknown, over, or its person is disabled.
 * Notes that the session was used.
 */
export async function readSession(
	token: string,
	db: Queryable = database()
): Promise<SignedIn | null> {
	const rows = await db
		.select({
			session: sessions,
			name: users.name,
			email: users.email,
			roles: memberships.roles,
			venue: venues
		})
		.from(sessions)
		.innerJoin(users, eq(users.id, sessions.userId))
		.leftJoin(memberships, eq(memberships.userId, users.id))
		.leftJoin(venues, eq(venues.id, memberships.venueId))
		.where(and(eq(sessions.sessionToken, token), liveSession(), isNull(users.disabledAt)))
		.orderBy(asc(venues.name), asc(venues.id));
	if (rows.length === 0) return null;
	const [{ session, name, email }] = rows;
	if (Date.now() - session.lastSeenAt.getTime() > seenEverySeconds * 1000) {
		await db
			.update(sessions)
			.set({ lastSeenAt: new Date() })
			.where(eq(sessions.sessionToken, token));
	}
	const held = rows.flatMap(({ venue, roles }) =>
		venue && roles
			? [{ venueId: venue.id, venueName: venue.name, timeZone: venue.timeZone, roles }]
			: []
	);
	return {
		person: { id: session.userId, name, email, sessionId: session.id },
		memberships: held,
		current: held.find((m) => m.venueId === session.venueId) ?? held.at(0) ?? null
	};
}
