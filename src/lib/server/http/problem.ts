import { error, json } from '@sveltejs/kit';
import { isAppError, type ErrorCode } from '../errors';

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
			return problem(
				503,
				'The database does not answer. Nothing was changed. Try again in a moment.'
			);
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
			error(503, {
				message: 'The database does not answer. Nothing was changed. Try again in a moment.'
			});
		}
		throw thrown;
	}
}

const awayCodes = new Set([
	'ECONNREFUSED',
	'ECONNRESET',
	'EPIPE',
	'ENOTFOUND',
	'ETIMEDOUT',
	'57P01',
	'57P02',
	'57P03',
	'08006',
	'08001',
	'08003'
]);

/** Whether an error says that PostgreSQL cannot be reached or is shutting down. */
export function isDatabaseAway(thrown: unknown): boolean {
	for (let e = thrown; e instanceof Error; e = e.cause) {
		const code = (e as Error & { code?: string }).code;
		if (code && awayCodes.has(code)) return true;
		if (/Connection terminated|timeout exceeded when trying to connect/i.test(e.message))
			return true;
	}
	return false;
}
