import { json, type RequestEvent } from '@sveltejs/kit';
import page from '../../../error.html?raw';
import { asksForJson } from '../http/asksForJson';
import { databaseAwayMessage, problem } from '../http/problem';

/**
 * What a page says when not even its session can be read. Not SvelteKit's `error`: thrown in a hook
 * it goes past the other hooks, and its answer would lack their headers.
 */
export function awayAnswer(
	event: Pick<RequestEvent, 'isDataRequest' | 'request' | 'route'>
): Response {
	const message = databaseAwayMessage;
	// A form that was sent by script waits for an action's result.
	if (event.request.headers.has('x-sveltekit-action')) {
		return json({ type: 'error', status: 503, error: { message, retry: true } }, { status: 503 });
	}
	if (event.isDataRequest) return json({ message, retry: true }, { status: 503 });
	if (asksForJson(event)) return problem(503, message, { retry: true });
	const text = page
		.replace('%sveltekit.error.message%', message)
		.replace('%sveltekit.status%', '503');
	return new Response(text, {
		status: 503,
		headers: { 'content-type': 'text/html; charset=utf-8' }
	});
}
