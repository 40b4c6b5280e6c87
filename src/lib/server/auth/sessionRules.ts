/**
 * How long a signed-in browser stays so. A session ends 30 days after sign-in whatever happens, and
 * 12 hours after it was last used, with one exception: while a run that its person started is open,
 * idleness does not end it. A presenter is not asked for a password in the dark.
 */
export const absoluteDays = 30;
export const idleHours = 12;
/** `lastSeenAt` is written at most this often. */
export const seenEverySeconds = 60;

/**
 * The cookie of both ways of signing in. Over https its prefix makes browsers refuse it from any
 * other host, a subdomain too, and without `secure` or with another path (RFC 6265bis, 4.1.3.2).
 */
export const sessionCookie = (secure: boolean) => ({
	name: `${secure ? '__Host-' : ''}farwheel-session`,
	options: { httpOnly: true, sameSite: 'lax' as const, path: '/', secure }
});
