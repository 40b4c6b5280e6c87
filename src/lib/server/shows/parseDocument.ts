import { z } from 'zod';
import { showDocumentSchema, type ShowDocument } from '../../show/document';
import { AppError } from '../errors';

/** One field that was refused. `path` is such as "scenes.3.view.distance"; empty for the whole. */
export interface FieldIssue {
	path: string;
	message: string;
}

function issuesOf(error: z.ZodError): FieldIssue[] {
	return error.issues.flatMap((issue) => {
		const path = issue.path.map(String);
		if (issue.code !== 'unrecognized_keys') {
			return [{ path: path.join('.'), message: issue.message }];
		}
		return issue.keys.map((key) => ({
			path: [...path, key].join('.'),
			message: 'There is no such field in a show document.'
		}));
	});
}

/** @throws AppError invalid, with `issues` naming each field by its path */
export function parseDocument(input: unknown): ShowDocument {
	const result = showDocumentSchema.safeParse(input);
	if (result.success) return result.data;
	const issues = issuesOf(result.error);
	const [first] = issues;
	throw new AppError(
		'invalid',
		`The show document was refused${first.path ? ` at ${first.path}` : ''}: ${first.message} Nothing was saved.`,
		{ issues }
	);
}
