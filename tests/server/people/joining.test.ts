import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, test } from 'vitest';
import { readSession } from '../../../src/lib/server/auth/readSession';
import { signInWithPassword } from '../../../src/lib/server/auth/signIn';
import { startSession } from '../../../src/lib/server/auth/startSession';
import { invitations, memberships, users } from '../../../src/lib/server/db/schema';
import type { Letter } from '../../../src/lib/server/mail/Letter';
import { secretToken } from '../../../src/lib/server/mail/secretTokens';
import {
	invite,
	joinAsKnownPerson,
	joinAsNewPerson,
	listInvitations,
	readInvitation,
	resendInvitation,
	withdrawInvitation
} from '../../../src/lib/server/people';
import { joinVenue, makeVenue, useDatabase } from '../shows/support';
import { goodPassword, recordLetters, visitor } from './support';

const db = useDatabase();
let letters: Letter[] = [];
beforeAll(() => {
	letters = recordLetters();
});

let counter = 0;
const newAddress = () => `joiner-${++counter}@example.org`;
const tokenOf = (id: string) => secretToken('invitation', id);
const asNew = (token: string, password = goodPassword) =>
	joinAsNewPerson({ token, name: 'Nova Carrick', password, requestId: 'test' }, db.current);

describe('an invitation', () => {
	test('puts one letter in the queue and joins a new person with its roles, once', async () => {
		const ctx = await makeVenue(db.current, ['manager']);
		const email = newAddress();
		const id = await invite(ctx, { email: ` ${email.toUpperCase()}`.trim(), roles: ['presenter'] });
		expect(letters.filter((letter) => letter.id === id)).toEqual([{ kind: 'invitation', id }]);
		const userId = await asNew(tokenOf(id));
		const session = await signInWithPassword(
			{ email, password: goodPassword, visitor, requestId: 'test' },
			db.current
		);
		expect(await readSession(session.token, db.current)).toMatchObject({
			person: { id: userId, email },
			current: { venueId: ctx.venueId, roles: ['presenter'] }
		});
		await expect(asNew(tokenOf(id))).rejects.toMatchObject({ code: 'not-found' });
		expect(await listInvitations(ctx)).toEqual([]);
	});

	test('holds the hash of its token and never the token', async () => {
		const ctx = await makeVenue(db.current, ['manager']);
		const id = await invite(ctx, { email: newAddress(), roles: ['adviser'] });
		const [row] = await db.current.select().from(invitations).where(eq(invitations.id, id));
		expect(row.tokenHash).toMatch(/^[0-9a-f]{64}$/);
		expect(JSON.stringify(row)).not.toContain(tokenOf(id));
	});

	test('used twice at the same moment makes one person', async () => {
		const ctx = await makeVenue(db.current, ['manager']);
		const email = newAddress();
		const token = tokenOf(await invite(ctx, { email, roles: ['adviser'] }));
		const both = await Promise.allSettled([asNew(token), asNew(token)]);
		expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
		expect(await db.current.select().from(users).where(eq(users.email, email))).toHaveLength(1);
	});

	test('is over after seven days, when withdrawn, and when sent again', async () => {
		const ctx = await makeVenue(db.current, ['manager']);
		const late = await invite(ctx, { email: newAddress(), roles: ['adviser'] });
		await db.current
			.update(invitations)
			.set({ expiresAt: new Date(Date.now() - 1000) })
			.where(eq(invitations.id, late));
		expect(await readInvitation(tokenOf(late), db.current)).toBeNull();

		const taken = await invite(ctx, { email: newAddress(), roles: ['adviser'] });
		await withdrawInvitation(ctx, taken);
		expect(await readInvitation(tokenOf(taken), db.current)).toBeNull();

		const first = await invite(ctx, { email: newAddress(), roles: ['adviser'] });
		const second = await resendInvitation(ctx, first);
		expect(await readInvitation(tokenOf(first), db.current)).toBeNull();
		expect((await readInvitation(tokenOf(second), db.current))?.id).toBe(second);
	});

	test('is refused for a member, a malformed address and no role', async () => {
		const ctx = await makeVenue(db.current, ['manager']);
		const email = newAddress();
		await asNew(tokenOf(await invite(ctx, { email, roles: ['adviser'] })));
		await expect(invite(ctx, { email, roles: ['producer'] })).rejects.toMatchObject({
			code: 'conflict'
		});
		await expect(invite(ctx, { email: 'nobody', roles: ['producer'] })).rejects.toMatchObject({
			code: 'invalid'
		});
		await expect(invite(ctx, { email: newAddress(), roles: [] })).rejects.toMatchObject({
			code: 'invalid'
		});
	});

	test('a refused password uses nothing up', async () => {
		const ctx = await makeVenue(db.current, ['manager']);
		const token = tokenOf(await invite(ctx, { email: newAddress(), roles: ['adviser'] }));
		await expect(asNew(token, 'short')).rejects.toMatchObject({
			code: 'invalid',
			details: { field: 'password' }
		});
		expect(await readInvitation(token, db.current)).not.toBeNull();
	});

	test('a known person joins by being signed in, and only the invited one', async () => {
		const ctx = await makeVenue(db.current, ['manager']);
		const known = await joinVenue(db.current, await makeVenue(db.current), ['producer']);
		const stranger = await joinVenue(db.current, ctx, ['producer']);
		const [{ email }] = await db.current.select().from(users).where(eq(users.id, known.userId));
		const token = tokenOf(await invite(ctx, { email, roles: ['adviser', 'presenter'] }));
		await expect(asNew(token)).rejects.toMatchObject({ code: 'conflict' });

		const { token: cookie } = await startSession(known.userId, visitor, { db: db.current });
		const sessionId = (await readSession(cookie, db.current))?.person.sessionId ?? '';
		const enter = (userId: string) =>
			joinAsKnownPerson({ token, userId, sessionId, requestId: 'test' }, db.current);
		await expect(enter(stranger.userId)).rejects.toMatchObject({ code: 'forbidden' });
		await enter(known.userId);
		expect((await readSession(cookie, db.current))?.current).toMatchObject({
			venueId: ctx.venueId,
			roles: ['adviser', 'presenter']
		});
		const held = await db.current
			.select()
			.from(memberships)
			.where(eq(memberships.userId, known.userId));
		expect(held).toHaveLength(1);
	});
});
