import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { database, type Database } from '../db/database';
import { AppError } from '../errors';

const day = 86_400;
/** Wrong tries in a day that cost nothing, for one account and for one address. */
const free = { account: 5, address: 40 };
const longestWaitSeconds = 15 * 60;

/**
 * The wait after so many tries more than are free: 5 s, 10 s, 20 s … up to 15 minutes. It is capped,
 * so that nobody can lock a person out for good; a sign-in link by mail is not held up at all.
 */
export const waitAfter = (over: number): number =>
	Math.min(longestWaitSeconds, 5 * 2 ** Math.max(0, over - 1));

const limiters = new WeakMap<
	Database,
	{ tries: RateLimiterPostgres; waits: RateLimiterPostgres }
>();

/** Counters in rows that all app processes share. */
function limitersOf(db: Database) {
	const made = limiters.get(db);
	if (made) return made;
	const shared = {
		storeClient: '$client' in db ? db.$client : null,
		storeType: 'pool',
		tableName: 'rate_limits',
		tableCreated: true
	};
	const both = {
		tries: new RateLimiterPostgres({ ...shared, keyPrefix: 'try', points: 1e6, duration: day }),
		waits: new RateLimiterPostgres({ ...shared, keyPrefix: 'wait', points: 1, duration: 1 })
	};
	limiters.set(db, both);
	return both;
}

function tooMany(milliseconds: number): AppError {
	const waitSeconds = Math.max(1, Math.ceil(milliseconds / 1000));
	const words =
		waitSeconds < 90 ? `${waitSeconds} seconds` : `${Math.ceil(waitSeconds / 60)} minutes`;
	return new AppError(
		'too-many',
		`Too many tries went wrong. Wait ${words}, or let us mail you a link.`,
		{ waitSeconds }
	);
}

/**
 * Counts a try before its password is looked at, so that tries sent all at once count too.
 * @param subjects such as ["account:a@example.org", "address:203.0.113.5"]
 * @throws AppError too-many with the seconds to wait
 */
export async function countSignInTry(
	subjects: readonly string[],
	db: Database = database()
): Promise<void> {
	const { tries, waits } = limitersOf(db);
	for (const subject of subjects) {
		const waiting = await waits.get(subject);
		if (waiting && waiting.consumedPoints > 0) throw tooMany(waiting.msBeforeNext);
	}
	for (const subject of subjects) {
		const { consumedPoints } = await tries.consume(subject);
		const over = consumedPoints - free[subject.startsWith('account:') ? 'account' : 'address'];
		if (over <= 0) continue;
		try {
			await waits.consume(subject, 1, { customDuration: waitAfter(over) });
		} catch (refused) {
			// Another try of the same moment has taken the one place.
			if (refused instanceof RateLimiterRes) throw tooMany(refused.msBeforeNext);
			throw refused;
		}
	}
}

/**
 * After a sign-in that worked: the account starts afresh, the address gets its try back.
 * @param address null where none was counted
 */
export async function forgiveSignInTries(
	account: string,
	address: string | null,
	db: Database = database()
): Promise<void> {
	const { tries, waits } = limitersOf(db);
	await Promise.all([
		tries.delete(account),
		waits.delete(account),
		address === null ? null : tries.reward(address, 1)
	]);
}
