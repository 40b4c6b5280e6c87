import { redirect } from '@sveltejs/kit';
import { links } from '$lib/links';
import { copyFromShelf, readShelf } from '$lib/server/galaxies';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { contextOf } from '$lib/server/http/contextOf';
import { jsonField } from '../../jsonField';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const ctx = contextOf(locals);
	return {
		entry: await orError(Promise.resolve(params.id).then(readShelf)),
		mayCopy: may(ctx.roles, 'galaxy.edit')
	};
};

export const actions: Actions = {
	/** Takes what was tried on the page, or the shelf's own where nothing was. */
	copy: async ({ locals, params, request }) => {
		const document = jsonField(await request.formData(), 'document');
		const work = copyFromShelf(contextOf(locals), { shelfId: params.id, document });
		redirect(303, links.galaxy(await orError(work)));
	}
};
