import { randomUUID } from 'node:crypto';
import type { Context } from '../../../src/lib/server/context';
import { connect, type Database } from '../../../src/lib/server/db/database';
import {
	domes,
	editions,
	memberships,
	shows,
	users,
	venues
} from '../../../src/lib/server/db/schema';
import type { Role } from '../../../src/lib/roles';
import type { EditionContent } from '../../../src/lib/show/edition';
import { makeContent, makeScene, uuid } from '../../show/support/content';
import { freshDatabase } from '../support/database';

export const controlId = uuid(501);

/** Three scenes that wait for the presenter; the second has a live control of 0 to 2, resting at 1. */
export const content: EditionContent = makeContent([
	makeScene(1),
	makeScene(2, {
		controls: [
			{
				id: controlId,
				label: 'Halo mass',
				target: { kind: 'halo-factor' },
				min: 0,
				max: 2,
				rest: 1
			}
		]
	}),
	makeScene(3)
]);
export const sceneIds = content.show.scenes.map((scene) => scene.id);

/** A database with its pool; `close` drops it. */
export async function openDatabase() {
	const fresh = await freshDatabase();
	const { db, pool } = connect(fresh.url);
	const close = async () => {
		await pool.end();
		await fresh.close();
	};
	return { db, url: fresh.url, close };
}

export async function makeVenue(db: Database, name = 'Venue') {
	const [venue] = await db.insert(venues).values({ name, timeZone: 'Europe/London' }).returning();
	return venue;
}

/** A new person with roles in a venue, as verbs see them. */
export async function contextFor(
	db: Database,
	venue: { id: string; name: string },
	roles: Role[]
): Promise<Context> {
	const name = `${roles.join(' and ')} of ${venue.name}`;
	const [user] = await db
		.insert(users)
		.values({ name, email: `${randomUUID()}@example.org` })
		.returning();
	await db.insert(memberships).values({ userId: user.id, venueId: venue.id, roles });
	return {
		userId: user.id,
		userName: name,
		venueId: venue.id,
		venueName: venue.name,
		timeZone: 'Europe/London',
		roles,
		requestId: 'test',
		db
	};
}

export async function makeDome(db: Database, venueId: string, name = 'Great Dome') {
	const [dome] = await db
		.insert(domes)
		.values({ venueId, name, diameterMetres: 12, seats: 80 })
		.returning();
	return dome;
}

export async function makeEdition(db: Database, venueId: string, of: EditionContent = content) {
	const [show] = await db
		.insert(shows)
		.values({
			venueId,
			title: of.show.title,
			audience: of.show.audience,
			lengthSeconds: 180,
			document: of.show
		})
		.returning();
	const [edition] = await db
		.insert(editions)
		.values({ venueId, showId: show.id, number: 1, content: of, hash: 'ab'.repeat(32) })
		.returning();
	return edition;
}
