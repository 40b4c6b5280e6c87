import { json } from '@sveltejs/kit';
import { z } from 'zod';
import { claimPairing } from '$lib/server/domes';
import { giveToken } from '$lib/server/domes/screenOf';
import { answering, problem } from '$lib/server/http/problem';
import { readBody } from '$lib/server/http/readBody';
import type { RequestHandler } from './$types';

const bodySchema = z.strictObject({ claim: z.string().min(20).max(100) });

/** What became of a code: waiting, expired, or paired (the token then comes as a cookie). */
export const POST: RequestHandler = ({ cookies, request }) =>
	answering(async () => {
		const body = bodySchema.safeParse(await readBody(request));
		if (!body.success) return problem(400, 'A claim is {"claim": "…"}.');
		const answer = await claimPairing(body.data.claim);
		if (answer.status === 'paired') giveToken(cookies, answer.token);
		return json({ status: answer.status });
	});
