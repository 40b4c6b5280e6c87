import { randomBytes, randomUUID } from 'node:crypto';
import { AuthError, SvelteKitAuth, type SvelteKitAuthConfig } from '@auth/sveltekit';
import Nodemailer from '@auth/sveltekit/providers/nodemailer';
import { isRedirect, type Handle, type RequestEvent } from '@sveltejs/kit';
import { eq } from 'drizzle-orm';
import { links } from '../../links';
import { audit } from '../context';
import { database } from '../db/database';
import { sessions, users } from '../db/schema';
import { environment } from '../env';
import { safeNext } from '../http/safeNext';
import { visitorOf } from '../http/visitor';
import { log } from '../log';
import { mailQueue } from '../mail/mailQueue';
import { secretToken } from '../mail/secretTokens';
import { authAdapter } from './adapter';
import { sessionToken } from './cookie';
import { absoluteDays, sessionCookie } from './sessionRules';

const linkMinutes = 15;
const maxAge = absoluteDays * 86_400;

/** Where the mailed link's page posts to; the one address of Auth.js that browsers reach. */
export const callbackPath = '/auth/callback/nodemailer';

/**
 * Auth.js, for sign-in links by mail. Sessions are rows of our own table; the password form writes
 * the same kind (signIn.ts). Whether a session still counts is decided in readSession.ts alone.
 */
const { handle, signIn } = SvelteKitAuth(async (event): Promise<SvelteKitAuthConfig> => {
	const { AUTH_SECRET, SMTP_URL, MAIL_FROM } = environment();
	const adapter = authAdapter();
	return {
		secret: AUTH_SECRET,
		trustHost: true,
		adapter: {
			...adapter,
			createSession: (session) => createSession(session, event)
		},
		session: {
			strategy: 'database',
			maxAge,
			// Never prolonged: 30 days after sign-in it is over.
			updateAge: maxAge,
			generateSessionToken: () => randomBytes(32).toString('base64url')
		},
		cookies: { sessionToken: sessionCookie(event.url.protocol === 'https:') },
		pages: {
			signIn: links.signIn(),
			error: links.signIn(),
			verifyRequest: links.signIn()
		},
		providers: [
			Nodemailer({
				server: SMTP_URL,
				from: MAIL_FROM,
				maxAge: linkMinutes * 60,
				// The letter's job knows the first part only and makes the second again.
				generateVerificationToken: () => {
					const id = randomUUID();
					return `${id}.${secretToken('sign-in', id)}`;
				},
				sendVerificationRequest: async ({ identifier, token, url, expires }) => {
					const next = safeNext(pathOf(new URL(url).searchParams.get('callbackUrl')));
					const letter = {
						kind: 'sign-in',
						id: token.split('.')[0],
						email: identifier,
						next,
						until: expires.getTime()
					} as const;
					await mailQueue().enqueue(letter, database());
				}
			})
		],
		callbacks: {
			// Nobody gets an account by asking for a link, and a disabled person gets no link.
			signIn: async ({ user }) => {
				const [known] = await database()
					.select({ disabledAt: users.disabledAt })
					.from(users)
					.where(eq(users.email, user.email ?? ''));
				return known?.disabledAt === null;
			},
			redirect: ({ url }) => safeNext(pathOf(url))
		},
		logger: {
			error: (error) => log.info({ err: error }, 'a sign-in link did not work'),
			warn: (code) => log.debug({ code }, 'Auth.js warns'),
			debug: () => undefined
		}
	};
});

/** Path of an address of any origin: where to go on is always in this app. */
function pathOf(url: string | null): string | null {
	const parsed = url ? URL.parse(url, environment().ORIGIN) : null;
	return parsed && parsed.pathname + parsed.search;
}

async function createSession(
	session: { sessionToken: string; userId: string; expires: Date },
	event: RequestEvent
) {
	const { address, userAgent } = visitorOf(event);
	const replaced = sessionToken(event);
	return database().transaction(async (tx) => {
		if (replaced) await tx.delete(sessions).where(eq(sessions.sessionToken, replaced));
		await audit(
			tx,
			{ userId: session.userId, venueId: null, requestId: event.locals.requestId },
			{
				action: 'person.sign-in',
				subjectKind: 'person',
				subjectId: session.userId,
				details: { by: 'link' }
			}
		);
		const [row] = await tx
			.insert(sessions)
			.values({ ...session, address, userAgent: userAgent.slice(0, 400) })
			.returning();
		return row;
	});
}

/** Lets Auth.js answer at its callback and nowhere else. */
export const authCallback: Handle = async ({ event, resolve }) => {
	if (event.url.pathname !== callbackPath) return resolve(event);
	const answer = await handle({ event, resolve });
	// Its redirects have headers that cannot be added to; the other hooks add some.
	return new Response(answer.body, { status: answer.status, headers: new Headers(answer.headers) });
};

/**
 * Mails a sign-in link to an address, if it belongs to somebody who may sign in; otherwise does
 * nothing, and says nothing about which it was.
 * @param next where to go after signing in
 */
export async function mailSignInLink(
	event: RequestEvent,
	email: string,
	next: string
): Promise<void> {
	const body = new FormData();
	body.set('providerId', 'nodemailer');
	body.set('email', email);
	body.set('redirectTo', next);
	const { host, protocol } = new URL(environment().ORIGIN);
	const request = new Request(event.url, {
		method: 'POST',
		body,
		// Not the visitor's Host header: links in mails must lead here.
		headers: { 'x-forwarded-host': host, 'x-forwarded-proto': protocol.slice(0, -1) }
	});
	try {
		await signIn({ ...event, request });
	} catch (thrown) {
		// A redirect is its success, a refusal its answer for a stranger.
		if (!isRedirect(thrown) && !(thrown instanceof AuthError)) throw thrown;
	}
}
