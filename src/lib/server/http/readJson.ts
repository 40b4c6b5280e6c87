import { AppError } from '../errors';
import { readBody, type BodyLimit } from './readBody';

/** Largest show document taken, bytes. Two hundred scenes with long scripts fit. */
export const largestDocument = 1024 * 1024;

const showLimit: BodyLimit = {
	bytes: largestDocument,
	words: 'A show may have at most 1 MB. Nothing was saved.'
};

/** @throws AppError too-large, invalid for what is not a JSON object */
export async function readJson(
	request: Request,
	limit: BodyLimit = showLimit
): Promise<Record<string, unknown>> {
	const body = await readBody(request, limit);
	if (typeof body !== 'object' || body === null || Array.isArray(body)) {
		throw new AppError('invalid', 'The body must be a JSON object. Nothing was saved.');
	}
	return { ...body };
}
