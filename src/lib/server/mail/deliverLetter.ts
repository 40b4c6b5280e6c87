import { and, eq, isNull, lt } from 'drizzle-orm';
import type { Queryable } from '../db/database';
import { mailsSent } from '../db/schema';
import { environment } from '../env';
import { composeLetter } from './composeLetter';
import { letterKey, type Letter } from './Letter';
import type { MailTransport } from './transport';

/**
 * Seconds. A claim that old without a sending is the mark of a worker that died: longer than the mail
 * server's answer may take, and shorter than the queue waits before it gives the job out again.
 */
const claimLasts = 100;

/**
 * Sends a letter, once in its life. Where a worker died half-way the letter may go out a second time,
 * under the same message id, by which mail programs drop the double.
 * @returns whether this call sent it
 * @throws what the transport threw; the letter may then be tried again
 */
export async function deliverLetter(
	letter: Letter,
	transport: MailTransport,
	db: Queryable
): Promise<boolean> {
	const key = letterKey(letter);
	const mail = await composeLetter(letter, db);
	if (!mail) return false;
	const claimed = await db
		.insert(mailsSent)
		.values({ key })
		.onConflictDoUpdate({
			target: mailsSent.key,
			set: { claimedAt: new Date() },
			setWhere: and(
				isNull(mailsSent.sentAt),
				lt(mailsSent.claimedAt, new Date(Date.now() - claimLasts * 1000))
			)
		})
		.returning({ key: mailsSent.key });
	if (claimed.length === 0) return false;
	const { hostname } = new URL(environment().ORIGIN);
	try {
		await transport.send({ ...mail, messageId: `<${key.replace(':', '.')}@${hostname}>` });
	} catch (error) {
		await db.delete(mailsSent).where(eq(mailsSent.key, key));
		throw error;
	}
	await db.update(mailsSent).set({ sentAt: new Date() }).where(eq(mailsSent.key, key));
	return true;
}
