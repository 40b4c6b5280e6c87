import { listDomes, listScreens, isInTouch } from '$lib/server/domes';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { contextOf } from '$lib/server/http/contextOf';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const ctx = contextOf(locals);
	const archived = url.searchParams.has('archived');
	const [domes, screens] = await orError(
		Promise.all([listDomes(ctx, { archived }), listScreens(ctx)])
	);
	return {
		archived,
		mayEdit: may(ctx.roles, 'dome.edit'),
		domes: domes.map(({ id, name, diameterMetres, seats, filmSize, tiltDegrees, openRunId }) => ({
			id,
			name,
			diameterMetres,
			seats,
			filmSize,
			tiltDegrees,
			openRunId,
			screens: screens.filter((screen) => screen.domeId === id).length,
			inTouch: screens.filter((screen) => screen.domeId === id && isInTouch(screen)).length
		}))
	};
};
