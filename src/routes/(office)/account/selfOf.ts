import { error } from '@sveltejs/kit';
import type { Self } from '$lib/server/people';

/** The signed-in person. The hooks guard this page; this is for the compiler. */
export function selfOf({ person, requestId }: App.Locals): Self {
	if (!person) error(401, { message: 'Sign in first.' });
	return { ...person, requestId };
}
