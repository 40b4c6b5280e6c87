import { redirect } from '@sveltejs/kit';
import { setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { z } from 'zod';
import { links } from '$lib/links';
import { clearSessionCookie } from '$lib/server/auth/cookie';
import { orError } from '$lib/server/http/problem';
import { tried } from '$lib/server/http/tried';
import { completeReset, readReset } from '$lib/server/people';
import type { Actions, PageServerLoad } from './$types';

// Length and the rest are the verb's to judge; this only bounds what is read.
const schema = z.object({ password: z.string().max(1000) });

export const load: PageServerLoad = async ({ params }) => {
	const reset = await orError(readReset(params.token));
	return { email: reset?.email ?? null, form: await superValidate(zod4(schema)) };
};

export const actions: Actions = {
	default: async (event) => {
		const form = await superValidate(event, zod4(schema));
		const { password } = form.data;
		form.data.password = '';
		const done = await tried(
			completeReset({
				token: event.params.token,
				password,
				requestId: event.locals.requestId
			})
		);
		if ('refused' in done) return setError(form, 'password', done.refused.message);
		clearSessionCookie(event);
		redirect(303, `${links.signIn()}?changed`);
	}
};
