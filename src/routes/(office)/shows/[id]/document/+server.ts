import { json } from '@sveltejs/kit';
import { AppError } from '$lib/server/errors';
import { answering } from '$lib/server/http/problem';
import { copyShow, saveShow } from '$lib/server/shows';
import { contextOf } from '$lib/server/http/contextOf';
import { readJson } from '$lib/server/http/readJson';
import type { RequestHandler } from './$types';

const only = (body: Record<string, unknown>, known: string[]) => {
	const [odd] = Object.keys(body).filter((key) => !known.includes(key));
	if (odd === undefined) return;
	const issues = [{ path: odd, message: 'There is no such field here.' }];
	throw new AppError('invalid', `Nothing was saved: there is no field “${odd}” here.`, { issues });
};

/** Saves: {baseRevision, document} → {revision, at}; 409 carries theirs, revision, by and at. */
export const PUT: RequestHandler = ({ locals, params, request }) =>
	answering(async () => {
		const body = await readJson(request);
		only(body, ['baseRevision', 'document']);
		const { baseRevision, document } = body;
		return json(await saveShow(contextOf(locals), { id: params.id, baseRevision, document }));
	});

/** Keeps a version as a show of its own: {document} → 201 {id}. */
export const POST: RequestHandler = ({ locals, params, request }) =>
	answering(async () => {
		const body = await readJson(request);
		only(body, ['document']);
		const document = body.document ?? null;
		const id = await copyShow(contextOf(locals), { id: params.id, document });
		return json({ id }, { status: 201 });
	});
