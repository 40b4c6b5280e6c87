import { json } from '@sveltejs/kit';
import { answering } from '$lib/server/http/problem';
import { copyShow, saveShow } from '$lib/server/shows';
import { contextOf } from '$lib/server/http/contextOf';
import { onlyFields } from '$lib/server/http/onlyFields';
import { readJson } from '$lib/server/http/readJson';
import type { RequestHandler } from './$types';

/** Saves: {baseRevision, document} → {revision, at}; 409 carries theirs, revision, by and at. */
export const PUT: RequestHandler = ({ locals, params, request }) =>
	answering(async () => {
		const body = await readJson(request);
		onlyFields(body, ['baseRevision', 'document']);
		const { baseRevision, document } = body;
		return json(await saveShow(contextOf(locals), { id: params.id, baseRevision, document }));
	});

/** Keeps a version as a show of its own: {document} → 201 {id}. */
export const POST: RequestHandler = ({ locals, params, request }) =>
	answering(async () => {
		const body = await readJson(request);
		onlyFields(body, ['document']);
		const document = body.document ?? null;
		const id = await copyShow(contextOf(locals), { id: params.id, document });
		return json({ id }, { status: 201 });
	});
