import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { readShow } from '$lib/server/shows';
import { contextOf } from '$lib/server/http/contextOf';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const ctx = contextOf(locals);
	const show = await orError(readShow(ctx, params.id));
	return {
		show: {
			id: show.id,
			document: show.document,
			revision: show.revision,
			savedAt: show.updatedAt.toISOString(),
			archived: show.archivedAt !== null,
			edition: show.edition
		},
		galaxies: show.galaxies,
		archivedGalaxies: show.archived,
		mayEdit: may(ctx.roles, 'show.edit') && show.archivedAt === null,
		mayFreeze: may(ctx.roles, 'edition.freeze') && show.archivedAt === null,
		timeZone: ctx.timeZone
	};
};
