import type { RequestEvent } from '@sveltejs/kit';
import { sessionCookie } from './sessionRules';
import type { StartedSession } from './startSession';

const cookieOf = ({ url }: RequestEvent) => sessionCookie(url.protocol === 'https:');

export const sessionToken = (event: RequestEvent): string | undefined =>
	event.cookies.get(cookieOf(event).name);

export function setSessionCookie(event: RequestEvent, { token, expires }: StartedSession): void {
	const { name, options } = cookieOf(event);
	event.cookies.set(name, token, { ...options, expires });
}

export function clearSessionCookie(event: RequestEvent): void {
	const { name, options } = cookieOf(event);
	event.cookies.delete(name, options);
}
