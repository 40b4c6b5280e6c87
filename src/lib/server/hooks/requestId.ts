import type { Handle } from '@sveltejs/kit';

/** Names the request; the log, the audit rows and error pages carry the name. */
export const requestId: Handle = async ({ event, resolve }) => {
	event.locals.requestId = crypto.randomUUID();
	event.locals.person = null;
	event.locals.ctx = null;
	event.locals.venues = [];
	const response = await resolve(event);
	response.headers.set('x-request-id', event.locals.requestId);
	return response;
};
