import { sql } from 'drizzle-orm';
import { timestamp, uuid } from 'drizzle-orm/pg-core';

/** UUID primary key made by the database. */
export const id = () =>
	uuid()
		.primaryKey()
		.default(sql`gen_random_uuid()`);

/** timestamptz as a Date. */
export const moment = () => timestamp({ withTimezone: true, mode: 'date' });

export const createdAt = () => moment().notNull().defaultNow();
export const updatedAt = () => moment().notNull().defaultNow();
