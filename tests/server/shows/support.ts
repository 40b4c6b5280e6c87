import { afterAll, beforeAll } from 'vitest';
import type { Role } from '../../../src/lib/roles';
import type { Context } from '../../../src/lib/server/context';
import { connect, type Database } from '../../../src/lib/server/db/database';
import { galaxies, measurements, users, venues } from '../../../src/lib/server/db/schema';
import type { ShowDocument } from '../../../src/lib/show/document';
import { newId } from '../../../src/lib/show/editing';
import type { GalaxyDocument } from '../../../src/lib/show/galaxy';
import { galaxy, makeContent, makeScene } from '../../show/support/content';
import { freshDatabase } from '../support/database';

/** A database for one test file; read `db.current` inside tests. */
export function useDatabase(): { current: Database } {
	const held: { current: Database } = {
		get current(): Database {
			throw new Error('The database is there inside tests only.');
		}
	};
	let close = async () => {};
	beforeAll(async () => {
		const fresh = await freshDatabase();
		const { db, pool } = connect(fresh.url);
		Object.defineProperty(held, 'current', { value: db });
		close = async () => {
			await pool.end();
			await fresh.close();
		};
	});
	afterAll(() => close());
	return held;
}

/** A venue with one person in it, and the context that person acts in. */
export async function makeVenue(
	db: Database,
	roles: readonly Role[] = ['producer']
): Promise<Context> {
	const [venue] = await db
		.insert(venues)
		.values({ name: 'Test house', timeZone: 'Europe/London' })
		.returning();
	return joinVenue(db, { venueId: venue.id }, roles);
}

/** One more person in a venue. */
export async function joinVenue(
	db: Database,
	{ venueId }: { venueId: string },
	roles: readonly Role[]
): Promise<Context> {
	const id = newId();
	const [person] = await db
		.insert(users)
		.values({ name: `Person ${id.slice(0, 4)}`, email: `${id}@example.org` })
		.returning();
	return {
		userId: person.id,
		userName: person.name,
		venueId,
		venueName: 'Test house',
		timeZone: 'Europe/London',
		roles,
		requestId: 'test',
		db
	};
}

export async function makeGalaxy(
	ctx: Context,
	overrides: Partial<GalaxyDocument> = {}
): Promise<string> {
	const document = { ...galaxy, ...overrides };
	const db = ctx.db as Database;
	const [row] = await db
		.insert(galaxies)
		.values({ venueId: ctx.venueId, name: document.name, document })
		.returning();
	await db.insert(measurements).values({
		venueId: ctx.venueId,
		galaxyId: row.id,
		name: 'Speeds',
		source: 'Invented for tests.',
		rows: [{ radius: 8, speed: 210, error: 5 }]
	});
	return row.id;
}

/** A whole document of so many scenes about one galaxy. */
export function makeDocument(galaxyId: string, count = 2, title = 'Test show'): ShowDocument {
	const scenes = Array.from({ length: count }, (_, i) =>
		makeScene(i + 1, { subject: { kind: 'galaxy', galaxyId } })
	);
	return { ...makeContent(scenes).show, title };
}
