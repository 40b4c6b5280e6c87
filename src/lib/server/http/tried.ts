import { error } from '@sveltejs/kit';
import { isDatabaseAway } from '../db/databaseAway';
import { isAppError, type AppError } from '../errors';
import { databaseAwayMessage } from './problem';

/**
 * For form actions: runs a verb and hands back what it refused, to be said at the form's field.
 * @throws SvelteKit's 503 where the database is away; anything unexpected as it is
 */
export async function tried<T>(work: Promise<T>): Promise<{ value: T } | { refused: AppError }> {
	try {
		return { value: await work };
	} catch (thrown) {
		if (isAppError(thrown)) return { refused: thrown };
		if (isDatabaseAway(thrown)) error(503, { message: databaseAwayMessage, retry: true });
		throw thrown;
	}
}
