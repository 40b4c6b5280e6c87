import { fail, redirect } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { roleInfo } from '$lib/roles';
import { mailSignInLink } from '$lib/server/auth/authjs';
import { sessionToken, setSessionCookie } from '$lib/server/auth/cookie';
import { signInWithPassword } from '$lib/server/auth/signIn';
import { environment } from '$lib/server/env';
import { safeNext } from '$lib/server/http/safeNext';
import { tried } from '$lib/server/http/tried';
import { visitorOf } from '$lib/server/http/visitor';
import { mayMailLink } from '$lib/server/people';
import { demoPassword, demoPeople } from '../../../local/demoPeople.js';
import { signInSchema } from './schema';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	if (locals.person) redirect(303, safeNext(url.searchParams.get('next')));
	const demo = environment().FARWHEEL_DEMO
		? demoPeople.map(({ email, name, venue, roles }) => ({
				email,
				name,
				venue,
				roles: roles.map((role) => roleInfo[role].label).join(', ')
			}))
		: [];
	return {
		form: await superValidate(zod4(signInSchema)),
		demo,
		passwordChanged: url.searchParams.has('changed'),
		linkFailed: url.searchParams.has('error'),
		mailPage: environment().FARWHEEL_MAIL_PAGE ?? null,
		demoPassword: demo.length > 0 ? demoPassword : null
	};
};

export const actions: Actions = {
	password: async (event) => {
		const form = await superValidate(event, zod4(signInSchema));
		const { email, password } = form.data;
		// What was typed stays, but a password is never sent back.
		form.data.password = '';
		if (!form.valid) return fail(400, { form });
		const session = await tried(
			signInWithPassword({
				email,
				password,
				visitor: visitorOf(event),
				requestId: event.locals.requestId,
				replaces: sessionToken(event)
			})
		);
		if ('refused' in session) return setError(form, 'password', session.refused.message);
		setSessionCookie(event, session.value);
		redirect(303, safeNext(event.url.searchParams.get('next')));
	},
	link: async (event) => {
		const form = await superValidate(event, zod4(signInSchema));
		form.data.password = '';
		const wrong = form.errors.email;
		form.errors = {};
		if (wrong) return setError(form, 'email', wrong);
		const { email } = form.data;
		const may = await tried(mayMailLink(email, visitorOf(event)));
		if ('refused' in may) return setError(form, 'email', may.refused.message);
		if (may.value) {
			await tried(mailSignInLink(event, email, safeNext(event.url.searchParams.get('next'))));
		}
		form.valid = true;
		return message(
			form,
			`If ${email} can sign in here, a link is on its way. It works for fifteen minutes.`
		);
	}
};
