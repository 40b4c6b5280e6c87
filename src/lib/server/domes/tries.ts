import { sql } from 'drizzle-orm';
import type { Queryable } from '../db/database';
import { AppError } from '../errors';

export interface TryLimit {
	/** What is counted, with who: "pairing:<user>". */
	key: string;
	points: number;
	windowSeconds: number;
}

/** How many points of the window are used. */
async function used(db: Queryable, key: string): Promise<{ points: number; waitSeconds: number }> {
	const now = Date.now();
	const { rows } = await db.execute<{ points: number; expire: string }>(
		sql`select points, expire from rate_limits where key = ${key} and expire > ${now}`
	);
	const row = rows[0];
	if (!row) return { points: 0, waitSeconds: 0 };
	return { points: row.points, waitSeconds: Math.ceil((Number(row.expire) - now) / 1000) };
}

/**
 * Counts one try, in a row that all app processes share.
 * @returns tries used, this one counted. Give it the database and not a transaction: the count must
 * stay where the work around it fails.
 */
export async function countTry(db: Queryable, limit: TryLimit): Promise<number> {
	const now = Date.now();
	const expire = now + limit.windowSeconds * 1000;
	const { rows } = await db.execute<{ points: number }>(sql`
		insert into rate_limits as r (key, points, expire) values (${limit.key}, 1, ${expire})
		on conflict (key) do update set
			points = case when r.expire > ${now} then r.points + 1 else 1 end,
			expire = case when r.expire > ${now} then r.expire else ${expire} end
		returning points`);
	return rows[0].points;
}

/** @throws AppError too-many once the points of the window are used, with the time to wait */
export async function requireTriesLeft(db: Queryable, limit: TryLimit, what: string) {
	const { points, waitSeconds } = await used(db, limit.key);
	if (points < limit.points) return;
	const minutes = Math.max(1, Math.ceil(waitSeconds / 60));
	throw new AppError(
		'too-many',
		`${what} Wait ${minutes} ${minutes === 1 ? 'minute' : 'minutes'} and try again.`,
		{ waitSeconds }
	);
}

/** Gives a counted try back, where what was tried turned out right or was not a try at all. */
export async function giveBackTry(db: Queryable, { key }: TryLimit): Promise<void> {
	await db.execute(sql`update rate_limits set points = greatest(points - 1, 0) where key = ${key}`);
}
