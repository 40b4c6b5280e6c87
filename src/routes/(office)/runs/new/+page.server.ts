import { fail, redirect } from '@sveltejs/kit';
import { links } from '$lib/links';
import { isInTouch, listDomes, listScreens } from '$lib/server/domes';
import { isAppError } from '$lib/server/errors';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { editionsToRun, startRun } from '$lib/server/runs';
import { contextOf } from '$lib/server/http/contextOf';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const ctx = contextOf(locals);
	const [editions, domes, screens] = await orError(
		Promise.all([editionsToRun(ctx), listDomes(ctx), listScreens(ctx)])
	);
	return {
		editions,
		editionId: url.searchParams.get('edition') ?? editions[0]?.id ?? '',
		domes: domes.map(({ id, name, openRunId }) => ({
			id,
			name,
			openRunId,
			screens: screens
				.filter((screen) => screen.domeId === id)
				.map((screen) => ({ id: screen.id, name: screen.name, inTouch: isInTouch(screen) }))
		})),
		mayStart: may(ctx.roles, 'run.start')
	};
};

export const actions: Actions = {
	default: async ({ locals, request }) => {
		const form = await request.formData();
		const chosen = {
			editionId: String(form.get('edition') ?? ''),
			domeId: String(form.get('dome') ?? '')
		};
		let runId: string;
		try {
			({ runId } = await startRun(contextOf(locals), chosen));
		} catch (thrown) {
			if (!isAppError(thrown) || thrown.code !== 'conflict') return orError(Promise.reject(thrown));
			const { href } = thrown.details;
			return fail(409, {
				...chosen,
				problem: thrown.message,
				href: typeof href === 'string' ? href : null
			});
		}
		redirect(303, links.console(runId));
	}
};
