/**
 * How long a signed-in browser stays so. A session ends 30 days after sign-in whatever happens, and
 * 12 hours after it was last used, with one exception: while a run that its person started is open,
 * idleness does not end it. A presenter is not asked for a password in the dark.
 */
export const absoluteDays = 30;
export const idleHours = 12;
/** `lastSeenAt` is written at most this often. */
export const seenEverySeconds = 60;

/** Name and flags are those Auth.js uses, so that both ways of signing in make one kind of session. */
export const sessionCookie = (secure: boolean) => ({
	name: `${secure ? '__Secure-' : ''}authjs.session-token`,
	options: { httpOnly: true, sameSite: 'lax' as const, path: '/', secure }
});
