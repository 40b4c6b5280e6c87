import { json } from '@sveltejs/kit';
import { keepFit } from '$lib/server/fits';
import { contextOf } from '$lib/server/http/contextOf';
import { onlyFields } from '$lib/server/http/onlyFields';
import { answering } from '$lib/server/http/problem';
import { readJson } from '$lib/server/http/readJson';
import type { RequestHandler } from './$types';

/** A record with two models of 32 components fits many times over. */
const limit = {
	bytes: 1024 * 1024,
	words: 'The record of a fit may have at most 1 MB. It was not kept.'
};

/** Keeps a fit: {record} → 201 {id}. */
export const POST: RequestHandler = ({ locals, params, request }) =>
	answering(async () => {
		const body = await readJson(request, limit);
		onlyFields(body, ['record']);
		const id = await keepFit(contextOf(locals), params.id, body.record);
		return json({ id }, { status: 201 });
	});
