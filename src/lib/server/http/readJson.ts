import { AppError, isAppError } from '$lib/server/errors';
import { readBody } from './readBody';

/** Largest show document taken, bytes. Two hundred scenes with long scripts fit. */
export const largestDocument = 1024 * 1024;

/**
 * @param limit the largest body, bytes, and what the refusal of a larger one says
 * @throws AppError too-large, invalid for what is not a JSON object
 */
export async function readJson(
	request: Request,
	limit = { bytes: largestDocument, words: 'A show may have at most 1 MB. Nothing was saved.' }
): Promise<Record<string, unknown>> {
	const tooLargeError = () => new AppError('too-large', limit.words);
	// Answered before the body is read: a connection that is cut in the middle shows no answer.
	if (Number(request.headers.get('content-length')) > limit.bytes) throw tooLargeError();
	const body = await readBody(request, limit.bytes).catch((thrown: unknown) => {
		// The server in front of the app has a limit of its own and says so by a status.
		const tooLarge =
			(isAppError(thrown) && thrown.code === 'too-large') ||
			(typeof thrown === 'object' &&
				thrown !== null &&
				'status' in thrown &&
				thrown.status === 413);
		if (!tooLarge) throw thrown;
		throw tooLargeError();
	});
	if (typeof body !== 'object' || body === null || Array.isArray(body)) {
		throw new AppError('invalid', 'The body must be a JSON object. Nothing was saved.');
	}
	return { ...body };
}
