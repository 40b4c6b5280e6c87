import { error, isHttpError, isRedirect, json } from '@sveltejs/kit';
import { isDatabaseAway } from '../db/databaseAway';
import { isAppError, type ErrorCode } from '../errors';
import { log } from '../log';

export { isDatabaseAway };

export const databaseAwayMessage =
	'The database does not answer. Nothing was changed. Try again in a moment.';

const statusOf: Record<ErrorCode, number> = {
	'not-found': 404,
	forbidden: 403,
	invalid: 400,
	conflict: 409,
	precondition: 422,
	'too-many': 429,
	'too-large': 413,
	unavailable: 503
};

const titleOf: Record<number, string> = {
	400: 'The request is not valid',
	401: 'Sign in first',
	403: 'Not allowed',
	404: 'Not found',
	409: 'Somebody was faster',
	413: 'Too large',
	422: 'Not possible yet',
	429: 'Too many tries',
	500: 'It failed',
	503: 'The database is away'
};

/** RFC 9457 problem details. `extra` members are added as they stand. */
export function problem(
	status: number,
	detail: string,
	extra: Record<string, unknown> = {}
): Response {
	return json(
		{ type: 'about:blank', title: titleOf[status] ?? 'Problem', status, detail, ...extra },
		{ status, headers: { 'content-type': 'application/problem+json' } }
	);
}

/**
 * For +server.ts: runs a handler and turns whatever fails into problem details; the
 * unexpected is logged under an id that the answer names.
 */
export async function answering(work: () => Promise<Response>): Promise<Response> {
	try {
		return await work();
	} catch (thrown) {
		if (isAppError(thrown)) return problem(statusOf[thrown.code], thrown.message, thrown.details);
		if (isDatabaseAway(thrown)) {
			return problem(503, databaseAwayMessage);
		}
		// What SvelteKit throws on purpose keeps its status; a redirect goes on its way.
		if (isRedirect(thrown)) throw thrown;
		if (isHttpError(thrown)) return problem(thrown.status, thrown.body.message);
		const id = crypto.randomUUID();
		log.error({ err: thrown, requestId: id }, 'a request failed');
		return problem(500, 'Something went wrong on our side. Nothing was changed.', { id });
	}
}

/** For load functions and actions: runs a verb and turns coded errors into SvelteKit's. */
export async function orError<T>(work: Promise<T>): Promise<T> {
	try {
		return await work;
	} catch (thrown) {
		if (isAppError(thrown)) error(statusOf[thrown.code], { message: thrown.message });
		if (isDatabaseAway(thrown)) {
			error(503, { message: databaseAwayMessage, retry: true });
		}
		throw thrown;
	}
}
