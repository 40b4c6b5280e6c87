import { and, asc, eq, isNull, ne, sql } from 'drizzle-orm';
import type { Role } from '../../roles';
import { queryable, requireRole, type Context } from '../context';
import type { Queryable } from '../db/database';
import { memberships, sessions, users } from '../db/schema';
import { liveSession } from '../auth/liveSession';
import { AppError, notFound } from '../errors';

export interface Member {
	id: string;
	name: string;
	email: string;
	roles: Role[];
	disabledAt: Date | null;
	since: Date;
	/** When one of their sessions was last used. */
	lastSeenAt: Date | null;
	openSessions: number;
}

/** People of the venue by name. */
export async function listMembers(ctx: Context): Promise<Member[]> {
	requireRole(ctx, 'people.read');
	const mine = sql`from ${sessions} where ${sessions.userId} = ${users.id}`;
	return queryable(ctx)
		.select({
			id: users.id,
			name: users.name,
			email: users.email,
			roles: memberships.roles,
			disabledAt: users.disabledAt,
			since: memberships.createdAt,
			lastSeenAt: sql<Date | null>`(select max(${sessions.lastSeenAt}) ${mine})`.mapWith(
				sessions.lastSeenAt
			),
			openSessions: sql<number>`(select count(*)::int ${mine} and ${liveSession()})`
		})
		.from(memberships)
		.innerJoin(users, eq(users.id, memberships.userId))
		.where(eq(memberships.venueId, ctx.venueId))
		.orderBy(asc(users.name), asc(users.id));
}

export interface MemberForChange {
	id: string;
	name: string;
	roles: Role[];
	disabledAt: Date | null;
}

/**
 * One member, with all memberships of the venue locked until the transaction ends, so that two
 * managers cannot each remove the other.
 * @throws AppError not-found also for a person of another venue
 */
export async function memberForChange(
	tx: Queryable,
	venueId: string,
	userId: string
): Promise<MemberForChange> {
	await tx
		.select({ userId: memberships.userId })
		.from(memberships)
		.where(eq(memberships.venueId, venueId))
		.orderBy(asc(memberships.userId))
		.for('update');
	const [member] = await tx
		.select({
			id: users.id,
			name: users.name,
			roles: memberships.roles,
			disabledAt: users.disabledAt
		})
		.from(memberships)
		.innerJoin(users, eq(users.id, memberships.userId))
		.where(and(eq(memberships.venueId, venueId), eq(memberships.userId, userId)));
	if (!member) throw notFound('person');
	return member;
}

/** @throws AppError precondition where nobody else could look after the venue */
export async function requireOtherManager(
	tx: Queryable,
	venueId: string,
	userId: string
): Promise<void> {
	const [other] = await tx
		.select({ id: users.id })
		.from(memberships)
		.innerJoin(users, eq(users.id, memberships.userId))
		.where(
			and(
				eq(memberships.venueId, venueId),
				ne(memberships.userId, userId),
				isNull(users.disabledAt),
				sql`'manager' = any(${memberships.roles})`
			)
		)
		.limit(1);
	if (other) return;
	throw new AppError(
		'precondition',
		'This is the only manager of the venue. Make somebody else a manager first.'
	);
}
