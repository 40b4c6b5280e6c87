import type { RequestEvent } from '@sveltejs/kit';

/** Whether the answer is read by a script: problem details then, and no redirect and no page. */
export function asksForJson({
	request,
	route,
	isDataRequest
}: Pick<RequestEvent, 'request' | 'route' | 'isDataRequest'>): boolean {
	if (route.id?.startsWith('/api/')) return true;
	if (isDataRequest || request.headers.has('x-sveltekit-action')) return false;
	const accept = request.headers.get('accept') ?? '';
	if (request.method === 'GET' || request.method === 'HEAD') {
		return accept.startsWith('application/json');
	}
	return !accept.includes('text/html');
}
