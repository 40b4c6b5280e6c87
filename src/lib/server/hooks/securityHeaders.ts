import type { Handle } from '@sveltejs/kit';

const always = {
	'x-content-type-options': 'nosniff',
	// Links in mails carry tokens. Not no-referrer: forms would then send no Origin to check.
	'referrer-policy': 'same-origin',
	'permissions-policy': 'camera=(), microphone=(), geolocation=(), payment=(), usb=()',
	'cross-origin-opener-policy': 'same-origin'
};

/** Headers beside the content security policy, which svelte.config.js holds. */
export const securityHeaders: Handle = async ({ event, resolve }) => {
	const response = await resolve(event);
	for (const [name, value] of Object.entries(always)) response.headers.set(name, value);
	if (event.url.protocol === 'https:') {
		response.headers.set('strict-transport-security', 'max-age=31536000; includeSubDomains');
	}
	if (event.locals.person && !response.headers.has('cache-control')) {
		response.headers.set('cache-control', 'private, no-store');
	}
	return response;
};
