import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, test } from 'vitest';
import { readSession } from '../../../src/lib/server/auth/readSession';
import { signInWithPassword } from '../../../src/lib/server/auth/signIn';
import { startSession } from '../../../src/lib/server/auth/startSession';
import { passwordResets, users } from '../../../src/lib/server/db/schema';
import type { Letter } from '../../../src/lib/server/mail/Letter';
import { secretToken } from '../../../src/lib/server/mail/secretTokens';
import { completeReset, readReset, requestReset } from '../../../src/lib/server/people';
import { makeVenue, useDatabase } from '../shows/support';
import { goodPassword, recordLetters } from './support';

const db = useDatabase();
let letters: Letter[] = [];
beforeAll(() => {
	letters = recordLetters();
});
let hosts = 0;
const newVisitor = () => ({ address: `192.0.2.${++hosts}`, userAgent: 'Test browser' });

async function newPerson() {
	const { userId } = await makeVenue(db.current);
	const [{ email }] = await db.current.select().from(users).where(eq(users.id, userId));
	return { userId, email };
}
/** Asks for a reset. @returns the token in its mail, or null where none went out */
async function ask(email: string, visitor = newVisitor()): Promise<string | null> {
	const before = letters.length;
	await requestReset({ email, visitor, requestId: 'test' }, db.current);
	const letter = letters.at(before);
	return letter ? secretToken('reset', letter.id) : null;
}
const complete = (token: string, password = goodPassword) =>
	completeReset({ token, password, requestId: 'test' }, db.current);

describe('a password reset', () => {
	test('sets the password once and ends every session and every other link', async () => {
		const { userId, email } = await newPerson();
		const session = await startSession(userId, newVisitor(), { db: db.current });
		const first = (await ask(email)) ?? '';
		const second = (await ask(email)) ?? '';
		await complete(second);
		expect(await readSession(session.token, db.current)).toBeNull();
		await expect(complete(second)).rejects.toMatchObject({ code: 'not-found' });
		await expect(complete(first)).rejects.toMatchObject({ code: 'not-found' });
		await signInWithPassword(
			{ email, password: goodPassword, visitor: newVisitor(), requestId: 'test' },
			db.current
		);
	});

	test('is over after one hour and for a disabled person', async () => {
		const { userId, email } = await newPerson();
		const token = (await ask(email)) ?? '';
		expect((await readReset(token, db.current))?.userId).toBe(userId);
		await db.current.update(users).set({ disabledAt: new Date() }).where(eq(users.id, userId));
		expect(await readReset(token, db.current)).toBeNull();
		expect(await ask(email)).toBeNull();
		await db.current.update(users).set({ disabledAt: null }).where(eq(users.id, userId));
		await db.current
			.update(passwordResets)
			.set({ expiresAt: new Date(Date.now() - 1000) })
			.where(eq(passwordResets.userId, userId));
		expect(await readReset(token, db.current)).toBeNull();
	});

	test('a refused password keeps the link', async () => {
		const { email } = await newPerson();
		const token = (await ask(email)) ?? '';
		await expect(complete(token, 'passwordpassword1')).rejects.toMatchObject({ code: 'invalid' });
		await complete(token);
	});

	test('mails nothing for an unknown address, and three an hour for a known one', async () => {
		expect(await ask('nobody-here@example.org')).toBeNull();
		const { email } = await newPerson();
		const tokens = [];
		for (let i = 0; i < 4; i++) tokens.push(await ask(email));
		expect(tokens.map(Boolean)).toEqual([true, true, true, false]);
	});

	test('an address that asks for everybody has to wait', async () => {
		const visitor = newVisitor();
		for (let i = 0; i < 30; i++) await ask(`nobody-${i}@example.org`, visitor);
		await expect(ask('one-more@example.org', visitor)).rejects.toMatchObject({ code: 'too-many' });
	});
});
