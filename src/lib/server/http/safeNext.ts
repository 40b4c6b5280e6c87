/**
 * Where to go after signing in: an address of this app, or home. A link that somebody sends must not
 * lead to another site.
 */
export function safeNext(next: string | null): string {
	if (!next || !next.startsWith('/')) return '/';
	const base = 'http://farwheel.invalid';
	const url = URL.parse(next, base);
	return url && url.origin === base && !url.pathname.startsWith('//')
		? url.pathname + url.search + url.hash
		: '/';
}
