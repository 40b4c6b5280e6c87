import { readGalaxy } from '$lib/server/galaxies';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { contextOf } from '$lib/server/http/contextOf';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const ctx = contextOf(locals);
	const galaxy = await orError(readGalaxy(ctx, params.id));
	const archived = galaxy.archivedAt !== null;
	return {
		galaxy: {
			id: galaxy.id,
			document: galaxy.document,
			revision: galaxy.revision,
			savedAt: galaxy.updatedAt.toISOString(),
			archived,
			measurements: galaxy.measurements,
			usedBy: galaxy.usedBy
		},
		mayEdit: may(ctx.roles, 'galaxy.edit') && !archived,
		mayCopy: may(ctx.roles, 'galaxy.edit'),
		timeZone: ctx.timeZone
	};
};
