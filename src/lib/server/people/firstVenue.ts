import { randomUUID } from 'node:crypto';
import { audit } from '../context';
import { closeDatabase, database } from '../db/database';
import { runMigrations } from '../db/migrate';
import { invitations, venues } from '../db/schema';
import { environment } from '../env';
import { AppError } from '../errors';
import { deliverLetter } from '../mail/deliverLetter';
import { secretToken, tokenHash } from '../mail/secretTokens';
import { smtpTransport, type MailTransport } from '../mail/transport';
import { links } from '../../links';
import { emailSchema } from './roleList';
import { invitationDays } from './invitations';

export interface FirstVenue {
	venueName: string;
	/** IANA name, such as Europe/London. */
	timeZone: string;
	/** Of the manager to be. */
	email: string;
	/** The app's address, for the link. */
	origin: string;
}

/** @throws AppError invalid for a name that is none of the IANA time zones */
function requireTimeZone(timeZone: string): void {
	try {
		new Intl.DateTimeFormat('en-GB', { timeZone });
	} catch (cause) {
		if (!(cause instanceof RangeError)) throw cause;
		throw new AppError('invalid', `"${timeZone}" is no time zone, such as Europe/London.`);
	}
}

/**
 * Makes the first venue of an installation and mails its manager an invitation. Closes the database
 * when it is done: it is for a command, not for the running app.
 * @throws AppError conflict where the installation has a venue already
 */
export async function createFirstVenue(
	{ venueName, timeZone, email: address, origin }: FirstVenue,
	transport: MailTransport = smtpTransport()
): Promise<{ invitationUrl: string }> {
	requireTimeZone(timeZone);
	const email = emailSchema.safeParse(address);
	if (!email.success) throw new AppError('invalid', email.error.issues[0].message);
	const { DATABASE_URL, MIGRATIONS_FOLDER } = environment();
	await runMigrations(DATABASE_URL, MIGRATIONS_FOLDER);
	try {
		const id = randomUUID();
		await database().transaction(async (tx) => {
			const [existing] = await tx.select({ name: venues.name }).from(venues).limit(1);
			if (existing) {
				throw new AppError(
					'conflict',
					`This installation has a venue already: ${existing.name}. Its manager invites people on the people page.`
				);
			}
			const [venue] = await tx.insert(venues).values({ name: venueName, timeZone }).returning();
			await tx.insert(invitations).values({
				id,
				venueId: venue.id,
				email: email.data,
				roles: ['manager'],
				tokenHash: tokenHash(secretToken('invitation', id)),
				invitedBy: null,
				expiresAt: new Date(Date.now() + invitationDays * 86_400_000)
			});
			await audit(
				tx,
				{ userId: null, venueId: venue.id, requestId: 'first-venue' },
				{ action: 'venue.create', subjectKind: 'venue', subjectId: venue.id }
			);
		});
		await deliverLetter({ kind: 'invitation', id }, transport, database());
		return { invitationUrl: origin + links.join(secretToken('invitation', id)) };
	} finally {
		await closeDatabase();
	}
}
