import { database } from '$lib/server/db/database';
import { isId } from '$lib/server/domes/isId';
import { notPaired } from '$lib/server/domes/notPaired';
import { screenOf } from '$lib/server/domes/screenOf';
import { notFound } from '$lib/server/errors';
import { answering } from '$lib/server/http/problem';
import { editionOf } from '$lib/server/runs/editionOf';
import type { RequestHandler } from './$types';

/** A frozen edition of the screen's venue. It never changes, so the browser may keep it. */
export const GET: RequestHandler = (event) =>
	answering(async () => {
		const known = await screenOf(event);
		if (!known) return notPaired();
		if (!isId(event.params.id)) throw notFound('edition');
		const edition = await editionOf(database(), event.params.id);
		if (edition.venueId !== known.screen.venueId) throw notFound('edition');
		const headers = {
			etag: `"${edition.hash}"`,
			'cache-control': 'private, max-age=31536000, immutable'
		};
		if (event.request.headers.get('if-none-match') === headers.etag) {
			return new Response(null, { status: 304, headers });
		}
		return new Response(JSON.stringify(edition.content), {
			headers: { ...headers, 'content-type': 'application/json' }
		});
	});
