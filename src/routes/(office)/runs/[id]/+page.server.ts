import { fail } from '@sveltejs/kit';
import { queryable } from '$lib/server/context';
import { fieldsOrError } from '$lib/server/http/fieldsOrError';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { eventsAfter, readRun, readRunEdition, runLog, saveLog } from '$lib/server/runs';
import { totalSeconds } from '$lib/show/timing';
import { contextOf } from '$lib/server/http/contextOf';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const ctx = contextOf(locals);
	const run = await orError(readRun(ctx, params.id));
	const [edition, events] = await orError(
		Promise.all([readRunEdition(ctx, run), eventsAfter(queryable(ctx), run.id, 0)])
	);
	return {
		run: {
			id: run.id,
			showTitle: run.showTitle,
			editionId: run.editionId,
			editionNumber: run.editionNumber,
			domeName: run.domeName,
			startedAt: run.startedAt,
			endedAt: run.endedAt,
			startedByName: run.startedByName,
			headCount: run.headCount,
			remarks: run.remarks
		},
		log: runLog(edition.content, events, Date.now()),
		expectedSeconds: totalSeconds(edition.content.show),
		timeZone: ctx.timeZone,
		mayLog: may(ctx.roles, 'run.log')
	};
};

export const actions: Actions = {
	default: async ({ locals, params, request }) => {
		const form = await request.formData();
		const typed = {
			headCount: String(form.get('headCount') ?? '').trim(),
			remarks: String(form.get('remarks') ?? '')
		};
		const { problems } = await fieldsOrError(
			saveLog(contextOf(locals), params.id, { ...typed, headCount: typed.headCount || null })
		);
		if (problems) return fail(400, { typed, problems });
		return { saved: true };
	}
};
