import { randomUUID } from 'node:crypto';
import { and, eq, gt, isNull } from 'drizzle-orm';
import { forgiveSignInTries } from '../auth/limits';
import { hashPassword } from '../auth/passwordHash';
import { endSessions } from '../auth/sessions';
import { normalEmail } from '../auth/signIn';
import type { Visitor } from '../auth/startSession';
import { audit } from '../context';
import { database, type Database, type Queryable } from '../db/database';
import { passwordResets, passwords, users } from '../db/schema';
import { countTry, requireTriesLeft } from '../domes/tries';
import { AppError } from '../errors';
import { mailQueue } from '../mail/mailQueue';
import { secretToken, tokenHash } from '../mail/secretTokens';
import { passwordProblem } from './passwordRules';

const resetMinutes = 60;

/**
 * Counts a wish for a mailed link: three an hour for one account, thirty for one address.
 * @returns whether a mail may go to the account; beyond that the page says the same and none goes
 * @throws AppError too-many for an address that asks for everybody
 */
export async function mayMailLink(
	email: string,
	visitor: Visitor,
	db: Database = database()
): Promise<boolean> {
	const address = { key: `link-address:${visitor.address}`, points: 30, windowSeconds: 3600 };
	await requireTriesLeft(db, address, 'Too many links were asked for from this address.');
	await countTry(db, address);
	const key = `link-account:${normalEmail(email)}`.slice(0, 240);
	return (await countTry(db, { key, points: 3, windowSeconds: 3600 })) <= 3;
}

/** Mails a link for a new password where there is such a person; says nothing about whether. */
export async function requestReset(
	{ email, visitor, requestId }: { email: string; visitor: Visitor; requestId: string },
	db: Database = database()
): Promise<void> {
	if (!(await mayMailLink(email, visitor, db))) return;
	await db.transaction(async (tx) => {
		const [person] = await tx
			.select({ id: users.id })
			.from(users)
			.where(and(eq(users.email, normalEmail(email)), isNull(users.disabledAt)));
		if (!person) return;
		const id = randomUUID();
		await tx.insert(passwordResets).values({
			id,
			userId: person.id,
			tokenHash: tokenHash(secretToken('reset', id)),
			expiresAt: new Date(Date.now() + resetMinutes * 60_000)
		});
		await mailQueue().enqueue({ kind: 'reset', id }, tx);
		await audit(
			tx,
			{ userId: person.id, venueId: null, requestId },
			{ action: 'person.ask-reset', subjectKind: 'person', subjectId: person.id }
		);
	});
}

/** Whom a link is for; null once it is used, an hour old, or its person disabled. */
export async function readReset(
	token: string,
	db: Queryable = database()
): Promise<{ id: string; userId: string; email: string; name: string } | null> {
	const [row] = await db
		.select({ id: passwordResets.id, userId: users.id, email: users.email, name: users.name })
		.from(passwordResets)
		.innerJoin(users, eq(users.id, passwordResets.userId))
		.where(
			and(
				eq(passwordResets.tokenHash, tokenHash(token)),
				isNull(passwordResets.usedAt),
				gt(passwordResets.expiresAt, new Date()),
				isNull(users.disabledAt)
			)
		);
	return row ?? null;
}

/** Writes a person's password. The caller ends sessions as fits. */
export async function writePassword(tx: Queryable, userId: string, hash: string): Promise<void> {
	await tx
		.insert(passwords)
		.values({ userId, hash })
		.onConflictDoUpdate({ target: passwords.userId, set: { hash, changedAt: new Date() } });
}

/**
 * Sets the new password, ends every session of the person and uses up every link they hold.
 * @throws AppError invalid for a password that is refused; not-found for a link that is over
 */
export async function completeReset(
	{ token, password, requestId }: { token: string; password: string; requestId: string },
	db: Database = database()
): Promise<void> {
	const gone = new AppError(
		'not-found',
		'This link was used or is older than an hour. Ask for a new one.'
	);
	const open = await readReset(token, db);
	if (!open) throw gone;
	const problem = passwordProblem(password, [open.email, open.name]);
	if (problem) throw new AppError('invalid', problem);
	const hash = await hashPassword(password);
	await db.transaction(async (tx) => {
		const used = await tx
			.update(passwordResets)
			.set({ usedAt: new Date() })
			.where(and(eq(passwordResets.userId, open.userId), isNull(passwordResets.usedAt)))
			.returning({ id: passwordResets.id });
		if (!used.some(({ id }) => id === open.id)) throw gone;
		await writePassword(tx, open.userId, hash);
		await endSessions(open.userId, { db: tx });
		await audit(
			tx,
			{ userId: open.userId, venueId: null, requestId },
			{ action: 'person.reset-password', subjectKind: 'person', subjectId: open.userId }
		);
	});
	await forgiveSignInTries(`account:${open.email}`, null, db);
}
