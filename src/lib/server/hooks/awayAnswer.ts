import { json, type RequestEvent } from '@sveltejs/kit';
import page from '../../../error.html?raw';
import { databaseAwayMessage } from '../http/problem';

/**
 * What a page says when not even its session can be read. Not SvelteKit's `error`: thrown in a hook
 * it goes past the other hooks, and its answer would lack their headers.
 */
export function awayAnswer({
	isDataRequest,
	request
}: Pick<RequestEvent, 'isDataRequest' | 'request'>): Response {
	const message = databaseAwayMessage;
	// A form that was sent by script waits for an action's result.
	if (request.headers.has('x-sveltekit-action')) {
		return json({ type: 'error', status: 503, error: { message, retry: true } }, { status: 503 });
	}
	const byScript =
		isDataRequest || request.headers.get('accept')?.startsWith('application/json') === true;
	if (byScript) return json({ message, retry: true }, { status: 503 });
	const text = page
		.replace('%sveltekit.error.message%', message)
		.replace('%sveltekit.status%', '503');
	return new Response(text, {
		status: 503,
		headers: { 'content-type': 'text/html; charset=utf-8' }
	});
}
