import { pgTable, text } from 'drizzle-orm/pg-core';
import { createdAt, moment } from '../columns';

/**
 * One row a letter, written before it goes out, so that a retry of its job or a second worker never
 * sends it twice. A letter that the mail server refused gives its row back; one whose worker died
 * half-way loses it after a while, when the letter may be claimed anew.
 */
export const mailsSent = pgTable('mails_sent', {
	/** What the letter is for, such as "invitation:<id>". */
	key: text().primaryKey(),
	claimedAt: createdAt(),
	sentAt: moment()
});
