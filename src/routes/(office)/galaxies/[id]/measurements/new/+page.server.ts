import { requireRole } from '$lib/server/context';
import { readGalaxy } from '$lib/server/galaxies';
import { contextOf } from '$lib/server/http/contextOf';
import { orError } from '$lib/server/http/problem';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const ctx = contextOf(locals);
	await orError(Promise.resolve().then(() => requireRole(ctx, 'galaxy.edit')));
	const { id, document, archivedAt } = await orError(readGalaxy(ctx, params.id));
	return {
		galaxy: {
			id,
			name: document.name,
			model: document.model,
			outerRadius: document.look.outerRadius
		},
		archived: archivedAt !== null
	};
};
