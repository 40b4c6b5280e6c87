import { json } from '@sveltejs/kit';
import { contextOf } from '$lib/server/http/contextOf';
import { onlyFields } from '$lib/server/http/onlyFields';
import { answering } from '$lib/server/http/problem';
import { readJson } from '$lib/server/http/readJson';
import { addMeasurements } from '$lib/server/measurements';
import type { RequestHandler } from './$types';

/** 20,000 rows with all their columns fit. */
const limit = {
	bytes: 5.5 * 1024 * 1024,
	words: 'A table may have at most 5 MB. Nothing was saved.'
};

/** Adds a table: {table} → 201 {id}; 400 carries `issues`, each with the path of its field. */
export const POST: RequestHandler = ({ locals, params, request }) =>
	answering(async () => {
		const body = await readJson(request, limit);
		onlyFields(body, ['table']);
		const id = await addMeasurements(contextOf(locals), params.id, body.table);
		return json({ id }, { status: 201 });
	});
