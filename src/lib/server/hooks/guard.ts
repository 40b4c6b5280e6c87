import { redirect, type Handle } from '@sveltejs/kit';
import { links } from '$lib/links';
import { asksForJson } from '../http/asksForJson';
import { problem } from '../http/problem';
import { isOpenApi } from './session';

/** Routes behind sign-in, by route id; a layout load is not a guard. */
export const needsSignIn = (routeId: string): boolean =>
	routeId.startsWith('/(office)') ||
	routeId.startsWith('/(stage)/runs') ||
	(routeId.startsWith('/api/') && !isOpenApi(routeId));

export const guard: Handle = async ({ event, resolve }) => {
	const { route, locals, url, request } = event;
	if (!route.id || !needsSignIn(route.id)) return resolve(event);
	if (!locals.person) {
		if (asksForJson(event)) return problem(401, 'Sign in, then ask again.');
		redirect(303, links.signIn(request.method === 'GET' ? url.pathname + url.search : undefined));
	}
	// One's own account is there without a venue too.
	if (!locals.ctx && !route.id.startsWith('/(office)/account')) {
		if (asksForJson(event)) return problem(404, 'There is no such thing in this venue.');
		redirect(303, links.noVenue());
	}
	return resolve(event);
};
