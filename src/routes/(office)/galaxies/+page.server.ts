import { fail, redirect } from '@sveltejs/kit';
import { links } from '$lib/links';
import { isAppError } from '$lib/server/errors';
import {
	archiveGalaxy,
	copyGalaxy,
	createGalaxy,
	galaxyFilterSchema,
	listGalaxies,
	restoreGalaxy,
	shelf,
	speedSummary,
	startingShapes
} from '$lib/server/galaxies';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { contextOf } from '$lib/server/http/contextOf';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const ctx = contextOf(locals);
	const filter = galaxyFilterSchema.parse(Object.fromEntries(url.searchParams));
	const mayEdit = may(ctx.roles, 'galaxy.edit');
	return {
		filter,
		making: mayEdit && url.searchParams.has('new'),
		galaxies: await orError(listGalaxies(ctx, filter)),
		shapes: startingShapes.map(({ id, label, help }) => ({ id, label, help })),
		shelf: shelf().map(({ id, document, sources }) => ({
			id,
			name: document.name,
			source: sources[0],
			...speedSummary(document)
		})),
		mayEdit,
		timeZone: ctx.timeZone
	};
};

const idOf = async (request: Request) => String((await request.formData()).get('id') ?? '');

export const actions: Actions = {
	create: async ({ locals, request }) => {
		const data = await request.formData();
		const name = String(data.get('name') ?? '');
		const shape = String(data.get('shape') ?? '');
		let id: string;
		try {
			id = await createGalaxy(contextOf(locals), { name, shape });
		} catch (thrown) {
			if (!isAppError(thrown) || thrown.code !== 'invalid') return orError(Promise.reject(thrown));
			const [issue] = thrown.details.issues as { message: string }[];
			return fail(400, { name, shape, problem: issue.message });
		}
		redirect(303, links.galaxy(id));
	},
	copy: async ({ locals, request }) => {
		const id = await orError(copyGalaxy(contextOf(locals), { id: await idOf(request) }));
		redirect(303, links.galaxy(id));
	},
	archive: async ({ locals, request }) => ({
		archived: await orError(archiveGalaxy(contextOf(locals), await idOf(request)))
	}),
	restore: async ({ locals, request }) => ({
		restored: await orError(restoreGalaxy(contextOf(locals), await idOf(request)))
	})
};
