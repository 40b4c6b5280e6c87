import type { z } from 'zod';
import { galaxyDocumentSchema, type GalaxyDocument } from '../../show/galaxy';
import { AppError } from '../errors';

/** One field that was refused, such as "model.components.0.parameters.mass"; empty for the whole. */
export interface GalaxyIssue {
	path: string;
	message: string;
}

function issuesOf(error: z.ZodError): GalaxyIssue[] {
	return error.issues.flatMap((issue) => {
		const path = issue.path.map(String);
		if (issue.code !== 'unrecognized_keys') {
			return [{ path: path.join('.'), message: issue.message }];
		}
		return issue.keys.map((key) => ({
			path: [...path, key].join('.'),
			message: 'There is no such field in a galaxy.'
		}));
	});
}

/** @throws AppError invalid, with `issues` naming each field by its path */
export function parseGalaxy(input: unknown): GalaxyDocument {
	const result = galaxyDocumentSchema.safeParse(input);
	if (result.success) return result.data;
	const issues = issuesOf(result.error);
	const [first] = issues;
	throw new AppError(
		'invalid',
		`The galaxy was refused${first.path ? ` at ${first.path}` : ''}: ${first.message} Nothing was saved.`,
		{ issues }
	);
}
