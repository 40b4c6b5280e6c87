import { json } from '@sveltejs/kit';
import { requestPairing } from '$lib/server/domes';
import { answering } from '$lib/server/http/problem';
import type { RequestHandler } from './$types';

/** A code for an unpaired dome page, the claim its browser keeps, and how long both last. */
export const POST: RequestHandler = ({ getClientAddress }) =>
	answering(async () => {
		const { code, claim, expiresAt } = await requestPairing(getClientAddress());
		return json({ code, claim, secondsLeft: (expiresAt.getTime() - Date.now()) / 1000 });
	});
