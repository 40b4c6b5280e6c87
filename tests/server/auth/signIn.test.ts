import { eq, sql } from 'drizzle-orm';
import { beforeAll, describe, expect, test } from 'vitest';
import { waitAfter } from '../../../src/lib/server/auth/limits';
import { hashPassword, verifyPassword } from '../../../src/lib/server/auth/passwordHash';
import { readSession } from '../../../src/lib/server/auth/readSession';
import { sessionCookie } from '../../../src/lib/server/auth/sessionRules';
import { listSessions } from '../../../src/lib/server/auth/sessions';
import { signInWithPassword } from '../../../src/lib/server/auth/signIn';
import { passwords, sessions, users } from '../../../src/lib/server/db/schema';
import { changePassword, endOtherSessions, endOwnSession } from '../../../src/lib/server/people';
import { makeVenue, useDatabase } from '../shows/support';
import { goodPassword, useTestEnvironment } from '../people/support';

const db = useDatabase();
let hash = '';
beforeAll(async () => {
	useTestEnvironment();
	hash = await hashPassword(goodPassword);
});

let hosts = 0;
/** Every test comes from an address of its own, so that limits do not mix. */
const newVisitor = () => ({ address: `198.51.100.${++hosts}`, userAgent: 'Test browser' });

async function newPerson() {
	const ctx = await makeVenue(db.current);
	await db.current.insert(passwords).values({ userId: ctx.userId, hash });
	const [{ email, name }] = await db.current.select().from(users).where(eq(users.id, ctx.userId));
	return { id: ctx.userId, email, name };
}

const signIn = (
	email: string,
	password = goodPassword,
	visitor = newVisitor(),
	replaces?: string
) => signInWithPassword({ email, password, visitor, requestId: 'test', replaces }, db.current);

describe('passwords', () => {
	test('are kept as argon2id with 19 MiB, two passes and one lane', async () => {
		expect(hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
		expect(await verifyPassword(hash, goodPassword)).toBe(true);
		expect(await verifyPassword(hash, `${goodPassword} `)).toBe(false);
	});

	test('an unknown account costs the same work as a known one', async () => {
		const time = async (stored: string | null) => {
			const began = performance.now();
			for (let i = 0; i < 8; i++) await verifyPassword(stored, 'something else entirely');
			return performance.now() - began;
		};
		await time(null);
		const ratio = (await time(null)) / (await time(hash));
		expect(ratio).toBeGreaterThan(0.4);
		expect(ratio).toBeLessThan(2.5);
	});
});

describe('signInWithPassword', () => {
	test('starts a session under a new token each time and ends the one it replaces', async () => {
		const { id, email } = await newPerson();
		const first = await signIn(email.toUpperCase());
		const second = await signIn(email, goodPassword, newVisitor(), first.token);
		expect(second.token).not.toBe(first.token);
		expect(second.token.length).toBeGreaterThanOrEqual(43);
		expect(await readSession(first.token, db.current)).toBeNull();
		expect((await readSession(second.token, db.current))?.person.id).toBe(id);
		const days = (second.expires.getTime() - Date.now()) / 86_400_000;
		expect(days).toBeGreaterThan(29.9);
		expect(days).toBeLessThan(30.1);
	});

	test('refuses unknown, wrong and disabled in the same words', async () => {
		const { id, email } = await newPerson();
		const said = new Set<string>();
		const refused = async (address: string, password: string) => {
			await signIn(address, password).then(
				() => said.add('let in'),
				(thrown: Error) => said.add(thrown.message)
			);
		};
		await refused(email, 'wrong wrong wrong');
		await refused('nobody-at-all@example.org', goodPassword);
		await db.current.update(users).set({ disabledAt: new Date() }).where(eq(users.id, id));
		await refused(email, goodPassword);
		expect([...said]).toEqual([expect.stringContaining('do not go together')]);
	});
});

describe('limits', () => {
	test('waits grow from 5 seconds to 15 minutes and no further', () => {
		expect([1, 2, 3, 4, 9, 50].map(waitAfter)).toEqual([5, 10, 20, 40, 900, 900]);
	});

	test('hold an account after five wrong tries, whoever asks, and let go after a wait', async () => {
		const { email } = await newPerson();
		for (let i = 0; i < 6; i++) {
			await expect(signIn(email, 'wrong wrong wrong')).rejects.toMatchObject({ code: 'invalid' });
		}
		await expect(signIn(email)).rejects.toMatchObject({ code: 'too-many' });
		await db.current.execute(
			sql`update rate_limits set expire = 1 where key = ${`wait:account:${email}`}`
		);
		await signIn(email);
		// Forgiven: the next wrong try is the first again.
		await expect(signIn(email, 'wrong wrong wrong')).rejects.toMatchObject({ code: 'invalid' });
		await signIn(email);
	});

	test('count tries that are sent all at once', async () => {
		const { email } = await newPerson();
		const all = await Promise.allSettled(
			Array.from({ length: 20 }, () => signIn(email, 'wrong wrong wrong'))
		);
		const looked = all.filter((one) => one.status === 'rejected' && one.reason.code === 'invalid');
		expect(looked.length).toBeLessThanOrEqual(6);
	});

	test('hold an address that tries many accounts', async () => {
		const visitor = newVisitor();
		const codes: string[] = [];
		for (let i = 0; i < 43; i++) {
			await signIn(`nobody-${i}@example.org`, 'x', visitor).catch((thrown) =>
				codes.push(thrown.code)
			);
		}
		expect(codes.slice(0, 40).every((code) => code === 'invalid')).toBe(true);
		expect(codes.at(-1)).toBe('too-many');
	}, 60_000);
});

describe('one’s own account', () => {
	async function signedIn() {
		const person = await newPerson();
		const { token } = await signIn(person.email);
		const sessionId = (await readSession(token, db.current))?.person.sessionId ?? '';
		return { self: { ...person, sessionId, requestId: 'test' }, token };
	}

	test('changing the password ends the other sessions and keeps this one', async () => {
		const { self, token } = await signedIn();
		const other = await signIn(self.email);
		await changePassword(
			self,
			{ current: goodPassword, password: 'nine slow barges at dusk' },
			db.current
		);
		expect(await readSession(other.token, db.current)).toBeNull();
		expect(await readSession(token, db.current)).not.toBeNull();
		await signIn(self.email, 'nine slow barges at dusk');
	});

	test('a wrong present password and a refused new one name their fields', async () => {
		const { self } = await signedIn();
		const change = (current: string, password: string) =>
			changePassword(self, { current, password }, db.current);
		await expect(change('wrong', 'nine slow barges at dusk')).rejects.toMatchObject({
			code: 'invalid',
			details: { field: 'current' }
		});
		await expect(change(goodPassword, 'short')).rejects.toMatchObject({
			code: 'invalid',
			details: { field: 'password' }
		});
	});

	test('sessions end one by one or all others, and never somebody else’s', async () => {
		const { self, token } = await signedIn();
		const other = await signedIn();
		await expect(endOwnSession(self, other.self.sessionId, db.current)).rejects.toMatchObject({
			code: 'not-found'
		});
		await signIn(self.email);
		await signIn(self.email);
		expect(await endOtherSessions(self, db.current)).toBe(2);
		await endOwnSession(self, self.sessionId, db.current);
		expect(await readSession(token, db.current)).toBeNull();
		expect(await readSession(other.token, db.current)).not.toBeNull();
	});
});

const hoursAgo = (hours: number) => new Date(Date.now() - hours * 3_600_000);

describe('readSession', () => {
	test('is null after 30 days, after 12 idle hours, and for an unknown token', async () => {
		const { email } = await newPerson();
		const { token } = await signIn(email);
		const mine = eq(sessions.sessionToken, token);
		await db.current
			.update(sessions)
			.set({ lastSeenAt: hoursAgo(11.9) })
			.where(mine);
		expect(await readSession(token, db.current)).not.toBeNull();
		// Reading it was a use.
		const [{ lastSeenAt }] = await db.current.select().from(sessions).where(mine);
		expect(Date.now() - lastSeenAt.getTime()).toBeLessThan(60_000);
		await db.current
			.update(sessions)
			.set({ lastSeenAt: hoursAgo(12.1) })
			.where(mine);
		expect(await readSession(token, db.current)).toBeNull();
		await db.current
			.update(sessions)
			.set({ lastSeenAt: new Date(), expires: hoursAgo(0.01) })
			.where(mine);
		expect(await readSession(token, db.current)).toBeNull();
		expect(await readSession('no such token', db.current)).toBeNull();
	});
});

describe('listSessions', () => {
	test('shows what would still be let in, and the next sign-in clears the rest away', async () => {
		const { id, email } = await newPerson();
		const { token: idle } = await signIn(email);
		const { token: current } = await signIn(email);
		await db.current
			.update(sessions)
			.set({ lastSeenAt: hoursAgo(12.1) })
			.where(eq(sessions.sessionToken, idle));
		const currentId = (await readSession(current, db.current))?.person.sessionId;
		expect((await listSessions(id, db.current)).map((shown) => shown.id)).toEqual([currentId]);
		await signIn(email);
		const kept = await db.current.select().from(sessions).where(eq(sessions.userId, id));
		expect(kept.map(({ sessionToken }) => sessionToken)).not.toContain(idle);
		expect(kept).toHaveLength(2);
	});
});

describe('sessionCookie', () => {
	test('is bound to this very host over https, and readable by no script either way', () => {
		const { name, options } = sessionCookie(true);
		expect(name).toMatch(/^__Host-/);
		// What the prefix demands; with anything else a browser drops the cookie.
		expect(options).toEqual({ httpOnly: true, sameSite: 'lax', path: '/', secure: true });
		expect(sessionCookie(false).name).not.toMatch(/^__/);
		expect(sessionCookie(false).options).toMatchObject({ httpOnly: true, secure: false });
	});
});
