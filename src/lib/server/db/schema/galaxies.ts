import { index, integer, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import type { GalaxyDocument } from '../../../show/galaxy';
import type { FitRecord } from '../../../measurements/fitRecord';
import type { Measured, MeasuredPoint, RadiusUnit, SpeedUnit } from '../../../measurements/types';
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
		/** In the units below, as they came. */
		rows: jsonb().$type<MeasuredPoint[]>().notNull(),
		radiusUnit: text().$type<RadiusUnit>().notNull().default('kpc'),
		speedUnit: text().$type<SpeedUnit>().notNull().default('km/s'),
		/** Mpc. */
		distance: jsonb().$type<Measured>(),
		/** Degrees, 90 is edge-on. */
		inclination: jsonb().$type<Measured>(),
		createdAt: createdAt(),
		createdBy: uuid().references(() => users.id, { onDelete: 'set null' })
	},
	(t) => [index('measurements_galaxy').on(t.galaxyId)]
);

/** A fit that was kept: data, settings and result as they were. Never changed. */
export const fits = pgTable(
	'fits',
	{
		id: id(),
		venueId: uuid()
			.notNull()
			.references(() => venues.id, { onDelete: 'cascade' }),
		galaxyId: uuid()
			.notNull()
			.references(() => galaxies.id, { onDelete: 'cascade' }),
		measurementsId: uuid().references(() => measurements.id, { onDelete: 'set null' }),
		name: text().notNull(),
		record: jsonb().$type<FitRecord>().notNull(),
		createdAt: createdAt(),
		createdBy: uuid().references(() => users.id, { onDelete: 'set null' })
	},
	(t) => [index('fits_galaxy').on(t.galaxyId)]
);
