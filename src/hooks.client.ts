import type { HandleClientError } from '@sveltejs/kit';
import { newId } from '$lib/show/editing';

/** What fails in the browser is named too, so that a person can say which one they saw. */
export const handleError: HandleClientError = ({ error, status }) => {
	if (status === 404) return { message: 'There is no such page.' };
	const id = newId();
	reportError(new Error(`failure ${id}`, { cause: error }));
	return { message: 'This page stopped working. Your saved work is safe.', id };
};
