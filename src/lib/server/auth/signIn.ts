import { eq } from 'drizzle-orm';
import { audit } from '../context';
import { database, type Database } from '../db/database';
import { passwords, users } from '../db/schema';
import { AppError } from '../errors';
import { countSignInTry, forgiveSignInTries } from './limits';
import { verifyPassword } from './passwordHash';
import { startSession, type StartedSession, type Visitor } from './startSession';

export const normalEmail = (email: string): string => email.trim().toLowerCase();

export interface PasswordSignIn {
	email: string;
	password: string;
	visitor: Visitor;
	requestId: string;
	/** The session this browser had before; it ends. */
	replaces?: string;
}

/**
 * Signs a person in by password.
 * @throws AppError invalid: the same words, after the same work, for an unknown e-mail, a wrong
 * password and a disabled person; too-many with the time to wait
 */
export async function signInWithPassword(
	{ email, password, visitor, requestId, replaces }: PasswordSignIn,
	db: Database = database()
): Promise<StartedSession> {
	const account = `account:${normalEmail(email)}`.slice(0, 240);
	const address = `address:${visitor.address}`;
	await countSignInTry([account, address], db);
	const [found] = await db
		.select({ id: users.id, disabledAt: users.disabledAt, hash: passwords.hash })
		.from(users)
		.leftJoin(passwords, eq(passwords.userId, users.id))
		.where(eq(users.email, normalEmail(email)));
	const matches = await verifyPassword(found?.hash ?? null, password);
	if (!found || !matches || found.disabledAt) {
		throw new AppError(
			'invalid',
			'This e-mail and password do not go together. Check both, or ask for a new password.'
		);
	}
	await forgiveSignInTries(account, address, db);
	return db.transaction(async (tx) => {
		await audit(
			tx,
			{ userId: found.id, venueId: null, requestId },
			{ action: 'person.sign-in', subjectKind: 'person', subjectId: found.id }
		);
		return startSession(found.id, visitor, { replaces, db: tx });
	});
}
