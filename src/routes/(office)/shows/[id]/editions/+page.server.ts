import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { listEditions } from '$lib/server/shows';
import { contextOf } from '$lib/server/http/contextOf';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const ctx = contextOf(locals);
	return {
		...(await orError(listEditions(ctx, params.id))),
		mayRun: may(ctx.roles, 'run.start'),
		timeZone: ctx.timeZone
	};
};
