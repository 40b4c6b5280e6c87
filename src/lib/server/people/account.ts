import { and, eq } from 'drizzle-orm';
import { countSignInTry, forgiveSignInTries } from '../auth/limits';
import { hashPassword, verifyPassword } from '../auth/passwordHash';
import { endSession, endSessions } from '../auth/sessions';
import { audit } from '../context';
import { database, type Database } from '../db/database';
import { memberships, passwords, sessions } from '../db/schema';
import { AppError, notFound } from '../errors';
import { passwordProblem } from './passwordRules';
import { writePassword } from './resets';

/** The signed-in person, acting on their own account; no venue is needed. */
export interface Self {
	id: string;
	name: string;
	email: string;
	sessionId: string;
	requestId: string;
}

const by = ({ id, requestId }: Self) => ({ userId: id, venueId: null, requestId });

/**
 * Changes one's password and ends one's other sessions.
 * @throws AppError invalid with details.field "current" or "password"; too-many after wrong tries
 */
export async function changePassword(
	self: Self,
	{ current, password }: { current: string; password: string },
	db: Database = database()
): Promise<void> {
	const problem = passwordProblem(password, [self.email, self.name]);
	if (problem) throw new AppError('invalid', problem, { field: 'password' });
	const account = `account:${self.email}`.slice(0, 240);
	await countSignInTry([account], db);
	const [held] = await db
		.select({ hash: passwords.hash })
		.from(passwords)
		.where(eq(passwords.userId, self.id));
	if (!(await verifyPassword(held?.hash ?? null, current))) {
		throw new AppError('invalid', 'This is not your present password.', { field: 'current' });
	}
	await forgiveSignInTries(account, null, db);
	const hash = await hashPassword(password);
	await db.transaction(async (tx) => {
		await writePassword(tx, self.id, hash);
		await endSessions(self.id, { except: self.sessionId, db: tx });
		await audit(tx, by(self), {
			action: 'person.change-password',
			subjectKind: 'person',
			subjectId: self.id
		});
	});
}

/** Ends one of one's sessions. @throws AppError not-found where it is over or somebody else's */
export async function endOwnSession(
	self: Self,
	sessionId: string,
	db: Database = database()
): Promise<void> {
	await db.transaction(async (tx) => {
		if (!(await endSession(self.id, sessionId, tx))) {
			throw new AppError('not-found', 'This session is over already.');
		}
		await audit(tx, by(self), {
			action: 'person.end-session',
			subjectKind: 'session',
			subjectId: sessionId
		});
	});
}

/** Ends all of one's sessions but this one. @returns how many */
export async function endOtherSessions(self: Self, db: Database = database()): Promise<number> {
	return db.transaction(async (tx) => {
		const ended = await endSessions(self.id, { except: self.sessionId, db: tx });
		await audit(tx, by(self), {
			action: 'person.end-sessions',
			subjectKind: 'person',
			subjectId: self.id,
			details: { ended }
		});
		return ended;
	});
}

/** Goes on in another of one's venues. @throws AppError not-found for a venue one is not in */
export async function switchVenue(
	self: Self,
	venueId: string,
	db: Database = database()
): Promise<void> {
	const [held] = await db
		.select({ venueId: memberships.venueId })
		.from(memberships)
		.where(and(eq(memberships.userId, self.id), eq(memberships.venueId, venueId)));
	if (!held) throw notFound('venue');
	await db
		.update(sessions)
		.set({ venueId })
		.where(and(eq(sessions.id, self.sessionId), eq(sessions.userId, self.id)));
}
