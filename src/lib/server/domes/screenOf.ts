import type { Cookies } from '@sveltejs/kit';
import type { domes } from '../db/schema';
import { environment } from '../env';
import { screenByToken, type Screen } from './screens';

const cookieName = 'farwheel_screen';
const cookieDays = 400;

/** Leaves the token with the browser; scripts cannot read it. */
export function giveToken(cookies: Cookies, token: string): void {
	cookies.set(cookieName, token, {
		path: '/',
		httpOnly: true,
		sameSite: 'lax',
		secure: environment().ORIGIN.startsWith('https:'),
		maxAge: cookieDays * 24 * 3600
	});
}

/** The screen a request comes from, by its cookie or `Authorization: Bearer`; null where unpaired. */
export async function screenOf(event: {
	cookies: Cookies;
	request: Request;
}): Promise<{ screen: Screen; dome: typeof domes.$inferSelect } | null> {
	const bearer = /^Bearer (\S{20,})$/.exec(event.request.headers.get('authorization') ?? '');
	const token = bearer?.[1] ?? event.cookies.get(cookieName);
	return token ? screenByToken(token) : null;
}
