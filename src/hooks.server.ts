import { sequence } from '@sveltejs/kit/hooks';
import type { ServerInit } from '@sveltejs/kit';
import { building } from '$app/environment';
import { authCallback } from '$lib/server/auth/authjs';
import { databaseAway } from '$lib/server/hooks/databaseAway';
import { guard } from '$lib/server/hooks/guard';
import { reportError } from '$lib/server/hooks/reportError';
import { requestId } from '$lib/server/hooks/requestId';
import { securityHeaders } from '$lib/server/hooks/securityHeaders';
import { session } from '$lib/server/hooks/session';
import { shutDown, startUp } from '$lib/server/hooks/startUp';

export const init: ServerInit = async () => {
	if (building) return;
	await startUp();
	process.once('sveltekit:shutdown', shutDown);
};

export const handle = sequence(
	requestId,
	securityHeaders,
	databaseAway,
	authCallback,
	session,
	guard
);

export const handleError = reportError;
