import { error, fail, redirect } from '@sveltejs/kit';
import { setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { z } from 'zod';
import { links } from '$lib/links';
import { roleInfo } from '$lib/roles';
import { sessionToken, setSessionCookie } from '$lib/server/auth/cookie';
import { startSession } from '$lib/server/auth/startSession';
import { orError } from '$lib/server/http/problem';
import { tried } from '$lib/server/http/tried';
import { visitorOf } from '$lib/server/http/visitor';
import { joinAsKnownPerson, joinAsNewPerson, readInvitation } from '$lib/server/people';
import type { Actions, PageServerLoad } from './$types';

const schema = z.object({ name: z.string().max(1000), password: z.string().max(1000) });

export const load: PageServerLoad = async ({ params, locals }) => {
	const invitation = await orError(readInvitation(params.token));
	return {
		invitation: invitation && {
			email: invitation.email,
			venueName: invitation.venueName,
			roles: invitation.roles.map((role) => roleInfo[role]),
			isKnown: invitation.userId !== null
		},
		signedInAs: locals.person?.email ?? null,
		form: await superValidate(zod4(schema))
	};
};

export const actions: Actions = {
	/** A new person: account and membership in one. */
	account: async (event) => {
		const form = await superValidate(event, zod4(schema));
		const { name, password } = form.data;
		form.data.password = '';
		if (!form.valid) return fail(400, { form });
		const { requestId } = event.locals;
		const joined = await tried(
			joinAsNewPerson({ token: event.params.token, name, password, requestId })
		);
		if ('refused' in joined) {
			const { message, details } = joined.refused;
			return setError(form, details.field === 'name' ? 'name' : 'password', message);
		}
		const replaces = sessionToken(event);
		const session = await orError(startSession(joined.value, visitorOf(event), { replaces }));
		setSessionCookie(event, session);
		redirect(303, links.home());
	},
	/** Somebody who is signed in already. */
	enter: async ({ params, locals }) => {
		if (!locals.person) error(401, { message: 'Sign in, then open the link again.' });
		await orError(
			joinAsKnownPerson({
				token: params.token,
				userId: locals.person.id,
				sessionId: locals.person.sessionId,
				requestId: locals.requestId
			})
		);
		redirect(303, links.home());
	}
};
