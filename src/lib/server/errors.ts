/** Codes that verbs throw. They know nothing of HTTP; `http/problem.ts` turns them into answers. */
export type ErrorCode =
	| 'not-found'
	| 'forbidden'
	| 'invalid'
	| 'conflict'
	| 'precondition'
	| 'too-many'
	| 'too-large'
	| 'unavailable';

/** An expected failure with a message fit for the person who asked. */
export class AppError extends Error {
	constructor(
		readonly code: ErrorCode,
		message: string,
		/** Facts the page needs, such as the other version of a stale save. */
		readonly details: Record<string, unknown> = {}
	) {
		super(message);
		this.name = 'AppError';
	}
}

/** The same answer for what is not there and for what belongs to another venue. */
export const notFound = (what: string) =>
	new AppError('not-found', `There is no such ${what} in this venue.`);

export const isAppError = (error: unknown): error is AppError => error instanceof AppError;
