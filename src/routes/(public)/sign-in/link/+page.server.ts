import { callbackPath } from '$lib/server/auth/authjs';
import { safeNext } from '$lib/server/http/safeNext';
import type { PageServerLoad } from './$types';

/** Programs that open mailed links to look at them must not use the link up: a person presses. */
export const load: PageServerLoad = ({ url: { searchParams } }) => ({
	action: callbackPath,
	email: searchParams.get('email') ?? '',
	token: searchParams.get('token') ?? '',
	callbackUrl: safeNext(searchParams.get('callbackUrl'))
});
