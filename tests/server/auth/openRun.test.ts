import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { readSession } from '../../../src/lib/server/auth/readSession';
import { startSession } from '../../../src/lib/server/auth/startSession';
import { domes, runs, sessions } from '../../../src/lib/server/db/schema';
import { createShow, freezeEdition, saveShow } from '../../../src/lib/server/shows';
import { makeDocument, makeGalaxy, makeVenue, useDatabase } from '../shows/support';
import { visitor } from '../people/support';

const db = useDatabase();

test('an open run keeps its presenter’s idle session, and its end lets it go', async () => {
	const ctx = await makeVenue(db.current, ['manager']);
	const id = await createShow(ctx, { title: 'Night' });
	const document = makeDocument(await makeGalaxy(ctx));
	await saveShow(ctx, { id, document, baseRevision: 1 });
	const edition = await freezeEdition(ctx, { showId: id });
	const [dome] = await db.current
		.insert(domes)
		.values({ venueId: ctx.venueId, name: 'Dome', diameterMetres: 10, seats: 50 })
		.returning();
	const [run] = await db.current
		.insert(runs)
		.values({
			venueId: ctx.venueId,
			editionId: edition.id,
			domeId: dome.id,
			startedBy: ctx.userId
		})
		.returning();
	const { token } = await startSession(ctx.userId, visitor, { db: db.current });
	const idle = () =>
		db.current
			.update(sessions)
			.set({ lastSeenAt: new Date(Date.now() - 13 * 3_600_000) })
			.where(eq(sessions.sessionToken, token));
	await idle();
	expect(await readSession(token, db.current)).not.toBeNull();
	await db.current.update(runs).set({ endedAt: new Date() }).where(eq(runs.id, run.id));
	await idle();
	expect(await readSession(token, db.current)).toBeNull();
});
