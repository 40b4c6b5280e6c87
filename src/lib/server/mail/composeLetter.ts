import { and, eq, gt, isNull } from 'drizzle-orm';
import { links } from '../../links';
import type { Queryable } from '../db/database';
import { invitations, passwordResets, users, venues } from '../db/schema';
import { environment } from '../env';
import type { Letter } from './Letter';
import type { MailText } from './mailText';
import { secretToken } from './secretTokens';
import { invitationMail, resetMail, signInMail } from './templates';

const absolute = (path: string): string => environment().ORIGIN + path;

/** The words of a letter as its row now stands; null where there is nothing left to say. */
export async function composeLetter(
	letter: Letter,
	db: Queryable
): Promise<(MailText & { to: string }) | null> {
	if (letter.kind === 'sign-in') {
		if (Date.now() > letter.until) return null;
		const token = `${letter.id}.${secretToken('sign-in', letter.id)}`;
		const link = absolute(links.signInLink(letter.email, token, letter.next));
		return { to: letter.email, ...signInMail({ link }) };
	}
	const link = absolute(
		(letter.kind === 'invitation' ? links.join : links.reset)(secretToken(letter.kind, letter.id))
	);
	return letter.kind === 'invitation'
		? invitation(letter.id, link, db)
		: reset(letter.id, link, db);
}

async function invitation(id: string, link: string, db: Queryable) {
	const [row] = await db
		.select({
			to: invitations.email,
			roles: invitations.roles,
			venueName: venues.name,
			invitedBy: users.name
		})
		.from(invitations)
		.innerJoin(venues, eq(venues.id, invitations.venueId))
		.leftJoin(users, eq(users.id, invitations.invitedBy))
		.where(
			and(
				eq(invitations.id, id),
				isNull(invitations.usedAt),
				isNull(invitations.withdrawnAt),
				gt(invitations.expiresAt, new Date())
			)
		);
	return row ? { to: row.to, ...invitationMail({ ...row, link }) } : null;
}

async function reset(id: string, link: string, db: Queryable) {
	const [row] = await db
		.select({ to: users.email, name: users.name })
		.from(passwordResets)
		.innerJoin(users, eq(users.id, passwordResets.userId))
		.where(
			and(
				eq(passwordResets.id, id),
				isNull(passwordResets.usedAt),
				gt(passwordResets.expiresAt, new Date()),
				isNull(users.disabledAt)
			)
		);
	return row ? { to: row.to, ...resetMail({ name: row.name, link }) } : null;
}
