import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { listRuns } from '$lib/server/runs';
import { contextOf } from '$lib/server/http/contextOf';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const ctx = contextOf(locals);
	const runs = await orError(listRuns(ctx));
	const dome = url.searchParams.get('dome') ?? '';
	const names = [...new Set(runs.map((run) => run.domeName))].sort();
	return {
		dome: names.includes(dome) ? dome : '',
		domeNames: names,
		runs: runs
			.filter((run) => !names.includes(dome) || run.domeName === dome)
			.map((run) => ({
				id: run.id,
				showTitle: run.showTitle,
				editionNumber: run.editionNumber,
				domeName: run.domeName,
				startedAt: run.startedAt,
				endedAt: run.endedAt,
				startedByName: run.startedByName,
				headCount: run.headCount
			})),
		timeZone: ctx.timeZone,
		mayStart: may(ctx.roles, 'run.start')
	};
};
