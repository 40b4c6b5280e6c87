import type { RequestEvent } from '@sveltejs/kit';
import type { Visitor } from '../auth/startSession';

/** The browser that asks. */
export const visitorOf = (event: RequestEvent): Visitor => ({
	address: event.getClientAddress(),
	userAgent: event.request.headers.get('user-agent') ?? ''
});
