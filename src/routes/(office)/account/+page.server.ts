import { redirect } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { z } from 'zod';
import { links } from '$lib/links';
import { listSessions } from '$lib/server/auth/sessions';
import { orError } from '$lib/server/http/problem';
import { tried } from '$lib/server/http/tried';
import { changePassword, endOtherSessions, endOwnSession, switchVenue } from '$lib/server/people';
import { idIn } from '$lib/server/http/idIn';
import { selfOf } from './selfOf';
import type { Actions, PageServerLoad } from './$types';

const schema = z.object({ current: z.string().max(1000), password: z.string().max(1000) });

export const load: PageServerLoad = async ({ locals }) => {
	const self = selfOf(locals);
	return {
		form: await superValidate(zod4(schema)),
		sessions: await orError(listSessions(self.id)),
		thisSession: self.sessionId,
		timeZone: locals.ctx?.timeZone ?? 'UTC'
	};
};

export const actions: Actions = {
	password: async ({ request, locals }) => {
		const form = await superValidate(request, zod4(schema));
		const typed = { ...form.data };
		form.data.current = form.data.password = '';
		const changed = await tried(changePassword(selfOf(locals), typed));
		if ('refused' in changed) {
			const { message: words, details } = changed.refused;
			return setError(form, details.field === 'password' ? 'password' : 'current', words);
		}
		return message(form, 'Your password is changed, and your other sessions are ended.');
	},
	end: async ({ request, locals }) => {
		await orError(endOwnSession(selfOf(locals), idIn(await request.formData(), 'sessionId')));
		return { done: 'The session is ended.' };
	},
	endOthers: async ({ locals }) => {
		const ended = await orError(endOtherSessions(selfOf(locals)));
		return { done: ended === 1 ? 'One session is ended.' : `${ended} sessions are ended.` };
	},
	venue: async ({ request, locals }) => {
		await orError(switchVenue(selfOf(locals), idIn(await request.formData(), 'venueId')));
		redirect(303, links.home());
	}
};
