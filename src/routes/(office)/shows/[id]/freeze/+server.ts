import { json } from '@sveltejs/kit';
import { z } from 'zod';
import { AppError } from '$lib/server/errors';
import { answering } from '$lib/server/http/problem';
import { freezeEdition } from '$lib/server/shows';
import { contextOf } from '$lib/server/http/contextOf';
import { readJson } from '$lib/server/http/readJson';
import type { RequestHandler } from './$types';

const freezeSchema = z.strictObject({
	note: z.string().max(1000).default(''),
	revision: z.number().int().min(1)
});

/** Freezes the saved show: {note, revision} → the edition; 422 carries `reasons`. */
export const POST: RequestHandler = ({ locals, params, request }) =>
	answering(async () => {
		const body = freezeSchema.safeParse(await readJson(request));
		if (!body.success) throw new AppError('invalid', z.prettifyError(body.error));
		const edition = await freezeEdition(contextOf(locals), { showId: params.id, ...body.data });
		return json(edition, { status: edition.isNew ? 201 : 200 });
	});
