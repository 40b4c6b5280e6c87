import { error, json } from '@sveltejs/kit';
import { isDatabaseAway } from '../db/databaseAway';
import { isAppError, type ErrorCode } from '../errors';

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

/** For +server.ts: runs a handler and turns coded errors into problem details. Others pass on. */
export async function answering(work: () => Promise<Response>): Promise<Response> {
	try {
		return await work();
	} catch (thrown) {
		if (isAppError(thrown)) return problem(statusOf[thrown.code], thrown.message, thrown.details);
		if (isDatabaseAway(thrown)) {
			return problem(503, databaseAwayMessage);
		}
		throw thrown;
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
