import { sql } from 'drizzle-orm';
import { roles, type Role } from '../../roles';
import { database, type Database } from '../db/database';
import { venues } from '../db/schema';
import { seedContent } from './content';
import { seedPeople, type DemoHouse } from './people';

/** The content is credited to a person of each role, so the first venue must have them all. */
function everyRole(house: DemoHouse): Record<Role, { id: string; name: string }> {
	const entries = roles.map((role) => {
		const user = house.users[role];
		if (!user) throw new Error(`The first demo venue has no ${role}.`);
		return [role, user];
	});
	return Object.fromEntries(entries);
}

/**
 * Fills a database that holds no venue with the demo, in one transaction.
 * @returns whether it did; a second process that starts at the same moment waits and finds it done
 */
export async function seedDemo(db: Database = database()): Promise<boolean> {
	return db.transaction(async (tx) => {
		await tx.execute(sql`select pg_advisory_xact_lock(20181)`);
		const [existing] = await tx.select({ id: venues.id }).from(venues).limit(1);
		if (existing) return false;
		const [first] = await seedPeople(tx);
		await seedContent(tx, { venueId: first.venueId, users: everyRole(first) });
		return true;
	});
}
