import { and, eq, gt, isNull } from 'drizzle-orm';
import { z } from 'zod';
import { roles as allRoles, type Role } from '../../roles';
import { hashPassword } from '../auth/passwordHash';
import { audit } from '../context';
import { database, type Database, type Queryable } from '../db/database';
import { invitations, memberships, passwords, sessions, users, venues } from '../db/schema';
import { AppError } from '../errors';
import { tokenHash } from '../mail/secretTokens';
import { passwordProblem } from './passwordRules';

export interface OpenInvitation {
	id: string;
	email: string;
	roles: Role[];
	venueId: string;
	venueName: string;
	/** The person who has this address already; they join by signing in. */
	userId: string | null;
}

/** What a link stands for; null once it is used, withdrawn or over. */
export async function readInvitation(
	token: string,
	db: Queryable = database()
): Promise<OpenInvitation | null> {
	const [row] = await db
		.select({
			id: invitations.id,
			email: invitations.email,
			roles: invitations.roles,
			venueId: invitations.venueId,
			venueName: venues.name,
			userId: users.id
		})
		.from(invitations)
		.innerJoin(venues, eq(venues.id, invitations.venueId))
		.leftJoin(users, eq(users.email, invitations.email))
		.where(
			and(
				eq(invitations.tokenHash, tokenHash(token)),
				isNull(invitations.usedAt),
				isNull(invitations.withdrawnAt),
				gt(invitations.expiresAt, new Date())
			)
		);
	return row ?? null;
}

const goneMessage =
	'This link was used, withdrawn, or is older than seven days. Ask the manager for a new one.';

/** Uses the link up. The condition settles a race: one of two gets the row. */
async function use(tx: Queryable, token: string): Promise<OpenInvitation> {
	const invitation = await readInvitation(token, tx);
	const [used] = invitation
		? await tx
				.update(invitations)
				.set({ usedAt: new Date() })
				.where(
					and(
						eq(invitations.id, invitation.id),
						isNull(invitations.usedAt),
						isNull(invitations.withdrawnAt)
					)
				)
				.returning({ id: invitations.id })
		: [];
	if (!invitation || !used) throw new AppError('not-found', goneMessage);
	return invitation;
}

async function enter(
	tx: Queryable,
	{ id, venueId, roles }: OpenInvitation,
	userId: string,
	requestId: string
): Promise<void> {
	const [held] = await tx
		.select({ roles: memberships.roles })
		.from(memberships)
		.where(and(eq(memberships.userId, userId), eq(memberships.venueId, venueId)));
	const both = allRoles.filter((role) => roles.includes(role) || held?.roles.includes(role));
	await tx
		.insert(memberships)
		.values({ userId, venueId, roles: both })
		.onConflictDoUpdate({
			target: [memberships.userId, memberships.venueId],
			set: { roles: both }
		});
	await audit(
		tx,
		{ userId, venueId, requestId },
		{
			action: 'person.join',
			subjectKind: 'person',
			subjectId: userId,
			details: { invitation: id, roles }
		}
	);
}

const nameSchema = z
	.string()
	.trim()
	.min(1, 'Write your name as colleagues know it.')
	.max(120, 'Use at most 120 characters.');

/**
 * Makes an account for the invited address and joins. Having the mail proves the address.
 * @returns the new person's id
 * @throws AppError invalid (details.field says where), not-found for a link that is over, conflict
 * where the address has an account already
 */
export async function joinAsNewPerson(
	input: { token: string; name: string; password: string; requestId: string },
	db: Database = database()
): Promise<string> {
	const name = nameSchema.safeParse(input.name);
	if (!name.success) {
		throw new AppError('invalid', name.error.issues[0].message, { field: 'name' });
	}
	const open = await readInvitation(input.token, db);
	if (!open) throw new AppError('not-found', goneMessage);
	const problem = passwordProblem(input.password, [open.email, name.data, open.venueName]);
	if (problem) throw new AppError('invalid', problem, { field: 'password' });
	const hash = await hashPassword(input.password);
	return db.transaction(async (tx) => {
		const invitation = await use(tx, input.token);
		const [person] = await tx
			.insert(users)
			.values({ name: name.data, email: invitation.email, emailVerified: new Date() })
			.onConflictDoNothing()
			.returning({ id: users.id });
		if (!person) {
			throw new AppError('conflict', 'This e-mail has an account already. Sign in to join.');
		}
		await tx.insert(passwords).values({ userId: person.id, hash });
		await enter(tx, invitation, person.id, input.requestId);
		return person.id;
	});
}

/** A person who is signed in joins one more venue, and goes on working in it. */
export async function joinAsKnownPerson(
	input: { token: string; userId: string; sessionId: string; requestId: string },
	db: Database = database()
): Promise<void> {
	await db.transaction(async (tx) => {
		const invitation = await use(tx, input.token);
		if (invitation.userId !== input.userId) {
			throw new AppError(
				'forbidden',
				`This invitation is for ${invitation.email}. Sign out, and open the link again.`
			);
		}
		await enter(tx, invitation, input.userId, input.requestId);
		await tx
			.update(sessions)
			.set({ venueId: invitation.venueId })
			.where(and(eq(sessions.id, input.sessionId), eq(sessions.userId, input.userId)));
	});
}
