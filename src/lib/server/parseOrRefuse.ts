import type { z } from 'zod';
import { AppError } from './errors';

/** One field that was refused. `path` is such as "scenes.3.view.distance"; empty for the whole. */
export interface FieldIssue {
	path: string;
	message: string;
}

function issuesOf(error: z.ZodError, what: string): FieldIssue[] {
	return error.issues.flatMap((issue) => {
		const path = issue.path.map(String);
		if (issue.code !== 'unrecognized_keys') {
			return [{ path: path.join('.'), message: issue.message }];
		}
		return issue.keys.map((key) => ({
			path: [...path, key].join('.'),
			message: `There is no such field in a ${what}.`
		}));
	});
}

/**
 * A whole document that somebody wants to save.
 * @param what such as "show document", for the message
 * @throws AppError invalid, with `issues` naming each field by its path
 */
export function parseOrRefuse<T>(schema: z.ZodType<T>, input: unknown, what: string): T {
	const result = schema.safeParse(input);
	if (result.success) return result.data;
	const issues = issuesOf(result.error, what);
	const [first] = issues;
	throw new AppError(
		'invalid',
		`The ${what} was refused${first.path ? ` at ${first.path}` : ''}: ${first.message} Nothing was saved.`,
		{ issues }
	);
}
