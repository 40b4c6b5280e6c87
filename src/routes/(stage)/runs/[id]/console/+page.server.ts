import { redirect } from '@sveltejs/kit';
import { links } from '$lib/links';
import { queryable } from '$lib/server/context';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { eventsAfter, readRun, readRunEdition } from '$lib/server/runs';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params, url }) => {
	const { ctx } = locals;
	if (!ctx) redirect(303, links.signIn(url.pathname));
	const run = await orError(readRun(ctx, params.id));
	const [edition, events] = await orError(
		Promise.all([readRunEdition(ctx, run), eventsAfter(queryable(ctx), run.id, 0)])
	);
	return {
		run: { id: run.id, domeName: run.domeName, editionNumber: run.editionNumber },
		geometry: { apertureDegrees: run.apertureDegrees, tiltDegrees: run.tiltDegrees },
		content: edition.content,
		events,
		reader: ctx.userName,
		mayCommand: may(ctx.roles, 'run.command')
	};
};
