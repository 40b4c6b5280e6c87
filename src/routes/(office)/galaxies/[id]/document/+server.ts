import { json } from '@sveltejs/kit';
import { copyGalaxy, saveGalaxy } from '$lib/server/galaxies';
import { answering } from '$lib/server/http/problem';
import { readJson } from '$lib/server/http/readJson';
import { contextOf } from '$lib/server/http/contextOf';
import { onlyFields } from '$lib/server/http/onlyFields';
import type { RequestHandler } from './$types';

/** Largest galaxy taken; 32 components with long sources fit many times over. */
const limit = {
	bytes: 256 * 1024,
	words: 'A galaxy may have at most 256 kB. Nothing was saved.'
};

/** Saves: {baseRevision, document} → {revision, at}; 409 carries theirs, revision, by and at. */
export const PUT: RequestHandler = ({ locals, params, request }) =>
	answering(async () => {
		const body = await readJson(request, limit);
		onlyFields(body, ['baseRevision', 'document']);
		const { baseRevision, document } = body;
		return json(await saveGalaxy(contextOf(locals), { id: params.id, baseRevision, document }));
	});

/** Keeps a version as a galaxy of its own: {document} → 201 {id}. */
export const POST: RequestHandler = ({ locals, params, request }) =>
	answering(async () => {
		const body = await readJson(request, limit);
		onlyFields(body, ['document']);
		const document = body.document ?? null;
		const id = await copyGalaxy(contextOf(locals), { id: params.id, document });
		return json({ id }, { status: 201 });
	});
