import { demoPassword, demoPeople, demoVenues } from '../../../local/demoPeople.js';
import type { Role } from '../../roles';
import { hashPassword } from '../auth/passwordHash';
import type { Queryable } from '../db/database';
import { memberships, passwords, users, venues } from '../db/schema';

export interface DemoHouse {
	venueId: string;
	/** The person who holds each role; missing where the venue has none. */
	users: Partial<Record<Role, { id: string; name: string }>>;
}

/** Makes the demo's venues and people, who share one password. @returns the houses in their order */
export async function seedPeople(tx: Queryable): Promise<DemoHouse[]> {
	const hash = await hashPassword(demoPassword);
	const houses: DemoHouse[] = [];
	for (const { name, timeZone } of demoVenues) {
		const [venue] = await tx.insert(venues).values({ name, timeZone }).returning();
		const house: DemoHouse = { venueId: venue.id, users: {} };
		for (const person of demoPeople.filter(({ venue }) => venue === name)) {
			const [user] = await tx
				.insert(users)
				.values({ name: person.name, email: person.email, emailVerified: new Date() })
				.returning();
			await tx.insert(passwords).values({ userId: user.id, hash });
			await tx
				.insert(memberships)
				.values({ userId: user.id, venueId: venue.id, roles: person.roles });
			for (const role of person.roles) house.users[role] = { id: user.id, name: user.name };
		}
		houses.push(house);
	}
	return houses;
}
