import type { Handle } from '@sveltejs/kit';

/** Requests that failed because the database was away; noted by `reportError`. */
const failed = new WeakSet<App.Locals>();

export const noteDatabaseAway = (locals: App.Locals): void => void failed.add(locals);

/** Such a request answers 503 and says when to come back, instead of SvelteKit's 500. */
export const databaseAway: Handle = async ({ event, resolve }) => {
	const response = await resolve(event);
	if (response.status === 503) response.headers.set('retry-after', '5');
	if (response.status !== 500 || !failed.has(event.locals)) return response;
	const headers = new Headers(response.headers);
	headers.set('retry-after', '5');
	return new Response(response.body, { status: 503, headers });
};
