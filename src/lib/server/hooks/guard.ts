import { redirect, type Handle, type RequestEvent } from '@sveltejs/kit';
import { links } from '$lib/links';
import { problem } from '../http/problem';
import { isOpenApi } from './session';

/** Routes behind sign-in, by route id; a layout load is not a guard. */
export const needsSignIn = (routeId: string): boolean =>
	routeId.startsWith('/(office)') ||
	routeId.startsWith('/(stage)/runs') ||
	(routeId.startsWith('/api/') && !isOpenApi(routeId));

/** Whether the answer is read by a script: problem details then, and no redirect. */
function asksForJson({ request, route, isDataRequest }: RequestEvent): boolean {
	if (route.id?.startsWith('/api/')) return true;
	if (isDataRequest || request.headers.has('x-sveltekit-action')) return false;
	const accept = request.headers.get('accept') ?? '';
	if (request.method === 'GET' || request.method === 'HEAD') {
		return accept.startsWith('application/json');
	}
	return !accept.includes('text/html');
}

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
