import { index, integer, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import type { GalaxyDocument } from '../../../show/galaxy';
import type { MeasuredPoint } from '../../../measurements/types';
import { createdAt, id, moment, updatedAt } from '../columns';
import { users, venues } from './people';

/** A mass model with its look and its sources. `revision` rises by one with every save. */
export const galaxies = pgTable(
	'galaxies',
	{
		id: id(),
		venueId: uuid()
			.notNull()
			.references(() => venues.id, { onDelete: 'cascade' }),
		name: text().notNull(),
		document: jsonb().$type<GalaxyDocument>().notNull(),
		revision: integer().notNull().default(1),
		updatedAt: updatedAt(),
		updatedBy: uuid().references(() => users.id, { onDelete: 'set null' }),
		createdAt: createdAt(),
		archivedAt: moment()
	},
	(t) => [index('galaxies_venue').on(t.venueId)]
);

/** A table of observed speeds with a source, belonging to a galaxy. */
export const measurements = pgTable(
	'measurements',
	{
		id: id(),
		venueId: uuid()
			.notNull()
			.references(() => venues.id, { onDelete: 'cascade' }),
		galaxyId: uuid()
			.notNull()
			.references(() => galaxies.id, { onDelete: 'cascade' }),
		name: text().notNull(),
		/** Citation, or for invented data a plain statement that it is invented. */
		source: text().notNull(),
		rows: jsonb().$type<MeasuredPoint[]>().notNull(),
		createdAt: createdAt(),
		createdBy: uuid().references(() => users.id, { onDelete: 'set null' })
	},
	(t) => [index('measurements_galaxy').on(t.galaxyId)]
);
