import { orError } from '$lib/server/http/problem';
import { readShow } from '$lib/server/shows';
import { contextOf } from '$lib/server/http/contextOf';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const show = await orError(readShow(contextOf(locals), params.id));
	const used = new Set(
		show.document.scenes.flatMap(({ subject }) =>
			subject.kind === 'galaxy' ? [subject.galaxyId] : []
		)
	);
	return {
		showId: show.id,
		document: show.document,
		galaxies: Object.fromEntries(Object.entries(show.galaxies).filter(([id]) => used.has(id)))
	};
};
