import { randomUUID } from 'node:crypto';
import { and, desc, eq, isNull } from 'drizzle-orm';
import type { Role } from '../../roles';
import { audit, inTransaction, queryable, requireRole, type Context } from '../context';
import type { Queryable } from '../db/database';
import { invitations, memberships, users } from '../db/schema';
import { AppError, notFound } from '../errors';
import { mailQueue } from '../mail/mailQueue';
import { secretToken, tokenHash } from '../mail/secretTokens';
import { emailSchema, parseRoles } from './roleList';

export const invitationDays = 7;

export interface InvitationShown {
	id: string;
	email: string;
	roles: Role[];
	expiresAt: Date;
	createdAt: Date;
}

const isOpen = and(isNull(invitations.usedAt), isNull(invitations.withdrawnAt));

/** Invitations nobody has answered yet, newest first; those whose time is over too. */
export async function listInvitations(ctx: Context): Promise<InvitationShown[]> {
	requireRole(ctx, 'people.read');
	return queryable(ctx)
		.select({
			id: invitations.id,
			email: invitations.email,
			roles: invitations.roles,
			expiresAt: invitations.expiresAt,
			createdAt: invitations.createdAt
		})
		.from(invitations)
		.where(and(eq(invitations.venueId, ctx.venueId), isOpen))
		.orderBy(desc(invitations.createdAt), desc(invitations.id));
}

/** Writes an invitation and the letter that carries its link. @returns its id */
async function write(
	tx: Queryable,
	values: { venueId: string; email: string; roles: Role[]; invitedBy: string | null }
): Promise<string> {
	const id = randomUUID();
	await tx.insert(invitations).values({
		...values,
		id,
		tokenHash: tokenHash(secretToken('invitation', id)),
		expiresAt: new Date(Date.now() + invitationDays * 86_400_000)
	});
	await mailQueue().enqueue({ kind: 'invitation', id }, tx);
	return id;
}

/**
 * Invites an e-mail address to join the venue. An open invitation to the same address is replaced.
 * @throws AppError invalid for a malformed address; conflict where the person is in the venue already
 */
export async function invite(
	ctx: Context,
	input: { email: string; roles: unknown }
): Promise<string> {
	requireRole(ctx, 'people.invite');
	const email = emailSchema.safeParse(input.email);
	if (!email.success) throw new AppError('invalid', email.error.issues[0].message);
	const roles = parseRoles(input.roles);
	return inTransaction(ctx, async (tx) => {
		const [member] = await tx
			.select({ name: users.name })
			.from(memberships)
			.innerJoin(users, eq(users.id, memberships.userId))
			.where(and(eq(memberships.venueId, ctx.venueId), eq(users.email, email.data)));
		if (member) {
			throw new AppError(
				'conflict',
				`${member.name} is in this venue already. Change their roles in the list instead.`
			);
		}
		await tx
			.update(invitations)
			.set({ withdrawnAt: new Date() })
			.where(and(eq(invitations.venueId, ctx.venueId), eq(invitations.email, email.data), isOpen));
		const id = await write(tx, {
			venueId: ctx.venueId,
			email: email.data,
			roles,
			invitedBy: ctx.userId
		});
		await audit(tx, ctx, {
			action: 'invitation.send',
			subjectKind: 'invitation',
			subjectId: id,
			details: { email: email.data, roles }
		});
		return id;
	});
}

/** Makes an invitation's link worth nothing. @throws AppError not-found where it is not open here */
export async function withdrawInvitation(ctx: Context, id: string): Promise<void> {
	requireRole(ctx, 'people.invite');
	await inTransaction(ctx, async (tx) => {
		await withdraw(tx, ctx, id);
		await audit(tx, ctx, {
			action: 'invitation.withdraw',
			subjectKind: 'invitation',
			subjectId: id
		});
	});
}

/** Sends a fresh link for seven more days; the old one ends. @returns the new invitation's id */
export async function resendInvitation(ctx: Context, id: string): Promise<string> {
	requireRole(ctx, 'people.invite');
	return inTransaction(ctx, async (tx) => {
		const { email, roles } = await withdraw(tx, ctx, id);
		const fresh = await write(tx, {
			venueId: ctx.venueId,
			email,
			roles,
			invitedBy: ctx.userId
		});
		await audit(tx, ctx, {
			action: 'invitation.resend',
			subjectKind: 'invitation',
			subjectId: fresh,
			details: { replaces: id }
		});
		return fresh;
	});
}

async function withdraw(tx: Queryable, ctx: Context, id: string) {
	const [row] = await tx
		.update(invitations)
		.set({ withdrawnAt: new Date() })
		.where(and(eq(invitations.id, id), eq(invitations.venueId, ctx.venueId), isOpen))
		.returning({ email: invitations.email, roles: invitations.roles });
	if (!row) throw notFound('open invitation');
	return row;
}
