import { redirect } from '@sveltejs/kit';
import { requireRole } from '$lib/server/context';
import { links } from '$lib/links';
import { copyFromShelf, readShelf, type ShelfEntry } from '$lib/server/galaxies';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { contextOf } from '../../../shows/contextOf';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const ctx = contextOf(locals);
	const read = async (): Promise<ShelfEntry> => {
		requireRole(ctx, 'galaxy.read');
		return readShelf(params.id);
	};
	return { entry: await orError(read()), mayCopy: may(ctx.roles, 'galaxy.edit') };
};

export const actions: Actions = {
	copy: async ({ locals, params }) => {
		const id = await orError(copyFromShelf(contextOf(locals), { shelfId: params.id }));
		redirect(303, links.galaxy(id));
	}
};
