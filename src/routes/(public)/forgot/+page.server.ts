import { fail } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { z } from 'zod';
import { tried } from '$lib/server/http/tried';
import { visitorOf } from '$lib/server/http/visitor';
import { requestReset } from '$lib/server/people';
import type { Actions, PageServerLoad } from './$types';

const schema = z.object({
	email: z.email('Write a whole e-mail address, such as name@example.org.').max(254)
});

export const load: PageServerLoad = async () => ({ form: await superValidate(zod4(schema)) });

export const actions: Actions = {
	default: async (event) => {
		const form = await superValidate(event, zod4(schema));
		if (!form.valid) return fail(400, { form });
		const { email } = form.data;
		const visitor = visitorOf(event);
		const asked = await tried(requestReset({ email, visitor, requestId: event.locals.requestId }));
		if ('refused' in asked) return setError(form, 'email', asked.refused.message);
		return message(
			form,
			`If ${email} has an account here, a link is on its way. It works once, for one hour.`
		);
	}
};
