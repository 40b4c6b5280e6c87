import { fail, redirect } from '@sveltejs/kit';
import { links } from '$lib/links';
import { requireRole } from '$lib/server/context';
import { createDome, filmSizes, initialDomeSettings } from '$lib/server/domes';
import { fieldsOrError } from '$lib/server/http/fieldsOrError';
import { orError } from '$lib/server/http/problem';
import { contextOf } from '$lib/server/http/contextOf';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals }) => {
	const ctx = contextOf(locals);
	await orError(Promise.resolve().then(() => requireRole(ctx, 'dome.edit')));
	return { settings: initialDomeSettings, filmSizes };
};

export const actions: Actions = {
	default: async ({ locals, request }) => {
		const settings = Object.fromEntries(await request.formData()) as Record<string, string>;
		const { value, problems } = await fieldsOrError(createDome(contextOf(locals), settings));
		if (problems) return fail(400, { settings, problems });
		redirect(303, links.dome(value.id));
	}
};
