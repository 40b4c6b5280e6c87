import { fail, redirect } from '@sveltejs/kit';
import { links } from '$lib/links';
import { isAppError } from '$lib/server/errors';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import {
	archiveShow,
	copyShow,
	createShow,
	listShows,
	restoreShow,
	showFilterSchema
} from '$lib/server/shows';
import { contextOf } from '$lib/server/http/contextOf';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const ctx = contextOf(locals);
	const filter = showFilterSchema.parse(Object.fromEntries(url.searchParams));
	const mayEdit = may(ctx.roles, 'show.edit');
	return {
		filter,
		making: mayEdit && url.searchParams.has('new'),
		shows: await orError(listShows(ctx, filter)),
		mayEdit,
		timeZone: ctx.timeZone
	};
};

const idOf = async (request: Request) => String((await request.formData()).get('id') ?? '');

export const actions: Actions = {
	create: async ({ locals, request }) => {
		const title = String((await request.formData()).get('title') ?? '');
		let id: string;
		try {
			id = await createShow(contextOf(locals), { title });
		} catch (thrown) {
			if (!isAppError(thrown) || thrown.code !== 'invalid') return orError(Promise.reject(thrown));
			const [issue] = thrown.details.issues as { message: string }[];
			return fail(400, { title, problem: issue.message });
		}
		redirect(303, links.show(id));
	},
	copy: async ({ locals, request }) => {
		const id = await orError(copyShow(contextOf(locals), { id: await idOf(request) }));
		redirect(303, links.show(id));
	},
	archive: async ({ locals, request }) => ({
		archived: await orError(archiveShow(contextOf(locals), await idOf(request)))
	}),
	restore: async ({ locals, request }) => ({
		restored: await orError(restoreShow(contextOf(locals), await idOf(request)))
	})
};
