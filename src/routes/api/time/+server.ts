import { json } from '@sveltejs/kit';

/** The server's clock, milliseconds since 1970: screens and consoles measure their offset with it. */
export const GET = () => json({ now: Date.now() }, { headers: { 'cache-control': 'no-store' } });
