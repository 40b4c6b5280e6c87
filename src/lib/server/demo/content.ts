import type { Role } from '../../roles';
import type { Context } from '../context';
import type { Queryable } from '../db/database';
import { domes, shows } from '../db/schema';
import { freezeEdition } from '../shows/freezeEdition';
import { listColumns } from '../shows/createShow';
import { seedGalaxies } from './galaxies';
import { demoShow } from './show';

export interface DemoVenue {
	venueId: string;
	users: Record<Role, { id: string; name: string }>;
}

/** Fills the first demo venue: two domes, three galaxies, the show and its first edition. */
export async function seedContent(tx: Queryable, { venueId, users }: DemoVenue): Promise<void> {
	await tx.insert(domes).values([
		{ venueId, name: 'Great Dome', diameterMetres: 12, seats: 96, tiltDegrees: 10, filmSize: 2048 },
		{ venueId, name: 'Travelling Dome', diameterMetres: 5, seats: 30, filmSize: 1024 }
	]);
	const producer = users.producer;
	const document = demoShow(await seedGalaxies(tx, { venueId, userId: producer.id }));
	const [show] = await tx
		.insert(shows)
		.values({ ...listColumns(document), venueId, document, updatedBy: producer.id })
		.returning({ id: shows.id });
	// Frozen by the verb itself, so that the demo meets every check a real show meets.
	const ctx: Context = {
		userId: producer.id,
		userName: producer.name,
		venueId,
		venueName: '',
		timeZone: 'Europe/London',
		roles: ['producer'],
		requestId: 'demo',
		tx
	};
	await freezeEdition(ctx, { showId: show.id, note: 'First edition, ready to run.' });
}
