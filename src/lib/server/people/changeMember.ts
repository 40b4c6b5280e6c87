import { and, eq, ne } from 'drizzle-orm';
import { endSessions } from '../auth/sessions';
import { audit, inTransaction, requireRole, type Context } from '../context';
import type { Queryable } from '../db/database';
import { memberships, sessions, users } from '../db/schema';
import { AppError } from '../errors';
import { memberForChange, requireOtherManager, type MemberForChange } from './members';
import { parseRoles } from './roleList';

/** Checks the role, finds and locks the member, does the work and writes the audit row. */
async function changing(
	ctx: Context,
	userId: string,
	action: string,
	work: (tx: Queryable, member: MemberForChange) => Promise<Record<string, unknown> | void>
): Promise<void> {
	requireRole(ctx, 'people.change');
	await inTransaction(ctx, async (tx) => {
		const member = await memberForChange(tx, ctx.venueId, userId);
		const details = (await work(tx, member)) ?? {};
		await audit(tx, ctx, { action, subjectKind: 'person', subjectId: userId, details });
	});
}

/** Gives a member other roles in this venue. They count from the person's next request. */
export const changeRoles = (ctx: Context, userId: string, input: unknown): Promise<void> =>
	changing(ctx, userId, 'person.roles', async (tx, member) => {
		const roles = parseRoles(input);
		if (member.roles.includes('manager') && !roles.includes('manager')) {
			await requireOtherManager(tx, ctx.venueId, userId);
		}
		await tx
			.update(memberships)
			.set({ roles })
			.where(and(eq(memberships.userId, userId), eq(memberships.venueId, ctx.venueId)));
		return { from: member.roles, to: roles };
	});

/** Signs a member out everywhere. */
export const endMemberSessions = (ctx: Context, userId: string): Promise<void> =>
	changing(ctx, userId, 'person.end-sessions', async (tx) => ({
		ended: await endSessions(userId, { db: tx })
	}));

/**
 * Keeps a person from signing in and puts them out at once, or lets them in again. It holds
 * everywhere, so a manager may do it only to people who are in no other venue.
 */
export const disableMember = (ctx: Context, userId: string, disabled = true): Promise<void> =>
	changing(ctx, userId, disabled ? 'person.disable' : 'person.enable', async (tx, member) => {
		if (userId === ctx.userId) {
			throw new AppError('precondition', 'You cannot disable yourself. Ask another manager.');
		}
		const [elsewhere] = await tx
			.select({ venueId: memberships.venueId })
			.from(memberships)
			.where(and(eq(memberships.userId, userId), ne(memberships.venueId, ctx.venueId)))
			.limit(1);
		if (elsewhere) {
			throw new AppError(
				'precondition',
				`${member.name} works in another venue too. Remove them from this one instead.`
			);
		}
		if (disabled && member.roles.includes('manager')) {
			await requireOtherManager(tx, ctx.venueId, userId);
		}
		await tx
			.update(users)
			.set({ disabledAt: disabled ? new Date() : null })
			.where(eq(users.id, userId));
		if (disabled) await endSessions(userId, { db: tx });
	});

/** Takes a member out of the venue. Their shows and logs stay. */
export const removeMember = (ctx: Context, userId: string): Promise<void> =>
	changing(ctx, userId, 'person.remove', async (tx, member) => {
		if (member.roles.includes('manager')) await requireOtherManager(tx, ctx.venueId, userId);
		await tx
			.delete(memberships)
			.where(and(eq(memberships.userId, userId), eq(memberships.venueId, ctx.venueId)));
		await tx
			.update(sessions)
			.set({ venueId: null })
			.where(and(eq(sessions.userId, userId), eq(sessions.venueId, ctx.venueId)));
		return { roles: member.roles };
	});
