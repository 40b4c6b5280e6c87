import { redirect } from '@sveltejs/kit';
import { links } from '$lib/links';
import { clearSessionCookie, sessionToken } from '$lib/server/auth/cookie';
import { endSessionByToken } from '$lib/server/auth/sessions';
import type { RequestHandler } from './$types';

export const POST: RequestHandler = async (event) => {
	const token = sessionToken(event);
	if (token) await endSessionByToken(token);
	clearSessionCookie(event);
	redirect(303, links.signIn());
};
