import type { Handle } from '@sveltejs/kit';
import { clearSessionCookie, sessionToken } from '../auth/cookie';
import { readSession } from '../auth/readSession';
import { isDatabaseAway } from '../db/databaseAway';
import { databaseAwayMessage, problem } from '../http/problem';
import { awayAnswer } from './awayAnswer';

/** From the session's cookie to who asks and in which venue. */
export const session: Handle = async ({ event, resolve }) => {
	const token = sessionToken(event);
	if (token) {
		try {
			const found = await readSession(token);
			if (!found) clearSessionCookie(event);
			event.locals.person = found?.person ?? null;
			event.locals.venues =
				found?.memberships.map(({ venueId, venueName }) => ({ id: venueId, name: venueName })) ??
				[];
			if (found?.current) {
				event.locals.ctx = {
					...found.current,
					userId: found.person.id,
					userName: found.person.name,
					requestId: event.locals.requestId
				};
			}
		} catch (thrown) {
			if (!isDatabaseAway(thrown)) throw thrown;
			// What needs no sign-in goes on as for a stranger: a dome must not notice.
			if (event.route.id?.startsWith('/api/')) {
				if (!isOpenApi(event.route.id)) return problem(503, databaseAwayMessage);
			} else if (!event.route.id?.startsWith('/(stage)/dome')) {
				return awayAnswer(event);
			}
		}
	}
	return resolve(event);
};

/** API routes that answer without a signed-in person. */
export const isOpenApi = (routeId: string): boolean =>
	['/api/health', '/api/time', '/api/screen'].some(
		(open) => routeId === open || routeId.startsWith(`${open}/`)
	);
