import { and, eq } from 'drizzle-orm';
import { beforeAll, describe, expect, test } from 'vitest';
import { roles, type Role } from '../../../src/lib/roles';
import { readSession } from '../../../src/lib/server/auth/readSession';
import { startSession } from '../../../src/lib/server/auth/startSession';
import type { Context } from '../../../src/lib/server/context';
import { auditLog, memberships } from '../../../src/lib/server/db/schema';
import {
	changeRoles,
	disableMember,
	endMemberSessions,
	invite,
	listInvitations,
	listMembers,
	removeMember,
	resendInvitation,
	withdrawInvitation
} from '../../../src/lib/server/people';
import { joinVenue, makeVenue, useDatabase } from '../shows/support';
import { recordLetters, visitor } from './support';

const db = useDatabase();
beforeAll(() => void recordLetters());

const anyId = '00000000-0000-4000-8000-000000000000';
/** Every verb about people, asked for somebody who is not there. */
const verbs: Record<string, (ctx: Context) => Promise<unknown>> = {
	listMembers,
	listInvitations,
	invite: (ctx) => invite(ctx, { email: 'a@example.org', roles: ['adviser'] }),
	withdrawInvitation: (ctx) => withdrawInvitation(ctx, anyId),
	resendInvitation: (ctx) => resendInvitation(ctx, anyId),
	changeRoles: (ctx) => changeRoles(ctx, anyId, ['adviser']),
	endMemberSessions: (ctx) => endMemberSessions(ctx, anyId),
	disableMember: (ctx) => disableMember(ctx, anyId),
	removeMember: (ctx) => removeMember(ctx, anyId)
};

describe('verbs about people', () => {
	const others = roles.filter((role) => role !== 'manager');
	test.each(Object.keys(verbs).flatMap((verb) => others.map((role) => [verb, role] as const)))(
		'%s is forbidden to a %s',
		async (verb, role) => {
			const ctx = await makeVenue(db.current, [role]);
			await expect(verbs[verb](ctx)).rejects.toMatchObject({ code: 'forbidden' });
		}
	);

	test.each(['changeRoles', 'endMemberSessions', 'disableMember', 'removeMember'] as const)(
		'%s answers not-found for a person of another venue',
		async (name) => {
			const ctx = await makeVenue(db.current, ['manager']);
			const stranger = await makeVenue(db.current, ['producer']);
			const verb = {
				changeRoles: () => changeRoles(ctx, stranger.userId, ['adviser']),
				endMemberSessions: () => endMemberSessions(ctx, stranger.userId),
				disableMember: () => disableMember(ctx, stranger.userId),
				removeMember: () => removeMember(ctx, stranger.userId)
			}[name];
			await inVenue(stranger);
			await expect(verb()).rejects.toMatchObject({ code: 'not-found' });
		}
	);

	test('a list holds the people and invitations of its own venue only', async () => {
		const ctx = await member(await makeVenue(db.current, ['manager']));
		const other = await member(await makeVenue(db.current, ['manager']));
		await invite(other, { email: 'far@example.org', roles: ['adviser'] });
		expect((await listMembers(ctx)).map(({ id }) => id)).toEqual([ctx.userId]);
		expect(await listInvitations(ctx)).toEqual([]);
		const [theirs] = await listInvitations(other);
		await expect(withdrawInvitation(ctx, theirs.id)).rejects.toMatchObject({ code: 'not-found' });
	});
});

/** Writes the membership that the context stands for. */
async function inVenue(ctx: Context): Promise<void> {
	await db.current
		.insert(memberships)
		.values({ userId: ctx.userId, venueId: ctx.venueId, roles: [...ctx.roles] })
		.onConflictDoNothing();
}
async function member(ctx: Context): Promise<Context> {
	await inVenue(ctx);
	return ctx;
}
/** A manager and one more person of the same venue. */
async function house(held: Role[] = ['presenter']) {
	const manager = await member(await makeVenue(db.current, ['manager']));
	return { manager, person: await member(await joinVenue(db.current, manager, held)) };
}

describe('changeRoles', () => {
	test('changes the roles and writes who, from what and to what', async () => {
		const { manager, person } = await house();
		await changeRoles(manager, person.userId, ['technician', 'producer']);
		const found = (await listMembers(manager)).find(({ id }) => id === person.userId);
		expect(found?.roles).toEqual(['producer', 'technician']);
		const [row] = await db.current
			.select()
			.from(auditLog)
			.where(and(eq(auditLog.subjectId, person.userId), eq(auditLog.action, 'person.roles')));
		expect(row).toMatchObject({
			actorId: manager.userId,
			venueId: manager.venueId,
			details: { from: ['presenter'], to: ['producer', 'technician'] }
		});
	});

	test.each([[[]], [['emperor']], ['manager'], [null]])('refuses %j', async (input) => {
		const { manager, person } = await house();
		await expect(changeRoles(manager, person.userId, input)).rejects.toMatchObject({
			code: 'invalid'
		});
	});
});

describe('the last manager', () => {
	test('is neither removed nor made anything else', async () => {
		const { manager } = await house();
		await expect(changeRoles(manager, manager.userId, ['producer'])).rejects.toMatchObject({
			code: 'precondition'
		});
		await expect(removeMember(manager, manager.userId)).rejects.toMatchObject({
			code: 'precondition'
		});
	});

	test('a disabled manager does not count as another', async () => {
		const { manager, person } = await house(['manager']);
		await disableMember(manager, person.userId);
		await expect(removeMember(manager, manager.userId)).rejects.toMatchObject({
			code: 'precondition'
		});
	});

	test('two managers who remove each other at once leave one', async () => {
		const { manager, person } = await house(['manager']);
		const both = await Promise.allSettled([
			removeMember(manager, person.userId),
			removeMember(person, manager.userId)
		]);
		expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
	});
});

describe('disableMember', () => {
	test('puts the person out at once and lets them in again', async () => {
		const { manager, person } = await house();
		const { token } = await startSession(person.userId, visitor, { db: db.current });
		expect((await readSession(token, db.current))?.person.id).toBe(person.userId);
		await disableMember(manager, person.userId);
		expect(await readSession(token, db.current)).toBeNull();
		await disableMember(manager, person.userId, false);
		// The old session is gone for good.
		expect(await readSession(token, db.current)).toBeNull();
	});

	test('is refused for oneself and for a person of two venues', async () => {
		const { manager, person } = await house();
		await expect(disableMember(manager, manager.userId)).rejects.toMatchObject({
			code: 'precondition'
		});
		const elsewhere = await makeVenue(db.current, ['manager']);
		await inVenue({ ...person, venueId: elsewhere.venueId });
		await expect(disableMember(manager, person.userId)).rejects.toMatchObject({
			code: 'precondition'
		});
	});
});

describe('removeMember', () => {
	test('takes the venue away from an open session', async () => {
		const { manager, person } = await house();
		const { token } = await startSession(person.userId, visitor, { db: db.current });
		expect((await readSession(token, db.current))?.current?.venueId).toBe(manager.venueId);
		await removeMember(manager, person.userId);
		expect(await readSession(token, db.current)).toMatchObject({ memberships: [], current: null });
	});
});
