import { error, fail } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { z } from 'zod';
import { roles } from '$lib/roles';
import { idIn } from '$lib/server/http/idIn';
import { orError } from '$lib/server/http/problem';
import { tried } from '$lib/server/http/tried';
import {
	changeRoles,
	disableMember,
	endMemberSessions,
	invite,
	listInvitations,
	listMembers,
	removeMember,
	resendInvitation,
	withdrawInvitation
} from '$lib/server/people';
import type { Context } from '$lib/server/context';
import type { Actions, PageServerLoad, RequestEvent } from './$types';

const schema = z.object({ email: z.string().max(1000), roles: z.array(z.enum(roles)) });

function contextOf(locals: App.Locals): Context {
	if (!locals.ctx) error(404, { message: 'There is no such page.' });
	return locals.ctx;
}

export const load: PageServerLoad = async ({ locals }) => {
	const ctx = contextOf(locals);
	const members = await orError(listMembers(ctx));
	const invitations = await orError(listInvitations(ctx));
	return {
		members,
		invitations: invitations.map((row) => ({ ...row, over: row.expiresAt < new Date() })),
		self: ctx.userId,
		timeZone: ctx.timeZone,
		form: await superValidate(zod4(schema))
	};
};

/** One change to one row: says what was done, or why it was not, above the table. */
const change =
	(
		field: string,
		done: string,
		verb: (ctx: Context, id: string, data: FormData) => Promise<unknown>
	) =>
	async ({ request, locals }: RequestEvent) => {
		const data = await request.formData();
		const result = await tried(verb(contextOf(locals), idIn(data, field), data));
		if ('refused' in result) return fail(400, { refused: result.refused.message });
		return { done };
	};

export const actions: Actions = {
	invite: async ({ request, locals }) => {
		const form = await superValidate(request, zod4(schema));
		const { email } = form.data;
		const sent = await tried(invite(contextOf(locals), form.data));
		if ('refused' in sent) {
			const field = form.data.roles.length === 0 ? 'roles._errors' : 'email';
			return setError(form, field, sent.refused.message);
		}
		form.data = { email: '', roles: [] };
		return message(form, `An invitation is on its way to ${email}. It works for seven days.`);
	},
	roles: change('userId', 'The roles are changed.', (ctx, id, data) =>
		changeRoles(ctx, id, data.getAll('roles'))
	),
	endSessions: change('userId', 'The person is signed out everywhere.', endMemberSessions),
	disable: change('userId', 'The person is out and cannot sign in.', (ctx, id) =>
		disableMember(ctx, id)
	),
	enable: change('userId', 'The person can sign in again.', (ctx, id) =>
		disableMember(ctx, id, false)
	),
	remove: change('userId', 'The person is no longer in this venue.', removeMember),
	withdraw: change('invitationId', 'The invitation is withdrawn.', withdrawInvitation),
	resend: change(
		'invitationId',
		'A fresh link is on its way; the old one is over.',
		resendInvitation
	)
};
